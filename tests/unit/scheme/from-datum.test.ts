import { describe, expect, it } from 'vitest';
import { evaluate } from '../../../shared/template/evaluate';
import { buildScheme } from '../../../shared/scheme/build';
import { schemeFromDatum } from '../../../shared/scheme/from-datum';
import { templateById } from '../../../templates';

function handle() {
  const template = templateById('tapered-handle');
  if (!template) throw new Error('no such family');
  const evaluation = evaluate(template, template.example, { entryUnit: 'mm' });
  if (!evaluation.part) throw new Error(JSON.stringify(evaluation.problems));
  const good = { ...evaluation, part: evaluation.part };
  return { part: good.part, scheme: buildScheme(template, good, { generalTolerance: 'ISO 2768-m' }) };
}

describe('schemeFromDatum', () => {
  const { part, scheme } = handle();
  const designed = scheme.sizes.filter(({ kind, reference }) => kind === 'length' && !reference);

  it('gives every length from the face, once and complete', () => {
    const outcome = schemeFromDatum(part, scheme, 'right-face');
    if ('refused' in outcome) throw new Error(JSON.stringify(outcome.refused));
    const lengths = outcome.scheme.sizes.filter(({ kind }) => kind === 'length');
    expect(lengths).toHaveLength(designed.length);
    for (const { from, to } of lengths) expect([from, to]).toContain('right-face');
    expect(outcome.scheme.completeness).toEqual({ missing: [], redundant: [] });
  });

  it('keeps every original limit in the worst case', () => {
    const outcome = schemeFromDatum(part, scheme, 'right-face');
    if ('refused' in outcome) throw new Error(JSON.stringify(outcome.refused));
    const stationLimits = new Map([['right-face', { least: part.length, most: part.length }]]);
    for (const size of outcome.scheme.sizes.filter(({ kind }) => kind === 'length')) {
      stationLimits.set(size.from ?? '', {
        least: part.length - size.upperLimit,
        most: part.length - size.lowerLimit,
      });
    }
    for (const size of designed) {
      const [from, to] = [stationLimits.get(size.from ?? ''), stationLimits.get(size.to ?? '')];
      if (!from || !to) throw new Error(`${size.id} lost a station`);
      expect(to.most - from.least).toBeLessThanOrEqual(size.upperLimit + 1e-9);
      expect(to.least - from.most).toBeGreaterThanOrEqual(size.lowerLimit - 1e-9);
    }
  });

  it('never gives two sizes one balloon, nor a new size an old number', () => {
    const outcome = schemeFromDatum(part, scheme, 'right-face');
    if ('refused' in outcome) throw new Error(JSON.stringify(outcome.refused));
    const balloons = outcome.scheme.sizes.filter(({ reference }) => !reference).map(({ balloon }) => balloon);
    expect(new Set(balloons).size).toBe(balloons.length);
    const before = new Map(scheme.sizes.map(({ id, balloon }) => [id, balloon]));
    for (const { id, balloon } of outcome.scheme.sizes) {
      if (before.has(id)) expect(balloon).toBe(before.get(id));
      else expect([...before.values()]).not.toContain(balloon);
    }
  });

  it('refuses a face that no length runs to, and names those it could be', () => {
    const outcome = schemeFromDatum(part, scheme, 'threadChamfer.edge');
    expect('refused' in outcome && outcome.refused[0]?.message).toMatch(
      /Give as-designed or one of left-face, .*right-face/,
    );
  });
});
