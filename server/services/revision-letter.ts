/** I and O are left out: on paper they read as 1 and 0. */
const LETTERS = 'ABCDEFGHJKLMNPQRSTUVWXYZ';

/** 1 → A, 2 → B, … 24 → Z, 25 → AA. */
export function revisionLetter(sequence: number): string {
  let letters = '';
  for (let rest = sequence; rest > 0; rest = Math.floor((rest - 1) / LETTERS.length)) {
    letters = LETTERS.charAt((rest - 1) % LETTERS.length) + letters;
  }
  return letters;
}
