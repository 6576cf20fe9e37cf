import { inchesToMm, MM_PER_INCH } from '../../units/length';
import { roundHalfEven } from '../../units/format';
import { unifiedBasicSizes } from './unified';
import type { Limits, ThreadSeries } from './thread-spec';

/** Factor of a class on the class 2A pitch diameter tolerance. Source: ASME B1.1. */
const PITCH_FACTOR: Readonly<Record<string, number>> = {
  '1A': 1.5,
  '2A': 1,
  '3A': 0.75,
  '1B': 1.95,
  '2B': 1.3,
  '3B': 0.975,
};

/** Inch limits are tabled to four decimals, each quantity rounded before it is added; so are these. */
const table = (inches: number): number => roundHalfEven(inches, 4);

/** Length of engagement the tolerance is reckoned for: one diameter in the graded and the coarse constant series, else nine pitches. */
function engagement(series: ThreadSeries, major: number, tpi: number): number {
  const byDiameter = series === 'unc' || series === 'unf' || (series === 'un' && tpi <= 8);
  return byDiameter ? major : 9 / tpi;
}

/** Class 2A pitch diameter tolerance, in: 0.0015 ∛D + 0.0015 √LE + 0.015 ∛(P²). Source: ASME B1.1. */
function pitchTolerance2A(series: ThreadSeries, major: number, tpi: number): number {
  return (
    0.0015 * Math.cbrt(major) + 0.0015 * Math.sqrt(engagement(series, major, tpi)) + 0.015 * tpi ** (-2 / 3)
  );
}

const inMm = ({ max, min }: Limits): Limits => ({ max: inchesToMm(max), min: inchesToMm(min) });

/** Limits of an external unified thread, mm; null for a class that is not 1A, 2A or 3A. */
export function unifiedExternalLimits(
  series: ThreadSeries,
  majorMm: number,
  tpi: number,
  threadClass: string,
): { major: Limits; pitch: Limits } | null {
  const factor = threadClass.endsWith('A') ? PITCH_FACTOR[threadClass] : undefined;
  if (factor === undefined) return null;
  const major = roundHalfEven(majorMm / MM_PER_INCH, 4);
  const base = pitchTolerance2A(series, majorMm / MM_PER_INCH, tpi);
  const allowance = threadClass === '3A' ? 0 : table(0.3 * base);
  const crest = table((threadClass === '1A' ? 0.09 : 0.06) * tpi ** (-2 / 3));
  const basicPitch = table(unifiedBasicSizes(majorMm / MM_PER_INCH, 1 / tpi).pitchDiameter);
  const majorMax = major - allowance;
  const pitchMax = basicPitch - allowance;
  return {
    major: inMm({ max: majorMax, min: majorMax - crest }),
    pitch: inMm({ max: pitchMax, min: pitchMax - table(factor * base) }),
  };
}

/** Minor diameter tolerance of the internal thread, in. Source: ASME B1.1 formulas for 1B, 2B and 3B. */
function minorTolerance(major: number, tpi: number, threadClass: string): number {
  const p = 1 / tpi;
  const small = 0.05 * p ** (2 / 3) + (0.03 * p) / major - 0.002;
  if (threadClass === '3B') {
    return tpi <= 12 ? 0.12 * p : Math.max(small, 0.23 * p - 1.5 * p * p);
  }
  const floor = 0.25 * p - 0.4 * p * p;
  return major >= 0.25 ? floor : Math.min(Math.max(small, floor), 0.394 * p);
}

/** Limits of an internal unified thread, mm; null for a class that is not 1B, 2B or 3B. */
export function unifiedInternalLimits(
  series: ThreadSeries,
  majorMm: number,
  tpi: number,
  threadClass: string,
): { minor: Limits; pitch: Limits } | null {
  const factor = threadClass.endsWith('B') ? PITCH_FACTOR[threadClass] : undefined;
  if (factor === undefined) return null;
  const inches = majorMm / MM_PER_INCH;
  const basic = unifiedBasicSizes(inches, 1 / tpi);
  const minorMin = table(basic.minor);
  const minorMax = minorMin + table(minorTolerance(inches, tpi, threadClass));
  // The standard prints minor limits to three decimals from #6 up; only the largest of class 3B keeps its fourth.
  const places = inches < 0.138 ? 4 : 3;
  const pitchMin = table(basic.pitchDiameter);
  return {
    minor: inMm({
      min: roundHalfEven(minorMin, places),
      max: roundHalfEven(minorMax, threadClass === '3B' ? 4 : places),
    }),
    pitch: inMm({ min: pitchMin, max: pitchMin + table(factor * pitchTolerance2A(series, inches, tpi)) }),
  };
}
