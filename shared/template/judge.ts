import type { Problem } from '../problem';
import type { LengthUnit } from '../units/length';
import { readsOnlyGood } from './build-scope';
import { compileExpression } from './expression';
import { isTable } from './read-typed';
import { atRow, type Scope } from './scope';
import type { EvaluatedParameters, EvaluatedValue, ParameterBase, Template } from './template';
import {
  fillSentence,
  labelInSentence,
  leastInWords,
  lengthInWords,
  mostInWords,
  rangeInWords,
} from './words';

/** A parameter that may be judged where it stands: path, value, the scope of its row. */
export interface Field {
  parameter: ParameterBase;
  path: string;
  value: EvaluatedValue;
  scope: Scope;
  row?: { table: string; index: number };
}

export function fieldsOf(template: Template, parameters: EvaluatedParameters, scope: Scope): Field[] {
  return template.parameters.flatMap((parameter): Field[] => {
    if (!isTable(parameter)) {
      const value = parameters.values[parameter.id];
      return value ? [{ parameter, path: parameter.id, value, scope }] : [];
    }
    const table = parameter.id;
    return (parameters.tables[table] ?? []).flatMap((row, index) =>
      parameter.columns.flatMap((column): Field[] => {
        const value = row.values[column.id];
        if (!value) return [];
        const path = `${table}[${index}].${column.id}`;
        return [{ parameter: column, path, value, scope: atRow(scope, table, index), row: { table, index } }];
      }),
    );
  });
}

/** Whether a field is shown; a condition that rests on something bad counts as shown. */
export function isShown(field: Field, bad: ReadonlySet<string>): boolean {
  if (field.parameter.when === undefined) return true;
  const when = compileExpression(field.parameter.when);
  return !readsOnlyGood(when, bad, field.row) || when.run(field.scope) === true;
}

/** Judges one value against its own least and most; 0 of an optional size means none and is let through. */
export function judgeRange(field: Field, bad: ReadonlySet<string>, unit: LengthUnit): Problem | undefined {
  const { parameter, value, path } = field;
  if (typeof value.value !== 'number' || (value.value === 0 && parameter.optional)) return undefined;
  const bound = (source: string | undefined): number | undefined => {
    if (source === undefined) return undefined;
    const expression = compileExpression(source);
    const worth = readsOnlyGood(expression, bad, field.row) ? expression.run(field.scope) : undefined;
    return typeof worth === 'number' ? worth : undefined;
  };
  const [least, most] = [bound(parameter.minimum), bound(parameter.maximum)];
  const small = least !== undefined && value.value < least - RANGE_SLACK;
  const large = most !== undefined && value.value > most + RANGE_SLACK;
  if (!small && !large) return undefined;
  const isLength = parameter.kind === 'length' || parameter.kind === 'diameter';
  const given = isLength ? lengthInWords(value.value, unit) : String(value.value);
  return {
    path,
    message: `${given} is too ${small ? 'small' : 'large'} for the ${labelInSentence(parameter.label)}. Give ${allowed(least, most, isLength, unit)}.`,
  };
}

/** A bound written as a formula may miss a round figure by the last bit. */
const RANGE_SLACK = 1e-9;

function allowed(
  least: number | undefined,
  most: number | undefined,
  isLength: boolean,
  unit: LengthUnit,
): string {
  if (least !== undefined && most !== undefined) {
    return isLength ? rangeInWords(least, most, unit) : `${least} to ${most}`;
  }
  if (least !== undefined)
    return isLength ? `${leastInWords(least, unit)} ${unit} or more` : `${least} or more`;
  return isLength ? `${mostInWords(most ?? 0, unit)} ${unit} or less` : `${most ?? 0} or less`;
}

/** Every constraint that rests on good values and does not hold, at most one a field. */
export function judgeConstraints(
  template: Template,
  scope: Scope,
  bad: ReadonlySet<string>,
  unit: LengthUnit,
): Problem[] {
  const problems: Problem[] = [];
  const said = new Set<string>();
  for (const { holds, when, parameter, message, each } of template.constraints) {
    const judged = compileExpression(holds);
    const applies = when === undefined ? undefined : compileExpression(when);
    const rows = each === undefined ? [undefined] : (scope.tables.get(each) ?? []).map((_, index) => index);
    for (const index of rows) {
      const row = each === undefined || index === undefined ? undefined : { table: each, index };
      const here = row ? atRow(scope, row.table, row.index) : scope;
      const path = row ? `${row.table}[${row.index}].${parameter}` : parameter;
      if (said.has(path) || bad.has(path)) continue;
      if (!readsOnlyGood(judged, bad, row) || (applies && !readsOnlyGood(applies, bad, row))) continue;
      if (applies && applies.run(here) !== true) continue;
      if (judged.run(here) !== false) continue;
      said.add(path);
      problems.push({ path, message: fillSentence(message, here, unit) });
    }
  }
  return problems;
}
