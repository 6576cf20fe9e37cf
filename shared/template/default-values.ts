import type { LengthUnit } from '../units/length';
import { isTable } from './read-typed';
import type { ParameterBase, Template, TypedRow, TypedValues, WorkedExample } from './template';

/** A default as it must be typed in a drawing of this entry unit: defaults are written in millimetres. */
function typedDefault(parameter: ParameterBase, text: string, entryUnit: LengthUnit): string {
  const isLength = parameter.kind === 'length' || parameter.kind === 'diameter';
  return isLength && entryUnit === 'in' && /^[\d.]+$/.test(text) && Number(text) !== 0 ? `${text} mm` : text;
}

/** What a new drawing starts with, typed as a person of that entry unit would have typed it. Parameters not built yet are left out. */
export function defaultValues(template: Template, entryUnit: LengthUnit = 'mm'): TypedValues {
  const values: TypedValues = {};
  for (const parameter of template.parameters) {
    if (parameter.notYet !== undefined) continue;
    if (!isTable(parameter)) {
      values[parameter.id] = typedDefault(parameter, parameter.default ?? '', entryUnit);
      continue;
    }
    const columns = new Map(parameter.columns.map((column) => [column.id, column]));
    values[parameter.id] = (parameter.defaultRows ?? []).map((row): TypedRow => {
      const typed: TypedRow = { key: row.key };
      for (const [id, text] of Object.entries(row)) {
        const column = columns.get(id);
        if (column) typed[id] = typedDefault(column, text, entryUnit);
      }
      return typed;
    });
  }
  return values;
}

/** The worked examples of a family, the first one always there. */
export function workedExamples(template: Template): readonly WorkedExample[] {
  return (
    template.examples ?? [
      { id: `${template.id}-example`, name: template.name, entryUnit: 'mm', values: template.example },
    ]
  );
}

/** The values of the family's first worked example, completed with its defaults. Its entry unit is millimetres. */
export function exampleValues(template: Template): TypedValues {
  return { ...defaultValues(template), ...template.example };
}
