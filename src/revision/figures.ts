import type { EngineResult } from '../../shared/engine';
import type { Size } from '../../shared/scheme/scheme';
import type { EvaluatedValue, ParameterBase } from '../../shared/template/template';
import { formatAngle, formatLength, formatNumber, type LengthFormat } from '../../shared/units/format';

const CELL = /^([^[.]+)\[(\d+)\]\.(.+)$/;

/** What the engine read at a path; undefined before its first answer. */
export function evaluatedAt(result: EngineResult | null, path: string): EvaluatedValue | undefined {
  if (!result) return undefined;
  const { values, tables } = result.evaluation.parameters;
  const cell = CELL.exec(path);
  if (!cell) return values[path];
  return tables[cell[1] ?? '']?.[Number(cell[2])]?.values[cell[3] ?? ''];
}

/** The figure of a field in the sheet's unit, or a dash where there is none. */
export function figureText(
  parameter: ParameterBase,
  value: EvaluatedValue | undefined,
  format: LengthFormat,
): string {
  if (!value || value.value === null || value.value === '') return '–';
  if (typeof value.value !== 'number') return '';
  if (parameter.kind === 'length' || parameter.kind === 'diameter') return formatLength(value.value, format);
  if (parameter.kind === 'angle') return formatAngle(value.value);
  return formatNumber(value.value, 4);
}

/** The limits of a size as the table of sizes prints them: `±0.2`, `14.000 / 13.957`, `6g`. */
export function limitsText(size: Size, format: LengthFormat): string {
  const { tolerance } = size;
  if (tolerance.kind === 'none') return '';
  if (tolerance.kind === 'thread-class') return tolerance.code ?? '';
  const angle = size.kind === 'angle';
  const one = (value: number) => (angle ? `${formatNumber(value, 3)}°` : formatLength(value, format));
  const even = Math.abs(tolerance.upper + tolerance.lower) < 1e-9;
  if (tolerance.kind !== 'fit' && even) return `±${one(tolerance.upper)}`;
  if (angle) return `${one(size.upperLimit)} / ${one(size.lowerLimit)}`;
  return `${fixed(size.upperLimit, format)} / ${fixed(size.lowerLimit, format)}`;
}

/** A limit as it stands beside another, with the same decimals, so that both can be compared at a glance. */
export function fixed(mm: number, format: LengthFormat): string {
  const decimals = format.unit === 'in' ? 4 : 3;
  const value = format.unit === 'in' ? mm / 25.4 : mm;
  const text = formatNumber(value, decimals, { fixed: true });
  return format.style === 'asme' ? text.replace(/^(-?)0\./, '$1.') : text;
}
