import type { EngineResult } from '../../shared/engine';
import { buildScope } from '../../shared/template/build-scope';
import { fieldsOf, isShown } from '../../shared/template/judge';
import { templateById } from '../../templates';

/** Paths of the fields that these values show, by the family's own conditions. */
export function shownPaths({
  evaluation,
  problems,
}: Pick<EngineResult, 'evaluation' | 'problems'>): string[] {
  const template = templateById(evaluation.template);
  if (!template) return [];
  const bad = new Set(problems.map(({ path }) => path));
  const scope = buildScope(template, evaluation.parameters);
  return fieldsOf(template, evaluation.parameters, scope)
    .filter((field) => isShown(field, bad))
    .map(({ path }) => path);
}
