import { quoteGiven, refuse } from './parsed';

/** An exact fraction of whole numbers, so that a conversion rounds once, at the end. */
export interface Ratio {
  numerator: number;
  denominator: number;
}

/** More digits than this cannot be held exactly, and no size needs them. */
const MAX_DIGITS = 12;
const MAX_EXPONENT = 9;

const DECIMAL = /^(\d*)(?:([.,])(\d*))?(?:[eE]([+-]?\d{1,4}))?$/;

/**
 * Reads an unsigned decimal figure: `12`, `.5`, `12,5` (comma as decimal sign), `1e2`.
 * A comma before exactly three digits (`1,000`) may be a decimal sign or a thousands mark: refused, saying how to type either.
 */
export function readDecimal(text: string): { ok: true; ratio: Ratio } | { ok: false; message: string } {
  const found = DECIMAL.exec(text);
  const whole = found?.[1] ?? '';
  const part = found?.[3] ?? '';
  if (!found || whole.length + part.length === 0) {
    if (/^[\d.,]+$/.test(text) && /\d/.test(text)) {
      return refuse(
        `${quoteGiven(text)} has more than one point or comma. Leave thousands marks out and use one point: 1250.5.`,
      );
    }
    return refuse(
      `${quoteGiven(text)} is not a figure. Type digits with at most one decimal point, such as 12 or 12.5.`,
    );
  }
  if (found[2] === ',' && part.length === 3 && /^[1-9]\d{0,2}$/.test(whole) && found[4] === undefined) {
    return refuse(
      `${quoteGiven(text)} can be read two ways. Type ${whole}.${part} for the decimal or ${whole}${part} for the whole number.`,
    );
  }
  const digits = `${whole}${part}`.replace(/^0+/, '');
  if (digits.replace(/0+$/, '').length > MAX_DIGITS) {
    return refuse(`${quoteGiven(text)} has more than ${MAX_DIGITS} digits. Type it rounded, such as 12.345.`);
  }
  const exponent = Number(found[4] ?? '0');
  if (Math.abs(exponent) > MAX_EXPONENT) {
    return refuse(
      `${quoteGiven(text)} is out of all measure. Type the figure without an exponent, such as 12.5.`,
    );
  }
  return { ok: true, ratio: exactRatio(digits, part.length - exponent) };
}

/** digits × 10^-places, with trailing noughts taken out so both whole numbers stay small enough to be exact. */
function exactRatio(digits: string, places: number): Ratio {
  const trimmed = digits.replace(/0+$/, '');
  if (trimmed === '') return { numerator: 0, denominator: 1 };
  const left = places - (digits.length - trimmed.length);
  return left > 0
    ? { numerator: Number(trimmed), denominator: 10 ** left }
    : { numerator: Number(trimmed) * 10 ** -left, denominator: 1 };
}
