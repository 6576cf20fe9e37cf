import { buildPart } from '../part/build';
import type { Part } from '../part/part';
import type { Advice, Problem } from '../problem';
import type { LengthUnit } from '../units/length';
import { buildScope, spreadBad } from './build-scope';
import { compileExpression } from './expression';
import { templateHash } from './hash';
import { fieldsOf, isShown, judgeConstraints, judgeRange } from './judge';
import { judgeTolerances } from './judge-tolerances';
import { partInput } from './part-from-template';
import { readTyped, type ReadParameters } from './read-typed';
import type { Scope } from './scope';
import type { EvaluatedParameters, Evaluation, EvaluationOptions, Template, TypedValues } from './template';
import { fillSentence } from './words';

/** More sentences than this help nobody; the first ones are kept. */
const MAX_PROBLEMS = 50;

/**
 * Values as typed to a Part. Every bad value is a problem at its own path, with what is allowed in the entry unit;
 * on problems `part` is absent. Whatever is typed, it never throws.
 */
export function evaluate(template: Template, typed: TypedValues, options: EvaluationOptions): Evaluation {
  const read = readTyped(template, typed, options.entryUnit);
  const { problems, scope, parameters } = judge(template, read, options);
  const finish = (all: readonly Problem[], part?: Part, advice: readonly Advice[] = []): Evaluation => ({
    template: template.id,
    templateHash: templateHash(template),
    entryUnit: options.entryUnit,
    parameters,
    problems: all.slice(0, MAX_PROBLEMS),
    advice,
    ...(part ? { part } : {}),
  });
  if (problems.length > 0) return finish(problems);
  const { input, pathOf } = partInput(template, scope);
  const built = buildPart(input);
  if (!('part' in built)) {
    return finish(
      built.problems.map(({ input: id, message }) => ({
        path: pathOf.get(id) ?? firstPath(template),
        message,
      })),
    );
  }
  return finish([], built.part, remarksOn(template, scope, options.entryUnit));
}

function remarksOn(template: Template, scope: Scope, unit: LengthUnit): Advice[] {
  return (template.remarks ?? []).flatMap(({ code, parameter, when, message }) =>
    compileExpression(when).run(scope) === true
      ? [{ code, path: parameter, message: fillSentence(message, scope, unit) }]
      : [],
  );
}

function firstPath(template: Template): string {
  return template.parameters[0]?.id ?? 'parameters';
}

function judge(
  template: Template,
  read: ReadParameters,
  { entryUnit }: EvaluationOptions,
): { problems: Problem[]; scope: Scope; parameters: EvaluatedParameters } {
  const parameters = hideUnshown(template, read);
  const scope = buildScope(template, parameters);
  const problems = [...read.firm, ...read.problems.values()];
  const bad = new Set<string>();
  const markBad = (path: string): void => {
    bad.add(path);
    const cell = /^(.*)\[\d+\]\.(.*)$/.exec(path);
    if (cell) bad.add(`${cell[1]}.${cell[2]}`);
  };
  for (const { path } of problems) markBad(path);
  for (const field of fieldsOf(template, parameters, scope)) {
    if (bad.has(field.path)) continue;
    const problem = judgeRange(field, bad, entryUnit);
    if (!problem) continue;
    problems.push(problem);
    markBad(problem.path);
  }
  spreadBad(template, scope, bad);
  problems.push(...judgeConstraints(template, scope, bad, entryUnit));
  if (problems.length === 0) problems.push(...judgeTolerances(template, parameters, scope, entryUnit));
  return { problems: inFieldOrder(template, problems), scope, parameters };
}

/** A value of a field that is not shown stays as typed but counts for nothing, whatever it says. */
function hideUnshown(template: Template, read: ReadParameters): EvaluatedParameters {
  const scope = buildScope(template, read.parameters);
  const bad = new Set(read.problems.keys());
  for (const field of fieldsOf(template, read.parameters, scope)) {
    if (isShown(field, bad)) continue;
    read.problems.delete(field.path);
    const unset = { text: field.value.text, value: null };
    if (!field.row) read.parameters.values[field.parameter.id] = unset;
    else {
      const rows = read.parameters.tables[field.row.table];
      const row = rows?.[field.row.index];
      if (rows && row)
        rows[field.row.index] = { key: row.key, values: { ...row.values, [field.parameter.id]: unset } };
    }
  }
  return read.parameters;
}

/** Problems in the order of the form, so that the first one named is the first one met. */
function inFieldOrder(template: Template, problems: readonly Problem[]): Problem[] {
  const order = new Map(template.parameters.map(({ id }, index) => [id, index]));
  const rank = ({ path }: Problem): number => order.get(/^[^[.]*/.exec(path)?.[0] ?? '') ?? order.size;
  const rowOf = ({ path }: Problem): number => Number(/\[(\d+)\]/.exec(path)?.[1] ?? '-1');
  return problems
    .map((problem, index) => ({ problem, index }))
    .sort(
      (a, b) => rank(a.problem) - rank(b.problem) || rowOf(a.problem) - rowOf(b.problem) || a.index - b.index,
    )
    .map(({ problem }) => problem);
}
