import { describe, expect, it } from 'vitest';
import { buildScheme } from '../../shared/scheme/build';
import { completenessOf } from '../../shared/scheme/completeness';
import type { Scheme } from '../../shared/scheme/scheme';
import type { Part } from '../../shared/part/part';
import { evaluate } from '../../shared/template/evaluate';
import type { Template, TypedValues } from '../../shared/template/template';
import { steppedShaft } from '../../templates/stepped-shaft';
import { taperedHandle } from '../../templates/tapered-handle';
import { pinned } from './generators/pinned';
import { steppedShaftValues } from './generators/stepped-shaft';
import { taperedHandleValues } from './generators/tapered-handle';

const FAMILIES = [
  { template: steppedShaft, values: pinned(steppedShaftValues, 200) },
  { template: taperedHandle, values: pinned(taperedHandleValues, 200) },
] as const;

function schemeOf(template: Template, values: TypedValues): { part: Part; scheme: Scheme } {
  const evaluation = evaluate(template, values, { entryUnit: 'mm' });
  expect(evaluation.problems, JSON.stringify(values)).toEqual([]);
  const part = evaluation.part;
  if (!part) throw new Error('no part');
  return { part, scheme: buildScheme(template, { ...evaluation, part }, { generalTolerance: 'ISO 2768-m' }) };
}

describe.each(FAMILIES)('$template.id over 200 pinned parts', ({ template, values }) => {
  const made = values.map((each) => ({ values: each, ...schemeOf(template, each) }));

  it('sizes every part completely and once', () => {
    for (const { scheme, values: typed } of made) {
      expect(scheme.completeness, JSON.stringify(typed)).toEqual({ missing: [], redundant: [] });
    }
  });

  it('misses any size that is taken away, and finds any size that is said again', () => {
    for (const { part, scheme, values: typed } of made) {
      for (const size of scheme.sizes) {
        if (size.reference) continue;
        const others = scheme.sizes.filter(({ id }) => id !== size.id);
        const without = completenessOf(part, others);
        expect(without.missing.length, `${size.id} of ${JSON.stringify(typed)}`).toBeGreaterThan(0);
        expect(without.redundant).toEqual([]);
        const again = completenessOf(part, [...scheme.sizes, { ...size, id: 'again' }]);
        expect(again, `${size.id} of ${JSON.stringify(typed)}`).toEqual({
          missing: [],
          redundant: ['again'],
        });
      }
    }
  });

  it('says the overall length twice when its brackets are taken off', () => {
    for (const { part, scheme } of made) {
      const sizes = scheme.sizes.map((size) => ({ ...size, reference: false }));
      const overall = scheme.sizes.some(({ reference }) => reference);
      expect(completenessOf(part, sizes).redundant).toHaveLength(overall ? 1 : 0);
    }
  });

  it('gives finite figures, limits round the nominal side of every size, and each id and balloon once', () => {
    for (const { part, scheme } of made) {
      for (const { nominal, upperLimit, lowerLimit, anchor, features } of scheme.sizes) {
        expect([nominal, upperLimit, lowerLimit].every(Number.isFinite)).toBe(true);
        expect(lowerLimit).toBeGreaterThan(0);
        expect(lowerLimit).toBeLessThanOrEqual(upperLimit);
        if (anchor.kind === 'span') expect(anchor.to - anchor.from).toBeCloseTo(nominal, 9);
        if (anchor.kind === 'across') expect(anchor.diameter).toBeCloseTo(nominal, 9);
        for (const id of features) expect(part.features.map((feature) => feature.id)).toContain(id);
      }
      const ids = scheme.sizes.map(({ id }) => id);
      expect(new Set(ids).size).toBe(ids.length);
      const balloons = scheme.sizes.filter(({ reference }) => !reference).map(({ balloon }) => balloon);
      expect(balloons).toEqual(balloons.map((_, index) => index + 1));
    }
  });
});

it('covers what the families can do', () => {
  const shafts = FAMILIES[0].values.map(
    ({ steps }) => steps as unknown as { thread: string; fit: string; diameter: string }[],
  );
  const handles = FAMILIES[1].values;
  const covered = {
    sixSteps: shafts.filter((steps) => steps.length === 6).length,
    threaded: shafts.filter((steps) => steps.some(({ thread }) => thread !== '')).length,
    fitted: shafts.filter((steps) =>
      steps.some(({ fit, diameter }) => fit !== '' || / [a-z]+\d|[±+]/.test(diameter)),
    ).length,
    hexagon: handles.filter(({ grip }) => grip === 'hex').length,
    round: handles.filter(({ grip }) => grip === 'round').length,
    crowned: handles.filter(({ endForm, endSize }) => endForm === 'crown' && endSize !== '0').length,
    chamfered: handles.filter(({ endForm, endSize }) => endForm === 'chamfer' && endSize !== '0').length,
    plain: handles.filter(({ endSize }) => endSize === '0').length,
    inches: handles.filter(({ barDiameter }) => String(barDiameter).endsWith('in')).length,
    flatsGiven: handles.filter(({ flatsLength }) => flatsLength !== '').length,
    noSpigot: handles.filter(({ spigotLength }) => spigotLength === '0').length,
  };
  console.info('pinned parts cover', covered);
  for (const [what, count] of Object.entries(covered)) expect(count, what).toBeGreaterThanOrEqual(10);
});
