import { describe, expect, it } from 'vitest';
import { exampleValues } from '../../../shared/template/default-values';
import { evaluate } from '../../../shared/template/evaluate';
import type { TypedRow, TypedValues } from '../../../shared/template/template';
import { templateById } from '../../../templates';
import { shownPaths } from '../../../src/engine/shown-paths';
import { formRows, offeredChoices } from '../../../src/features/fill-in/field-rows';

function rowsOf(id: string, change: TypedValues = {}) {
  const template = templateById(id);
  if (!template) throw new Error(`no family ${id}`);
  const values = { ...exampleValues(template), ...change };
  const evaluation = evaluate(template, values, { entryUnit: 'mm' });
  const shown = shownPaths({ evaluation, problems: evaluation.problems });
  return formRows(template, values, shown);
}
const paths = (rows: ReturnType<typeof rowsOf>) =>
  rows.shape.map((row) => (row.kind === 'one' ? row.path : row.parameter.id));

describe('the form of a family', () => {
  it('shows a field only while the values ask for it', () => {
    expect(paths(rowsOf('tapered-handle', { grip: 'hex' }))).toContain('acrossFlats');
    expect(paths(rowsOf('tapered-handle', { grip: 'round' }))).not.toContain('acrossFlats');
  });

  it('shows the sizes of the stored sheet before the engine has said which fields count', () => {
    const template = templateById('tapered-handle');
    if (!template) throw new Error('no such family');
    const values = { ...exampleValues(template), grip: 'hex' };
    const stored = new Set(['acrossFlats', 'spigotDiameter']);
    expect(paths(formRows(template, values, null, stored))).toEqual(expect.arrayContaining([...stored]));
    expect(paths(formRows(template, values, null))).not.toContain('acrossFlats');
  });

  it('puts title, material and quantity after the shape, and what cannot be asked for yet apart', () => {
    const rows = rowsOf('tapered-handle');
    expect(rows.sheet.map(({ path }) => path)).toEqual(['title', 'material', 'quantity']);
    expect(rows.notYet.length).toBeGreaterThan(0);
    for (const { parameter } of rows.notYet) expect(parameter.notYet).toBeTruthy();
    const shown = paths(rows);
    for (const { path } of rows.notYet) expect(shown).not.toContain(path);
  });

  it('offers no choice that cannot be drawn yet, and no field that leaves nothing to choose', () => {
    const rows = rowsOf('tapered-handle');
    expect(paths(rows)).not.toContain('taperBy');
    const grip = rows.shape.find((row) => row.kind === 'one' && row.path === 'grip');
    if (grip?.kind !== 'one') throw new Error('a tapered handle asks for its grip');
    expect(offeredChoices(grip.parameter, 'hex').map(({ id }) => id)).toEqual(['round', 'hex']);
    expect(offeredChoices(grip.parameter, 'knurled').map(({ id }) => id)).toContain('knurled');
    expect(rows.notYetChoices.map(({ label }) => label)).toEqual(
      expect.arrayContaining(['Grip: knurled', 'Taper given by: half angle, included angle, ratio']),
    );
    expect(paths(rowsOf('tapered-handle', { taperBy: 'ratio' }))).toContain('taperBy');
  });

  it('gives every row of a table its cells, a new one too', () => {
    const steps: TypedRow[] = [{ key: 'n', diameter: '20', length: '30' }, { key: 'm' }];
    const [table] = rowsOf('stepped-shaft', { steps }).shape;
    if (table?.kind !== 'table') throw new Error('the first field of a stepped shaft is its steps');
    expect(table.rows.map(({ key }) => key)).toEqual(['n', 'm']);
    for (const row of table.rows)
      expect(row.cells.map(({ path }) => path)).toEqual(
        expect.arrayContaining([
          `steps[${row.index}].diameter`,
          `steps[${row.index}].length`,
          `steps[${row.index}].thread`,
        ]),
      );
  });
});
