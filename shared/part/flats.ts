import type { Body, FlatsCut } from './body';
import { STATION_TOLERANCE } from './body';
import { radiusAt, spansAbove } from './generator';

/** Where flats really leave a face: the parts of the declared span where r(x) exceeds their distance. */
export function flatsSpans(body: Body, cut: FlatsCut): { from: number; to: number }[] {
  return spansAbove(body.outer, cut.distance, Math.max(cut.from, body.x0), Math.min(cut.to, body.x1));
}

/** From the first to the last station where the flats leave a face; null where they touch nothing. */
export function flatsSpan(body: Body, cut: FlatsCut): { from: number; to: number } | null {
  const spans = flatsSpans(body, cut);
  const first = spans[0];
  const last = spans[spans.length - 1];
  return first && last ? { from: first.from, to: last.to } : null;
}

/** Half of a face's width at most: where its neighbours meet it. Infinite for one flat or a pair. */
export function faceLimit(cut: FlatsCut): number {
  return cut.count >= 3 ? cut.distance * Math.tan(Math.PI / cut.count) : Infinity;
}

/** Radius at which even flats leave no round between them. Infinite for one flat or a pair. */
export function cornerRadius(cut: FlatsCut): number {
  return cut.count >= 3 ? cut.distance / Math.cos(Math.PI / cut.count) : Infinity;
}

/**
 * Half width w of each face at x (mm): sqrt(r² − h²), limited by the neighbours at h·tan(π/n); 0 where the
 * round is within the flats' distance. One formula draws sharp and rounded corners, arcs of a chamfer and run-outs.
 */
export function halfWidth(body: Body, cut: FlatsCut, x: number, side: 'left' | 'right' = 'right'): number {
  if (x < cut.from - STATION_TOLERANCE || x > cut.to + STATION_TOLERANCE) return 0;
  const r = radiusAt(body.outer, x, side);
  if (r <= cut.distance) return 0;
  return Math.min(Math.sqrt((r - cut.distance) * (r + cut.distance)), faceLimit(cut));
}
