import { describe, expect, it } from 'vitest';
import { defaultValues, exampleValues, workedExamples } from '../../../shared/template/default-values';
import { evaluate } from '../../../shared/template/evaluate';
import { templateHash } from '../../../shared/template/hash';
import type { Evaluation, TypedValues } from '../../../shared/template/template';
import { templateById, templates } from '../../../templates/index';
import { steppedShaft } from '../../../templates/stepped-shaft';
import { taperedHandle } from '../../../templates/tapered-handle';
import { REFUSED_VALUES } from './refused-values';

const handleWith = (change: TypedValues, entryUnit: 'mm' | 'in' = 'mm'): Evaluation =>
  evaluate(taperedHandle, { ...exampleValues(taperedHandle), ...change }, { entryUnit });
const shaftOf = (...rows: Record<string, string>[]): Evaluation =>
  evaluate(
    steppedShaft,
    { steps: rows.map((row, index) => ({ key: `r${index + 1}`, ...row })) },
    { entryUnit: 'mm' },
  );

describe('values that are refused', () => {
  it.each(REFUSED_VALUES)('$family: $name', ({ family, change, entryUnit = 'mm', path, says }) => {
    const template = templateById(family);
    if (!template) throw new Error(family);
    const evaluation = evaluate(template, { ...exampleValues(template), ...change } as TypedValues, {
      entryUnit,
    });
    expect(evaluation.part).toBeUndefined();
    const at = evaluation.problems.filter((problem) => problem.path === path);
    expect(at.map(({ message }) => message).join(' '), JSON.stringify(evaluation.problems)).toContain(says);
    for (const { message } of evaluation.problems) expect(message.length).toBeLessThan(500);
  });

  it('says one thing of one fault', () => {
    const faults: TypedValues[] = [
      { spigotDiameter: '30' },
      { taperLength: '3' },
      { acrossFlats: '30' },
      { barDiameter: 'thick' },
    ];
    for (const change of faults) {
      expect(handleWith(change).problems.map(({ path }) => path)).toHaveLength(1);
    }
  });
});

describe('worked examples', () => {
  it.each(
    templates.flatMap((template) => workedExamples(template).map((example) => ({ template, example }))),
  )('$example.id makes a part with nothing to say against it', ({ template, example }) => {
    const { part, problems } = evaluate(template, example.values, { entryUnit: example.entryUnit });
    expect(problems).toEqual([]);
    expect(part?.length).toBeGreaterThan(50);
  });

  it('make the same part from defaults in either entry unit', () => {
    for (const template of templates) {
      const absent = evaluate(template, {}, { entryUnit: 'in' });
      const typedMm = evaluate(template, defaultValues(template), { entryUnit: 'mm' });
      const typedIn = evaluate(template, defaultValues(template, 'in'), { entryUnit: 'in' });
      expect(typedMm.problems).toEqual([]);
      expect(typedMm.part).toEqual(absent.part);
      expect(typedIn.part).toEqual(absent.part);
    }
  });
});

describe('what is typed', () => {
  it('takes numbers, units and a diameter sign alike', () => {
    const plain = handleWith({ barDiameter: '25.4' }).part;
    expect(plain?.maxDiameter).toBe(25.4);
    for (const text of ['1 in', '1"', 'Ø25.4', '2.54 cm'])
      expect(handleWith({ barDiameter: text }).part).toEqual(plain);
    expect(handleWith({ barDiameter: 25.4 as unknown as string }).part).toEqual(plain);
  });

  it('takes empty, none and 0 of an optional alike where none has a meaning of its own', () => {
    const round = { grip: 'round', flatsLength: '' };
    for (const unset of ['', 'none', '0']) {
      expect(handleWith({ ...round, knurl: unset, threadRelief: unset, endSize: unset }).problems).toEqual(
        [],
      );
      expect(handleWith({ flatsLength: unset }).part).toEqual(handleWith({ flatsLength: '' }).part);
    }
  });

  it('gives a thread a chamfer of one pitch unless told otherwise, and none for 0', () => {
    const leg = (threadChamfer: string): number | undefined => {
      const found = handleWith({ threadChamfer }).part?.features.find(({ id }) => id === 'threadChamfer');
      return found?.kind === 'chamfer' ? found.leg : undefined;
    };
    expect(leg('')).toBe(1.5);
    expect(leg('1')).toBe(1);
    expect(leg('0')).toBeUndefined();
  });

  it('takes the diameter of a threaded step from its thread, typed beside it or not', () => {
    const alone = shaftOf({ length: '30', thread: 'M16' });
    expect(alone.part?.maxDiameter).toBe(16);
    expect(shaftOf({ length: '30', thread: 'M16', diameter: '16 mm' }).part).toEqual(alone.part);
  });

  it('makes neighbours of one diameter one face, unless a fit or thread tells them apart', () => {
    const cylinders = (...rows: Record<string, string>[]): number =>
      shaftOf(...rows).part?.features.filter(({ kind }) => kind === 'cylinder').length ?? 0;
    const plain = { diameter: '20', length: '10' };
    expect(cylinders(plain, plain, { diameter: '30', length: '10' })).toBe(2);
    expect(cylinders({ ...plain, fit: 'h6' }, plain)).toBe(2);
    expect(cylinders({ ...plain, fit: 'h6' }, { diameter: '20 h6', length: '10' })).toBe(1);
    expect(cylinders({ length: '10', thread: 'M20' }, plain)).toBe(2);
  });

  it('draws a title as typed: hyphens, arrows, accents, Greek and Cyrillic', () => {
    for (const title of [
      'A--B',
      '-> <- => !=',
      'Größe Ø12 ±0.1',
      'Вал ступенчатый',
      'Άξονας',
      'x'.repeat(80),
    ]) {
      expect(handleWith({ title }).parameters.values['title']?.value).toBe(title);
      expect(handleWith({ title }).problems).toEqual([]);
    }
    expect(handleWith({ title: 'x'.repeat(81) }).problems).toHaveLength(1);
  });

  it('says what a bar too small for sharp corners leaves', () => {
    const advice = handleWith({
      barDiameter: '3/4 in',
      acrossFlats: '.670 in',
      spigotDiameter: '12',
      endSize: '0',
    }).advice;
    expect(advice.map(({ code }) => code)).toEqual(['rounded-corners']);
    // 0.670 in / cos 30° = 0.7737 in = 19.651 mm
    expect(advice[0]?.message).toContain('19.651 mm');
    expect(handleWith({ barDiameter: '26' }).advice).toEqual([]);
  });

  it('keeps row keys that are fit to keep and calls the others by their place', () => {
    const rows = ['a1', '', 'a1', 'not a key'].map((key, index) => ({
      key,
      diameter: String(10 + index),
      length: '5',
    }));
    const { parameters } = evaluate(steppedShaft, { steps: rows }, { entryUnit: 'mm' });
    expect(parameters.tables['steps']?.map(({ key }) => key)).toEqual(['a1', 'r2', 'r3', 'r4']);
  });

  it('offers a smallest crown that may itself be typed', () => {
    const refused = handleWith({ endSize: '6' }).problems[0]?.message ?? '';
    const least = /radius of ([\d.]+) to 500 mm/.exec(refused)?.[1] ?? '';
    expect(Number(least)).toBeGreaterThan(8);
    expect(handleWith({ endSize: least }).problems).toEqual([]);
    expect(handleWith({ endSize: String(Number(least) - 0.001) }).problems).toHaveLength(1);
  });
});

it('names a template by its content', () => {
  expect(templateHash(steppedShaft)).toMatch(/^[0-9a-f]{64}$/);
  expect(templateHash({ ...steppedShaft })).toBe(templateHash(steppedShaft));
  expect(templateHash({ ...steppedShaft, name: 'Another' })).not.toBe(templateHash(steppedShaft));
});
