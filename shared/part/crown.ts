import type { ArcPiece, Generator } from './body';
import { minOuter } from './envelope';
import { mirrorGenerator, radiusAt, spanOf } from './generator';
import { crossings, pieceRadius } from './piece';
import type { CrownInput } from './part-input';
import type { InputProblem } from './input-problem';
import { millimetresUp } from './input-problem';

export interface PlacedCrown {
  input: CrownInput;
  from: number;
  to: number;
  envelope: Generator;
}

/**
 * A spherical crown whose apex is the end face, followed from the apex to where it first meets the outline.
 * A radius too small to meet it at all is a problem that names the least allowed.
 */
export function placeCrown(
  input: CrownInput,
  outline: Generator,
): { crown: PlacedCrown } | { problem: InputProblem } {
  const { from: first, to: last } = spanOf(outline);
  const length = first + last;
  const rightward = input.end === 'right' ? outline : mirrorGenerator(outline, length);
  const meets = input.radius > 0 ? firstMeeting(rightward, input.radius) : null;
  if (meets === null) {
    const least = leastRadius(rightward);
    return {
      problem: {
        input: input.id,
        message: `A crown of this radius never meets the outline; it must be at least ${millimetresUp(least)}.`,
      },
    };
  }
  const arc: ArcPiece = { ...sphere(rightward, input.radius), from: meets };
  const envelope = input.end === 'right' ? [arc] : mirrorGenerator([arc], length);
  const span = spanOf(envelope);
  return { crown: { input, from: span.from, to: span.to, envelope } };
}

export function cutCrown(outline: Generator, crown: PlacedCrown): Generator {
  return minOuter(outline, crown.envelope);
}

function sphere(outline: Generator, radius: number): ArcPiece {
  const { from, to } = spanOf(outline);
  const centreX = to - radius;
  return { kind: 'arc', from: Math.max(from, centreX), to, centreX, centreR: 0, radius, sign: 1 };
}

/** The station nearest the right end where the sphere reaches the outline; null where it never does. */
function firstMeeting(outline: Generator, radius: number): number | null {
  const arc = sphere(outline, radius);
  for (const piece of [...outline].reverse()) {
    if (piece.to <= arc.from) break;
    // A step down to the sphere's left: it meets the shoulder's own face.
    if (piece.to < arc.to && pieceRadius(arc, piece.to) >= pieceRadius(piece, piece.to)) return piece.to;
    const points = crossings(piece, arc);
    const nearest = points[points.length - 1];
    if (nearest !== undefined) return nearest;
    const left = Math.max(piece.from, arc.from);
    if (pieceRadius(arc, left) >= pieceRadius(piece, left) - 1e-9 && left > spanOf(outline).from) return left;
  }
  return null;
}

/**
 * Least radius whose sphere reaches the outline: at a distance u from the end a sphere of (r² + u²)/2u passes
 * through it, and its middle must not lie nearer the end than u.
 */
function leastRadius(outline: Generator): number {
  const { from, to } = spanOf(outline);
  const needed = (u: number): number => {
    const r = radiusAt(outline, to - u, 'right');
    return Math.max(u, (r * r + u * u) / (2 * u));
  };
  const span = to - from;
  const steps = 2000;
  let best = span;
  for (let i = 1; i < steps; i += 1) {
    const u = (span * i) / steps;
    if (needed(u) < needed(best)) best = u;
  }
  let low = Math.max(span / steps / 2, best - span / steps);
  let high = Math.min(span, best + span / steps);
  for (let i = 0; i < 80; i += 1) {
    const p = low + (high - low) / 3;
    const q = high - (high - low) / 3;
    if (needed(p) < needed(q)) high = q;
    else low = p;
  }
  return needed((low + high) / 2);
}
