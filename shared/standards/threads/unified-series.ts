// ASME B1.1 unified series: basic diameters (in) with their threads per inch. Certainty: standard to 1-1/2 in; UNEF list from memory.

export interface UnifiedSize {
  /** As it is named: `#10`, `3/8`, `1-1/4`. */
  name: string;
  /** Basic major diameter, inches. */
  inches: number;
  unc?: number;
  unf?: number;
  unef?: number;
}

type Row = readonly [name: string, inches: number, unc: number, unf: number, unef: number];

/** 0 = not listed. */
const ROWS: readonly Row[] = [
  ['#0', 0.06, 0, 80, 0],
  ['#1', 0.073, 64, 72, 0],
  ['#2', 0.086, 56, 64, 0],
  ['#3', 0.099, 48, 56, 0],
  ['#4', 0.112, 40, 48, 0],
  ['#5', 0.125, 40, 44, 0],
  ['#6', 0.138, 32, 40, 0],
  ['#8', 0.164, 32, 36, 0],
  ['#10', 0.19, 24, 32, 0],
  ['#12', 0.216, 24, 28, 32],
  ['1/4', 0.25, 20, 28, 32],
  ['5/16', 0.3125, 18, 24, 32],
  ['3/8', 0.375, 16, 24, 32],
  ['7/16', 0.4375, 14, 20, 28],
  ['1/2', 0.5, 13, 20, 28],
  ['9/16', 0.5625, 12, 18, 24],
  ['5/8', 0.625, 11, 18, 24],
  ['11/16', 0.6875, 0, 0, 24],
  ['3/4', 0.75, 10, 16, 20],
  ['13/16', 0.8125, 0, 0, 20],
  ['7/8', 0.875, 9, 14, 20],
  ['15/16', 0.9375, 0, 0, 20],
  ['1', 1, 8, 12, 20],
  ['1-1/16', 1.0625, 0, 0, 18],
  ['1-1/8', 1.125, 7, 12, 18],
  ['1-3/16', 1.1875, 0, 0, 18],
  ['1-1/4', 1.25, 7, 12, 18],
  ['1-5/16', 1.3125, 0, 0, 18],
  ['1-3/8', 1.375, 6, 12, 18],
  ['1-7/16', 1.4375, 0, 0, 18],
  ['1-1/2', 1.5, 6, 12, 18],
  ['1-9/16', 1.5625, 0, 0, 18],
  ['1-5/8', 1.625, 0, 0, 18],
  ['1-11/16', 1.6875, 0, 0, 18],
  ['1-3/4', 1.75, 5, 0, 0],
  ['1-13/16', 1.8125, 0, 0, 0],
  ['1-7/8', 1.875, 0, 0, 0],
  ['1-15/16', 1.9375, 0, 0, 0],
  ['2', 2, 4.5, 0, 0],
  ['2-1/16', 2.0625, 0, 0, 0],
  ['2-1/8', 2.125, 0, 0, 0],
  ['2-3/16', 2.1875, 0, 0, 0],
  ['2-1/4', 2.25, 4.5, 0, 0],
  ['2-5/16', 2.3125, 0, 0, 0],
  ['2-3/8', 2.375, 0, 0, 0],
  ['2-7/16', 2.4375, 0, 0, 0],
  ['2-1/2', 2.5, 4, 0, 0],
  ['2-5/8', 2.625, 0, 0, 0],
  ['2-3/4', 2.75, 4, 0, 0],
  ['2-7/8', 2.875, 0, 0, 0],
  ['3', 3, 4, 0, 0],
  ['3-1/4', 3.25, 4, 0, 0],
  ['3-1/2', 3.5, 4, 0, 0],
  ['3-3/4', 3.75, 4, 0, 0],
  ['4', 4, 4, 0, 0],
];

export const UNIFIED_SIZES: readonly UnifiedSize[] = ROWS.map(([name, inches, unc, unf, unef]) => ({
  name,
  inches,
  ...(unc > 0 ? { unc } : {}),
  ...(unf > 0 ? { unf } : {}),
  ...(unef > 0 ? { unef } : {}),
}));

/** Constant-pitch series of ASME B1.1. */
export const CONSTANT_PITCH_TPI: readonly number[] = [4, 6, 8, 12, 16, 20, 28, 32];

/** Fewest threads per inch a diameter may have: the UNC count of the next size at or below it that has one. */
export function fewestTpiAt(inches: number): number {
  let fewest = 64;
  for (const size of UNIFIED_SIZES) {
    if (size.inches > inches) break;
    if (size.unc !== undefined) fewest = size.unc;
  }
  return fewest;
}
