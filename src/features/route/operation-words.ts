import type { Operation, Target } from '../../../shared/route/route';
import type { Size } from '../../../shared/scheme/scheme';
import { formatAngle, formatLength, formatNumber, type LengthFormat } from '../../../shared/units/format';
import { fixed } from '../../revision/figures';
import { toRadians } from '../../../shared/units/angle';

/** Stop lengths from the set-up's datum, in the order they are met. */
export function stopWords({ stops }: Operation, format: LengthFormat): string {
  return stops
    .map(({ length }) => formatLength(length, { ...format, decimals: format.unit === 'in' ? 3 : 2 }))
    .join(', ');
}

const SIGNS: Readonly<Partial<Record<Size['kind'], string>>> = {
  diameter: 'Ø',
  thread: 'Ø',
  knurl: 'Ø',
  hole: 'Ø',
  radius: 'R',
};

/** What to reach, with limits: `Ø14 14.000 / 13.957`. */
export function targetWords(
  operation: Operation,
  sizes: ReadonlyMap<string, Size>,
  format: LengthFormat,
): string {
  if (operation.method === 'inspect') return balloonWords(operation.target, sizes);
  const parts = operation.target.map((target) => oneTarget(target, sizes.get(target.size), format));
  if (operation.blankDiameter !== undefined)
    parts.push(`blank Ø${formatLength(operation.blankDiameter, format)}`);
  if (operation.faces !== undefined && operation.depth !== undefined)
    parts.push(`${operation.faces} × ${formatLength(operation.depth, format)} deep`);
  if (operation.halfAngle !== undefined) {
    const angle = toRadians(operation.halfAngle);
    parts.push(`half angle ${formatAngle(angle)}, ${formatAngle(angle, { style: 'minutes' })}`);
  }
  if (operation.slantLength !== undefined) parts.push(`slant ${formatLength(operation.slantLength, format)}`);
  if (operation.settings !== undefined && operation.settings > 1)
    parts.push(`${operation.settings} settings`);
  return parts.join('\n');
}

/** `sizes 1 to 6, 9`: what is measured, by the balloons of the sheet. */
function balloonWords(targets: readonly Target[], sizes: ReadonlyMap<string, Size>): string {
  const numbers = targets
    .flatMap(({ size }) => sizes.get(size)?.balloon ?? [])
    .filter((balloon) => balloon > 0);
  const sorted = [...new Set(numbers)].sort((a, b) => a - b);
  const runs: [number, number][] = [];
  for (const number of sorted) {
    const last = runs.at(-1);
    if (last && last[1] === number - 1) last[1] = number;
    else runs.push([number, number]);
  }
  if (runs.length === 0) return '';
  const words = runs.map(([from, to]) =>
    from === to ? String(from) : to === from + 1 ? `${from}, ${to}` : `${from} to ${to}`,
  );
  return `size${sorted.length === 1 ? '' : 's'} ${words.join(', ')}`;
}

function oneTarget(target: Target, size: Size | undefined, format: LengthFormat): string {
  if (size?.designation) return size.designation;
  const sign = size ? (SIGNS[size.kind] ?? '') : '';
  if (size?.kind === 'angle') return `${formatNumber(target.nominal, 3)}°`;
  const nominal = `${sign}${formatLength(target.nominal, format)}`;
  if (target.upperLimit === target.lowerLimit) return nominal;
  return `${nominal}  ${fixed(target.upperLimit, format)} / ${fixed(target.lowerLimit, format)}`;
}

export function feedWords({ feed, feedPer }: Operation, format: LengthFormat): string {
  if (feed <= 0) return 'by hand';
  const perMinute = feedPer === 'min';
  const text = formatLength(feed, { ...format, style: 'iso', ...(perMinute ? { decimals: 1 } : {}) });
  return perMinute ? `${text}/min` : text;
}
