import { describe, expect, it } from 'vitest';
import type { Mark, Sheet } from '../../../shared/drawing/sheet';
import { endView } from '../../../shared/drawing/passes/end-view';
import { profileOf, reach } from '../../../shared/drawing/profile';
import { halfWidth } from '../../../shared/part/flats';
import { toPart } from '../../../shared/drawing/x-map';
import type { TypedValues } from '../../../shared/template/template';
import { STEPPED_SHAFT_EXAMPLES } from '../../../templates/stepped-shaft-examples';
import { TAPERED_HANDLE_EXAMPLES } from '../../../templates/tapered-handle-examples';
import { partAndScheme, sheetOf } from '../../corpus/sheet-of';

const typed: TypedValues = TAPERED_HANDLE_EXAMPLES[0].values;
const iso = sheetOf('tapered-handle', typed, { style: 'iso', unit: 'mm' });
const asme = sheetOf('tapered-handle', typed, { style: 'asme', unit: 'mm' });

const mapNamed = (sheet: Sheet, name: string) => sheet.maps.find((m) => m.view === name);
const marksOf = (sheet: Sheet, name: string): readonly Mark[] =>
  sheet.groups.find((g) => g.role === 'view' && g.view === name)?.marks ?? [];
const radii = (marks: readonly Mark[]): number[] =>
  marks.flatMap((m) => (m.type === 'circle' && m.line === 'visible' ? [m.r] : [])).sort((a, b) => a - b);

describe('end views', () => {
  it('stand on the far side in first angle and on their own side in third', () => {
    const middle = (sheet: Sheet): number => {
      const knots = mapNamed(sheet, 'axis')?.knots ?? [];
      return ((knots[0]?.[1] ?? 0) + (knots[knots.length - 1]?.[1] ?? 0)) / 2;
    };
    expect(mapNamed(iso.sheet, 'end-left')?.centreX).toBeGreaterThan(middle(iso.sheet));
    expect(mapNamed(asme.sheet, 'end-left')?.centreX).toBeLessThan(middle(asme.sheet));
  });

  it('show the circles that can be seen from that end and no others', () => {
    const { body } = iso.part;
    // From the left: the thread's crest and the spigot before the hexagon; the taper behind it is hidden.
    expect(radii(endView(body, 'end-left', 1, 0.7, 3).marks)).toEqual([5, 7]);
    // From the right: the crown's edge, then the taper grows and hides what is behind it.
    const right = radii(endView(body, 'end-right', 1, 0.7, 3).marks);
    expect(right).not.toContain(5);
    expect(Math.max(...right)).toBeLessThan(12.5);
  });

  it('draw no circle over milled corners', () => {
    const circles = radii(endView(iso.part.body, 'end-left', 1, 0.7, 3).marks);
    expect(circles.every((r) => Math.abs(r - 12.5) > 0.7)).toBe(true);
  });

  it('open the thread root circle for a quarter', () => {
    const root = endView(iso.part.body, 'end-left', 1, 0.7, 3).marks.find(
      (m) => m.type === 'path' && m.line === 'thin',
    );
    expect(root?.type === 'path' && root.commands[1]).toMatchObject({ op: 'A', large: 1 });
  });

  it('are left out of a part that is round all over', () => {
    const { sheet } = sheetOf('stepped-shaft', STEPPED_SHAFT_EXAMPLES[0].values, {
      style: 'iso',
      unit: 'mm',
    });
    expect(sheet.maps.map((m) => m.view)).toEqual(['axis']);
  });
});

describe('the axis view', () => {
  it('draws the run-out of the front face where r² = h² + w²', () => {
    const map = mapNamed(iso.sheet, 'axis');
    const cut = iso.part.body.cuts.find((c) => c.kind === 'flats');
    if (!map || cut?.kind !== 'flats') throw new Error('The handle has lost its flats.');
    const nearest = marksOf(iso.sheet, 'axis').flatMap((m) =>
      m.type === 'polyline' && m.line === 'visible' ? m.points : [],
    );
    const tested = nearest
      .map((p) => ({ x: toPart(map.knots, p.x), y: Math.abs(p.y - map.axisY) / map.scale }))
      // The face towards the viewer: its edges lie within half a face of the axis, clear of the corner lines.
      .filter((p) => p.y < 5.5 && p.x > 90);
    expect(tested.length).toBeGreaterThan(6);
    for (const p of tested) expect(p.y).toBeCloseTo(halfWidth(iso.part.body, cut, p.x), 4);
  });

  it('reaches to a rounded corner where it stands up and to the flat where that lies on top', () => {
    const flats = { kind: 'flats' as const, id: 'f', from: 0, to: 10, count: 6, distance: 11 };
    expect(reach(12.5, [{ ...flats, phase: Math.PI / 6 }]).top).toBeCloseTo(12.5, 9);
    expect(reach(12.5, [{ ...flats, phase: 0 }]).top).toBeCloseTo(11, 9);
    expect(reach(20, [{ ...flats, phase: Math.PI / 6 }]).top).toBeCloseTo(22 / Math.sqrt(3), 9);
  });

  it('covers the part from face to face without a gap', () => {
    const spans = profileOf(iso.part.body);
    expect(spans[0]?.from).toBe(0);
    expect(spans[spans.length - 1]?.to).toBeCloseTo(iso.part.length, 9);
    spans.slice(1).forEach((span, i) => expect(span.from).toBeCloseTo(spans[i]?.to ?? NaN, 9));
  });
});

describe('what a sheet says', () => {
  it('refuses, in words, a sheet and scale that cannot hold the part', () => {
    expect(() =>
      sheetOf('tapered-handle', typed, { style: 'iso', unit: 'mm', options: { sheet: 'A4', scale: 5 } }),
    ).toThrow(/does not fit sheet A4 at the scale 5:1\. It would fit /);
  });

  it('notes a hexagon milled from the round, and that strength was not checked', () => {
    const words = iso.sheet.groups
      .find((g) => g.role === 'notes')
      ?.marks.flatMap((m) => (m.type === 'text' ? [m.text] : []));
    expect(words).toContain('Hexagon milled from round 25: corners stay round.');
    expect(words).toContain('SIZES NOT CHECKED FOR STRENGTH.');
  });

  it('writes inches without a leading zero in ASME style and with as many decimals as needed in ISO', () => {
    const text = (style: 'iso' | 'asme', id: string): string | undefined => {
      const { part, scheme } = partAndScheme('tapered-handle', typed, { style, unit: 'in' });
      expect(part.length).toBeGreaterThan(0);
      return (
        sheetOf('tapered-handle', typed, { style, unit: 'in' }).sheet.groups.find(
          (g) => g.role === 'dimension' && g.sizeId === id,
        )?.text ?? scheme.datum
      );
    };
    expect(text('asme', 'spigotDiameter')).toMatch(/^Ø\.5512 h9/);
    expect(text('iso', 'taperLength')).toBe('3.7402');
  });
});
