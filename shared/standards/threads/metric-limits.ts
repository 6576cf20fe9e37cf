import { metricBasicSizes } from './metric';
import { DEVIATIONS, MAJOR_GRADE_6, MINOR_GRADE_6, PITCH_GRADE_6, stepR40 } from './metric-tolerances';
import type { Limits } from './thread-spec';

/** R40 steps of a grade from grade 6: each grade is a factor of 1.25 (grades 3 to 9). */
const STEPS_PER_GRADE = 4;

/** R40 steps from Td2 of grade 6 to TD2 of an internal grade: 0.85, 1.06, 1.32, 1.7 and 2.12 times. */
const INTERNAL_PITCH_STEPS: Readonly<Record<number, number>> = { 4: -3, 5: 1, 6: 5, 7: 9, 8: 13 };

/** ISO 965-1 formula: Td(6) = 180 P^(2/3) - 3.15 / √P. */
function majorGrade6(pitch: number): number {
  return MAJOR_GRADE_6[pitch] ?? stepR40(180 * pitch ** (2 / 3) - 3.15 / Math.sqrt(pitch), 0);
}

/** ISO 965-1 formula: TD1(6) = 433 P - 190 P^1.22 below 1 mm, else 230 P^0.7. */
function minorGrade6(pitch: number): number {
  return (
    MINOR_GRADE_6[pitch] ?? stepR40(pitch < 1 ? 433 * pitch - 190 * pitch ** 1.22 : 230 * pitch ** 0.7, 0)
  );
}

/** ISO 965-1 formula: Td2(6) = 90 P^0.4 d^0.1, d the geometric mean of the diameter range. */
function pitchGrade6(major: number, pitch: number): number {
  const range = PITCH_GRADE_6.find(({ over, upTo }) => major > over && major <= upTo);
  if (!range) return stepR40(90 * pitch ** 0.4 * major ** 0.1, 0);
  return range.byPitch[pitch] ?? stepR40(90 * pitch ** 0.4 * Math.sqrt(range.over * range.upTo) ** 0.1, 0);
}

/** ISO 965-1 formulas: 15, 30 and 50 + 11 P for g, f and e; h and H are zero. */
function deviation(position: string, pitch: number): number | null {
  const lower = position.toLowerCase();
  if (lower === 'h') return 0;
  if (lower !== 'e' && lower !== 'f' && lower !== 'g') return null;
  const base = { e: 50, f: 30, g: 15 }[lower];
  return DEVIATIONS[lower][pitch] ?? base + 11 * pitch;
}

interface ClassParts {
  pitchGrade: number;
  crestGrade: number;
  position: string;
}

/** `6g` is one grade for both; `4g6g` is the pitch diameter's and then the crest's. */
function readClass(text: string): ClassParts | null {
  const found = /^(\d)([a-zA-Z])(?:(\d)([a-zA-Z]))?$/.exec(text);
  if (!found || (found[4] !== undefined && found[4] !== found[2])) return null;
  return { pitchGrade: Number(found[1]), crestGrade: Number(found[3] ?? found[1]), position: found[2] ?? '' };
}

const between = (max: number, tolerance: number): Limits => ({ max, min: max - tolerance });

/** Limits of an external metric thread, mm; null for a class the standard does not table. Source: ISO 965-1, -3. */
export function metricExternalLimits(
  major: number,
  pitch: number,
  threadClass: string,
): { major: Limits; pitch: Limits } | null {
  const parts = readClass(threadClass);
  if (!parts || parts.position !== parts.position.toLowerCase()) return null;
  const offset = deviation(parts.position, pitch);
  if (
    offset === null ||
    ![4, 6, 8].includes(parts.crestGrade) ||
    parts.pitchGrade < 3 ||
    parts.pitchGrade > 9
  )
    return null;
  const crest = stepR40(majorGrade6(pitch), (parts.crestGrade - 6) * STEPS_PER_GRADE);
  const flank = stepR40(pitchGrade6(major, pitch), (parts.pitchGrade - 6) * STEPS_PER_GRADE);
  const { pitchDiameter } = metricBasicSizes(major, pitch);
  return {
    major: between(major - offset / 1000, crest / 1000),
    pitch: between(pitchDiameter - offset / 1000, flank / 1000),
  };
}

/** Limits of an internal metric thread, mm; null for a class the standard does not table. Source: ISO 965-1, -3. */
export function metricInternalLimits(
  major: number,
  pitch: number,
  threadClass: string,
): { minor: Limits; pitch: Limits } | null {
  const parts = readClass(threadClass);
  if (!parts || (parts.position !== 'G' && parts.position !== 'H')) return null;
  const offset = deviation(parts.position, pitch);
  const flankSteps = INTERNAL_PITCH_STEPS[parts.pitchGrade];
  if (offset === null || flankSteps === undefined || parts.crestGrade < 4 || parts.crestGrade > 8)
    return null;
  const crest = stepR40(minorGrade6(pitch), (parts.crestGrade - 6) * STEPS_PER_GRADE);
  const flank = stepR40(pitchGrade6(major, pitch), flankSteps);
  const basic = metricBasicSizes(major, pitch);
  const above = (size: number, tolerance: number): Limits => ({
    min: size + offset / 1000,
    max: size + (offset + tolerance) / 1000,
  });
  return { minor: above(basic.minor, crest), pitch: above(basic.pitchDiameter, flank) };
}
