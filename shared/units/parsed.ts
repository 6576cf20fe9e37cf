/** The unit a bare figure means. Inside the engine every length is in millimetres. */
export type LengthUnit = 'mm' | 'in';

/** What reading a typed text gives back: the value, or a plain sentence saying what was given and what is allowed. */
export type Parsed<T, Extra extends object = object> =
  ({ ok: true; value: T } & Extra) | { ok: false; message: string };

/** Longest text any reader looks at; a size, a thread or a tolerance never needs more. */
export const MAX_TYPED_LENGTH = 64;

export function refuse(message: string): { ok: false; message: string } {
  return { ok: false, message };
}

/** The given text as it may stand in a sentence: control characters out, long texts cut short. */
export function quoteGiven(text: string): string {
  const head = Array.from(text.slice(0, 60));
  const clean = head
    .filter((c) => {
      const code = c.codePointAt(0) ?? 0;
      return code >= 32 && !(code >= 127 && code < 160);
    })
    .join('');
  const short = clean.length > 28 ? `${clean.slice(0, 27)}…` : text.length > 60 ? `${clean}…` : clean;
  return `“${short}”`;
}

/**
 * Brings the characters a keyboard, a phone or a pasted document may give to the plain ones the readers know:
 * odd spaces, typographic quotes and primes, vulgar fractions, the fraction slash. Minus signs are left alone.
 */
export function plainCharacters(text: string): string {
  return text
    .replace(/[\u00a0\u2000-\u200a\u202f\u205f\u3000\t\r\n]/g, ' ')
    .replace(/[\u201c\u201d\u2033\u2036]|\u2032\u2032|''|\u2019\u2019/g, '"')
    .replace(/[\u2018\u2019\u2032]/g, "'")
    .replace(/[\u00bc-\u00be\u2150-\u215e]/g, (c) => ` ${VULGAR_FRACTIONS[c] ?? c}`)
    .replace(/[\u2044\u2215]/g, '/')
    .replace(/ {2,}/g, ' ')
    .trim();
}

const VULGAR_FRACTIONS: Readonly<Record<string, string>> = {
  '¼': '1/4',
  '½': '1/2',
  '¾': '3/4',
  '⅐': '1/7',
  '⅑': '1/9',
  '⅒': '1/10',
  '⅓': '1/3',
  '⅔': '2/3',
  '⅕': '1/5',
  '⅖': '2/5',
  '⅗': '3/5',
  '⅘': '4/5',
  '⅙': '1/6',
  '⅚': '5/6',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
};
