import fc from 'fast-check';
import { expect, it } from 'vitest';
import { buildScheme } from '../../shared/scheme/build';
import { evaluate } from '../../shared/template/evaluate';
import { exampleValues } from '../../shared/template/default-values';
import type { Template, TypedValues } from '../../shared/template/template';
import { templates } from '../../templates/index';
import { PINNED_SEED } from './generators/pinned';

/** Runs a family. */
const RUNS = 3000;

/** Texts near what people type, so that many get past the reader and meet the constraints. */
const nearlyTyped = fc.oneof(
  { weight: 6, arbitrary: fc.integer({ min: 0, max: 600 }).map((n) => String(n / 4)) },
  {
    weight: 2,
    arbitrary: fc.constantFrom(
      '1/2 in',
      '3/4"',
      '.67 in',
      '25 h6',
      '14 h9',
      '16 ±0.1',
      '20 +0/-0.1',
      '-3',
      '1e9',
      '1e-9',
      '0',
      'none',
      '',
    ),
  },
  {
    weight: 2,
    arbitrary: fc.constantFrom('M10', 'M16x1.5 LH', '3/8-16 UNC', 'M1', 'M500', 'Tr20x4', 'G1/4', '2 BA'),
  },
  {
    weight: 1,
    arbitrary: fc.constantFrom(
      'hex',
      'round',
      'crown',
      'chamfer',
      'end-diameter',
      'yes',
      '__proto__',
      'NaN',
      'Infinity',
    ),
  },
  { weight: 1, arbitrary: fc.string({ unit: 'binary', maxLength: 100 }) },
);
const anything = fc.oneof(
  { weight: 5, arbitrary: nearlyTyped },
  { weight: 1, arbitrary: fc.anything({ withNullPrototype: true }) },
);

function changes(template: Template): fc.Arbitrary<Record<string, unknown>> {
  const names = [...template.parameters.map(({ id }) => id), '__proto__', 'constructor', ''];
  const row = fc.dictionary(
    fc.constantFrom('key', 'diameter', 'length', 'fit', 'thread', 'keyWidth', 'constructor'),
    anything,
    { maxKeys: 5 },
  );
  const figure = fc.integer({ min: 2, max: 400 }).map((n) => String(n / 4));
  const goodRow = fc.record({ diameter: figure, length: figure });
  const nearlyRow = fc.record(
    { diameter: nearlyTyped, length: nearlyTyped, thread: nearlyTyped },
    { requiredKeys: ['length'] },
  );
  const rows = fc.oneof(
    fc.array(goodRow, { minLength: 1, maxLength: 12 }),
    fc.array(fc.oneof(row, goodRow, nearlyRow), { maxLength: 14 }),
    fc.oneof(nearlyRow, goodRow).map((only) => [only]),
    anything,
  );
  return fc.array(fc.tuple(fc.constantFrom(...names), anything), { maxLength: 3 }).chain((pairs) =>
    rows.map((table) => {
      const change: Record<string, unknown> = Object.fromEntries(pairs);
      if (template.id === 'stepped-shaft') change['steps'] = table;
      return change;
    }),
  );
}

it.each(templates)('$id: whatever is typed gives a part or sentences, never a fault', (template) => {
  const paths = new Set(template.parameters.map(({ id }) => id));
  let parts = 0;
  let refused = 0;
  fc.assert(
    fc.property(
      changes(template),
      fc.constantFrom('mm' as const, 'in' as const),
      fc.boolean(),
      (change, entryUnit, onExample) => {
        const typed = (onExample ? { ...exampleValues(template), ...change } : change) as TypedValues;
        const evaluation = evaluate(template, typed, { entryUnit });
        const { part, problems } = evaluation;
        expect(part === undefined).toBe(problems.length > 0);
        if (part) {
          parts += 1;
          const scheme = buildScheme(template, { ...evaluation, part }, { generalTolerance: 'ISO 2768-m' });
          expect(scheme.completeness, JSON.stringify(typed)).toEqual({ missing: [], redundant: [] });
          expect(JSON.stringify(part)).not.toContain('null');
        } else refused += 1;
        for (const { path, message } of problems) {
          const known = paths.has(/^[^[.]*/.exec(path)?.[0] ?? '');
          expect(known || message.includes('no size called') || message.includes('names are not known')).toBe(
            true,
          );
          expect(message).toMatch(/[.]$/);
          expect(message).not.toMatch(/undefined|NaN mm|\[object|Infinity mm|null/);
        }
      },
    ),
    { seed: PINNED_SEED, numRuns: RUNS },
  );
  // Both outcomes must be met, or the test proves nothing.
  expect(parts).toBeGreaterThan(60);
  expect(refused).toBeGreaterThan(500);
});

it('refuses what is not a list of names and values', () => {
  for (const template of templates) {
    for (const typed of [null, undefined, 3, 'text', [], [{ id: 1 }], () => 1]) {
      const { problems } = evaluate(template, typed as unknown as TypedValues, { entryUnit: 'mm' });
      expect(problems.map(({ path }) => path)).toEqual(['parameters']);
    }
  }
});
