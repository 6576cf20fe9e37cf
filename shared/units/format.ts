import { toDegrees } from './angle';
import { MM_PER_INCH } from './length';
import type { LengthUnit } from './parsed';

/** The drafting style a sheet follows. */
export type DraftingStyle = 'iso' | 'asme';
export type DecimalSign = '.' | ',';

export interface LengthFormat {
  unit: LengthUnit;
  style: DraftingStyle;
  decimalSign?: DecimalSign;
  /**
   * For the ASME inch style the number of decimals shown, always (default 3, by tolerance);
   * otherwise the most decimals shown (default 3 in mm, 4 in inches).
   */
  decimals?: number;
}

/** A nudge well under any shown digit, so that 1.0005 held as 1.00049999… still rounds up. */
const HALF_NUDGE = 1e-9;

/**
 * Rounds half away from zero to a number of decimals.
 * @throws RangeError when the value is not a finite number: that is a fault of the engine, never of the person.
 */
export function roundTo(value: number, decimals: number): number {
  if (!Number.isFinite(value)) throw new RangeError(`Cannot round ${value}: a size must be a finite number.`);
  const scale = 10 ** decimals;
  const scaled = Math.abs(value) * scale;
  const rounded = Math.floor(scaled + 0.5 + HALF_NUDGE * Math.max(1, scaled * 1e-3)) / scale;
  return value < 0 && rounded !== 0 ? -rounded : rounded;
}

/** Rounds to the side given, so that a worked-out limit is never widened by its rounding. */
export function roundInward(value: number, decimals: number, side: 'up' | 'down'): number {
  const scale = 10 ** decimals;
  const scaled = roundTo(value, decimals + 6) * scale;
  const whole = side === 'up' ? Math.ceil(scaled - HALF_NUDGE) : Math.floor(scaled + HALF_NUDGE);
  return whole === 0 ? 0 : roundTo(whole / scale, decimals);
}

/** Rounds halves to the even digit, as inch thread tables are rounded (ASME B1.30). */
export function roundHalfEven(value: number, decimals: number): number {
  const scaled = roundTo(value, decimals + 6) * 10 ** decimals;
  const below = Math.floor(scaled);
  const isHalf = Math.abs(scaled - below - 0.5) < 1e-6;
  return isHalf ? (below % 2 === 0 ? below : below + 1) / 10 ** decimals : roundTo(value, decimals);
}

function fixedText(value: number, decimals: number): string {
  return roundTo(value, decimals).toFixed(decimals);
}

function dropTrailingZeros(text: string): string {
  return text.includes('.') ? text.replace(/0+$/, '').replace(/\.$/, '') : text;
}

function withSign(text: string, decimalSign: DecimalSign | undefined): string {
  return decimalSign === ',' ? text.replace('.', ',') : text;
}

function isAsmeInch(format: LengthFormat): boolean {
  return format.style === 'asme' && format.unit === 'in';
}

/**
 * A length as the sheet prints it, without its unit.
 * ISO (and ASME millimetres): no trailing zeros, a leading zero below one. ASME inches: fixed decimals, no leading zero below one.
 * Source: ISO 129-1 and ASME Y14.5, decimal figures.
 */
export function formatLength(mm: number, format: LengthFormat): string {
  const value = format.unit === 'in' ? mm / MM_PER_INCH : mm;
  if (isAsmeInch(format)) {
    const text = fixedText(value, format.decimals ?? 3);
    return withSign(text.replace(/^(-?)0\./, '$1.'), format.decimalSign);
  }
  const text = dropTrailingZeros(fixedText(value, format.decimals ?? (format.unit === 'in' ? 4 : 3)));
  return withSign(text, format.decimalSign);
}

/** An upper or lower limit as printed beside a size: `+0.021`, `-0.05`, zero as `0` without a sign. */
export function formatSigned(mm: number, format: LengthFormat): string {
  const text = formatLength(mm, format);
  if (!/[1-9]/.test(text)) return '0';
  return text.startsWith('-') ? text : `+${text}`;
}

export interface AngleFormat {
  /** `decimal`: `1.5°`; `minutes`: `1° 30'`, with seconds when there are any. */
  style: 'decimal' | 'minutes';
  decimalSign?: DecimalSign;
  /** Most decimals of a degree in the decimal style, default 3. */
  decimals?: number;
}

/** An angle in radians as the sheet prints it, in degrees with its sign. */
export function formatAngle(radians: number, format: AngleFormat = { style: 'decimal' }): string {
  const degrees = toDegrees(radians);
  if (format.style === 'decimal') {
    return `${withSign(dropTrailingZeros(fixedText(degrees, format.decimals ?? 3)), format.decimalSign)}°`;
  }
  const totalSeconds = roundTo(Math.abs(degrees) * 3600, 0);
  const whole = Math.floor(totalSeconds / 3600);
  const minutes = Math.floor((totalSeconds % 3600) / 60);
  const seconds = totalSeconds % 60;
  const shown = [`${degrees < 0 && totalSeconds > 0 ? '-' : ''}${whole}°`];
  if (minutes > 0 || seconds > 0) shown.push(`${minutes}'`);
  if (seconds > 0) shown.push(`${seconds}"`);
  return shown.join(' ');
}

/** A plain figure (mass, speed, feed) with at most so many decimals, trailing zeros dropped unless `fixed`. */
export function formatNumber(
  value: number,
  decimals: number,
  options: { decimalSign?: DecimalSign; fixed?: boolean } = {},
): string {
  const text = fixedText(value, decimals);
  return withSign(options.fixed ? text : dropTrailingZeros(text), options.decimalSign);
}

/** An inch size as its binary fraction when it is one (`1-1/4`, `3/8`), else null. Denominators to 64. */
export function formatInchFraction(mm: number): string | null {
  const sixtyFourths = (mm / MM_PER_INCH) * 64;
  const rounded = Math.round(sixtyFourths);
  if (!Number.isFinite(mm) || rounded <= 0 || Math.abs(sixtyFourths - rounded) > 1e-6) return null;
  const whole = Math.floor(rounded / 64);
  let top = rounded % 64;
  let bottom = 64;
  if (top === 0) return String(whole);
  while (top % 2 === 0) {
    top /= 2;
    bottom /= 2;
  }
  return whole === 0 ? `${top}/${bottom}` : `${whole}-${top}/${bottom}`;
}
