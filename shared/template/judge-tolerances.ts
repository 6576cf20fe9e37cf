import type { Problem } from '../problem';
import { fitLimits } from '../standards/iso286';
import type { LengthUnit } from '../units/length';
import { toleranceKey } from './read-value';
import type { Scope } from './scope';
import { sizeInstances, type SizeInstance } from './size-instances';
import type { EvaluatedParameters, Template } from './template';
import { lengthInWords } from './words';

/** Tolerances that cannot be: a fit that is not tabled, a hole's code on a shaft, limits wider than the size itself, two that disagree. */
export function judgeTolerances(
  template: Template,
  parameters: EvaluatedParameters,
  scope: Scope,
  unit: LengthUnit,
): Problem[] {
  return sizeInstances(template, parameters, scope).flatMap((size): Problem[] => {
    const path = size.fitParameter ?? size.parameter;
    if (path === undefined) return [];
    const message = disagreement(parameters, size) ?? impossible(size, unit);
    return message === undefined ? [] : [{ path, message }];
  });
}

function impossible({ tolerance, nominal }: SizeInstance, unit: LengthUnit): string | undefined {
  if (tolerance.kind === 'none') return undefined;
  if (tolerance.kind === 'fit') {
    const { code } = tolerance;
    if (code !== code.toLowerCase()) {
      return `${code} is a fit for a hole. This is an outside size: give it in small letters, such as ${code.toLowerCase()}.`;
    }
    const limits = fitLimits(code, nominal);
    if (!limits.ok) return limits.message;
    return limits.value.lower <= -nominal
      ? `${code} leaves nothing of a size of ${lengthInWords(nominal, unit)}. Give a finer fit.`
      : undefined;
  }
  const widest = Math.max(Math.abs(tolerance.upper), Math.abs(tolerance.lower));
  return widest >= nominal
    ? `A tolerance of ${lengthInWords(widest, unit)} is as large as the size of ${lengthInWords(nominal, unit)} itself. Give a smaller tolerance.`
    : undefined;
}

/** A fit typed beside the size and another in the fit's own field. */
function disagreement(parameters: EvaluatedParameters, size: SizeInstance): string | undefined {
  const { template, parameter } = size;
  if (template.parameter === undefined || template.fit === undefined || parameter === undefined)
    return undefined;
  const place = /^(.*)\[(\d+)\]\./.exec(parameter);
  const values = place ? parameters.tables[place[1] ?? '']?.[Number(place[2])]?.values : parameters.values;
  const beside = toleranceKey(values?.[template.parameter]?.tolerance);
  const ownField = toleranceKey(values?.[template.fit]?.tolerance);
  return beside === '' || ownField === '' || beside === ownField
    ? undefined
    : `Two tolerances are given for one size, ${beside} beside it and ${ownField} here. Leave one of them out.`;
}
