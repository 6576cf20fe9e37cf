import type { Generator, Piece } from './body';
import { breaks, joined, pieceAt, spanOf } from './generator';
import { crossings, pieceRadius, slicePiece } from './piece';

/** r lowered to the envelope over the envelope's span; where they are equal the envelope's piece is kept. */
export function minOuter(outer: Generator, envelope: Generator): Generator {
  return combine(outer, envelope, (own, limit) => limit <= own);
}

/** b raised to the envelope over the envelope's span; where they are equal the envelope's piece is kept. */
export function maxInner(inner: Generator, envelope: Generator): Generator {
  return combine(inner, envelope, (own, limit) => limit >= own);
}

function combine(
  base: Generator,
  envelope: Generator,
  takes: (own: number, limit: number) => boolean,
): Generator {
  if (base.length === 0 || envelope.length === 0) return base;
  const { from, to } = spanOf(base);
  const stations = sorted([...breaks(base), ...breaks(envelope)].filter((x) => x >= from && x <= to));
  const pieces: Piece[] = [];
  for (let i = 0; i + 1 < stations.length; i += 1) {
    const a = stations[i] ?? from;
    const b = stations[i + 1] ?? to;
    const middle = (a + b) / 2;
    const own = pieceAt(base, middle);
    const limit = pieceAt(envelope, middle);
    if (!own) continue;
    if (!limit) {
      pieces.push(over(own, a, b));
      continue;
    }
    const cuts = [a, ...crossings(slicePiece(own, a, b), slicePiece(limit, a, b)), b];
    for (let j = 0; j + 1 < cuts.length; j += 1) {
      const p = cuts[j] ?? a;
      const q = cuts[j + 1] ?? b;
      if (q <= p) continue;
      const m = (p + q) / 2;
      const chosen = takes(pieceRadius(own, m), pieceRadius(limit, m)) ? limit : own;
      pieces.push(over(chosen, p, q));
    }
  }
  return joined(pieces);
}

/** The piece over exactly [a, b], so that neighbours meet without a gap. */
function over(piece: Piece, a: number, b: number): Piece {
  return { ...slicePiece(piece, a, b), from: a, to: b };
}

/** Ascending, each once. Stations nearer than 1e-9 mm are arithmetic noise of one another. */
function sorted(stations: number[]): number[] {
  const ordered = [...stations].sort((a, b) => a - b);
  const kept: number[] = [];
  for (const x of ordered) {
    const before = kept[kept.length - 1];
    if (before === undefined || x - before > 1e-9) kept.push(x);
  }
  const last = ordered[ordered.length - 1];
  if (last !== undefined && kept.length > 0)
    kept[kept.length - 1] = Math.max(last, kept[kept.length - 1] ?? last);
  return kept;
}
