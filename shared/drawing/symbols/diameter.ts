import type { SymbolMark } from '../sheet';

/** Room the diameter sign takes along the line, in letter heights (its box), before the air that follows it. */
export const DIAMETER_ROOM = 1.05;

/**
 * The diameter sign (ISO 81714-1 proportions: circle of 0.7 of the letter height, stroke at 60°), `height` the
 * letter height in mm. (x, y) is the left end of its baseline; turned it reads upwards from there.
 */
export function diameterSymbol(x: number, y: number, height: number, rotate: -90 | undefined): SymbolMark {
  const r = height * 0.37;
  const along = (height * DIAMETER_ROOM) / 2;
  const up = height / 2;
  const cx = rotate ? x - up : x + along;
  const cy = rotate ? y - along : y - up;
  const reach = height * 0.5;
  const sx = reach * Math.cos(Math.PI / 3);
  const sy = reach * Math.sin(Math.PI / 3);
  const [ax, ay] = rotate ? [sy, sx] : [sx, -sy];
  const halfX = rotate ? up : along;
  const halfY = rotate ? along : up;
  return {
    type: 'symbol',
    name: 'diameter',
    box: [cx - halfX, cy - halfY, cx + halfX, cy + halfY],
    marks: [
      { type: 'circle', line: 'symbol', cx, cy, r },
      { type: 'line', line: 'symbol', x1: cx - ax, y1: cy - ay, x2: cx + ax, y2: cy + ay },
    ],
  };
}
