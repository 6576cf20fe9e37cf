/** Extension lines give way: cut where a foreign text or arrowhead lies on them. Afterwards none crosses either. */
import { boxAround, boxesMeet, growBox } from '../geometry/box';
import type { Box } from '../geometry/box';
import { distanceToSegment, segmentsCross, segmentWithinBox } from '../geometry/segment';
import type { LineMark, Mark, Point } from '../sheet';
import { strokesOf, strokeBox, textBoxesOf } from '../strokes';
import type { Stroke } from '../strokes';

const TEXT_AIR = 0.6;
const ARROW_AIR = 0.4;
const LEAST_PIECE = 0.4;
const ON_LINE = 0.05;

interface Obstacle {
  box: Box;
  /** The head itself: an arrow that ends on a line, or only passes near it, is no obstacle. */
  head?: readonly Stroke[];
  tip?: Point;
}

function arrowBoxes(marks: readonly Mark[]): Obstacle[] {
  return marks.flatMap((mark) => {
    if (mark.type !== 'polyline' || mark.line !== 'arrow') return [];
    const head = strokesOf([mark]);
    const box = boxAround(head.map(strokeBox));
    return box ? [{ box: growBox(box, ARROW_AIR), head, tip: mark.points[0] }] : [];
  });
}

/** What an extension line of another size must stop at. */
function keepClear(marks: readonly Mark[]): Obstacle[] {
  return [...textBoxesOf(marks).map((b) => ({ box: growBox(b, TEXT_AIR) })), ...arrowBoxes(marks)];
}

function cut(line: LineMark, obstacles: readonly Obstacle[]): LineMark[] {
  const dx = line.x2 - line.x1;
  const dy = line.y2 - line.y1;
  const length = Math.hypot(dx, dy);
  const own: Box = [
    Math.min(line.x1, line.x2),
    Math.min(line.y1, line.y2),
    Math.max(line.x1, line.x2),
    Math.max(line.y1, line.y2),
  ];
  let kept: [number, number][] = [[0, 1]];
  for (const { box, tip, head } of obstacles) {
    if (!boxesMeet(own, box, 0.001)) continue;
    if (tip && distanceToSegment(tip.x, tip.y, line) < ON_LINE) continue;
    if (head && !head.some((edge) => segmentsCross(edge, line, 0))) continue;
    const hole = segmentWithinBox(line, box);
    if (!hole) continue;
    kept = kept.flatMap(([a, b]): [number, number][] => {
      const pieces: [number, number][] = [];
      if (hole[0] > a) pieces.push([a, Math.min(b, hole[0])]);
      if (hole[1] < b) pieces.push([Math.max(a, hole[1]), b]);
      return pieces;
    });
  }
  return kept
    .filter(([a, b]) => (b - a) * length >= LEAST_PIECE)
    .map(([a, b]) => ({
      ...line,
      x1: line.x1 + dx * a,
      y1: line.y1 + dy * a,
      x2: line.x1 + dx * b,
      y2: line.y1 + dy * b,
    }));
}

/** The sizes' marks with their extension lines cut at one another's writing; `cuts` counts the holes made. */
export function interrupt(sizes: readonly (readonly Mark[])[]): { marks: Mark[][]; cuts: number } {
  const boxes = sizes.map(keepClear);
  let cuts = 0;
  const marks = sizes.map((own, i) => {
    const foreign = boxes.flatMap((list, j) => (j === i ? [] : list));
    return own.flatMap((mark) => {
      if (mark.type !== 'line' || mark.line !== 'extension') return [mark];
      const pieces = cut(mark, foreign);
      const first = pieces[0];
      if (
        pieces.length !== 1 ||
        !first ||
        first.x1 !== mark.x1 ||
        first.y1 !== mark.y1 ||
        first.x2 !== mark.x2 ||
        first.y2 !== mark.y2
      )
        cuts++;
      return pieces;
    });
  });
  return { marks, cuts };
}
