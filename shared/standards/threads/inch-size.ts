/** Reads the size at the head of an inch thread: `3/8`, `1-1/4`, `1 1/4`, `.375`, `1"`. Inches, or null. */
export function readInchSize(text: string): number | null {
  const plain = text
    .replace(/"/g, '')
    .replace(/ ?in\.?$/i, '')
    .trim();
  const fraction = /^(?:(\d{1,2})[ -])?(\d{1,3})\/(\d{1,3})$/.exec(plain);
  if (fraction) {
    const bottom = Number(fraction[3]);
    return bottom === 0 ? null : Number(fraction[1] ?? '0') + Number(fraction[2]) / bottom;
  }
  return /^(?:\d{1,2}(?:\.\d{0,4})?|\.\d{1,4})$/.test(plain) ? Number(plain) : null;
}

/** Two sizes are the same when they agree to the four decimals inch tables are printed in. */
export function sameInches(a: number, b: number): boolean {
  return Math.abs(a - b) < 0.0006;
}

/** The inch size at the head of a designation, as a pattern part: not greedy over the dash before the threads per inch. */
export const INCH_SIZE = String.raw`(\d{1,2}[ -]\d{1,3}\/\d{1,3}|\d{1,3}\/\d{1,3}|\d{0,2}\.\d{1,4}|\d{1,2})(?: ?(?:"|in\.?))?`;
