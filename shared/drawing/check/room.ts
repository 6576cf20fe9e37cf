/** How a finished sheet is filled, and whether the next larger scale would still go on it. */
import { INCH_SCALES, ISO_SCALES } from '../../standards/scales';
import { boxAround } from '../geometry/box';
import type { Box } from '../geometry/box';
import type { Group } from '../sheet';
import type { ReadGroup, Reading } from './reading';

const EDGE = 4;

export function boxOf(groups: readonly ReadGroup[]): Box | null {
  return boxAround(groups.flatMap((g) => [...g.texts.map((t) => t.box), ...g.strokes.map((s) => s.box)]));
}

const rolesOf = (reading: Reading, ...roles: Group['role'][]): ReadGroup[] =>
  reading.groups.filter((g) => roles.includes(g.group.role));

/** The rectangles that views may stand in: over the notes, and beside them over the title block. */
export function roomsOf(reading: Reading): Box[] {
  const [x0, y0, x1, y1] = reading.sheet.frame;
  const notes = boxOf(rolesOf(reading, 'notes'));
  const block = boxOf(rolesOf(reading, 'title-block'));
  const foot = block ? block[1] : y1;
  const left = x0 + EDGE;
  const top = y0 + EDGE;
  const right = x1 - EDGE;
  if (!notes) return [[left, top, right, foot - EDGE]];
  return [
    [left, top, right, Math.min(notes[1], foot) - 3],
    [notes[2] + 5, top, right, foot - EDGE],
  ];
}

/** Views with their sizes and balloons. */
export function drawingBox(reading: Reading): Box | null {
  return boxOf(rolesOf(reading, 'view', 'dimension', 'balloon'));
}

/** True where the next larger scale of the style's series would still go on the same sheet. */
export function largerScaleFits(reading: Reading): boolean {
  const { sheet } = reading;
  const series = sheet.style === 'iso' ? ISO_SCALES : INCH_SCALES;
  const next = series
    .map((s) => s.factor)
    .filter((f) => f > sheet.scale + 1e-9)
    .sort((a, b) => a - b)[0];
  const drawing = drawingBox(reading);
  if (next === undefined || !drawing) return false;
  const grow = next / sheet.scale - 1;
  let wider = 0;
  let taller = 0;
  for (const view of rolesOf(reading, 'view')) {
    const box = boxOf([view]);
    if (!box) continue;
    wider += (box[2] - box[0]) * grow;
    taller = Math.max(taller, (box[3] - box[1]) * grow);
  }
  const w = drawing[2] - drawing[0] + wider;
  const h = drawing[3] - drawing[1] + taller;
  return roomsOf(reading).some((r) => w <= r[2] - r[0] && h <= r[3] - r[1]);
}
