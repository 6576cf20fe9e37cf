import { distanceToSegment } from '../../geometry/segment';
import { finding, ofRole, strokesOfKind } from '../reading';
import type { CheckRule, ReadGroup, ReadStroke } from '../reading';

const REACH = 3.2;
const SAME_LINE = 0.01;

/** The end nearest the view of each extension line; pieces that were cut apart count as one. */
function roots(size: ReadGroup): { x: number; y: number; pieces: ReadStroke[] }[] {
  const lines: ReadStroke[][] = [];
  for (const s of strokesOfKind(size, 'extension')) {
    const mate = lines.find((l) =>
      l.some((o) =>
        s.x1 === s.x2
          ? o.x1 === o.x2 && Math.abs(o.x1 - s.x1) < SAME_LINE
          : o.y1 === o.y2 && Math.abs(o.y1 - s.y1) < SAME_LINE,
      ),
    );
    if (mate) mate.push(s);
    else lines.push([s]);
  }
  return lines.map((pieces) => ({ x: pieces[0]?.x1 ?? 0, y: pieces[0]?.y1 ?? 0, pieces }));
}

/** An extension line begins at an edge of its view. */
export const extensionEdge: CheckRule = {
  id: 'extension-edge',
  check: (reading) =>
    ofRole(reading, 'dimension').flatMap((size) => {
      const view = ofRole(reading, 'view').find((v) => v.group.view === size.group.forView);
      if (!view) return [];
      const edges = strokesOfKind(view, 'visible');
      const loose = roots(size).some(({ pieces }) => {
        const ends = pieces.flatMap((p) => [
          { x: p.x1, y: p.y1 },
          { x: p.x2, y: p.y2 },
        ]);
        return !ends.some((p) => edges.some((e) => distanceToSegment(p.x, p.y, e) <= REACH));
      });
      return loose
        ? [finding('extension-edge', `An extension line of ${size.name} begins at no edge.`, [size.name])]
        : [];
    }),
};
