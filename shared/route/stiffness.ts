import type { Body } from '../part/body';
import { breaks, radiusAt, smallestRadius } from '../part/generator';
import { flatsSpan } from '../part/flats';
import { integrate } from '../part/quadrature';
import { LIMITS } from './rules';

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

/** Second moment of area of a ring (mm⁴); a bore is never taken for more than nearly all of it. */
function inertia(r: number, bore: number): number {
  return Math.max(1e-9, (Math.PI * (r ** 4 - Math.min(bore, 0.95 * r) ** 4)) / 4);
}

/** True where neither surface, flats nor bore change between two stations with no break between them. */
function isEven(
  body: Body,
  a: number,
  b: number,
  r: number,
  carrying: (body: Body, x: number) => number,
): boolean {
  const near = (b - a) * 1e-3;
  const same = (x: number): boolean => Math.abs(carrying(body, x) - r) < 1e-9;
  const bore = radiusAt(body.inner, (a + b) / 2);
  const solid = (x: number): boolean => Math.abs(radiusAt(body.inner, x) - bore) < 1e-9;
  return same(a + near) && same(b - near) && solid(a + near) && solid(b - near);
}

/**
 * Bend at the cut for each millimetre of radial depth (mm/mm): F/E · ∫ (xc − x)² / I dx from the grip's edge to the
 * far end of the cut, with nothing at the free end; integrated within each length of the outline.
 * Source: the cantilever of any handbook; the force is the named judgement figure.
 */
export function bendPerDepth(body: Body, gripEdge: number, cut: number): number {
  const from = Math.max(gripEdge, body.x0);
  const to = Math.min(cut, body.x1);
  if (to <= from) return 0;
  const marks = [from, to, ...breaks(body.outer), ...breaks(body.inner)];
  for (const flats of body.cuts) if (flats.kind === 'flats') marks.push(flats.from, flats.to);
  const stations = marks.filter((x) => x >= from && x <= to).sort((a, b) => a - b);
  const compliance = (x: number): number => {
    const r = carryingRadius(body, x);
    return (to - x) ** 2 / inertia(r, radiusAt(body.inner, x));
  };
  let sum = 0;
  for (let i = 0; i + 1 < stations.length; i += 1) {
    const a = stations[i] ?? from;
    const b = stations[i + 1] ?? to;
    if (b - a < 1e-9) continue;
    const middle = (a + b) / 2;
    const r = carryingRadius(body, middle);
    // A length of one radius has a closed form; only slopes and arcs are integrated.
    if (isEven(body, a, b, r, carryingRadius))
      sum += ((to - a) ** 3 - (to - b) ** 3) / 3 / inertia(r, radiusAt(body.inner, middle));
    else sum += integrate(compliance, a, b);
  }
  return (LIMITS.forcePerDepth.value / LIMITS.elasticModulus.value) * sum;
}
