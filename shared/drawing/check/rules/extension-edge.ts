import { distanceToSegment } from '../../geometry/segment';
import { finding, mapOf, ofRole, strokesOfKind } from '../reading';
import type { CheckRule, ReadGroup, ReadStroke, Reading } from '../reading';

const REACH = 3.2;
const SAME_LINE = 0.05;

/** Pieces of one extension line: cut apart at writing, or drawn once for several sizes. */
interface Line {
  upright: boolean;
  at: number;
  /** Which side of the view it lies on. */
  side: number;
  pieces: { size: ReadGroup; stroke: ReadStroke }[];
}

function linesBeside(reading: Reading, view: ReadGroup): Line[] {
  const map = mapOf(reading, view.group.view);
  const axisY = map?.axisY ?? 0;
  const knots = map?.knots ?? [];
  const middleX = map?.centreX ?? ((knots[0]?.[1] ?? 0) + (knots[knots.length - 1]?.[1] ?? 0)) / 2;
  const lines: Line[] = [];
  for (const size of ofRole(reading, 'dimension')) {
    if (size.group.forView !== view.group.view) continue;
    for (const stroke of strokesOfKind(size, 'extension')) {
      const upright = stroke.x1 === stroke.x2;
      const at = upright ? stroke.x1 : stroke.y1;
      const side = upright
        ? Math.sign(stroke.y1 + stroke.y2 - 2 * axisY)
        : Math.sign(stroke.x1 + stroke.x2 - 2 * middleX);
      const mate = lines.find(
        (l) => l.upright === upright && l.side === side && Math.abs(l.at - at) < SAME_LINE,
      );
      if (mate) mate.pieces.push({ size, stroke });
      else lines.push({ upright, at, side, pieces: [{ size, stroke }] });
    }
  }
  return lines;
}

/** An extension line begins at an edge of its view. */
export const extensionEdge: CheckRule = {
  id: 'extension-edge',
  check: (reading) =>
    ofRole(reading, 'view').flatMap((view) => {
      const edges = strokesOfKind(view, 'visible');
      const near = (x: number, y: number): boolean => edges.some((e) => distanceToSegment(x, y, e) <= REACH);
      return linesBeside(reading, view)
        .filter(({ pieces }) => !pieces.some(({ stroke: s }) => near(s.x1, s.y1) || near(s.x2, s.y2)))
        .map(({ pieces }) => {
          const names = [...new Set(pieces.map(({ size }) => size.name))];
          return finding(
            'extension-edge',
            `An extension line of ${names.join(', ')} begins at no edge.`,
            names,
          );
        });
    }),
};
