import { describe, expect, it } from 'vitest';
import { checkSheet } from '../../shared/drawing/check/check-sheet';
import type { DraftingStyle, Sheet } from '../../shared/drawing/sheet';
import { renderSvg } from '../../shared/render/svg';
import type { TypedValues } from '../../shared/template/template';
import { draw, partAndScheme } from '../corpus/sheet-of';
import { pinned } from './generators/pinned';
import { steppedShaftValues } from './generators/stepped-shaft';
import { taperedHandleValues } from './generators/tapered-handle';

const PARTS = 200;
/** Parts a test, so that none takes long. */
const CHUNK = 50;
/** Every so many parts are drawn in the style's other unit too, and drawn again to compare bytes. */
const ALSO = 5;

const families = [
  ['stepped-shaft', pinned(steppedShaftValues, PARTS)],
  ['tapered-handle', pinned(taperedHandleValues, PARTS)],
] as const;
const styles: readonly (readonly [DraftingStyle, 'mm' | 'in'])[] = [
  ['iso', 'mm'],
  ['asme', 'in'],
];

/** Draws the part and says what is wrong with its sheet, with the values it came from. */
function faultsOf(
  template: string,
  typed: TypedValues,
  style: DraftingStyle,
  unit: 'mm' | 'in',
  twice: boolean,
): string[] {
  const { part, scheme } = partAndScheme(template, typed, { style, unit });
  const sheet: Sheet = draw(part, scheme, { style, unit });
  const svg = renderSvg(sheet);
  const faults = checkSheet(sheet, scheme, part).map((f) => `${f.rule}: ${f.message}`);
  if (/NaN|Infinity|undefined/.test(svg)) faults.push('the SVG holds what is no number');
  if (sheet.groups.filter((g) => g.role === 'dimension').length !== scheme.sizes.length)
    faults.push('sizes are missing');
  if (twice && renderSvg(draw(part, scheme, { style, unit })) !== svg)
    faults.push('the same values gave other bytes');
  return faults.map((fault) => `${style} ${unit} ${fault} of ${JSON.stringify(typed)}`);
}

describe.each(families)('%s', (template, values) => {
  const chunks = Array.from({ length: PARTS / CHUNK }, (_, k) => k * CHUNK);
  it.each(styles.flatMap(([style, unit]) => chunks.map((from) => [style, unit, from] as const)))(
    'draws clean in %s, %s, parts from %i',
    (style, unit, from) => {
      const faults = values.slice(from, from + CHUNK).flatMap((typed, i) => {
        const other = unit === 'mm' ? 'in' : 'mm';
        const also = i % ALSO === 0;
        return [
          ...faultsOf(template, typed, style, unit, also),
          ...(also ? faultsOf(template, typed, style, other, false) : []),
        ];
      });
      expect(faults).toEqual([]);
    },
  );
});
