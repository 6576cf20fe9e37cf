import type { CircleMark, LineMark, Mark, PathMark, PolylineMark } from './sheet';

type Drawn = LineMark | PolylineMark | PathMark | CircleMark;

function moveDrawn(mark: Drawn, dx: number, dy: number): Drawn {
  switch (mark.type) {
    case 'line':
      return { ...mark, x1: mark.x1 + dx, y1: mark.y1 + dy, x2: mark.x2 + dx, y2: mark.y2 + dy };
    case 'polyline':
      return { ...mark, points: mark.points.map((p) => ({ x: p.x + dx, y: p.y + dy })) };
    case 'circle':
      return { ...mark, cx: mark.cx + dx, cy: mark.cy + dy };
    case 'path':
      return {
        ...mark,
        commands: mark.commands.map((c) => {
          if (c.op === 'Z') return c;
          if (c.op === 'C')
            return {
              ...c,
              x1: c.x1 + dx,
              y1: c.y1 + dy,
              x2: c.x2 + dx,
              y2: c.y2 + dy,
              x: c.x + dx,
              y: c.y + dy,
            };
          return { ...c, x: c.x + dx, y: c.y + dy };
        }),
      };
  }
}

/** The mark moved over the paper. */
export function moveMark(mark: Mark, dx: number, dy: number): Mark {
  if (mark.type === 'text') return { ...mark, x: mark.x + dx, y: mark.y + dy };
  if (mark.type === 'symbol')
    return {
      ...mark,
      box: [mark.box[0] + dx, mark.box[1] + dy, mark.box[2] + dx, mark.box[3] + dy],
      marks: mark.marks.map((m) => moveDrawn(m, dx, dy)),
    };
  return moveDrawn(mark, dx, dy);
}

/** All marks moved over the paper. */
export function moveMarks(marks: readonly Mark[], dx: number, dy: number): Mark[] {
  return marks.map((mark) => moveMark(mark, dx, dy));
}
