import { describe, expect, it } from 'vitest';
import type { Mark } from '../../../shared/drawing/sheet';
import { namedParts } from '../../corpus/named-parts';
import { sheetOf } from '../../corpus/sheet-of';

const windlass = namedParts.find((p) => p.name === 'windlass-handle');
if (!windlass) throw new Error('The corpus has lost its windlass handle.');
const at = (scale: number, sheet: 'A4' | 'A3') =>
  sheetOf(windlass.template, windlass.typed, { ...windlass, options: { scale, sheet } });

/** Upright edges within a millimetre of the right end of the axis view. */
function edgesNearEnd(scale: number, sheet: 'A4' | 'A3'): number {
  const drawn = at(scale, sheet).sheet;
  const view = drawn.groups.find((g) => g.view === 'axis');
  const knots = drawn.maps.find((m) => m.view === 'axis')?.knots ?? [];
  const end = knots[knots.length - 1]?.[1] ?? 0;
  const upright = (m: Mark): boolean =>
    m.type === 'line' && m.line === 'visible' && m.x1 === m.x2 && Math.abs(m.x1 - end) < 1.2;
  return (view?.marks ?? []).filter(upright).length;
}

describe('edges that would print as one', () => {
  it('draws the edge of a crown where it stands clear of the crown, and leaves it out where it would blot', () => {
    expect(edgesNearEnd(1, 'A4')).toBe(1);
    expect(edgesNearEnd(0.5, 'A4')).toBe(0);
  });
});

describe('sizes that end at one station', () => {
  it('share their extension line', () => {
    const { sheet } = at(1, 'A4');
    const upright = sheet.groups
      .filter((g) => g.role === 'dimension')
      .flatMap((g) => g.marks)
      .flatMap((m) =>
        m.type === 'line' && m.line === 'extension' && m.x1 === m.x2
          ? [[m.x1.toFixed(1), Math.min(m.y1, m.y2), Math.max(m.y1, m.y2)] as const]
          : [],
      );
    const overlaps = upright.filter(([x, lo, hi], i) =>
      upright.some(([ox, olo, ohi], k) => k !== i && ox === x && Math.min(hi, ohi) - Math.max(lo, olo) > 0.1),
    );
    expect(upright.length).toBeGreaterThan(4);
    expect(overlaps).toEqual([]);
  });
});
