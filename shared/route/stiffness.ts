import type { Body } from '../part/body';
import { radiusAt, smallestRadius } from '../part/generator';
import { flatsSpan } from '../part/flats';
import { LIMITS } from './rules';

const STATIONS = 24;

/** Smallest diameter of a body over [from, to], flats counted across them (mm). */
export function smallestDiameter(body: Body, from: number, to: number): number {
  const a = Math.max(from, body.x0);
  const b = Math.min(to, body.x1);
  let r = smallestRadius(body.outer, a, b);
  for (const cut of body.cuts) {
    if (cut.kind !== 'flats') continue;
    const span = flatsSpan(body, cut);
    if (span && span.from < b && span.to > a) r = Math.min(r, cut.distance);
  }
  return 2 * r;
}

/** Radius that carries the bending at x: the surface, held to a flat's distance. */
function carryingRadius(body: Body, x: number): number {
  let r = radiusAt(body.outer, x);
  for (const cut of body.cuts) {
    if (cut.kind === 'flats' && x >= cut.from && x <= cut.to) r = Math.min(r, cut.distance);
  }
  return r;
}

/**
 * Bend at the cut for each millimetre of radial depth (mm/mm): F/E · ∫ (xc − x)² / I dx from the grip's edge to the
 * far end of the cut, with nothing at the free end. Simpson's rule within each length of the outline.
 * Source: the cantilever of any handbook; the force is the named judgement figure.
 */
export function bendPerDepth(body: Body, gripEdge: number, cut: number): number {
  const from = Math.max(gripEdge, body.x0);
  const to = Math.min(cut, body.x1);
  if (to <= from) return 0;
  const breaks = [from, to, ...body.outer.map((piece) => piece.from)];
  for (const flats of body.cuts) if (flats.kind === 'flats') breaks.push(flats.from, flats.to);
  const stations = [...new Set(breaks.filter((x) => x >= from && x <= to))].sort((a, b) => a - b);
  let sum = 0;
  for (let i = 0; i + 1 < stations.length; i += 1) {
    const a = stations[i] ?? from;
    const b = stations[i + 1] ?? to;
    if (b - a < 1e-9) continue;
    const n = 2 * Math.max(1, Math.ceil((STATIONS * (b - a)) / (to - from) / 2));
    const h = (b - a) / n;
    for (let k = 0; k <= n; k += 1) {
      const x = k === 0 ? a + 1e-9 : k === n ? b - 1e-9 : a + k * h;
      const r = carryingRadius(body, x);
      const bore = radiusAt(body.inner, x);
      const inertia = Math.max(1e-9, (Math.PI * (r ** 4 - Math.min(bore, 0.95 * r) ** 4)) / 4);
      const weight = k === 0 || k === n ? 1 : k % 2 === 1 ? 4 : 2;
      sum += ((weight * h) / 3) * ((to - x) ** 2 / inertia);
    }
  }
  return (LIMITS.forcePerDepth.value / LIMITS.elasticModulus.value) * sum;
}
