import { describe, expect, it } from 'vitest';
import { numberBalloons } from '../../../shared/scheme/balloons';
import { buildScheme } from '../../../shared/scheme/build';
import { generalToleranceById } from '../../../shared/scheme/general-tolerance';
import type { Scheme, Size } from '../../../shared/scheme/scheme';
import { exampleValues } from '../../../shared/template/default-values';
import { evaluate } from '../../../shared/template/evaluate';
import type { Template, TypedValues } from '../../../shared/template/template';
import { steppedShaft } from '../../../templates/stepped-shaft';
import { taperedHandle } from '../../../templates/tapered-handle';

function schemeOf(
  template: Template,
  change: TypedValues,
  generalTolerance = 'ISO 2768-m',
  balloons?: Record<string, number>,
): Scheme {
  const evaluation = evaluate(template, { ...exampleValues(template), ...change }, { entryUnit: 'mm' });
  if (!evaluation.part) throw new Error(JSON.stringify(evaluation.problems));
  return buildScheme(template, { ...evaluation, part: evaluation.part }, { generalTolerance, balloons });
}
function sizeOf(scheme: Scheme, id: string): Size {
  const found = scheme.sizes.find((size) => size.id === id);
  if (!found) throw new Error(`no size ${id}`);
  return found;
}

describe('limits', () => {
  it('come from the fit, the thread class, what was typed, or the general tolerance', () => {
    const scheme = schemeOf(steppedShaft, {
      steps: [
        { key: 'a', length: '30', thread: 'M16-6g' },
        { key: 'b', diameter: '25', length: '40', fit: 'h6' },
        { key: 'c', diameter: '30 +0.1/-0.2', length: '50 ±0.1' },
        { key: 'd', diameter: '20', length: '3' },
      ],
      leftChamfer: '1',
      rightChamfer: '0',
    });
    const shown = (id: string): unknown[] => {
      const { tolerance, toleranceSource, upperLimit, lowerLimit } = sizeOf(scheme, id);
      return [tolerance.kind, toleranceSource, Number(upperLimit.toFixed(4)), Number(lowerLimit.toFixed(4))];
    };
    // ISO 965-1: M16 6g, es = 38 µm, Td = 280 µm.
    expect(shown('steps.a.thread')).toEqual(['thread-class', 'ISO 965 6g', 15.962, 15.682]);
    // ISO 286-2: 25 h6 is +0/-13 µm.
    expect(shown('steps.b.diameter')).toEqual(['fit', 'ISO 286 h6', 25, 24.987]);
    expect(shown('steps.c.diameter')).toEqual(['limits', 'as typed', 30.1, 29.8]);
    expect(shown('steps.c.length')).toEqual(['symmetric', 'as typed', 50.1, 49.9]);
    // ISO 2768-1 m: over 6 to 30 ±0.2, 0.5 to 3 ±0.1, broken edges 0.5 to 3 ±0.2.
    expect(shown('steps.d.diameter')).toEqual(['general', 'ISO 2768-m', 20.2, 19.8]);
    expect(shown('steps.d.length')).toEqual(['general', 'ISO 2768-m', 3.1, 2.9]);
    expect(shown('leftChamfer')).toEqual(['general', 'ISO 2768-m', 1.2, 0.8]);
    expect(shown('overall')).toEqual(['none', 'reference', 123, 123]);
  });

  it('of the shop block are inches by decimal places', () => {
    const bar = sizeOf(schemeOf(taperedHandle, {}, 'shop-inch'), 'barDiameter');
    expect(bar.upperLimit - bar.nominal).toBeCloseTo(0.005 * 25.4, 9);
    expect(bar.toleranceSource).toBe('shop block');
    expect(() => generalToleranceById('by eye')).toThrow(RangeError);
  });
});

describe('sizes', () => {
  it('of a hexagon handle are its parameters and the overall length in brackets', () => {
    const scheme = schemeOf(taperedHandle, { flatsLength: '70' });
    expect(scheme.sizes.map(({ id }) => id).sort()).toEqual(
      [
        'acrossFlats',
        'barDiameter',
        'endCrown',
        'flatsLength',
        'gripLength',
        'overall',
        'spigotDiameter',
        'spigotLength',
        'taperEndDiameter',
        'taperLength',
        'thread',
        'threadChamfer',
        'threadLength',
      ].sort(),
    );
    expect(scheme.sizes.filter(({ reference }) => reference).map(({ id, balloon }) => [id, balloon])).toEqual(
      [['overall', 0]],
    );
  });

  it('leave the flats length out where it says nothing of its own', () => {
    const shows = (flatsLength: string): boolean =>
      schemeOf(taperedHandle, { flatsLength }).sizes.some(({ id }) => id === 'flatsLength');
    expect(shows('')).toBe(false);
    expect(shows('60')).toBe(false);
    expect(shows('40')).toBe(true);
    // The taper meets the flats 31.67 mm past the grip; flats said to be longer end there all the same.
    expect(shows('90')).toBe(true);
    expect(shows('95')).toBe(false);
  });

  it('stand on the outline and name the stations they run between', () => {
    const scheme = schemeOf(taperedHandle, {});
    expect(sizeOf(scheme, 'taperEndDiameter').anchor).toMatchObject({
      kind: 'across',
      at: 181,
      diameter: 16,
    });
    expect(sizeOf(scheme, 'gripLength')).toMatchObject({ from: 'spigot.end', to: 'grip.end' });
    // One pitch of M10 at 45°: the middle of the slope lies 0.75 in and 0.75 down.
    expect(sizeOf(scheme, 'threadChamfer').anchor).toEqual({ kind: 'corner', x: 0.75, r: 4.25, end: 'left' });
    expect(sizeOf(scheme, 'thread')).toMatchObject({
      designation: 'M10',
      anchor: { kind: 'across', from: 1.5, to: 16 },
    });
  });

  it('keep their ids by row key when a row is put before them, and tell the form their new place', () => {
    const row = { key: 'x', diameter: '20', length: '10' };
    const before = schemeOf(steppedShaft, { steps: [row], leftChamfer: '', rightChamfer: '' });
    const after = schemeOf(steppedShaft, {
      steps: [{ key: 'y', diameter: '30', length: '5' }, row],
      leftChamfer: '',
      rightChamfer: '',
    });
    expect(sizeOf(before, 'steps.x.diameter').parameter).toBe('steps[0].diameter');
    expect(sizeOf(after, 'steps.x.diameter').parameter).toBe('steps[1].diameter');
  });

  it('of neighbours that are one face show one length with both texts', () => {
    const scheme = schemeOf(steppedShaft, {
      steps: [
        { key: 'a', diameter: '20', length: '10' },
        { key: 'b', diameter: '20', length: '15' },
        { key: 'c', diameter: '30', length: '5' },
      ],
      leftChamfer: '0',
      rightChamfer: '0',
    });
    expect(scheme.sizes.map(({ id }) => id)).toEqual([
      'steps.a.diameter',
      'steps.a.length',
      'steps.c.diameter',
      'steps.c.length',
      'overall',
    ]);
    expect(sizeOf(scheme, 'steps.a.length')).toMatchObject({ nominal: 25, typed: '10 + 15' });
  });
});

describe('balloons', () => {
  it('keep frozen numbers, and give new sizes numbers never used', () => {
    const frozen = { 'steps.r1.length': 7, 'steps.gone.diameter': 9 };
    const scheme = schemeOf(steppedShaft, {}, 'ISO 2768-m', frozen);
    expect(sizeOf(scheme, 'steps.r1.length').balloon).toBe(7);
    const others = scheme.sizes
      .filter(({ id, reference }) => id !== 'steps.r1.length' && !reference)
      .map(({ balloon }) => balloon);
    expect([...others].sort((a, b) => a - b)).toEqual(others.map((_, index) => 10 + index));
  });

  it('run along the part, then as the template writes them', () => {
    const at = (x: number): { kind: 'span'; from: number; to: number } => ({
      kind: 'span',
      from: x,
      to: x + 1,
    });
    const numbers = numberBalloons([
      { id: 'c', reference: false, anchor: at(10) },
      { id: 'ref', reference: true, anchor: at(0) },
      { id: 'a', reference: false, anchor: at(0) },
      { id: 'b', reference: false, anchor: at(0) },
    ]);
    expect([...numbers].sort()).toEqual([
      ['a', 1],
      ['b', 2],
      ['c', 3],
      ['ref', 0],
    ]);
  });
});
