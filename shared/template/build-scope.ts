import { compileExpression } from './expression';
import type { Compiled } from './expression-compile';
import { toleranceKey } from './read-value';
import { atRow, type ExpressionValue, type Scope } from './scope';
import type { EvaluatedParameters, EvaluatedValue, Template } from './template';

/** The scope of a template's expressions: what was read, then every derived value in the order written. */
export function buildScope(template: Template, parameters: EvaluatedParameters): Scope {
  const scope: Scope = { values: new Map(), tables: new Map() };
  for (const [id, value] of Object.entries(parameters.values)) enter(scope.values, id, value);
  for (const [id, rows] of Object.entries(parameters.tables)) {
    scope.tables.set(
      id,
      rows.map((row) => {
        const values = new Map<string, ExpressionValue>();
        for (const [column, value] of Object.entries(row.values)) enter(values, column, value);
        return { key: row.key, values };
      }),
    );
  }
  for (const { id, value, each } of template.derived) {
    const expression = compileExpression(value);
    if (each === undefined) scope.values.set(id, expression.run(scope));
    else {
      scope.tables.get(each)?.forEach((row, index) => {
        row.values.set(id, expression.run(atRow(scope, each, index)));
      });
    }
  }
  return scope;
}

function enter(values: Map<string, ExpressionValue>, id: string, { value, tolerance }: EvaluatedValue): void {
  values.set(id, value);
  values.set(`${id}.tolerance`, toleranceKey(tolerance));
}

/** Whether everything an expression reads was good; `bad` holds names, `table.column` and `table[index].column`. */
export function readsOnlyGood(
  expression: Compiled,
  bad: ReadonlySet<string>,
  row?: { table: string; index: number },
): boolean {
  for (const name of expression.symbols) if (bad.has(name)) return false;
  if (row) {
    for (const column of expression.columns)
      if (bad.has(`${row.table}[${row.index}].${column}`)) return false;
  }
  for (const name of expression.tableColumns) {
    const table = name.slice(0, name.indexOf('.'));
    if (bad.has(table) || bad.has(name)) return false;
  }
  return true;
}

/** Adds to `bad` every derived value that was worked out from something bad. */
export function spreadBad(template: Template, scope: Scope, bad: Set<string>): void {
  for (const { id, value, each } of template.derived) {
    const expression = compileExpression(value);
    if (each === undefined) {
      if (!readsOnlyGood(expression, bad)) bad.add(id);
      continue;
    }
    scope.tables.get(each)?.forEach((_, index) => {
      if (readsOnlyGood(expression, bad, { table: each, index })) return;
      bad.add(`${each}[${index}].${id}`);
      bad.add(`${each}.${id}`);
    });
  }
}
