import type { ArcPiece, Body, FlatsCut, Piece } from '../part/body';
import { levelRoots, pieceRadius } from '../part/piece';

/** A point of the silhouette: how far it reaches over and under the axis at x (mm of the part). */
export interface ProfilePoint {
  x: number;
  top: number;
  bottom: number;
}

/** A stretch without a step: straight between its points, or one arc. */
export interface ProfileSpan {
  from: number;
  to: number;
  points: readonly ProfilePoint[];
  arc?: ArcPiece;
}

/** Samples of a stretch whose silhouette is curved by flats. */
const CURVE_STEPS = 10;

/** The flats of a body. */
export function flatsOf(body: Body): FlatsCut[] {
  return body.cuts.filter((cut): cut is FlatsCut => cut.kind === 'flats');
}

/** Angle about the axis of each face's normal, 0 up, turning towards the viewer. */
export function faceAngles(cut: FlatsCut): number[] {
  return Array.from({ length: cut.count }, (_, k) => cut.phase + (2 * Math.PI * k) / cut.count);
}

/** Half a face's width where the round is r; 0 where the flats leave it alone. */
export function faceHalfWidth(cut: FlatsCut, r: number): number {
  if (r <= cut.distance) return 0;
  const limit = cut.count >= 3 ? cut.distance * Math.tan(Math.PI / cut.count) : Infinity;
  return Math.min(Math.sqrt((r - cut.distance) * (r + cut.distance)), limit);
}

/** How far a disc of r cut by flats reaches over and under the axis. */
export function reach(r: number, cuts: readonly FlatsCut[]): { top: number; bottom: number } {
  let top = r;
  let bottom = r;
  for (const cut of cuts) {
    if (r <= cut.distance) continue;
    const angles = faceAngles(cut);
    const freeUp = angles.every((a) => r * Math.cos(a) <= cut.distance + 1e-9);
    const freeDown = angles.every((a) => -r * Math.cos(a) <= cut.distance + 1e-9);
    const w = faceHalfWidth(cut, r);
    const ys = angles.flatMap((a) => [
      cut.distance * Math.cos(a) - w * Math.sin(a),
      cut.distance * Math.cos(a) + w * Math.sin(a),
    ]);
    if (!freeUp) top = Math.min(top, Math.max(...ys));
    if (!freeDown) bottom = Math.min(bottom, -Math.min(...ys));
  }
  return { top, bottom };
}

function cutsOver(body: Body, from: number, to: number): FlatsCut[] {
  const middle = (from + to) / 2;
  return flatsOf(body).filter((cut) => cut.from <= middle && middle <= cut.to);
}

function stationsWithin(piece: Piece, body: Body): number[] {
  const stations = [piece.from, piece.to];
  for (const cut of flatsOf(body)) {
    stations.push(cut.from, cut.to, ...levelRoots(piece, cut.distance));
    if (cut.count >= 3) stations.push(...levelRoots(piece, cut.distance / Math.cos(Math.PI / cut.count)));
  }
  const sorted = stations.filter((x) => x >= piece.from && x <= piece.to).sort((a, b) => a - b);
  return sorted.filter((x, i) => i === 0 || x - (sorted[i - 1] ?? -Infinity) > 1e-6);
}

function spanOver(piece: Piece, body: Body, from: number, to: number): ProfileSpan {
  const cuts = cutsOver(body, from, to).filter(
    (cut) => Math.max(pieceRadius(piece, from), pieceRadius(piece, to)) > cut.distance + 1e-9,
  );
  const at = (x: number): ProfilePoint => ({ x, ...reach(pieceRadius(piece, x), cuts) });
  if (cuts.length === 0 && piece.kind === 'arc') return { from, to, points: [at(from), at(to)], arc: piece };
  const plain = cuts.length === 0 || (piece.kind === 'line' && piece.start === piece.end);
  const steps = plain ? 1 : CURVE_STEPS;
  const points = Array.from({ length: steps + 1 }, (_, i) =>
    at(i === steps ? to : from + ((to - from) * i) / steps),
  );
  return { from, to, points };
}

/** The silhouette of a body from left to right, as the axis view shows it. */
export function profileOf(body: Body): ProfileSpan[] {
  const spans: ProfileSpan[] = [];
  for (const piece of body.outer) {
    const stations = stationsWithin(piece, body);
    for (let i = 0; i + 1 < stations.length; i++)
      spans.push(spanOver(piece, body, stations[i] ?? 0, stations[i + 1] ?? 0));
  }
  return spans;
}
