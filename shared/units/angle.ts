import { readDecimal } from './decimal';
import { MAX_TYPED_LENGTH, plainCharacters, quoteGiven, refuse, type Parsed } from './parsed';

export const RADIANS_PER_DEGREE = Math.PI / 180;

export const toRadians = (degrees: number): number => degrees * RADIANS_PER_DEGREE;
export const toDegrees = (radians: number): number => radians / RADIANS_PER_DEGREE;

const DECIMAL_DEGREES = /^([\d.,]+(?:[eE][+-]?\d+)?) ?(?:°|º|deg\.?|degs|degrees?)?$/i;
const SEXAGESIMAL =
  /^(?:([\d.,]+) ?(?:°|º|deg\.?|degrees?) ?)?(?:([\d.,]+) ?(?:'|min) ?)?(?:([\d.,]+) ?(?:"|sec))?$/i;

/**
 * Reads an angle typed in degrees: `1.5`, `1.5°`, `1.5 deg`, `1° 30'`, `1°30'15"`.
 * @returns value in radians, with the same angle in degrees beside it; or a sentence
 */
export function parseAngle(text: string): Parsed<number, { degrees: number }> {
  if (typeof text !== 'string') return refuse("An angle is typed as text, such as 1.5 or 1° 30'.");
  if (text.length > MAX_TYPED_LENGTH) {
    return refuse(
      `${quoteGiven(text)} is ${text.length} characters long. An angle takes at most ${MAX_TYPED_LENGTH}, such as 1.5 or 1° 30'.`,
    );
  }
  const plain = plainCharacters(text);
  if (plain === '') return refuse("No angle was given. Type it in degrees, such as 1.5 or 1° 30'.");
  if (/^[-\u2010-\u2015\u2212]/.test(plain)) {
    return refuse(
      `${quoteGiven(plain)} is negative. An angle is 0° or more; type it without the minus sign.`,
    );
  }
  const decimal = DECIMAL_DEGREES.exec(plain);
  if (decimal) {
    const read = readDecimal(decimal[1] ?? '');
    if (!read.ok) return read;
    return withinACircle(read.ratio.numerator / read.ratio.denominator, plain);
  }
  const parts = SEXAGESIMAL.exec(plain);
  if (!parts || (parts[1] ?? parts[2] ?? parts[3]) === undefined) return refuse(notAnAngle(plain));
  const seconds = [parts[1], parts[2], parts[3]].map((part, index) => {
    if (part === undefined) return 0;
    const read = readDecimal(part);
    return read.ok ? (read.ratio.numerator * [3600, 60, 1][index]!) / read.ratio.denominator : Number.NaN;
  });
  const [fromDegrees = 0, fromMinutes = 0, fromSeconds = 0] = seconds;
  const total = fromDegrees + fromMinutes + fromSeconds;
  if (!Number.isFinite(total)) return refuse(notAnAngle(plain));
  if (
    (parts[1] !== undefined && fromMinutes >= 3600) ||
    ((parts[1] ?? parts[2]) !== undefined && fromSeconds >= 60)
  ) {
    return refuse(
      `${quoteGiven(plain)} has 60 or more minutes or seconds. Type them below 60, such as 1° 30' 15".`,
    );
  }
  return withinACircle(total / 3600, plain);
}

function withinACircle(degrees: number, given: string): Parsed<number, { degrees: number }> {
  if (degrees > 360)
    return refuse(`${quoteGiven(given)} is more than a full turn. An angle is between 0° and 360°.`);
  return { ok: true, value: toRadians(degrees), degrees };
}

function notAnAngle(given: string): string {
  return `${quoteGiven(given)} is not an angle. Type it in degrees, such as 1.5, 1.5° or 1° 30'.`;
}
