import { formatLength, formatNumber, formatSigned } from '../units/format';
import type { LengthFormat } from '../units/format';
import type { Size } from '../scheme/scheme';
import { makeLabel } from './label';
import type { Label, Run } from './label';
import { rulesFor } from './rules';
import type { DraftingStyle } from './sheet';

/** How figures are written on one sheet. */
export interface Writing {
  style: DraftingStyle;
  unit: 'mm' | 'in';
  decimalSign: '.' | ',';
}

const MM_PER_INCH = 25.4;
/** Inch decimals a general size is given to. Source: common practice. */
const INCH_DECIMALS = 3;

/** True where so many decimals of an inch say the value exactly. */
function saidBy(mm: number, decimals: number): boolean {
  const scaled = (Math.abs(mm) / MM_PER_INCH) * 10 ** decimals;
  return Math.abs(scaled - Math.round(scaled)) < 1e-6 * Math.max(1, scaled);
}

/** Decimals of an inch size: three, or four where its limits need them. */
function inchDecimals(size: Size): number {
  const kind = size.tolerance.kind;
  if (kind === 'general' || kind === 'none' || kind === 'thread-class') return INCH_DECIMALS;
  return saidBy(size.tolerance.upper, INCH_DECIMALS) && saidBy(size.tolerance.lower, INCH_DECIMALS)
    ? INCH_DECIMALS
    : 4;
}

/** The format of one size's figures. */
export function formatOf(size: Size, writing: Writing): LengthFormat {
  const base = { unit: writing.unit, style: writing.style, decimalSign: writing.decimalSign };
  return writing.unit === 'in' && writing.style === 'asme' ? { ...base, decimals: inchDecimals(size) } : base;
}

/** Two limits one over the other show the same number of decimals; a plain zero stays as it is (ISO 129-1). */
function alike(upper: string, lower: string): [string, string] {
  const decimals = (text: string): number => /[.,](\d*)$/.exec(text)?.[1]?.length ?? 0;
  const most = Math.max(decimals(upper), decimals(lower));
  const sign = upper.includes(',') || lower.includes(',') ? ',' : '.';
  const fill = (text: string): string => {
    const lacking = most - decimals(text);
    if (text === '0' || lacking === 0) return text;
    return `${text}${decimals(text) === 0 ? sign : ''}${'0'.repeat(lacking)}`;
  };
  return [fill(upper), fill(lower)];
}

function toleranceRuns(size: Size, format: LengthFormat): { runs: Run[]; text: string } {
  const { kind, upper, lower, code } = size.tolerance;
  if (kind === 'symmetric') {
    const text = ` ±${formatLength(upper, format)}`;
    return { runs: [{ kind: 'text', text }], text };
  }
  if (kind !== 'limits' && kind !== 'fit') return { runs: [], text: '' };
  const name = kind === 'fit' && code ? ` ${code}` : '';
  const [high, low] = alike(formatSigned(upper, format), formatSigned(lower, format));
  const runs: Run[] = name ? [{ kind: 'text', text: name }] : [];
  return { runs: [...runs, { kind: 'stack', upper: high, lower: low }], text: `${name} ${high}/${low}` };
}

function degrees(value: number, writing: Writing): string {
  return `${formatNumber(value, 3, { decimalSign: writing.decimalSign })}°`;
}

/** What stands before and after the figure, by kind. */
function dressing(
  size: Size,
  format: LengthFormat,
  writing: Writing,
): { runs: Run[]; text: string; under?: string } {
  const figure = (): string => formatLength(size.nominal, format);
  const words = (text: string): { runs: Run[]; text: string } => ({ runs: [{ kind: 'text', text }], text });
  switch (size.kind) {
    case 'diameter':
    case 'hole':
      return { runs: [{ kind: 'diameter' }, { kind: 'text', text: figure() }], text: `Ø${figure()}` };
    case 'radius':
      return words(`${size.anchor.kind === 'arc' ? 'SR' : 'R'}${figure()}`);
    case 'chamfer':
      return words(writing.style === 'iso' ? `${figure()}×45°` : `${figure()} × 45°`);
    case 'thread':
      return words(size.designation ?? size.typed);
    case 'across-flats':
      return { ...words(figure()), under: 'across flats' };
    case 'angle':
      return words(`half angle ${degrees(size.nominal, writing)}`);
    case 'length':
    case 'position':
      return words(figure());
    default:
      return words(size.designation ?? size.typed);
  }
}

/** The writing of a size on this sheet: figure, symbols, tolerance, brackets of a reference. */
export function sizeLabel(size: Size, writing: Writing): Label {
  const rules = rulesFor(writing.style);
  const format = formatOf(size, writing);
  const base = dressing(size, format, writing);
  const tolerance = size.reference ? { runs: [], text: '' } : toleranceRuns(size, format);
  let runs: Run[] = [...base.runs, ...tolerance.runs];
  let text = base.text + tolerance.text;
  if (size.reference) {
    runs = [{ kind: 'text', text: '(' }, ...runs, { kind: 'text', text: ')' }];
    text = `(${text})`;
  }
  return makeLabel(joinTexts(runs), text, rules.sizeText, rules.smallText, base.under);
}

/** Neighbouring texts become one run: a reader of the sheet finds a figure in one piece. */
function joinTexts(runs: readonly Run[]): Run[] {
  const joined: Run[] = [];
  for (const run of runs) {
    const last = joined[joined.length - 1];
    if (run.kind === 'text' && last?.kind === 'text')
      joined[joined.length - 1] = { kind: 'text', text: last.text + run.text };
    else joined.push(run);
  }
  return joined;
}

/** A size as the sheet prints it, in one line, Ø for the diameter sign. */
export function sizeText(size: Size, writing: Writing): string {
  return sizeLabel(size, writing).text;
}
