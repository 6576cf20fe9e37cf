// Bar a small shop can buy, mm. Common practice: preferred sizes of bright bar, not a list any one standard gives.
import { inchesToMm } from '../units/length';
import { HEXAGON_BAR_MM } from './hexagons';
import type { Source } from './certainty';

export type BarShape = 'round' | 'hex' | 'square';

export const BAR_SOURCE: Source = { source: 'preferred sizes of bright bar', certainty: 'common practice' };

const ROUND_MM: readonly number[] = [
  3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20, 21, 22, 23, 24, 25, 26, 27, 28, 30, 32, 34,
  35, 36, 38, 40, 42, 45, 48, 50, 52, 55, 56, 60, 63, 65, 70, 75, 80, 85, 90, 95, 100, 110, 120, 125, 130,
  140, 150, 160, 180, 200,
];
const SQUARE_MM: readonly number[] = [
  3, 4, 5, 6, 8, 10, 12, 14, 15, 16, 18, 20, 22, 25, 28, 30, 32, 35, 36, 40, 45, 50, 60, 63, 70, 80, 100,
];

/** Sixteenths of an inch. */
const ROUND_SIXTEENTHS: readonly number[] = [
  2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20, 21, 22, 23, 24, 26, 28, 30, 32, 34, 36,
  38, 40, 42, 44, 48, 52, 56, 60, 64, 72, 80, 88, 96,
];
const HEX_SIXTEENTHS: readonly number[] = [
  2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 18, 20, 22, 24, 26, 28, 30, 32, 36, 40, 44, 48,
];
const SQUARE_SIXTEENTHS: readonly number[] = [
  2, 3, 4, 5, 6, 7, 8, 10, 12, 14, 16, 18, 20, 22, 24, 28, 32, 36, 40, 48,
];

const sixteenths = (list: readonly number[]): readonly number[] => list.map((n) => inchesToMm(n / 16));

/** Sizes in mm, ascending: diameter of round, across flats of hexagon and square. */
export const BAR_SIZES: Readonly<Record<BarShape, { metric: readonly number[]; inch: readonly number[] }>> = {
  round: { metric: ROUND_MM, inch: sixteenths(ROUND_SIXTEENTHS) },
  hex: { metric: HEXAGON_BAR_MM, inch: sixteenths(HEX_SIXTEENTHS) },
  square: { metric: SQUARE_MM, inch: sixteenths(SQUARE_SIXTEENTHS) },
};

/** The smallest listed bar at or above a size, mm; null when none is big enough. */
export function nextBarUp(shape: BarShape, atLeast: number, system: 'metric' | 'inch'): number | null {
  return BAR_SIZES[shape][system].find((size) => size >= atLeast - 1e-6) ?? null;
}
