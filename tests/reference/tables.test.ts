import { describe, expect, it } from 'vitest';
import { parseCentreHole } from '../../shared/standards/centre-holes';
import { drillByName, drillPointLength, tapDrill } from '../../shared/standards/drills';
import {
  generalAngular,
  generalBrokenEdge,
  generalLinear,
  inchDecimalTolerance,
} from '../../shared/standards/general-tolerances';
import { cuttingSpeed } from '../../shared/standards/speeds';
import { defaultMaterial, materialById } from '../../shared/standards/materials';
import { ROUGHNESS_GRADES } from '../../shared/standards/roughness';
import { ISO_SCALES } from '../../shared/standards/scales';
import { SHEET_SIZES, frameOf } from '../../shared/standards/sheets';
import { parseThread } from '../../shared/standards/threads';
import { toDegrees } from '../../shared/units/angle';

describe('general tolerances', () => {
  it.each([
    [2, 0.05, 0.1, 0.2, null],
    [5, 0.05, 0.1, 0.3, 0.5],
    [6, 0.05, 0.1, 0.3, 0.5],
    [25, 0.1, 0.2, 0.5, 1],
    [100, 0.15, 0.3, 0.8, 1.5],
    [300, 0.2, 0.5, 1.2, 2.5],
    [800, 0.3, 0.8, 2, 4],
    [1500, 0.5, 1.2, 3, 6],
    [3000, null, 2, 4, 8],
    [0.4, null, null, null, null],
    [4001, null, null, null, null],
  ])('%f mm: f %s, m %s, c %s, v %s (ISO 2768-1)', (size, f, m, c, v) => {
    expect([
      generalLinear(size, 'f'),
      generalLinear(size, 'm'),
      generalLinear(size, 'c'),
      generalLinear(size, 'v'),
    ]).toEqual([f, m, c, v]);
  });

  it('chamfers and angles (ISO 2768-1, from memory)', () => {
    expect([generalBrokenEdge(1, 'm'), generalBrokenEdge(5, 'm'), generalBrokenEdge(10, 'c')]).toEqual([
      0.2, 0.5, 2,
    ]);
    expect(toDegrees(generalAngular(40, 'm') ?? 0)).toBeCloseTo(0.5, 12);
    expect(toDegrees(generalAngular(8, 'v') ?? 0)).toBeCloseTo(3, 12);
  });

  it('inch sizes by their decimals: .XX ±.01, .XXX ±.005 (common practice)', () => {
    expect([inchDecimalTolerance(2), inchDecimalTolerance(3), inchDecimalTolerance(9)]).toEqual([
      0.254,
      0.127,
      null,
    ]);
  });
});

describe('tapping drills', () => {
  it.each([
    ['M2.5', '2.05'],
    ['M3', '2.5'],
    ['M4', '3.3'],
    ['M6', '5'],
    ['M8', '6.8'],
    ['M8x1', '7'],
    ['M12', '10.2'],
    ['M16', '14'],
    ['M20', '17.5'],
    ['M20x1.5', '18.5'],
    ['M30', '26.5'],
    ['M36', '32'],
    ['#6-32', '#36'],
    ['#10-32', '#21'],
    ['1/4-20', '#7'],
    ['5/16-18', 'F'],
    ['3/8-16', '5/16'],
    ['7/16-14', 'U'],
    ['1/2-13', '27/64'],
    ['5/8-11', '17/32'],
    ['7/8-9', '49/64'],
    ['1-8', '7/8'],
  ])('%s takes %s (published charts)', (designation, name) => {
    const thread = parseThread(designation);
    const drill = thread.ok ? tapDrill(thread.value) : null;
    expect(drill?.drill.name).toBe(name);
    expect(drill?.engagement).toBeGreaterThan(0.6);
    expect(drill?.engagement).toBeLessThan(0.9);
  });

  it('no drill is offered for a trapezoidal thread', () => {
    const thread = parseThread('Tr20x4');
    expect(thread.ok && tapDrill(thread.value)).toBeNull();
  });

  it('the point of a 118° drill is three tenths of its diameter (geometry)', () => {
    expect(drillPointLength(10)).toBeCloseTo(3.0043, 4);
    expect(drillByName('F')?.diameter).toBeCloseTo(6.5278, 4);
  });
});

describe('centre holes (ISO 6411, from memory)', () => {
  it.each([
    ['A1', 1, 2.12, 0.9],
    ['A2.5', 2.5, 5.3, 2.2],
    ['B4', 4, 8.5, 3.5],
    ['R3.15', 3.15, 6.7, 2.8],
    ['A10', 10, 21.2, 8.7],
  ])('%s', (typed, pilot, mouth, depth) => {
    const read = parseCentreHole(typed);
    expect(read.ok && read.value).toMatchObject({
      pilotDiameter: pilot,
      mouthDiameter: mouth,
      pilotDepth: depth,
      designation: typed,
    });
  });

  it('form B guards its seat: 4 mm pilot, 12.5 mm guard', () => {
    const read = parseCentreHole('B4');
    expect(read.ok && read.value?.guard?.diameter).toBe(12.5);
  });

  it('#3 of the plain inch series has a 7/64 in drill (ASME B94.11M, from memory)', () => {
    const read = parseCentreHole('#3');
    expect(read.ok && read.value?.pilotDiameter).toBeCloseTo(0.1094 * 25.4, 9);
  });
});

describe('sheets and scales', () => {
  it.each([
    ['A4', 297, 210],
    ['A3', 420, 297],
    ['A2', 594, 420],
    ['A1', 841, 594],
    ['A', 279.4, 215.9],
    ['B', 431.8, 279.4],
    ['C', 558.8, 431.8],
    ['D', 863.6, 558.8],
  ] as const)('%s is %f × %f mm (ISO 216, ASME Y14.1)', (id, width, height) => {
    expect(SHEET_SIZES[id]).toMatchObject({ width, height });
  });

  it('the drawing space of A3 is 390 × 277 (ISO 5457)', () => {
    expect(frameOf(SHEET_SIZES.A3)).toEqual({ x: 20, y: 10, width: 390, height: 277 });
  });

  it('recommended scales (ISO 5455)', () => {
    expect(ISO_SCALES.map(({ text }) => text)).toEqual([
      ...['50:1', '20:1', '10:1', '5:1', '2:1', '1:1', '1:2', '1:5', '1:10', '1:20', '1:50', '1:100'],
    ]);
    expect(
      ISO_SCALES.every(
        ({ text, factor }) => factor === Number(text.split(':')[0]) / Number(text.split(':')[1]),
      ),
    ).toBe(true);
  });

  it('roughness grades (ISO 1302)', () => {
    const byGrade = Object.fromEntries(ROUGHNESS_GRADES.map(({ grade, ra }) => [grade, ra]));
    expect(byGrade).toMatchObject({ N1: 0.025, N5: 0.4, N7: 1.6, N8: 3.2, N9: 6.3, N12: 50 });
  });
});

describe('materials', () => {
  it.each([
    ['steel-free-cutting', 7850, 60],
    ['steel-low-carbon', 7870, 30],
    ['stainless-303', 8000, 80],
    ['stainless-304', 7900, 50],
    ['stainless-316', 8000, 50],
    ['cast-iron-grey', 7200, 500],
    ['brass-free-cutting', 8470, 40],
    ['bronze-phosphor', 8850, 80],
    ['bronze-leaded', 8930, 60],
    ['copper', 8940, 30],
    ['titanium-6al-4v', 4430, 20],
    ['acetal', 1410, 20],
    ['nylon-6', 1140, 20],
  ])(
    '%s weighs %f ± %f kg/m³ (published density tables, data-sheet values from memory)',
    (id, density, tolerance) => {
      expect(Math.abs((materialById(id)?.density ?? 0) - density)).toBeLessThanOrEqual(tolerance);
    },
  );

  it('a part of no stated material is of free-cutting low-carbon steel', () => {
    expect(defaultMaterial()).toMatchObject({ id: 'steel-free-cutting', group: 'free-cutting-steel' });
    expect(materialById('unobtainium')).toBeNull();
  });

  // Workshop charts agree only roughly; these are bounds of sense in m/min (common practice).
  it.each([
    ['steel-low-carbon', 'hss', 20, 35],
    ['steel-low-carbon', 'carbide', 90, 135],
    ['stainless-304', 'hss', 18, 35],
    ['stainless-304', 'carbide', 70, 120],
    ['brass-free-cutting', 'hss', 70, 105],
    ['brass-free-cutting', 'carbide', 180, 200],
    ['aluminium-6082', 'hss', 60, 215],
    ['cast-iron-grey', 'hss', 16, 35],
  ] as const)('turning %s with %s runs between %f and %f m/min', (id, tool, low, high) => {
    const material = materialById(id);
    const speed = material ? cuttingSpeed(material, tool, 'turning') : 0;
    expect(speed).toBeGreaterThanOrEqual(low);
    expect(speed).toBeLessThanOrEqual(high);
  });
});
