import type { Sheet } from '../../../shared/drawing/sheet';
import type { Generator } from '../../../shared/part/body';
import { radiusAt } from '../../../shared/part/generator';
import type { SizeAnchor } from '../../../shared/scheme/scheme';

interface PaperPoint {
  x: number;
  y: number;
}

const SAMPLES = 24;

/**
 * The outline that a size measures, above and below the axis, in paper millimetres: what lights up on the part
 * with the size. Empty where the size is read elsewhere than on the axis view.
 */
export function litEdges(anchor: SizeAnchor, outer: Generator, sheet: Sheet): PaperPoint[][] {
  const view = sheet.maps.find(({ view }) => view === 'axis');
  if (!view || anchor.kind === 'flats' || anchor.kind === 'corner') return [];
  const from = Math.min(anchor.from, anchor.to);
  const to = Math.max(anchor.from, anchor.to);
  const stations = outer.flatMap((piece) => [piece.from, piece.to]).filter((x) => x > from && x < to);
  const even = Array.from({ length: SAMPLES + 1 }, (_, index) => from + ((to - from) * index) / SAMPLES);
  const xs = [...new Set([...even, ...stations])].sort((a, b) => a - b);
  const upper: PaperPoint[] = [];
  for (const [index, x] of xs.entries()) {
    const paperX = onPaper(view.knots, x);
    const last = index === xs.length - 1;
    const left = radiusAt(outer, x, 'left');
    const right = radiusAt(outer, x, 'right');
    if (index > 0) upper.push({ x: paperX, y: left * view.scale });
    if (!last && (index === 0 || left !== right)) upper.push({ x: paperX, y: right * view.scale });
  }
  return [
    upper.map(({ x, y }) => ({ x, y: view.axisY - y })),
    upper.map(({ x, y }) => ({ x, y: view.axisY + y })),
  ];
}

/** Part x to paper x over the knots of a view, which may be interrupted. */
function onPaper(knots: readonly (readonly [number, number])[], x: number): number {
  for (const [index, knot] of knots.entries()) {
    const next = knots[index + 1];
    if (!next) break;
    const isLast = index === knots.length - 2;
    if (x > next[0] && !isLast) continue;
    const span = next[0] - knot[0];
    return span === 0 ? next[1] : knot[1] + ((x - knot[0]) / span) * (next[1] - knot[1]);
  }
  return knots[0]?.[1] ?? 0;
}
