import type { Mark, PathCommand } from '../../../shared/drawing/sheet';

/** Marks as large as `k` makes them about the origin; widths of lines are those of their kind and stay. */
export function scaleMarks(marks: readonly Mark[], k: number): Mark[] {
  return marks.map((mark) => scaleMark(mark, k));
}

function scaleMark<One extends Mark>(mark: One, k: number): One;
function scaleMark(mark: Mark, k: number): Mark {
  switch (mark.type) {
    case 'line':
      return { ...mark, x1: mark.x1 * k, y1: mark.y1 * k, x2: mark.x2 * k, y2: mark.y2 * k };
    case 'polyline':
      return { ...mark, points: mark.points.map(({ x, y }) => ({ x: x * k, y: y * k })) };
    case 'path':
      return { ...mark, commands: mark.commands.map((command) => scaleCommand(command, k)) };
    case 'circle':
      return { ...mark, cx: mark.cx * k, cy: mark.cy * k, r: mark.r * k };
    case 'text':
      return { ...mark, x: mark.x * k, y: mark.y * k, size: mark.size * k };
    case 'symbol': {
      const [x0, y0, x1, y1] = mark.box;
      return {
        ...mark,
        box: [x0 * k, y0 * k, x1 * k, y1 * k],
        marks: mark.marks.map((inner) => scaleMark(inner, k)),
      };
    }
  }
}

function scaleCommand(command: PathCommand, k: number): PathCommand {
  switch (command.op) {
    case 'Z':
      return command;
    case 'A':
      return { ...command, r: command.r * k, x: command.x * k, y: command.y * k };
    case 'C': {
      const { x1, y1, x2, y2, x, y } = command;
      return { op: 'C', x1: x1 * k, y1: y1 * k, x2: x2 * k, y2: y2 * k, x: x * k, y: y * k };
    }
    default:
      return { ...command, x: command.x * k, y: command.y * k };
  }
}
