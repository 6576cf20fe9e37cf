import { describe, expect, it } from 'vitest';
import type { Part } from '../../shared/part/part';
import { buildScheme } from '../../shared/scheme/build';
import { redimension, toleranceUnit, type Redimensioned } from '../../shared/scheme/datum';
import type { Scheme } from '../../shared/scheme/scheme';
import { evaluate } from '../../shared/template/evaluate';
import type { TypedValues } from '../../shared/template/template';
import { steppedShaft } from '../../templates/stepped-shaft';
import { pinned } from './generators/pinned';
import { steppedShaftValues } from './generators/stepped-shaft';

function made(values: TypedValues): { part: Part; scheme: Scheme } {
  const evaluation = evaluate(steppedShaft, values, { entryUnit: 'mm' });
  if (!evaluation.part) throw new Error(JSON.stringify(evaluation.problems));
  const { part } = evaluation;
  return {
    part,
    scheme: buildScheme(steppedShaft, { ...evaluation, part }, { generalTolerance: 'ISO 2768-m' }),
  };
}

/** Worst-case range of an original length when every bench length may lie anywhere within its own limits. */
function worstCase(
  from: number,
  to: number,
  { lengths, datum }: Redimensioned,
  part: Part,
): [number, number] {
  const datumX = part.stations.find(({ id }) => id === datum)?.x ?? 0;
  const range = (x: number): [number, number] => {
    const length = lengths.find((each) => Math.abs(each.x - x) < 1e-6);
    if (!length) return [datumX, datumX];
    return x > datumX
      ? [datumX + length.lowerLimit, datumX + length.upperLimit]
      : [datumX - length.upperLimit, datumX - length.lowerLimit];
  };
  const [a, b] = [range(from), range(to)];
  return [b[0] - a[1], b[1] - a[0]];
}

describe('the same lengths from a datum face', () => {
  const parts = pinned(steppedShaftValues, 150)
    .map(made)
    .filter(({ scheme }) => scheme.sizes.some(({ reference }) => reference));

  it('hold every original limit in the worst case, from either face', () => {
    let judged = 0;
    for (const { part, scheme } of parts) {
      for (const datum of ['left-face', 'right-face']) {
        const bench = redimension(part, scheme, datum);
        for (const { anchor, kind, reference, upperLimit, lowerLimit } of scheme.sizes) {
          if (kind !== 'length' || reference || anchor.kind !== 'span') continue;
          const [least, most] = worstCase(anchor.from, anchor.to, bench, part);
          expect(least).toBeGreaterThanOrEqual(lowerLimit - 1e-9);
          expect(most).toBeLessThanOrEqual(upperLimit + 1e-9);
          judged += 1;
        }
      }
    }
    expect(judged).toBeGreaterThan(500);
  });

  it('leave no share unused: every station sits on a limit that is used up', () => {
    for (const { part, scheme } of parts) {
      const bench = redimension(part, scheme, 'left-face');
      for (const { x } of bench.lengths) {
        const usedUp = scheme.sizes.some(({ anchor, kind, reference, upperLimit, lowerLimit }) => {
          if (kind !== 'length' || reference || anchor.kind !== 'span') return false;
          if (Math.abs(anchor.from - x) > 1e-6 && Math.abs(anchor.to - x) > 1e-6) return false;
          const [least, most] = worstCase(anchor.from, anchor.to, bench, part);
          return Math.abs(most - least - (upperLimit - lowerLimit)) < 1e-9;
        });
        expect(usedUp).toBe(true);
      }
    }
  });

  it('refuse by name what falls below the figure of practice', () => {
    const { part, scheme } = made({
      steps: [
        { key: 'a', diameter: '20', length: '40' },
        { key: 'b', diameter: '30', length: '50 ±0.03' },
        { key: 'c', diameter: '20', length: '30' },
      ],
    });
    const { refused } = redimension(part, scheme, 'left-face');
    expect(refused.map(({ station }) => station)).toEqual(['steps.a.end', 'steps.b.end']);
    expect(refused[0]?.message).toContain('steps.b.length');
    expect(redimension(part, scheme, 'steps.a.end').refused).toEqual([]);
    expect(() => redimension(part, scheme, 'leftChamfer.edge')).toThrow(RangeError);
  });

  it('share in proportion to the standard tolerance unit', () => {
    const { part, scheme } = made({
      steps: [
        { key: 'a', diameter: '20', length: '20 ±1' },
        { key: 'b', diameter: '30', length: '100 ±0.1' },
        { key: 'c', diameter: '20', length: '30 ±5' },
      ],
    });
    const [a, b] = redimension(part, scheme, 'left-face').lengths;
    const width = (length: typeof a): number => (length ? length.upperLimit - length.lowerLimit : 0);
    expect(width(a) + width(b)).toBeCloseTo(0.2, 9);
    expect(width(a) / width(b)).toBeCloseTo(toleranceUnit(20) / toleranceUnit(120), 9);
    // ISO 286-1, i = 0.45 ∛D + 0.001 D: 2.019 µm at 80 mm.
    expect(toleranceUnit(80) * 1000).toBeCloseTo(2.019, 3);
  });
});
