import type { Box } from './box';

/** A straight stroke on paper. */
export interface Segment {
  x1: number;
  y1: number;
  x2: number;
  y2: number;
}

/** True where the segment touches or enters the box. Clips the segment by each side in turn. */
export function segmentMeetsBox(s: Segment, box: Box): boolean {
  let t0 = 0;
  let t1 = 1;
  const dx = s.x2 - s.x1;
  const dy = s.y2 - s.y1;
  const sides: readonly (readonly [number, number])[] = [
    [-dx, s.x1 - box[0]],
    [dx, box[2] - s.x1],
    [-dy, s.y1 - box[1]],
    [dy, box[3] - s.y1],
  ];
  for (const [p, q] of sides) {
    if (p === 0) {
      if (q <= 0) return false;
      continue;
    }
    const t = q / p;
    if (p < 0) t0 = Math.max(t0, t);
    else t1 = Math.min(t1, t);
    if (t0 >= t1) return false;
  }
  return true;
}

/** The part [t0, t1] of the segment inside the box, or null. */
export function segmentWithinBox(s: Segment, box: Box): readonly [number, number] | null {
  let t0 = 0;
  let t1 = 1;
  const dx = s.x2 - s.x1;
  const dy = s.y2 - s.y1;
  for (const [p, q] of [
    [-dx, s.x1 - box[0]],
    [dx, box[2] - s.x1],
    [-dy, s.y1 - box[1]],
    [dy, box[3] - s.y1],
  ] as const) {
    if (p === 0) {
      if (q <= 0) return null;
      continue;
    }
    const t = q / p;
    if (p < 0) t0 = Math.max(t0, t);
    else t1 = Math.min(t1, t);
    if (t0 >= t1) return null;
  }
  return [t0, t1];
}

/** True where the two cross at a point inside both (their ends pulled back by `trim` mm). */
export function segmentsCross(a: Segment, b: Segment, trim = 0.05): boolean {
  const ax = a.x2 - a.x1;
  const ay = a.y2 - a.y1;
  const bx = b.x2 - b.x1;
  const by = b.y2 - b.y1;
  const den = ax * by - ay * bx;
  if (Math.abs(den) < 1e-9) return false;
  const cx = b.x1 - a.x1;
  const cy = b.y1 - a.y1;
  const t = (cx * by - cy * bx) / den;
  const u = (cx * ay - cy * ax) / den;
  const ta = trim / Math.max(Math.hypot(ax, ay), 1e-9);
  const tb = trim / Math.max(Math.hypot(bx, by), 1e-9);
  return t > ta && t < 1 - ta && u > tb && u < 1 - tb;
}

/** Length over which two nearly parallel segments run side by side closer than `apart` mm. */
export function sideBySide(a: Segment, b: Segment, apart: number): number {
  const ax = a.x2 - a.x1;
  const ay = a.y2 - a.y1;
  const length = Math.hypot(ax, ay);
  if (length < 1e-9) return 0;
  const ux = ax / length;
  const uy = ay / length;
  const off1 = (b.x1 - a.x1) * -uy + (b.y1 - a.y1) * ux;
  const off2 = (b.x2 - a.x1) * -uy + (b.y2 - a.y1) * ux;
  if (Math.abs(off1) > apart || Math.abs(off2) > apart) return 0;
  const t1 = (b.x1 - a.x1) * ux + (b.y1 - a.y1) * uy;
  const t2 = (b.x2 - a.x1) * ux + (b.y2 - a.y1) * uy;
  return Math.max(0, Math.min(length, Math.max(t1, t2)) - Math.max(0, Math.min(t1, t2)));
}

/** Distance from a point to a segment. */
export function distanceToSegment(x: number, y: number, s: Segment): number {
  const dx = s.x2 - s.x1;
  const dy = s.y2 - s.y1;
  const square = dx * dx + dy * dy;
  const t = square === 0 ? 0 : Math.min(1, Math.max(0, ((x - s.x1) * dx + (y - s.y1) * dy) / square));
  return Math.hypot(x - s.x1 - t * dx, y - s.y1 - t * dy);
}
