import { describe, expect, it } from 'vitest';
import { checkSheet } from '../../../shared/drawing/check/check-sheet';
import { drawSheet } from '../../../shared/drawing/draw';
import type { DrawingOptions } from '../../../shared/drawing/sheet';
import { renderSvg } from '../../../shared/render/svg';
import type { TypedValues } from '../../../shared/template/template';
import { depotTitle, partAndScheme, sheetOf } from '../../corpus/sheet-of';

const shaft = (title: string, ...steps: [diameter: string, length: string][]): TypedValues => ({
  title,
  quantity: '1',
  leftChamfer: '0',
  rightChamfer: '0',
  steps: steps.map(([diameter, length], i) => ({ key: `r${i + 1}`, diameter, length, fit: '', thread: '' })),
});
const collars = Array.from({ length: 9 }, (_, i): [string, string] =>
  i % 2 === 0 ? ['20', i === 0 || i === 8 ? '30' : '1'] : ['26', '1'],
);
const twelve = Array.from({ length: 12 }, (_, i): [string, string] => [String(40 - 2 * i), String(8 + i)]);
const parts: readonly (readonly [string, TypedValues])[] = [
  ['a rod of 3000 by 3', shaft('Rod', ['3', '3000'])],
  ['a disc of 200 by 5', shaft('Disc', ['200', '5'])],
  ['collars of 1 mm', shaft('Collars', ...collars)],
  ['twelve rows', shaft('Twelve', ...twelve)],
  ['sizes with decimals', shaft('Fine', ['12.345', '20.125'], ['9.875', '15.0625'])],
];
const styles = [
  { style: 'iso', unit: 'mm' },
  { style: 'asme', unit: 'in' },
  { style: 'asme', unit: 'mm' },
  { style: 'iso', unit: 'in' },
] as const;

describe('parts at the edge', () => {
  it.each(parts.flatMap(([name, typed]) => styles.map((s) => [name, s.style, s.unit, typed] as const)))(
    'draws %s clean in %s, %s',
    (_, style, unit, typed) => {
      const { part, scheme, sheet } = sheetOf('stepped-shaft', typed, { style, unit });
      expect(checkSheet(sheet, scheme, part)).toEqual([]);
      expect(renderSvg(sheet)).not.toMatch(/NaN|undefined|Infinity/);
    },
  );

  it('prints a title of eighty characters as typed, dashes and arrows and accents unjoined', () => {
    const title = 'Spindle A--B -> sluice, Überlauf Étage é, No 3 of the northern paddle gear frame';
    const { sheet, part, scheme } = sheetOf('stepped-shaft', shaft(title, ['20', '60']), {
      style: 'iso',
      unit: 'mm',
      options: { titleBlock: { ...depotTitle, title } },
    });
    const words = sheet.groups
      .filter((g) => g.role === 'title-block')
      .flatMap((g) => g.marks.flatMap((m) => (m.type === 'text' ? [m.text] : [])));
    expect(words.join(' ')).toContain(title);
    expect(checkSheet(sheet, scheme, part)).toEqual([]);
    expect(renderSvg(sheet)).toContain('A--B -&gt;');
  });
});

describe('a sheet or a scale that cannot hold the part', () => {
  const { part, scheme } = partAndScheme('stepped-shaft', shaft('Long', ['60', '400']), {
    style: 'iso',
    unit: 'mm',
  });
  const refusal = (pinned: Partial<DrawingOptions>): { path: string; message: string } => {
    const result = drawSheet(part, scheme, {
      style: 'iso',
      unit: 'mm',
      sheet: 'auto',
      scale: 'auto',
      balloons: false,
      titleBlock: depotTitle,
      ...pinned,
    });
    if (!('problem' in result)) throw new Error('It was drawn.');
    return result.problem;
  };

  it('is refused at its field, with what would fit', () => {
    const both = refusal({ sheet: 'A4', scale: 5 });
    expect(both.path).toBe('scale');
    expect(both.message).toMatch(
      /400 mm long and 60 mm in diameter and does not fit sheet A4 at the scale 5:1\./,
    );
    expect(both.message).toMatch(/It would fit A4 at 1:2/);
    const scale = refusal({ scale: 10 });
    expect(scale).toMatchObject({ path: 'scale' });
    expect(scale.message).toMatch(/It would fit A\d at 1:/);
  });
});
