import { parseLength } from './length';
import {
  MAX_TYPED_LENGTH,
  plainCharacters,
  quoteGiven,
  refuse,
  type LengthUnit,
  type Parsed,
} from './parsed';

/** A tolerance as typed beside a size. `upper` and `lower` are deviations from the nominal in mm, signed. */
export type Tolerance =
  | { kind: 'none'; code?: undefined; upper?: undefined; lower?: undefined }
  | { kind: 'fit'; code: string; upper?: undefined; lower?: undefined }
  | { kind: 'symmetric'; code?: undefined; upper: number; lower: number }
  | { kind: 'limits'; code?: undefined; upper: number; lower: number };

/** Position letters of ISO 286-1; I, L, O, Q and W are left out by the standard. */
const FIT_CODE = /^(zc|zb|za|js|cd|ef|fg|[abcdefghjkmnprstuvxyz])(0?1|0|[2-9]|1[0-8])$/i;
const ONE_CASE = /^(?:[a-z]+|[A-Z]+)\d+$/;
const PLUS_MINUS = /^(?:±|\+ ?\/ ?-|\+ ?-|-\/\+)/;

/**
 * Reads a tolerance: empty, `none` or `0` (general tolerance), an ISO 286 code (`h6`, `H7`), `±0.05`, `+-0.05`, `+0/-0.1`, `+0.1/0`.
 * @param entryUnit what bare figures mean
 */
export function parseFitOrTolerance(text: string, entryUnit: LengthUnit): Parsed<Tolerance> {
  if (typeof text !== 'string') return refuse('A tolerance is typed as text, such as h6 or ±0.05.');
  if (text.length > MAX_TYPED_LENGTH) {
    return refuse(
      `${quoteGiven(text)} is ${text.length} characters long. A tolerance takes at most ${MAX_TYPED_LENGTH}, such as h6 or +0/-0.1.`,
    );
  }
  const plain = plainCharacters(text).replace(/[\u2010-\u2015\u2212]/g, '-');
  if (plain === '' || plain === '0' || plain.toLowerCase() === 'none')
    return { ok: true, value: { kind: 'none' } };
  const code = plain.replace(/ /g, '');
  if (FIT_CODE.test(code) && ONE_CASE.test(code)) return { ok: true, value: { kind: 'fit', code } };
  if (/^[A-Za-z]{1,2} ?\d{1,2} ?\/ ?[A-Za-z]{1,2} ?\d{1,2}$/.test(plain)) {
    return refuse(
      `${quoteGiven(plain)} is a pair of fits. Give the code of this part alone: capitals for a hole, small letters for a shaft.`,
    );
  }
  const both = PLUS_MINUS.exec(plain);
  if (both) return readSymmetric(plain, plain.slice(both[0].length).trim(), entryUnit);
  return readLimits(plain, entryUnit);
}

function readSymmetric(given: string, figure: string, entryUnit: LengthUnit): Parsed<Tolerance> {
  const read = parseLength(figure, entryUnit);
  if (!read.ok) return refuse(`The tolerance ${quoteGiven(given)} cannot be read. ${read.message}`);
  if (read.value === 0)
    return refuse(
      `${quoteGiven(given)} leaves no tolerance at all. Give a figure above 0, or leave it empty for the general tolerance.`,
    );
  return { ok: true, value: { kind: 'symmetric', upper: read.value, lower: -read.value } };
}

/** Two signed figures; 0 may stand without a sign; a unit after the last one holds for both. */
const LIMITS =
  /^([+-]?) ?([\d.,][^+]*?)(?: ?\/ ?(?=[+-]|0(?:[.,]0+)?(?:$|[^\d.,/]))| ?(?=[+-]))([+-]?) ?([\d.,].*)$/;

function readLimits(given: string, entryUnit: LengthUnit): Parsed<Tolerance> {
  const found = LIMITS.exec(given);
  if (!found) return refuse(notATolerance(given));
  const [, signA = '', bodyA = '', signB = '', bodyB = ''] = found;
  const ownUnit = /[a-z"µμ]/i;
  const sharedUnit = !ownUnit.test(bodyA) ? (/[a-z"µμ].*$/i.exec(bodyB)?.[0] ?? '') : '';
  const a = signedLength(signA, `${bodyA.trim()}${sharedUnit === '' ? '' : ` ${sharedUnit}`}`, entryUnit);
  const b = signedLength(signB, bodyB, entryUnit);
  if (!a.ok) return refuse(`The tolerance ${quoteGiven(given)} cannot be read. ${a.message}`);
  if (!b.ok) return refuse(`The tolerance ${quoteGiven(given)} cannot be read. ${b.message}`);
  const upper = Math.max(a.value, b.value);
  const lower = Math.min(a.value, b.value);
  if (upper === lower)
    return refuse(
      `${quoteGiven(given)} leaves no tolerance at all. Give two different limits, such as +0/-0.1.`,
    );
  return { ok: true, value: { kind: 'limits', upper, lower } };
}

function signedLength(sign: string, figure: string, entryUnit: LengthUnit): Parsed<number> {
  const read = parseLength(figure, entryUnit);
  if (!read.ok) return read;
  if (sign === '' && read.value !== 0) {
    return refuse(`${quoteGiven(figure)} has no sign. Write + or - before each limit.`);
  }
  return { ok: true, value: sign === '-' && read.value !== 0 ? -read.value : read.value };
}

function notATolerance(given: string): string {
  return `${quoteGiven(given)} is not a tolerance. Type an ISO code such as h6 or H7, ±0.05, or two limits such as +0/-0.1; leave it empty for the general tolerance.`;
}

/**
 * Parts a size typed with its tolerance (`25 h6`, `22 ±0.1`, `1/2 in +0/-.002`) into the two texts, neither of them judged.
 * A size alone comes back with an empty tolerance.
 */
export function splitSizeAndTolerance(text: string): { size: string; tolerance: string } {
  const given = typeof text === 'string' ? text.slice(0, MAX_TYPED_LENGTH * 2 + 1).trim() : '';
  const alone = { size: given, tolerance: '' };
  const patterns = [
    /^(.*?[^\s±+\-−eE/])\s*(±.*|\+.*)$/,
    /^(.*\S)\s+(0(?:[.,]0+)?\s*\/\s*[-−].*)$/,
    /^(.*\S)\s+([-−]\s*[\d.,]+[^/]*\/\s*(?:[-−+].*|0(?:[.,]0+)?\D*))$/,
    /^(.*[\d.,"″”'a-z])\s+([A-Za-z]{1,2}\d{1,2})$/,
    /^([\d.,/\- ]*[\d"″”])([A-Za-z]{1,2}\d{1,2})$/,
  ];
  for (const pattern of patterns) {
    const found = pattern.exec(given);
    if (found?.[1] !== undefined && found[2] !== undefined)
      return { size: found[1].trim(), tolerance: found[2].trim() };
  }
  return alone;
}
