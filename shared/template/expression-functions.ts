import { parseThread } from '../standards/threads';
import type { ExpressionValue, Scope, ScopeRow } from './scope';

/** What a call is given: its values, already worked out, and the scope they were read in. */
export interface ExpressionFunction {
  least: number;
  most: number;
  /** Position of the arguments that name a table and one of its columns, so that what a call depends on is known. */
  table?: number;
  column?: number;
  /** True where an unset argument is meaningful; otherwise a call with one comes to unset. */
  takesUnset?: boolean;
  apply: (args: readonly ExpressionValue[], scope: Scope) => ExpressionValue;
}

function figures(args: readonly ExpressionValue[]): number[] {
  return args.map((value) => (typeof value === 'number' ? value : Number.NaN));
}

function ofFigures(least: number, most: number, formula: (...args: number[]) => number): ExpressionFunction {
  return { least, most, apply: (args) => formula(...figures(args)) };
}

function rowsOf(args: readonly ExpressionValue[], scope: Scope): readonly ScopeRow[] {
  return scope.tables.get(String(args[0])) ?? [];
}

function columnOf(row: ScopeRow | undefined, column: ExpressionValue | undefined): ExpressionValue {
  return row?.values.get(String(column)) ?? null;
}

function sum(rows: readonly ScopeRow[], column: ExpressionValue | undefined): ExpressionValue {
  let total = 0;
  for (const row of rows) {
    const value = columnOf(row, column);
    if (typeof value !== 'number') return null;
    total += value;
  }
  return total;
}

function ofThread(read: (thread: { major: number; pitch: number }) => number): ExpressionFunction {
  return {
    least: 1,
    most: 1,
    apply: ([designation]) => {
      const thread = parseThread(String(designation));
      return thread.ok ? read(thread.value) : null;
    },
  };
}

/** The short list. Lengths in mm, angles in radians. */
export const FUNCTIONS: Readonly<Record<string, ExpressionFunction>> = {
  min: ofFigures(1, 8, Math.min),
  max: ofFigures(1, 8, Math.max),
  abs: ofFigures(1, 1, Math.abs),
  sqrt: ofFigures(1, 1, Math.sqrt),
  sin: ofFigures(1, 1, Math.sin),
  cos: ofFigures(1, 1, Math.cos),
  tan: ofFigures(1, 1, Math.tan),
  atan: ofFigures(1, 1, Math.atan),
  /** Whether a parameter has a value. */
  given: { least: 1, most: 1, takesUnset: true, apply: ([value]) => value !== null && value !== undefined },
  /** The first value that is set. */
  either: {
    least: 2,
    most: 4,
    takesUnset: true,
    apply: (args) => args.find((value) => value !== null) ?? null,
  },
  majorOf: ofThread((thread) => thread.major),
  pitchOf: ofThread((thread) => thread.pitch),
  count: { least: 1, most: 1, table: 0, apply: (args, scope) => rowsOf(args, scope).length },
  sumOf: {
    least: 2,
    most: 2,
    table: 0,
    column: 1,
    apply: (args, scope) => sum(rowsOf(args, scope), args[1]),
  },
  /** Sum of a column over the rows before an index. */
  sumBefore: {
    least: 3,
    most: 3,
    table: 0,
    column: 1,
    apply: (args, scope) => sum(rowsOf(args, scope).slice(0, Number(args[2])), args[1]),
  },
  /** A column's value in one row, unset outside the table. */
  valueAt: {
    least: 3,
    most: 3,
    table: 0,
    column: 1,
    apply: (args, scope) => columnOf(rowsOf(args, scope)[Number(args[2])], args[1]),
  },
  /** The tolerance typed with a size in one row, in canonical words, '' where none. */
  toleranceAt: {
    least: 3,
    most: 3,
    table: 0,
    column: 1,
    apply: (args, scope) =>
      columnOf(rowsOf(args, scope)[Number(args[2])], `${String(args[1])}.tolerance`) ?? '',
  },
  keyAt: {
    least: 2,
    most: 2,
    table: 0,
    apply: (args, scope) => rowsOf(args, scope)[Number(args[1])]?.key ?? null,
  },
  /** Index of the last row of the run that starts at an index, each following row saying yes in a column. */
  runEnd: {
    least: 3,
    most: 3,
    table: 0,
    column: 1,
    apply: (args, scope) => {
      const rows = rowsOf(args, scope);
      let end = Number(args[2]);
      while (columnOf(rows[end + 1], args[1]) === true) end += 1;
      return end;
    },
  },
  /** Texts put one after another: a feature's id from a row's key. */
  join: { least: 2, most: 4, apply: (args) => args.map(String).join('') },
};
