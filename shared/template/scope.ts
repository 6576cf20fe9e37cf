/** A figure (mm, radians, count), a text (choice, thread designation), a yes/no, or null where unset. */
export type ExpressionValue = number | string | boolean | null;

export interface ScopeRow {
  key: string;
  /** Columns and derived row values; `<column>.tolerance` holds the tolerance typed with a size, in canonical words. */
  values: Map<string, ExpressionValue>;
}

/** All an expression can see: the parameters, the derived values, and the rows of tables. */
export interface Scope {
  values: Map<string, ExpressionValue>;
  tables: Map<string, ScopeRow[]>;
  row?: ScopeRow;
  index?: number;
}

export function atRow(scope: Scope, table: string, index: number): Scope {
  const row = scope.tables.get(table)?.[index];
  return row ? { values: scope.values, tables: scope.tables, row, index } : scope;
}
