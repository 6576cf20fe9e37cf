// General tolerances: sizes with no limits of their own.
// ISO 2768-1 linear table. Certainty: standard. Chamfers, radii and angles: from memory.
import { toRadians } from '../units/angle';
import { inchesToMm } from '../units/length';
import type { Source } from './certainty';

/** fine, medium, coarse, very coarse. */
export type GeneralToleranceClass = 'f' | 'm' | 'c' | 'v';

export const ISO_2768_SOURCE: Source = { source: 'ISO 2768-1', certainty: 'standard' };

type Row = readonly [over: number, upTo: number, f: number | null, m: number, c: number, v: number | null];
const COLUMN: Readonly<Record<GeneralToleranceClass, 2 | 3 | 4 | 5>> = { f: 2, m: 3, c: 4, v: 5 };

const LINEAR: readonly Row[] = [
  [0.5, 3, 0.05, 0.1, 0.2, null],
  [3, 6, 0.05, 0.1, 0.3, 0.5],
  [6, 30, 0.1, 0.2, 0.5, 1],
  [30, 120, 0.15, 0.3, 0.8, 1.5],
  [120, 400, 0.2, 0.5, 1.2, 2.5],
  [400, 1000, 0.3, 0.8, 2, 4],
  [1000, 2000, 0.5, 1.2, 3, 6],
  [2000, 4000, null, 2, 4, 8],
];

const BROKEN_EDGES: readonly Row[] = [
  [0.5, 3, 0.2, 0.2, 0.4, 0.4],
  [3, 6, 0.5, 0.5, 1, 1],
  [6, Number.POSITIVE_INFINITY, 1, 1, 2, 2],
];

/** In minutes of arc, by the length of the shorter leg. */
const ANGLES: readonly Row[] = [
  [0, 10, 60, 60, 90, 180],
  [10, 50, 30, 30, 60, 120],
  [50, 120, 20, 20, 30, 60],
  [120, 400, 10, 10, 15, 30],
  [400, Number.POSITIVE_INFINITY, 5, 5, 10, 20],
];

function lookUp(rows: readonly Row[], size: number, cls: GeneralToleranceClass): number | null {
  // Ranges are over one bound and up to the next: a size on a bound belongs to the row below, which comes first.
  const row = rows.find(([over, upTo]) => size >= over && size <= upTo);
  return row?.[COLUMN[cls]] ?? null;
}

/** ± tolerance in mm of a plain length or diameter; null where the standard gives none (below 0.5 mm, above 4 m, some classes). */
export function generalLinear(nominalMm: number, cls: GeneralToleranceClass): number | null {
  return lookUp(LINEAR, nominalMm, cls);
}

/** ± tolerance in mm of an external radius or a chamfer height; null below 0.5 mm. */
export function generalBrokenEdge(nominalMm: number, cls: GeneralToleranceClass): number | null {
  return lookUp(BROKEN_EDGES, nominalMm, cls);
}

/** ± tolerance in radians of an angle, by the length of its shorter leg in mm. */
export function generalAngular(shorterLegMm: number, cls: GeneralToleranceClass): number | null {
  const minutes = lookUp(ANGLES, shorterLegMm, cls);
  return minutes === null ? null : toRadians(minutes / 60);
}

/** Inch title-block tolerances by the decimals a size is given to. Not a standard: every shop sets its own. */
export const INCH_DECIMAL_BLOCK: Readonly<{
  byDecimals: Readonly<Record<number, number>>;
  angleDegrees: number;
  note: string;
  basis: Source;
}> = {
  byDecimals: { 1: inchesToMm(0.03), 2: inchesToMm(0.01), 3: inchesToMm(0.005), 4: inchesToMm(0.0005) },
  angleDegrees: 0.5,
  note: '.XX ±.01  .XXX ±.005  angles ±.5°',
  basis: { source: 'shop setting', certainty: 'common practice' },
};

/** ± tolerance in mm of an inch size given to so many decimals, by the shop's block; null when the block names none. */
export function inchDecimalTolerance(decimals: number): number | null {
  return INCH_DECIMAL_BLOCK.byDecimals[decimals] ?? null;
}
