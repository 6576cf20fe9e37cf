import { describe, expect, it } from 'vitest';
import { BAR_SIZES, nextBarUp } from '../../../shared/standards/bars';
import { centreHoleForWork, parseCentreHole } from '../../../shared/standards/centre-holes';
import {
  nearestDrill,
  nextDrillUp,
  INCH_SYSTEMS,
  METRIC_SYSTEMS,
  DRILL_SIZES,
} from '../../../shared/standards/drills';
import { fitLimits } from '../../../shared/standards/iso286';
import { MATERIALS } from '../../../shared/standards/materials';
import { OPERATION_FACTORS, deepHoleFactors } from '../../../shared/standards/speeds';
import {
  endDiameterFrom,
  halfAngleFrom,
  halfAngleFromRatio,
  ratioFromHalfAngle,
  slantLength,
  taperLengthFrom,
  taperRatio,
} from '../../../shared/standards/tapers';

describe('fits', () => {
  it.each([
    ['H7', 0, /above 0/],
    ['H7', 600, /up to 500 mm/],
    ['h17', 25, /Grade 17/],
    ['w6', 25, /no “w6”/],
    ['t6', 10, /no “t6”/],
    ['hello', 25, /not an ISO fit code/],
    ['Hs7', 25, /not an ISO fit code/],
  ])('%s at %f mm is refused in words', (code, size, sentence) => {
    const limits = fitLimits(code, size);
    expect(limits.ok ? '' : limits.message).toMatch(sentence);
  });

  it('zero has no sign', () => {
    const limits = fitLimits('h6', 25);
    expect(limits.ok && Object.is(limits.value.upper, 0)).toBe(true);
  });
});

describe('a taper by any three of its figures', () => {
  it.each([
    [30, 20, 100],
    [12.7, 11, 40],
    [5, 4.999, 3],
  ])('D %f, d %f, L %f', (large, small, length) => {
    const angle = halfAngleFrom(large, small, length);
    expect(endDiameterFrom(large, angle, length)).toBeCloseTo(small, 10);
    expect(taperLengthFrom(large, small, angle)).toBeCloseTo(length, 8);
    expect(halfAngleFromRatio(taperRatio(large, small, length))).toBeCloseTo(angle, 12);
    expect(ratioFromHalfAngle(angle)).toBeCloseTo(taperRatio(large, small, length), 6);
    expect(slantLength(large, small, length) * Math.cos(angle)).toBeCloseTo(length, 10);
  });
});

describe('bars, drills and centres', () => {
  it('lists are in order and without doubles', () => {
    const lists = [
      ...Object.values(BAR_SIZES).flatMap(({ metric, inch }) => [metric, inch]),
      ...Object.values(DRILL_SIZES).map((drills) => drills.map(({ diameter }) => diameter)),
    ];
    for (const list of lists)
      expect(list.every((size, index) => index === 0 || size > (list[index - 1] ?? 0))).toBe(true);
  });

  it('the next bar up holds the part', () => {
    expect(nextBarUp('round', 24.2, 'metric')).toBe(25);
    expect(nextBarUp('round', 25, 'metric')).toBe(25);
    expect(nextBarUp('hex', 18.5, 'metric')).toBe(19);
    expect(nextBarUp('round', 19, 'inch')).toBe(19.05);
    expect(nextBarUp('round', 900, 'metric')).toBeNull();
  });

  it('the nearest drill, and the next one up', () => {
    expect(nearestDrill(6.74, METRIC_SYSTEMS)?.name).toBe('6.7');
    expect(nextDrillUp(6.74, METRIC_SYSTEMS)?.name).toBe('6.8');
    expect(nextDrillUp(5.1, INCH_SYSTEMS)?.name).toBe('#7');
    expect(nextDrillUp(500, METRIC_SYSTEMS)).toBeNull();
  });

  it('centres: none, refused, and the usual one for the work', () => {
    expect(parseCentreHole('none')).toEqual({ ok: true, value: null });
    const wrong = parseCentreHole('A3');
    expect(wrong.ok ? '' : wrong.message).toMatch(/A2\.5, A3\.15/);
    for (const diameter of [4, 8, 20, 45, 100])
      expect(centreHoleForWork(diameter).mouthDiameter).toBeLessThan(diameter / 2);
    expect(centreHoleForWork(25).designation).toBe('A2.5');
  });
});

describe('materials and speeds', () => {
  it('every material is whole: distinct id, sane figures, sources', () => {
    expect(new Set(MATERIALS.map(({ id }) => id)).size).toBe(MATERIALS.length);
    for (const { density, kc, cuttingSpeeds, basis, name } of MATERIALS) {
      expect(density).toBeGreaterThan(1000);
      expect(kc).toBeGreaterThan(100);
      expect(name).not.toBe('');
      for (const tool of ['hss', 'carbide'] as const) {
        expect(cuttingSpeeds[tool].finishing).toBeGreaterThanOrEqual(cuttingSpeeds[tool].turning);
        expect(cuttingSpeeds[tool].drilling).toBeGreaterThan(0);
      }
      expect(cuttingSpeeds.carbide.turning).toBeGreaterThan(cuttingSpeeds.hss.turning);
      for (const { source } of Object.values(basis)) expect(source).not.toBe('');
    }
  });

  it('every operation says why it is slower', () => {
    for (const { factor, reason } of Object.values(OPERATION_FACTORS)) {
      expect(factor).toBeGreaterThan(0);
      expect(factor).toBeLessThanOrEqual(1);
      expect(reason).toMatch(/\.$/);
    }
  });

  it('deep holes are drilled slower the deeper they are', () => {
    const shares = [2, 3, 4, 5, 6, 8].map((depth) => deepHoleFactors(depth * 5, 5).speed);
    expect(shares).toEqual([...shares].sort((a, b) => b - a));
    expect(shares[0]).toBe(1);
  });
});
