import { quoteGiven, refuse, type Parsed } from '../units/parsed';
import {
  FINE_RANGES,
  HOLE_J,
  IT_GRADES,
  MAIN_RANGES,
  SHAFT_ABOVE_FINE,
  SHAFT_ABOVE_MAIN,
  SHAFT_BELOW_FINE,
  SHAFT_BELOW_MAIN,
  SHAFT_J,
} from './iso286-tables';

/** Deviations from the nominal size, mm, signed. */
export interface FitLimits {
  upper: number;
  lower: number;
}

const MICROMETRE = 1000;
const LARGEST_MM = 500;

/** Standard tolerance IT of a size, mm; null outside 0 to 500 mm or grades 1 to 16. Source: ISO 286-1. */
export function itGrade(nominalMm: number, grade: number): number | null {
  const micrometres = itMicrometres(nominalMm, grade);
  return micrometres === null ? null : micrometres / MICROMETRE;
}

function itMicrometres(nominalMm: number, grade: number): number | null {
  return byRange(MAIN_RANGES, IT_GRADES[grade], nominalMm);
}

function byRange(
  ranges: readonly number[],
  values: readonly (number | null)[] | undefined,
  nominalMm: number,
): number | null {
  if (!(nominalMm > 0)) return null;
  const index = ranges.findIndex((end) => nominalMm <= end);
  return index < 0 ? null : (values?.[index] ?? null);
}

/**
 * Limits of a size by its ISO 286 code: shafts a to u, holes A to U, grades 1 to 16, to 500 mm.
 * @param code small letters for a shaft (`h6`), capitals for a hole (`H7`)
 * @returns deviations in mm, or a sentence saying what is not tabled
 */
export function fitLimits(code: string, nominalMm: number): Parsed<FitLimits> {
  const found = /^([A-Za-z]{1,2})(\d{1,2})$/.exec(code.slice(0, 8).replace(/\s/g, ''));
  const letter = found?.[1] ?? '';
  const grade = Number(found?.[2]);
  const isHole = letter === letter.toUpperCase();
  if (!found || (!isHole && letter !== letter.toLowerCase())) {
    return refuse(
      `${quoteGiven(code)} is not an ISO fit code. Type a letter and a grade, such as h6 for a shaft or H7 for a hole.`,
    );
  }
  if (!(nominalMm > 0) || nominalMm > LARGEST_MM) {
    return refuse(
      `The fit ${code} is tabled for sizes above 0 up to ${LARGEST_MM} mm. Give the limits themselves, such as +0/-0.1.`,
    );
  }
  const tolerance = itMicrometres(nominalMm, grade);
  if (tolerance === null) {
    return refuse(
      `Grade ${found[2]} of ${quoteGiven(code)} is not tabled. Use a grade from 1 to 16, or give the limits themselves.`,
    );
  }
  const limits = isHole
    ? holeDeviations(letter.toLowerCase(), grade, tolerance, nominalMm)
    : shaftDeviations(letter, grade, tolerance, nominalMm);
  if (!limits) {
    return refuse(
      `The standard table has no ${quoteGiven(code)} at this size. Use a common fit such as ${isHole ? 'H7, G7, K7 or P7' : 'h6, g6, k6 or p6'}, or give the limits themselves.`,
    );
  }
  // A limit of zero has no sign: +0 and -0 must not differ.
  return {
    ok: true,
    value: { upper: limits.upper / MICROMETRE || 0, lower: limits.lower / MICROMETRE || 0 },
  };
}

function shaftBelow(letter: string, nominalMm: number): number | null {
  if ((letter === 'a' || letter === 'b') && nominalMm <= 1) return null;
  return (
    byRange(MAIN_RANGES, SHAFT_BELOW_MAIN[letter], nominalMm) ??
    byRange(FINE_RANGES, SHAFT_BELOW_FINE[letter], nominalMm)
  );
}

function shaftAbove(letter: string, nominalMm: number): number | null {
  return (
    byRange(MAIN_RANGES, SHAFT_ABOVE_MAIN[letter], nominalMm) ??
    byRange(FINE_RANGES, SHAFT_ABOVE_FINE[letter], nominalMm)
  );
}

function shaftDeviations(letter: string, grade: number, it: number, nominalMm: number): FitLimits | null {
  if (letter === 'js') return { upper: it / 2, lower: -it / 2 };
  if (letter === 'j') {
    const ei = byRange(MAIN_RANGES, SHAFT_J[grade], nominalMm);
    return ei === null ? null : { upper: ei + it, lower: ei };
  }
  const below = shaftBelow(letter, nominalMm);
  if (below !== null) return { upper: -below, lower: -below - it };
  const above = shaftAbove(letter, nominalMm);
  if (above === null) return null;
  const ei = letter === 'k' && (grade < 4 || grade > 7) ? 0 : above;
  return { upper: ei + it, lower: ei };
}

/** Holes A to H mirror the shafts; K to U mirror them with the standard's delta where the grade is fine. */
function holeDeviations(letter: string, grade: number, it: number, nominalMm: number): FitLimits | null {
  if (letter === 'js') return { upper: it / 2, lower: -it / 2 };
  if (letter === 'j') {
    const es = byRange(MAIN_RANGES, HOLE_J[grade], nominalMm);
    return es === null ? null : { upper: es, lower: es - it };
  }
  const below = shaftBelow(letter, nominalMm);
  if (below !== null) return { upper: below + it, lower: below };
  const above = shaftAbove(letter, nominalMm);
  if (above === null) return null;
  const upper = holeUpper(letter, grade, it, nominalMm, above);
  return upper === null ? null : { upper, lower: upper - it };
}

function holeUpper(
  letter: string,
  grade: number,
  it: number,
  nominalMm: number,
  above: number,
): number | null {
  const isMiddle = letter === 'k' || letter === 'm' || letter === 'n';
  const finest = isMiddle ? 8 : 7;
  if (grade > finest) {
    if (letter === 'k') return nominalMm <= 3 ? 0 : null;
    if (letter === 'n' && nominalMm > 3) return 0;
    return -above;
  }
  // The one exception the standard makes to its own rule.
  if (letter === 'm' && grade === 6 && nominalMm > 250 && nominalMm <= 315) return -9;
  const finer = itMicrometres(nominalMm, grade - 1);
  const delta = nominalMm <= 3 || grade < 3 || finer === null ? 0 : it - finer;
  return -above + delta;
}
