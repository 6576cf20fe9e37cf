import fc from 'fast-check';

/** Every generator is drawn from this seed, so that a run can be told again. */
export const PINNED_SEED = 17_430_611;

/** The first values of an arbitrary, the same in every run. */
export function pinned<T>(arbitrary: fc.Arbitrary<T>, count: number, seed: number = PINNED_SEED): T[] {
  return fc.sample(arbitrary, { seed, numRuns: count });
}

/** A length in mm as a person types it, to a tenth unless told otherwise. */
export function typedMm(mm: number, decimals = 1): string {
  return String(Number(mm.toFixed(decimals)));
}

/** The same length in thousandths of an inch, with its unit. */
export function typedInches(mm: number): string {
  return `${Number((mm / 25.4).toFixed(3))} in`;
}

/** A number of tenths of a millimetre between two lengths. */
export function tenths(least: number, most: number): fc.Arbitrary<number> {
  return fc
    .integer({ min: Math.ceil(least * 10), max: Math.max(Math.ceil(least * 10), Math.floor(most * 10)) })
    .map((n) => n / 10);
}

/** A share of something, in hundredths from `least` to `most`. */
export function share(least: number, most: number): fc.Arbitrary<number> {
  return fc.integer({ min: Math.round(least * 100), max: Math.round(most * 100) }).map((n) => n / 100);
}

/** True in so many of a hundred. */
export function sometimes(percent: number): fc.Arbitrary<boolean> {
  return fc.integer({ min: 0, max: 99 }).map((n) => n < percent);
}
