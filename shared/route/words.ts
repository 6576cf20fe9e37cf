import { formatLength, roundTo } from '../units/format';
import type { DraftingStyle } from '../units/format';
import type { LengthUnit } from '../units/parsed';
import { MM_PER_INCH } from '../units/length';
import { materialById } from '../standards/materials';

/** How the sentences of a route say lengths: in the unit the drawing was typed in. Figures outside sentences stay mm. */
export interface Words {
  unit: LengthUnit;
  /** A length (mm) to thousandths of a millimetre, or ten-thousandths of an inch, without its unit. */
  length: (mm: number) => string;
  /** A length that is only looked at or sawn to: a tenth of a millimetre, a hundredth of an inch. */
  about: (mm: number) => string;
  /** Like `about`, with its unit. */
  aboutWithUnit: (mm: number) => string;
}

/** Decimals of an inch that a machinist reads on the dial, and one more where three do not hold the figure. */
function inchDecimals(mm: number): number {
  const inches = mm / MM_PER_INCH;
  return Math.abs(roundTo(inches, 3) - inches) > 5e-5 ? 4 : 3;
}

export function wordsIn(unit: LengthUnit = 'mm', style: DraftingStyle = 'iso'): Words {
  const fixed = unit === 'in' && style === 'asme';
  const length = (mm: number): string =>
    unit === 'mm'
      ? figure(mm)
      : formatLength(mm, { unit, style, ...(fixed ? { decimals: inchDecimals(mm) } : {}) });
  const about = (mm: number): string => formatLength(mm, { unit, style, decimals: unit === 'in' ? 2 : 1 });
  return { unit, length, about, aboutWithUnit: (mm) => `${about(mm)} ${unit}` };
}

/** A plain figure that is no length: degrees, ratios, the size in a tool's own name. */
export function figure(value: number): string {
  return String(roundTo(value, 3));
}

/** A name inside a sentence: its first letter small, and the rest, sizes of threads too, as it is written. */
export function inSentence(name: string): string {
  return name.charAt(0).toLowerCase() + name.slice(1);
}

/** What a material is called: its id is never said. */
export function materialName(id: string): string {
  return materialById(id)?.name ?? 'a material that is not in the table';
}

/** A thread's lead as the gearbox has it: millimetres, or threads to the inch where it is one of those. */
export function leadText(lead: number): string {
  const perInch = MM_PER_INCH / lead;
  const metric = Math.abs(lead / 0.05 - Math.round(lead / 0.05)) < 1e-6;
  const unified = Math.abs(perInch * 2 - Math.round(perInch * 2)) < 1e-6;
  return unified && !metric ? `${figure(perInch)} threads to the inch` : `${figure(lead)} mm`;
}
