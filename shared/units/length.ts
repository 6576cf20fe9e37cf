import { readDecimal, type Ratio } from './decimal';
import {
  MAX_TYPED_LENGTH,
  plainCharacters,
  quoteGiven,
  refuse,
  type LengthUnit,
  type Parsed,
} from './parsed';

export type { LengthUnit, Parsed } from './parsed';

/** How the figure was typed, so that a field can show it again in the same way. */
export type LengthKind = 'decimal' | 'fraction';

export type ParsedLength = Parsed<number, { unit: LengthUnit; kind: LengthKind }>;

/** One inch in millimetres, exact by definition (international yard, 1959). */
export const MM_PER_INCH = 25.4;

/** Inches to millimetres, by way of whole ten-thousandths so that 3/8 in is 9.525 and not a hair under. */
export function inchesToMm(inches: number): number {
  return (inches * 254_000) / 10_000;
}

/** Longest length any reader accepts, mm. Far beyond every machine this engine knows; families set their own limits. */
export const MAX_LENGTH_MM = 100_000;

interface NamedUnit {
  /** Whole numbers, so the conversion is exact before the one division. */
  mm: Ratio;
  shownAs: LengthUnit;
}

const METRIC = (numerator: number, denominator = 1): NamedUnit => ({
  mm: { numerator, denominator },
  shownAs: 'mm',
});
const INCH = (numerator: number, denominator: number): NamedUnit => ({
  mm: { numerator, denominator },
  shownAs: 'in',
});

const NAMED_UNITS: Readonly<Record<string, NamedUnit>> = {
  mm: METRIC(1),
  cm: METRIC(10),
  m: METRIC(1000),
  µm: METRIC(1, 1000),
  μm: METRIC(1, 1000),
  um: METRIC(1, 1000),
  in: INCH(254, 10),
  'in.': INCH(254, 10),
  inch: INCH(254, 10),
  inches: INCH(254, 10),
  '"': INCH(254, 10),
  thou: INCH(254, 10_000),
  ft: INCH(3048, 10),
};

const ASK_FRACTION = /^(?:(\d{1,6})(?: ?- ?| ))?(\d{1,6}) ?\/ ?(\d{1,6})$/;
const FIGURE_AND_UNIT = /^([\d.,/ -]*[\d.,](?:[eE][+-]?\d+)?) ?([^\d.,/ -].*)?$/;

/**
 * Reads a length as people type it: `12`, `12 mm`, `1.2 cm`, `1/2 in`, `1-1/4"`, `1 1/4 in`, `.437 in`, `25 thou`, `12,5`.
 * @param entryUnit what a bare figure means in this drawing
 * @returns value in mm (rounded once, from exact whole numbers), the unit it was typed in, and how it was typed;
 *   or a sentence. What can be read two ways (a bare fraction in a millimetre drawing, `1,000`) is asked about, never guessed.
 */
export function parseLength(text: string, entryUnit: LengthUnit): ParsedLength {
  if (typeof text !== 'string') return refuse('A length is typed as text, such as 12 mm or 1/2 in.');
  if (text.length > MAX_TYPED_LENGTH) {
    return refuse(
      `${quoteGiven(text)} is ${text.length} characters long. A length takes at most ${MAX_TYPED_LENGTH}, such as 12 mm or 1-1/4 in.`,
    );
  }
  const plain = plainCharacters(text);
  if (plain === '')
    return refuse('No length was given. Type a figure with or without a unit, such as 12, 12 mm or 1/2 in.');
  if (/^[-\u2010-\u2015\u2212]/.test(plain)) {
    return refuse(`${quoteGiven(plain)} is negative. A length is 0 or more; type it without the minus sign.`);
  }
  const found = FIGURE_AND_UNIT.exec(plain);
  const figure = found?.[1]?.trim();
  if (!found || figure === undefined) return refuse(notALength(plain));
  const unitText = (found[2] ?? '').trim();
  const typed = unitText === '' ? undefined : findUnit(unitText);
  if (unitText !== '' && !typed) {
    if (unitText === "'") {
      return refuse(
        `${quoteGiven(plain)} has a single mark, which is not read as feet. Type ft for feet or " for inches.`,
      );
    }
    return refuse(
      `${quoteGiven(plain)} has a unit that is not known: ${quoteGiven(unitText)}. Use mm, cm, m, in, ", thou or ft, or leave it out for ${entryUnit}.`,
    );
  }
  const unit = typed ?? (entryUnit === 'in' ? INCH(254, 10) : METRIC(1));

  if (figure.includes('/')) {
    const fraction = readFraction(figure);
    if (!fraction.ok) return fraction;
    if (!typed && entryUnit === 'mm') {
      const decimal = fraction.ratio.numerator / fraction.ratio.denominator;
      return refuse(
        `${quoteGiven(plain)} has no unit and this drawing is in millimetres. Type ${figure} in for inches or ${trimmedDecimal(decimal)} mm for millimetres.`,
      );
    }
    return inMillimetres(fraction.ratio, unit, 'fraction', plain);
  }
  if (/[ -]/.test(figure.replace(/[eE]-/, ''))) return refuse(notALength(plain));
  const decimal = readDecimal(figure);
  if (!decimal.ok) return decimal;
  return inMillimetres(decimal.ratio, unit, 'decimal', plain);
}

function findUnit(text: string): NamedUnit | undefined {
  const key = text.toLowerCase();
  return Object.hasOwn(NAMED_UNITS, key) ? NAMED_UNITS[key] : undefined;
}

function readFraction(figure: string): { ok: true; ratio: Ratio } | { ok: false; message: string } {
  const found = ASK_FRACTION.exec(figure);
  if (!found) {
    return refuse(
      `${quoteGiven(figure)} is not a fraction. Type it as 3/8, 1-1/4 or 1 1/4, in whole numbers.`,
    );
  }
  const whole = Number(found[1] ?? '0');
  const top = Number(found[2]);
  const bottom = Number(found[3]);
  if (bottom === 0) return refuse(`${quoteGiven(figure)} divides by nought. Type a fraction such as 3/8.`);
  if (found[1] !== undefined && top >= bottom) {
    return refuse(
      `${quoteGiven(figure)} has a whole number and a fraction of one or more. Type it as one figure, such as 1-1/4.`,
    );
  }
  return { ok: true, ratio: { numerator: whole * bottom + top, denominator: bottom } };
}

function inMillimetres(figure: Ratio, unit: NamedUnit, kind: LengthKind, given: string): ParsedLength {
  const value = (figure.numerator * unit.mm.numerator) / (figure.denominator * unit.mm.denominator);
  if (!Number.isFinite(value) || value > MAX_LENGTH_MM) {
    return refuse(
      `${quoteGiven(given)} is longer than ${MAX_LENGTH_MM / 1000} m, the longest length that is read. Check the figure and its unit.`,
    );
  }
  return { ok: true, value, unit: unit.shownAs, kind };
}

function trimmedDecimal(value: number): string {
  return String(Math.round(value * 1e4) / 1e4);
}

function notALength(given: string): string {
  return `${quoteGiven(given)} is not a length. Type a figure with or without a unit, such as 12, 12 mm, 1/2 in, 1-1/4" or .437 in.`;
}
