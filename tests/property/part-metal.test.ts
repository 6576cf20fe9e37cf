import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { applyRemoval, removedVolume } from '../../shared/part/apply';
import type { Body, Generator, LinePiece } from '../../shared/part/body';
import { constant } from '../../shared/part/generator';
import { mirrorBody, mirrorRemoval } from '../../shared/part/mirror';
import type { Removal } from '../../shared/part/removal';
import { differences, sameMetal } from '../../shared/part/same-metal';
import { sectionArea } from '../../shared/part/section';
import { volume, volumeBetween } from '../../shared/part/volume';

const LENGTH = 60;
const SEED = { seed: 20261, numRuns: 150 };
const mm = (least: number, most: number): fc.Arbitrary<number> =>
  fc.integer({ min: Math.round(least * 1000), max: Math.round(most * 1000) }).map((n) => n / 1000);

const span = fc
  .tuple(mm(-5, LENGTH), mm(1, 30))
  .map(([from, length]) => ({ from, to: Math.min(LENGTH + 5, from + length) }));

const line = (from: number, to: number, start: number, end: number): LinePiece => ({
  kind: 'line',
  from,
  to,
  start,
  end,
});

const envelope: fc.Arbitrary<Generator> = fc.oneof(
  fc.tuple(span, mm(3, 20), mm(3, 20)).map(([s, a, b]): Generator => [line(s.from, s.to, a, b)]),
  fc
    .tuple(mm(20, 40), mm(12, 25))
    .map(([at, radius]): Generator => [
      { kind: 'arc', from: at, to: at + radius * 0.98, centreX: at, centreR: 0, radius, sign: 1 },
    ]),
  fc
    .tuple(mm(10, 40), mm(3, 6))
    .map(([at, radius]): Generator => [
      { kind: 'arc', from: at - radius, to: at + radius, centreX: at, centreR: 18, radius, sign: -1 },
    ]),
);

const removal: fc.Arbitrary<Removal> = fc.oneof(
  { weight: 3, arbitrary: envelope.map((e): Removal => ({ kind: 'outer', envelope: e })) },
  fc
    .tuple(span, mm(0.5, 5), mm(0.5, 5))
    .map(([s, a, b]): Removal => ({ kind: 'bore', envelope: [line(s.from, s.to, a, b)] })),
  {
    weight: 2,
    arbitrary: fc
      .tuple(span, fc.integer({ min: 1, max: 8 }), mm(6, 18), mm(0, 3))
      .map(([s, count, distance, phase]): Removal => ({
        kind: 'cut',
        cut: { kind: 'flats', id: 'f', ...s, count, distance, phase },
      })),
  },
  fc.tuple(span, mm(6, 16)).map(([s, radius]): Removal => ({
    kind: 'treatment',
    treatment: {
      kind: 'thread',
      id: 't',
      from: Math.max(0, s.from),
      to: Math.max(1, s.to),
      internal: false,
      designation: 'any',
      major: 2 * radius + 1.5,
      pitchDiameter: 2 * radius,
      root: 2 * radius - 1,
      pitch: 1.5,
      lead: 1.5,
      starts: 1,
      hand: 'right',
    },
  })),
  fc.tuple(mm(0, 10), mm(45, 60)).map(([from, to]): Removal => ({ kind: 'trim', from, to })),
);

const blank: Body = {
  x0: -5,
  x1: LENGTH + 5,
  outer: constant(-5, LENGTH + 5, 16),
  inner: constant(-5, LENGTH + 5, 0),
  cuts: [],
  treatments: [],
};
const removals = fc.array(removal, { minLength: 1, maxLength: 6 });
const applied = (list: readonly Removal[]): Body => list.reduce(applyRemoval, blank);

describe('random removals', () => {
  it('balance: what each takes, integrated on its own, is what the body has lost', () => {
    fc.assert(
      fc.property(removals, (list) => {
        let body = blank;
        for (const each of list) {
          const taken = removedVolume(body, each);
          const after = applyRemoval(body, each);
          expect(Number.isFinite(taken)).toBe(true);
          expect(taken).toBeGreaterThanOrEqual(-1e-9);
          expect(Math.abs(volume(body) - volume(after) - taken)).toBeLessThan(1e-7 * volume(blank));
          body = after;
        }
      }),
      SEED,
    );
  });

  it('give the same metal twice over, and in any order', () => {
    fc.assert(
      fc.property(removals, (list) => {
        const body = applied(list);
        expect(differences(body, applied([...list, ...list]))).toEqual([]);
        expect(differences(body, applied([...list].reverse()))).toEqual([]);
        expect(sameMetal(body, body)).toBe(true);
      }),
      SEED,
    );
  });

  it('turned end for end leave the same volume and the mirrored metal', () => {
    fc.assert(
      fc.property(removals, (list) => {
        const body = applied(list);
        const turned = list
          .map((each) => mirrorRemoval(each, LENGTH))
          .reduce(applyRemoval, mirrorBody(blank, LENGTH));
        expect(Math.abs(volume(turned) - volume(body))).toBeLessThan(1e-8 * volume(blank));
        expect(differences(turned, mirrorBody(body, LENGTH))).toEqual([]);
        expect(differences(mirrorBody(mirrorBody(body, LENGTH), LENGTH), body)).toEqual([]);
      }),
      SEED,
    );
  });

  it('leave a volume that a plain sum of sections agrees with', () => {
    fc.assert(
      fc.property(removals, (list) => {
        const body = applied(list);
        const slices = 4000;
        const step = (body.x1 - body.x0) / slices;
        let sum = 0;
        for (let i = 0; i < slices; i += 1) sum += sectionArea(body, body.x0 + (i + 0.5) * step) * step;
        expect(Math.abs(sum - volume(body)) / volume(blank)).toBeLessThan(1e-3);
        expect(volumeBetween(body, body.x0, 20) + volumeBetween(body, 20, body.x1)).toBeCloseTo(
          volume(body),
          6,
        );
      }),
      { seed: 77, numRuns: 12 },
    );
  });
});

describe('same metal', () => {
  const ring = (radius: number): Removal => ({ kind: 'outer', envelope: constant(10, 20, radius) });
  it('finds a hundredth of a millimetre anywhere', () => {
    fc.assert(
      fc.property(removals, mm(1, 15), (list, place) => {
        const body = applied(list);
        const worse: Removal[] = [
          { kind: 'outer', envelope: constant(body.x0 + place, body.x0 + place + 2, 2.99) },
          { kind: 'trim', from: body.x0 + 0.01, to: body.x1 },
        ];
        for (const each of worse) {
          const after = applyRemoval(body, each);
          expect(removedVolume(body, each) > 1e-6).toBe(!sameMetal(body, after));
        }
      }),
      SEED,
    );
    expect(sameMetal(applied([ring(12)]), applied([ring(12.01)]))).toBe(false);
    expect(sameMetal(applied([ring(12)]), applied([ring(12 + 1e-9)]))).toBe(true);
  });

  it('takes a hexagon bar and a milled round for one', () => {
    const hexagon: Removal = {
      kind: 'cut',
      cut: { kind: 'flats', id: 'a', from: -5, to: 65, count: 6, distance: 12, phase: 0 },
    };
    const turned = applied([
      hexagon,
      { kind: 'outer', envelope: constant(-5, 65, 12 / Math.cos(Math.PI / 6)) },
    ]);
    const otherName: Removal = { kind: 'cut', cut: { ...hexagon.cut, id: 'b', phase: Math.PI / 3 } };
    expect(sameMetal(applied([hexagon]), turned)).toBe(true);
    expect(sameMetal(applied([otherName]), turned)).toBe(true);
    const offset: Removal = { kind: 'cut', cut: { ...hexagon.cut, phase: 0.01 } };
    expect(sameMetal(applied([offset]), turned)).toBe(false);
  });
});
