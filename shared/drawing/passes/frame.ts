import { frameOf, SHEET_SIZES } from '../../standards/sheets';
import { lineMark } from '../arrow';
import type { Box } from '../geometry/box';
import type { Mark, SheetSize } from '../sheet';

/** The frame of a sheet: x0, y0, x1, y1. */
export function frameBox(size: SheetSize): Box {
  const f = frameOf(SHEET_SIZES[size]);
  return [f.x, f.y, f.x + f.width, f.y + f.height];
}

/** The frame with its centring marks, from the paper's edge into the frame (ISO 5457). */
export function frameMarks(size: SheetSize): Mark[] {
  const [x0, y0, x1, y1] = frameBox(size);
  const { width, height } = SHEET_SIZES[size];
  const mx = width / 2;
  const my = height / 2;
  return [
    {
      type: 'polyline',
      line: 'frame',
      closed: true,
      points: [
        { x: x0, y: y0 },
        { x: x1, y: y0 },
        { x: x1, y: y1 },
        { x: x0, y: y1 },
      ],
    },
    lineMark('table', mx, Math.max(0, y0 - 5), mx, y0 + 3),
    lineMark('table', mx, y1, mx, Math.min(height, y1 + 5)),
    lineMark('table', Math.max(0, x0 - 5), my, x0 + 3, my),
    lineMark('table', x1 - 3, my, Math.min(width, x1 + 5), my),
  ];
}
