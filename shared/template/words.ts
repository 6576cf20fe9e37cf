import { formatLength } from '../units/format';
import { MM_PER_INCH, type LengthUnit } from '../units/length';
import { compileExpression } from './expression';
import type { ExpressionValue, Scope } from './scope';

/** Last figure a length is offered to in a sentence: a micrometre, or a tenth of a thou. */
const LAST_FIGURE: Readonly<Record<LengthUnit, number>> = { mm: 0.001, in: 0.0001 * MM_PER_INCH };
/** Just under half of the last figure, so that a bound that is itself round stays as it is. */
const SAFE_SIDE = 0.4999;

/** A length without its unit, as a person of this drawing would type it. */
export function bareLength(mm: number, unit: LengthUnit): string {
  return formatLength(mm, { unit, style: 'iso' });
}

/** A length with its unit: `12.5 mm`, `0.5 in`. */
export function lengthInWords(mm: number, unit: LengthUnit): string {
  return `${bareLength(mm, unit)} ${unit}`;
}

export function leastInWords(mm: number, unit: LengthUnit): string {
  return bareLength(mm + SAFE_SIDE * LAST_FIGURE[unit], unit);
}

export function mostInWords(mm: number, unit: LengthUnit): string {
  return bareLength(mm - SAFE_SIDE * LAST_FIGURE[unit], unit);
}

/** `8 to 500 mm`, each end rounded so that it may itself be typed; `exactly 8 mm` where one figure is left. */
export function rangeInWords(least: number, most: number, unit: LengthUnit): string {
  const [low, high] = [leastInWords(least, unit), mostInWords(most, unit)];
  return low === high ? `exactly ${low} ${unit}` : `${low} to ${high} ${unit}`;
}

function asLength(value: ExpressionValue, show: (mm: number) => string): string {
  return typeof value === 'number' && Number.isFinite(value) ? show(value) : String(value ?? 'nothing');
}

/** Fills the braces of a template's sentence; see `Constraint.message` for what they may hold. */
export function fillSentence(sentence: string, scope: Scope, unit: LengthUnit): string {
  const run = (source: string): ExpressionValue => compileExpression(source.trim()).run(scope);
  return sentence.replace(/\{([^{}]+)\}/g, (_, inside: string) => {
    if (inside.startsWith('range:')) {
      const [low = '', high = ''] = inside.slice(6).split('|');
      const [least, most] = [run(low), run(high)];
      return typeof least === 'number' && typeof most === 'number'
        ? rangeInWords(least, most, unit)
        : 'a size';
    }
    if (inside.startsWith('>='))
      return asLength(run(inside.slice(2)), (mm) => `${leastInWords(mm, unit)} ${unit}`);
    if (inside.startsWith('<='))
      return asLength(run(inside.slice(2)), (mm) => `${mostInWords(mm, unit)} ${unit}`);
    if (inside.startsWith('=')) return asLength(run(inside.slice(1)), (mm) => lengthInWords(mm, unit));
    if (inside.startsWith('#')) return String(run(inside.slice(1)) ?? '');
    return asLength(run(inside), (mm) => lengthInWords(mm, unit));
  });
}

/** A field's name inside a sentence: `Bar diameter` becomes `bar diameter`. */
export function labelInSentence(label: string): string {
  return /^[A-Z][a-z]/.test(label) ? label.charAt(0).toLowerCase() + label.slice(1) : label;
}
