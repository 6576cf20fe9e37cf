import Module from 'manifold-3d';
import type { Manifold } from 'manifold-3d';
import { describe, expect, it } from 'vitest';
import type { Body, Generator } from '../../shared/part/body';
import { mirrorBody } from '../../shared/part/mirror';
import { metalInner, metalOuter } from '../../shared/part/metal';
import { radiusAt } from '../../shared/part/generator';
import { volume } from '../../shared/part/volume';
import { built, hexHandle, thread, threadedShaft } from '../unit/part/sample-parts';

// Source: a general-purpose geometry kernel (manifold-3d), which knows nothing of this code: a solid of
// revolution of 1024 facets cut by half-spaces. Its facets are scaled to the circle's area, so what is left is
// the chord of arcs along the axis and of flats across the facets: some 5e-6 of the volume.
const SEGMENTS = 1024;
const TOLERANCE = 2e-5;
/** A regular polygon of n corners on radius 1 has area (n/2) sin(2π/n); scaled to the circle's. */
const SCALE = Math.sqrt(Math.PI / ((SEGMENTS / 2) * Math.sin((2 * Math.PI) / SEGMENTS)));

const kernel = await Module();
kernel.setup();

function outlinePoints(generator: Generator): [number, number][] {
  const points: [number, number][] = [];
  for (const piece of generator) {
    const steps = piece.kind === 'arc' ? 160 : 1;
    for (let i = 0; i <= steps; i += 1) {
      const share = (1 - Math.cos((Math.PI * i) / steps)) / 2;
      const x = i === steps ? piece.to : piece.from + (piece.to - piece.from) * share;
      points.push([radiusAt([piece], x), x]);
    }
  }
  return points;
}

function revolved(generator: Generator, x0: number, x1: number): Manifold {
  const points = outlinePoints(generator).map(([r, x]): [number, number] => [r * SCALE, x]);
  return kernel.Manifold.revolve([[[0, x0], ...points, [0, x1]]], SEGMENTS);
}

function kernelVolume(body: Body): number {
  let solid = revolved(metalOuter(body), body.x0, body.x1);
  const hollow = metalInner(body).some((piece) => radiusAt([piece], piece.from) > 0);
  if (hollow) solid = solid.subtract(revolved(metalInner(body), body.x0, body.x1));
  for (const cut of body.cuts) {
    if (cut.kind !== 'flats') continue;
    for (let face = 0; face < cut.count; face += 1) {
      const angle = cut.phase + (2 * Math.PI * face) / cut.count;
      const block = kernel.Manifold.cube([1000, 1000, cut.to - cut.from], false)
        .translate([cut.distance, -500, cut.from])
        .rotate([0, 0, (angle * 180) / Math.PI]);
      solid = solid.subtract(block);
    }
  }
  return solid.volume();
}

const cylinder = (id: string, length: number, diameter: number) =>
  ({ form: 'cylinder', id, length, diameter }) as const;
const cone = (id: string, length: number, startDiameter: number, endDiameter: number) =>
  ({ form: 'cone', id, length, startDiameter, endDiameter }) as const;

const PARTS: Record<string, Body> = {
  'plain cylinder': built({ lengths: [cylinder('a', 40, 20)] }).body,
  'threaded shaft with chamfers': threadedShaft().body,
  'hexagon on round running out into a taper, crowned': hexHandle().body,
  'the same turned end for end': mirrorBody(hexHandle().body, 126),
  'hexagon with sharp corners under a chamfer': built({
    lengths: [cylinder('a', 15, 12), cylinder('hex', 14, 26)],
    chamfers: [{ id: 'c', on: 'hex', end: 'right', leg: 3, angle: Math.PI / 6 }],
    flats: [{ id: 'h', from: 15, length: 14, count: 6, acrossFlats: 22 }],
  }).body,
  'crown over a square that runs into it': built({
    lengths: [cylinder('a', 10, 14), cylinder('grip', 40, 20)],
    crowns: [{ id: 'crown', end: 'right', radius: 10 }],
    flats: [{ id: 'square', from: 10, length: 25, count: 4, acrossFlats: 16, phase: 0.3 }],
  }).body,
  'single flat on a taper': built({
    lengths: [cone('taper', 50, 30, 18)],
    flats: [{ id: 'flat', from: 0, length: 20, count: 1, acrossFlats: 27 }],
  }).body,
  'a pair of flats across five': built({
    lengths: [cylinder('a', 30, 25)],
    flats: [
      { id: 'pair', from: 5, length: 20, count: 2, acrossFlats: 20 },
      { id: 'five', from: 10, length: 20, count: 5, acrossFlats: 21, phase: 0.2 },
    ],
  }).body,
  'chamfered thread blank with a centre hole': built({
    lengths: [cylinder('t', 24, 16), cylinder('b', 20, 25), cone('c', 30, 25, 40)],
    chamfers: [
      { id: 'lead', on: 't', end: 'left', leg: 2 },
      { id: 'cc', on: 'c', end: 'right', leg: 1.5 },
    ],
    threads: [{ id: 'th', on: 't', spec: thread('M16x2-6g') }],
    centreHoles: [
      { id: 'ca', end: 'left', designation: 'A2.5' },
      { id: 'cb', end: 'right', designation: 'B4' },
    ],
  }).body,
};

describe('volume against a general geometry kernel', () => {
  it.each(Object.entries(PARTS))('%s', (_name, body) => {
    const measured = kernelVolume(body);
    expect(measured).toBeGreaterThan(0);
    expect(Math.abs(volume(body) - measured) / measured).toBeLessThan(TOLERANCE);
  });

  it('would see a hundredth of a millimetre on a diameter', () => {
    const body = built({ lengths: [cylinder('a', 40, 20)] }).body;
    const other = built({ lengths: [cylinder('a', 40, 20.01)] }).body;
    expect(Math.abs(volume(other) - kernelVolume(body)) / kernelVolume(body)).toBeGreaterThan(TOLERANCE);
  });
});
