import type { ArcPiece, Piece } from './body';
import { STATION_TOLERANCE } from './body';

/** Radius of one piece at x (mm); x is held to where the piece's curve is defined. */
export function pieceRadius(piece: Piece, x: number): number {
  if (piece.kind === 'line') {
    const span = piece.to - piece.from;
    if (piece.start === piece.end || span <= 0) return piece.start;
    if (x === piece.to) return piece.end;
    return piece.start + ((piece.end - piece.start) * (x - piece.from)) / span;
  }
  const u = x - piece.centreX;
  return piece.centreR + piece.sign * Math.sqrt(Math.max(0, (piece.radius - u) * (piece.radius + u)));
}

/** The same curve over [from, to] within the piece. */
export function slicePiece(piece: Piece, from: number, to: number): Piece {
  if (from <= piece.from && to >= piece.to) return piece;
  const a = Math.max(from, piece.from);
  const b = Math.min(to, piece.to);
  if (piece.kind === 'arc') return { ...piece, from: a, to: b };
  return { kind: 'line', from: a, to: b, start: pieceRadius(piece, a), end: pieceRadius(piece, b) };
}

/** The piece with its curve moved over to [from, to] by x -> axis − x (turned end for end). */
export function mirrorPiece(piece: Piece, axis: number): Piece {
  const from = axis - piece.to;
  const to = axis - piece.from;
  if (piece.kind === 'line') return { kind: 'line', from, to, start: piece.end, end: piece.start };
  return { ...piece, from, to, centreX: axis - piece.centreX };
}

/** Integral of r² over [a, b] within the piece (mm³), in closed form. */
export function squareIntegral(piece: Piece, a: number, b: number): number {
  if (piece.kind === 'line') {
    const p = pieceRadius(piece, a);
    const q = pieceRadius(piece, b);
    return ((b - a) * (p * p + p * q + q * q)) / 3;
  }
  return arcSquare(piece, b) - arcSquare(piece, a);
}

function arcSquare(piece: ArcPiece, x: number): number {
  const { radius: R, centreR: c } = piece;
  const u = Math.max(-R, Math.min(R, x - piece.centreX));
  const root = Math.sqrt(Math.max(0, (R - u) * (R + u)));
  return (c * c + R * R) * u - (u * u * u) / 3 + piece.sign * c * (u * root + R * R * Math.asin(u / R));
}

/** Stations strictly inside the piece where r = level. */
export function levelRoots(piece: Piece, level: number): number[] {
  const inside = (x: number): boolean => x > piece.from + 1e-12 && x < piece.to - 1e-12;
  if (piece.kind === 'line') {
    const rise = piece.end - piece.start;
    if (rise === 0) return [];
    const x = piece.from + ((level - piece.start) * (piece.to - piece.from)) / rise;
    return inside(x) ? [x] : [];
  }
  const height = (level - piece.centreR) * piece.sign;
  if (height < 0 || height > piece.radius) return [];
  const u = Math.sqrt((piece.radius - height) * (piece.radius + height));
  return [piece.centreX - u, piece.centreX + u].filter(inside);
}

/** Stations strictly inside the common span of two pieces where their radii are equal. */
export function crossings(p: Piece, q: Piece): number[] {
  const from = Math.max(p.from, q.from);
  const to = Math.min(p.to, q.to);
  const candidates = rawCrossings(p, q);
  return candidates
    .filter((x) => x > from && x < to && Math.abs(pieceRadius(p, x) - pieceRadius(q, x)) < STATION_TOLERANCE)
    .sort((a, b) => a - b);
}

function rawCrossings(p: Piece, q: Piece): number[] {
  if (p.kind === 'line' && q.kind === 'line') {
    const sp = (p.end - p.start) / (p.to - p.from);
    const sq = (q.end - q.start) / (q.to - q.from);
    if (sp === sq) return [];
    return [(q.start - sq * q.from - (p.start - sp * p.from)) / (sp - sq)];
  }
  if (p.kind === 'arc' && q.kind === 'arc') return circlesCross(p, q);
  const line = p.kind === 'line' ? p : q;
  const arc = p.kind === 'arc' ? p : q;
  if (line.kind !== 'line' || arc.kind !== 'arc') return [];
  const slope = (line.end - line.start) / (line.to - line.from);
  // In u = x − centreX the line is height k + slope·u over the arc's centre.
  const k = line.start + slope * (arc.centreX - line.from) - arc.centreR;
  const a = 1 + slope * slope;
  const discriminant = slope * slope * k * k - a * (k * k - arc.radius * arc.radius);
  if (discriminant < 0) return [];
  const root = Math.sqrt(discriminant);
  return [arc.centreX + (-slope * k - root) / a, arc.centreX + (-slope * k + root) / a];
}

function circlesCross(p: ArcPiece, q: ArcPiece): number[] {
  const dx = q.centreX - p.centreX;
  const dr = q.centreR - p.centreR;
  const distance = Math.hypot(dx, dr);
  if (distance === 0) return [];
  const along = (distance * distance + p.radius * p.radius - q.radius * q.radius) / (2 * distance);
  const height = Math.sqrt(Math.max(0, p.radius * p.radius - along * along));
  if (Math.abs(along) > p.radius) return [];
  const middle = p.centreX + (dx * along) / distance;
  const aside = (dr * height) / distance;
  return [middle - aside, middle + aside];
}

/** True where the two pieces are one and the same curve. */
export function sameCurve(p: Piece, q: Piece): boolean {
  if (p.kind === 'arc' && q.kind === 'arc')
    return p.sign === q.sign && p.centreX === q.centreX && p.centreR === q.centreR && p.radius === q.radius;
  if (p.kind === 'line' && q.kind === 'line') {
    if (p.start === p.end && q.start === q.end) return p.start === q.start;
    const slopeP = (p.end - p.start) / (p.to - p.from);
    const slopeQ = (q.end - q.start) / (q.to - q.from);
    return (
      Math.abs(slopeP - slopeQ) < 1e-12 && Math.abs(p.start + slopeP * (q.from - p.from) - q.start) < 1e-12
    );
  }
  return false;
}
