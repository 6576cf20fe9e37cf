import { rulesFor } from './rules';
import type { DraftingStyle, LineMark, LineType, PolylineMark } from './sheet';

/** A filled arrowhead: its tip is the first point. (ux, uy) is the unit direction it points in. */
export function arrowHead(x: number, y: number, ux: number, uy: number, style: DraftingStyle): PolylineMark {
  const { arrowLength, arrowHalfWidth } = rulesFor(style);
  const bx = x - ux * arrowLength;
  const by = y - uy * arrowLength;
  return {
    type: 'polyline',
    line: 'arrow',
    closed: true,
    filled: true,
    points: [
      { x, y },
      { x: bx - uy * arrowHalfWidth, y: by + ux * arrowHalfWidth },
      { x: bx + uy * arrowHalfWidth, y: by - ux * arrowHalfWidth },
    ],
  };
}

/** A straight line of the named kind. */
export function lineMark(line: LineType, x1: number, y1: number, x2: number, y2: number): LineMark {
  return { type: 'line', line, x1, y1, x2, y2 };
}
