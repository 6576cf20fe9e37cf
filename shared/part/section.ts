import type { Body } from './body';
import { radiusAt } from './generator';
import { flatsOf, metalInner, metalOuter } from './metal';
import { areaBetween, flatLines, flattedDisc } from './polar';
import type { FlatLine, Region } from './polar';

type Side = 'left' | 'right';

/** Lines of every flat over x; at the end of a span, those of the asked side. */
export function linesAt(body: Body, x: number, side: Side = 'right'): FlatLine[] {
  return flatsOf(body)
    .filter((cut) => (side === 'right' ? x >= cut.from && x < cut.to : x > cut.from && x <= cut.to))
    .flatMap((cut) => flatLines(cut.count, cut.distance, cut.phase));
}

/** Area of metal in the section at x (mm²): the disc cut by its flats, less the bore, threads as pitch cylinders. */
export function sectionArea(body: Body, x: number, side: Side = x >= body.x1 ? 'left' : 'right'): number {
  const outer: Region = { radius: radiusAt(metalOuter(body), x, side), flats: linesAt(body, x, side) };
  const inner: Region = { radius: radiusAt(metalInner(body), x, side), flats: [] };
  return regionArea(outer, inner);
}

/** Area inside `outer` and outside `inner`, by the closed form where one set of even flats is clear of the bore. */
export function regionArea(outer: Region, inner: Region, bore = 0): number {
  const first = outer.flats[0];
  const even = first && isEven(outer.flats);
  if (first && even && inner.flats.length === 0 && inner.radius <= first.distance)
    return flattedDisc(outer.radius, outer.flats.length, first.distance) - Math.PI * inner.radius ** 2;
  return areaBetween(outer, inner, bore);
}

function isEven(lines: readonly FlatLine[]): boolean {
  const first = lines[0];
  if (!first) return false;
  const step = (2 * Math.PI) / lines.length;
  return lines.every(
    (line, i) => line.distance === first.distance && Math.abs(line.normal - first.normal - i * step) < 1e-12,
  );
}
