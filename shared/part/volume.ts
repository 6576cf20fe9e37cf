import type { Body } from './body';
import { flatsOf, metalInner, metalOuter } from './metal';
import type { Part } from './part';
import { shellVolume } from './shell';

/** Volume of metal of a body over [from, to] (mm³). */
export function volumeBetween(body: Body, from: number, to: number): number {
  const a = Math.max(from, body.x0);
  const b = Math.min(to, body.x1);
  if (b <= a) return 0;
  return shellVolume(
    { outer: metalOuter(body), outerFlats: flatsOf(body), inner: metalInner(body), innerFlats: [] },
    a,
    b,
  );
}

/** Volume of metal of a whole body (mm³): exact but where a flat runs out over a slope, there to some 1e-12. */
export function volume(body: Body): number {
  return volumeBetween(body, body.x0, body.x1);
}

/** Mass of the part (kg) at a density in kg/m³. */
export function partMass(part: Part, density: number): number {
  return volume(part.body) * 1e-9 * density;
}
