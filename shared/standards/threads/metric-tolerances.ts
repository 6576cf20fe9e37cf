// ISO 965-1 tolerances of metric threads, micrometres.
// Certainty: es of g, Td to P 1.5, Td2 of grades 3 to 9 and TD1 to P 0.7 agree with published tables (standard, handbook); the rest from memory.
// Where a pitch is not tabled the standard's own formulas stand in, rounded to the R40 series.

/** Grade 6 tolerance of the major diameter, external, by pitch. */
export const MAJOR_GRADE_6: Readonly<Record<number, number>> = {
  0.2: 56,
  0.25: 67,
  0.3: 75,
  0.35: 85,
  0.4: 95,
  0.45: 100,
  0.5: 106,
  0.6: 125,
  0.7: 140,
  0.75: 140,
  0.8: 150,
  1: 180,
  1.25: 212,
  1.5: 236,
  1.75: 265,
  2: 280,
  2.5: 335,
  3: 375,
  3.5: 425,
  4: 475,
  4.5: 500,
  5: 530,
  5.5: 560,
  6: 600,
  8: 710,
};

/** Grade 6 tolerance of the minor diameter, internal, by pitch. */
export const MINOR_GRADE_6: Readonly<Record<number, number>> = {
  0.2: 60,
  0.25: 71,
  0.3: 85,
  0.35: 100,
  0.4: 112,
  0.45: 125,
  0.5: 140,
  0.6: 160,
  0.7: 180,
  0.75: 190,
  0.8: 200,
  1: 236,
  1.25: 265,
  1.5: 300,
  1.75: 335,
  2: 375,
  2.5: 450,
  3: 500,
  3.5: 560,
  4: 600,
  4.5: 670,
  5: 710,
  5.5: 750,
  6: 800,
  8: 950,
};

/** Grade 6 tolerance of the pitch diameter, external: diameter over and up to, then by pitch. */
export const PITCH_GRADE_6: readonly {
  over: number;
  upTo: number;
  byPitch: Readonly<Record<number, number>>;
}[] = [
  { over: 0.99, upTo: 1.4, byPitch: { 0.2: 48, 0.25: 53, 0.3: 56 } },
  { over: 1.4, upTo: 2.8, byPitch: { 0.2: 50, 0.25: 56, 0.35: 63, 0.4: 67, 0.45: 71 } },
  { over: 2.8, upTo: 5.6, byPitch: { 0.35: 67, 0.5: 75, 0.6: 85, 0.7: 90, 0.75: 90, 0.8: 95 } },
  { over: 5.6, upTo: 11.2, byPitch: { 0.5: 85, 0.75: 100, 1: 112, 1.25: 118, 1.5: 132 } },
  {
    over: 11.2,
    upTo: 22.4,
    byPitch: { 0.5: 90, 0.75: 106, 1: 118, 1.25: 132, 1.5: 140, 1.75: 150, 2: 160, 2.5: 170 },
  },
  {
    over: 22.4,
    upTo: 45,
    byPitch: { 0.75: 112, 1: 125, 1.5: 150, 2: 170, 3: 200, 3.5: 212, 4: 224, 4.5: 236 },
  },
  { over: 45, upTo: 90, byPitch: { 1: 140, 1.5: 160, 2: 180, 3: 212, 4: 236, 5: 250, 5.5: 265, 6: 280 } },
  { over: 90, upTo: 180, byPitch: { 1.5: 170, 2: 190, 3: 224, 4: 250, 6: 300, 8: 335 } },
  { over: 180, upTo: 355, byPitch: { 2: 212, 3: 250, 4: 280, 6: 315, 8: 355 } },
];

/** Distance of the fundamental deviation below (external) or above (internal) the basic profile, by position and pitch. */
export const DEVIATIONS: Readonly<Record<'e' | 'f' | 'g', Readonly<Record<number, number>>>> = {
  e: {
    0.5: 50,
    0.6: 53,
    0.7: 56,
    0.75: 56,
    0.8: 60,
    1: 60,
    1.25: 63,
    1.5: 67,
    1.75: 71,
    2: 71,
    2.5: 80,
    3: 85,
    3.5: 90,
    4: 95,
    4.5: 100,
    5: 106,
    5.5: 112,
    6: 118,
    8: 140,
  },
  f: {
    0.35: 34,
    0.4: 34,
    0.45: 35,
    0.5: 36,
    0.6: 36,
    0.7: 38,
    0.75: 38,
    0.8: 38,
    1: 40,
    1.25: 42,
    1.5: 45,
    1.75: 48,
    2: 52,
    2.5: 58,
    3: 63,
    3.5: 70,
    4: 75,
    4.5: 80,
    5: 85,
    5.5: 90,
    6: 95,
    8: 118,
  },
  g: {
    0.2: 17,
    0.25: 18,
    0.3: 18,
    0.35: 19,
    0.4: 19,
    0.45: 20,
    0.5: 20,
    0.6: 21,
    0.7: 22,
    0.75: 22,
    0.8: 24,
    1: 26,
    1.25: 28,
    1.5: 32,
    1.75: 34,
    2: 38,
    2.5: 42,
    3: 48,
    3.5: 53,
    4: 60,
    4.5: 63,
    5: 71,
    5.5: 75,
    6: 80,
    8: 100,
  },
};

/** R40 preferred numbers of one decade, as ISO 3 rounds them for tolerances. */
const R40: readonly number[] = [
  100, 106, 112, 118, 125, 132, 140, 150, 160, 170, 180, 190, 200, 212, 224, 236, 250, 265, 280, 300, 315,
  335, 355, 375, 400, 425, 450, 475, 500, 530, 560, 600, 630, 670, 710, 750, 800, 850, 900, 950,
];

/** The R40 number so many steps along from the one nearest to a value; ten grades of the tables are four steps apart. */
export function stepR40(value: number, steps: number): number {
  const place = Math.round(Math.log10(value / 100) * R40.length) + steps;
  const decade = Math.floor(place / R40.length);
  const base = R40[place - decade * R40.length] ?? 100;
  return base * 10 ** decade;
}
