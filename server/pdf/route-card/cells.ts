import type { Operation } from '../../../shared/route/route';
import type { Scheme, Size } from '../../../shared/scheme/scheme';
import type { LengthFormat } from '../../../shared/units/format';
import { formatLength, formatNumber } from '../../../shared/units/format';
import type { Column } from './measures';

/** `Ø` stands for the diameter sign, which is drawn; each target has a line of its own. */
export type Cells = Readonly<Record<Column['id'], string>>;

const ACROSS = new Set<Size['kind']>(['diameter', 'hole', 'groove']);

/** What one operation says in each column; `holding` is how its set-up holds the work, as the card's head says. */
export function cellsOf(operation: Operation, scheme: Scheme, format: LengthFormat, holding: string): Cells {
  const length = (mm: number) => formatLength(mm, format);
  const tool = toolText(operation, holding);
  // Where nothing is cut the tool is a word of the operation, and the sizes have the whole width.
  const measuring = !operation.cut && operation.target.length > 0 && tool !== '';
  return {
    number: String(operation.number),
    operation: measuring ? `${operation.title}, ${tool}` : operation.title,
    stop: operation.stops.map((stop) => length(stop.length)).join(' '),
    target: targetText(operation, scheme, format),
    tool: measuring ? '' : tool,
    speed: operation.speed > 0 ? String(Math.round(operation.speed)) : '',
    feed: feedText(operation, format),
    passes: operation.passes > 0 && operation.cut ? String(operation.passes) : '',
    check: operation.check,
    tick: '',
  };
}

function targetText(operation: Operation, scheme: Scheme, format: LengthFormat): string {
  const own = ownFigures(operation, format);
  const sizes = new Map(scheme.sizes.map((size) => [size.id, size]));
  const targets = operation.target.map((target) => {
    const size = sizes.get(target.size);
    const limit = (value: number) =>
      size?.kind === 'angle' ? degrees(value, format) : formatLength(value, format);
    const sign = size && ACROSS.has(size.kind) ? 'Ø' : '';
    const name = size?.designation ?? `${sign}${limit(target.nominal)}`;
    const limits =
      target.upperLimit === target.lowerLimit
        ? ''
        : `: ${limit(target.upperLimit)}/${limit(target.lowerLimit)}`;
    return size?.kind === 'thread' ? name : `${name}${limits}`;
  });
  return [own.join(', '), ...targets].filter((line) => line !== '').join('\n');
}

/** What the card's head, the operation's own words or the last column say already is not said again. */
function toolText({ tool, title, check }: Operation, holding: string): string {
  return [holding, title, check].some((text) => text.toLowerCase().includes(tool.toLowerCase())) ? '' : tool;
}

function degrees(value: number, { decimalSign }: LengthFormat): string {
  return `${formatNumber(value, 2, { decimalSign })}°`;
}

/** Figures that belong to the method: how deep a flat, which angle on the slide, what a thread is turned to first. */
function ownFigures(operation: Operation, format: LengthFormat): string[] {
  const length = (mm: number) => formatLength(mm, format);
  const { method, depth, faces, halfAngle, settings, slantLength, blankDiameter } = operation;
  const figures: string[] = [];
  if (blankDiameter !== undefined) figures.push(`blank Ø${length(blankDiameter)}`);
  if (method === 'mill-flat' && depth !== undefined) figures.push(`${faces ?? 1} × ${length(depth)} deep`);
  else if (depth !== undefined) figures.push(`${length(depth)} deep`);
  if (halfAngle !== undefined) figures.push(`half angle ${degrees(halfAngle, format)}`);
  if (slantLength !== undefined) figures.push(`slant ${length(slantLength)}`);
  if (settings !== undefined && settings > 1) figures.push(`${settings} settings`);
  return figures;
}

function feedText(operation: Operation, format: LengthFormat): string {
  if (operation.feed <= 0) return operation.cut ? 'by hand' : '';
  // A dial of feeds has no finer steps than these.
  const decimals = operation.feedPer === 'min' ? { mm: 0, in: 1 } : { mm: 2, in: 4 };
  const figure = formatLength(operation.feed, { ...format, decimals: decimals[format.unit] });
  return operation.feedPer === 'min' ? `${figure}/min` : figure;
}
