import type { Generator, Piece } from './body';
import { STATION_TOLERANCE } from './body';
import { levelRoots, mirrorPiece, pieceRadius, sameCurve, slicePiece } from './piece';

/** A cylinder's generator: r over [from, to]. */
export function constant(from: number, to: number, radius: number): Generator {
  return [{ kind: 'line', from, to, start: radius, end: radius }];
}

/** The piece over x; at a station between two pieces, the one on the asked side. Null outside. */
export function pieceAt(generator: Generator, x: number, side: 'left' | 'right' = 'right'): Piece | null {
  const last = generator.length - 1;
  for (let index = 0; index <= last; index += 1) {
    const piece = generator[index];
    if (!piece || x < piece.from) return null;
    const within = side === 'left' ? x <= piece.to : x < piece.to || index === last;
    if (within && x <= piece.to) return piece;
  }
  return null;
}

/**
 * r at x (mm). At a step `side` says which of the two radii is meant; the right-hand one when absent
 * (at the last station, the left-hand one: there is no other). 0 outside the generator.
 */
export function radiusAt(generator: Generator, x: number, side: 'left' | 'right' = 'right'): number {
  const piece = pieceAt(generator, x, side);
  return piece ? pieceRadius(piece, x) : 0;
}

/** Largest r over [from, to], both sides of every step inside counted. */
export function largestRadius(generator: Generator, from: number, to: number): number {
  return extreme(generator, from, to, Math.max, -Infinity);
}

/** Smallest r over [from, to]. */
export function smallestRadius(generator: Generator, from: number, to: number): number {
  return extreme(generator, from, to, Math.min, Infinity);
}

function extreme(
  generator: Generator,
  from: number,
  to: number,
  pick: (...values: number[]) => number,
  start: number,
): number {
  let found = start;
  for (const piece of generator) {
    if (piece.to <= from || piece.from >= to) continue;
    const a = Math.max(piece.from, from);
    const b = Math.min(piece.to, to);
    found = pick(found, pieceRadius(piece, a), pieceRadius(piece, b));
    if (piece.kind === 'arc' && piece.centreX > a && piece.centreX < b)
      found = pick(found, pieceRadius(piece, piece.centreX));
  }
  return Number.isFinite(found) ? found : 0;
}

/** The generator over [from, to] only; pieces shorter than nothing are dropped. */
export function slice(generator: Generator, from: number, to: number): Generator {
  const pieces: Piece[] = [];
  for (const piece of generator) {
    if (piece.to <= from || piece.from >= to) continue;
    pieces.push(slicePiece(piece, from, to));
  }
  return pieces;
}

/** First and last station a generator covers. */
export function spanOf(generator: Generator): { from: number; to: number } {
  const first = generator[0];
  const last = generator[generator.length - 1];
  if (!first || !last) throw new Error('A generator needs at least one piece');
  return { from: first.from, to: last.to };
}

/** Every station where a piece begins or ends, ascending. */
export function breaks(generator: Generator): number[] {
  const stations = generator.map((piece) => piece.from);
  const last = generator[generator.length - 1];
  return last ? [...stations, last.to] : stations;
}

/** Neighbouring pieces of one curve joined; slivers under the station tolerance are closed up. */
export function joined(generator: Generator): Generator {
  const pieces: Piece[] = [];
  for (const piece of generator) {
    const before = pieces[pieces.length - 1];
    if (before && sameCurve(before, piece)) {
      pieces[pieces.length - 1] = join(before, piece);
      continue;
    }
    pieces.push(piece);
  }
  return pieces;
}

function join(p: Piece, q: Piece): Piece {
  if (p.kind === 'line' && q.kind === 'line')
    return { kind: 'line', from: p.from, to: q.to, start: p.start, end: q.end };
  return { ...p, to: q.to };
}

/** Stations inside [from, to] where r passes the level, steps included. */
export function levelStations(generator: Generator, level: number, from: number, to: number): number[] {
  const stations: number[] = [];
  for (const piece of slice(generator, from, to)) {
    stations.push(piece.from, ...levelRoots(piece, level));
  }
  return stations.filter((x) => x > from && x < to);
}

/** Spans of [from, to] where r exceeds the level by more than the station tolerance somewhere inside. */
export function spansAbove(
  generator: Generator,
  level: number,
  from: number,
  to: number,
): { from: number; to: number }[] {
  const stations = [from, ...levelStations(generator, level, from, to), to];
  const spans: { from: number; to: number }[] = [];
  for (let i = 0; i + 1 < stations.length; i += 1) {
    const a = stations[i] ?? from;
    const b = stations[i + 1] ?? to;
    if (b - a <= STATION_TOLERANCE) continue;
    const middle = (a + b) / 2;
    if (radiusAt(generator, middle) <= level + STATION_TOLERANCE / 10) continue;
    const before = spans[spans.length - 1];
    if (before && a - before.to <= STATION_TOLERANCE) before.to = b;
    else spans.push({ from: a, to: b });
  }
  return spans;
}

/** Turned end for end: x -> axis − x. */
export function mirrorGenerator(generator: Generator, axis: number): Generator {
  return [...generator].reverse().map((piece) => mirrorPiece(piece, axis));
}
