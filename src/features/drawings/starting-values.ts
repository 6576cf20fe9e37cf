import type { StartDrawingRequest } from '../../../shared/api/drawings';
import type { Template, TypedValues } from '../../../shared/template/template';
import type { LengthUnit } from '../../../shared/units/length';
import { defaultValues, workedExamples } from '../../../shared/template/default-values';

/**
 * What a new drawing is filled in with: the family's worked example where there is one in this entry unit, else its
 * defaults, which name their millimetres in an inch drawing.
 */
export function startingValues(template: Template, entryUnit: LengthUnit, title: string): TypedValues {
  const example = workedExamples(template).find((each) => each.entryUnit === entryUnit);
  const values = { ...defaultValues(template, entryUnit), ...(example?.values ?? {}) };
  return { ...values, title };
}

/** Whose sizes a new drawing begins with, in words. */
export function beginsWith(template: Template, entryUnit: LengthUnit): string {
  const example = workedExamples(template).find((each) => each.entryUnit === entryUnit);
  return example
    ? `It begins with the sizes of a worked example, ${example.name}: there is a sheet to look at, and you type your own sizes over them.`
    : 'It begins with the usual sizes of the family, in millimetres: there is a sheet to look at, and you type your own sizes over them.';
}

/** A sheet as the style draws it unless somebody says otherwise. */
export function startingSettings(style: 'iso' | 'asme', unit: LengthUnit): StartDrawingRequest['settings'] {
  return { unit, style, sheet: 'auto', scale: 'auto', balloons: true };
}
