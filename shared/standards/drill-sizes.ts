// Twist drills: number, letter and fraction sizes (ASME B94.11M, equal to the gauge tables of GNU units) and the metric jobber series
// (ISO 235, increments from memory).
import { inchesToMm } from '../units/length';

/** Number drills 1 to 80, inches. */
const NUMBER_INCHES: readonly number[] = [
  0.228, 0.221, 0.213, 0.209, 0.2055, 0.204, 0.201, 0.199, 0.196, 0.1935, 0.191, 0.189, 0.185, 0.182, 0.18,
  0.177, 0.173, 0.1695, 0.166, 0.161, 0.159, 0.157, 0.154, 0.152, 0.1495, 0.147, 0.144, 0.1405, 0.136, 0.1285,
  0.12, 0.116, 0.113, 0.111, 0.11, 0.1065, 0.104, 0.1015, 0.0995, 0.098, 0.096, 0.0935, 0.089, 0.086, 0.082,
  0.081, 0.0785, 0.076, 0.073, 0.07, 0.067, 0.0635, 0.0595, 0.055, 0.052, 0.0465, 0.043, 0.042, 0.041, 0.04,
  0.039, 0.038, 0.037, 0.036, 0.035, 0.033, 0.032, 0.031, 0.0292, 0.028, 0.026, 0.025, 0.024, 0.0225, 0.021,
  0.02, 0.018, 0.016, 0.0145, 0.0135,
];

/** Letter drills A to Z, inches. */
const LETTER_INCHES: readonly number[] = [
  0.234, 0.238, 0.242, 0.246, 0.25, 0.257, 0.261, 0.266, 0.272, 0.277, 0.281, 0.29, 0.295, 0.302, 0.316,
  0.323, 0.332, 0.339, 0.348, 0.358, 0.368, 0.377, 0.386, 0.397, 0.404, 0.413,
];

export type DrillSystem = 'metric' | 'number' | 'letter' | 'fraction';

export interface DrillSize {
  /** `6.8`, `#7`, `F`, `5/16`. */
  name: string;
  system: DrillSystem;
  /** mm. */
  diameter: number;
}

/** Metric steps: [from, up to, step], mm. */
const METRIC_STEPS: readonly (readonly [number, number, number])[] = [
  [0.3, 3, 0.05],
  [3.1, 14, 0.1],
  [14.25, 32, 0.25],
  [32.5, 50, 0.5],
  [51, 100, 1],
];

function metricDrills(): readonly DrillSize[] {
  return METRIC_STEPS.flatMap(([from, upTo, step]) => {
    const count = Math.round((upTo - from) / step);
    return Array.from({ length: count + 1 }, (_, index): DrillSize => {
      const hundredths = Math.round((from + index * step) * 100);
      return { name: String(hundredths / 100), system: 'metric', diameter: hundredths / 100 };
    });
  });
}

function fractionName(sixtyFourths: number): string {
  const whole = Math.floor(sixtyFourths / 64);
  let top = sixtyFourths % 64;
  let bottom = 64;
  if (top === 0) return String(whole);
  while (top % 2 === 0) {
    top /= 2;
    bottom /= 2;
  }
  return whole === 0 ? `${top}/${bottom}` : `${whole}-${top}/${bottom}`;
}

/** Every 1/64 in to 1-3/4, then every 1/32 to 2-1/4 and every 1/16 to 3. */
function fractionDrills(): readonly DrillSize[] {
  const list: DrillSize[] = [];
  for (let n = 1; n <= 192; n += n < 112 ? 1 : n < 144 ? 2 : 4) {
    list.push({ name: fractionName(n), system: 'fraction', diameter: inchesToMm(n / 64) });
  }
  return list;
}

/** All drills of a system, smallest first. */
export const DRILL_SIZES: Readonly<Record<DrillSystem, readonly DrillSize[]>> = {
  metric: metricDrills(),
  number: NUMBER_INCHES.map((inches, index): DrillSize => ({
    name: `#${index + 1}`,
    system: 'number',
    diameter: inchesToMm(inches),
  })).reverse(),
  letter: LETTER_INCHES.map((inches, index): DrillSize => ({
    name: String.fromCharCode(65 + index),
    system: 'letter',
    diameter: inchesToMm(inches),
  })),
  fraction: fractionDrills(),
};

export const INCH_SYSTEMS: readonly DrillSystem[] = ['fraction', 'number', 'letter'];
export const METRIC_SYSTEMS: readonly DrillSystem[] = ['metric'];

/** The drill of this name (`#7`, `F`, `5/16`, `6.8`), or null. */
export function drillByName(name: string): DrillSize | null {
  const wanted = name.trim().toUpperCase();
  for (const system of Object.values(DRILL_SIZES)) {
    const found = system.find((drill) => drill.name === wanted);
    if (found) return found;
  }
  return null;
}

function bySize(systems: readonly DrillSystem[]): readonly DrillSize[] {
  return systems.flatMap((system) => DRILL_SIZES[system]).sort((a, b) => a.diameter - b.diameter);
}

/** The drill nearest a diameter in mm; of two as near, the larger; null only when no system is named. */
export function nearestDrill(diameterMm: number, systems: readonly DrillSystem[]): DrillSize | null {
  let nearest: DrillSize | null = null;
  for (const drill of bySize(systems)) {
    if (
      nearest === null ||
      Math.abs(drill.diameter - diameterMm) <= Math.abs(nearest.diameter - diameterMm) + 1e-9
    )
      nearest = drill;
  }
  return nearest;
}

/** The smallest drill at or above a diameter in mm, or null when the lists end below it. */
export function nextDrillUp(diameterMm: number, systems: readonly DrillSystem[]): DrillSize | null {
  return bySize(systems).find((drill) => drill.diameter >= diameterMm - 1e-6) ?? null;
}

/** Length of a drill's point beyond its full diameter: (d/2) / tan(a/2). Point angle in radians, 118° unless given. */
export function drillPointLength(diameterMm: number, pointAngle: number = (118 * Math.PI) / 180): number {
  return diameterMm / 2 / Math.tan(pointAngle / 2);
}
