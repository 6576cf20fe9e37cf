import { describe, expect, it } from 'vitest';
import { buildPart } from '../../../shared/part/build';
import { halfWidth } from '../../../shared/part/flats';
import { radiusAt } from '../../../shared/part/generator';
import { partMass, volume, volumeBetween } from '../../../shared/part/volume';
import type { PartInput } from '../../../shared/part/part-input';
import { built, hexHandle, input, thread, threadedShaft } from './sample-parts';

function problemsOf(given: Partial<PartInput>): { input: string; message: string }[] {
  const result = buildPart(input(given));
  return 'problems' in result ? result.problems : [];
}
const bar = (length: number, diameter: number) =>
  ({ form: 'cylinder', id: 'bar', length, diameter }) as const;

describe('a part from its inputs', () => {
  it('measures plain solids by their formulas', () => {
    const cone = built({
      lengths: [{ form: 'cone', id: 'c', length: 30, startDiameter: 20, endDiameter: 10 }],
    });
    expect(volume(cone.body)).toBeCloseTo((Math.PI * 30 * (100 + 50 + 25)) / 3, 8);
    const ball = built({ lengths: [bar(10, 20)], crowns: [{ id: 'k', end: 'right', radius: 10.0001 }] });
    expect(volume(ball.body) / ((2 / 3) * Math.PI * 1000)).toBeCloseTo(1, 4);
    const hexagon = built({
      lengths: [bar(10, 30)],
      flats: [{ id: 'h', from: 0, length: 10, count: 6, acrossFlats: 20 }],
    });
    expect(volume(hexagon.body)).toBeCloseTo((Math.sqrt(3) / 2) * 400 * 10, 8);
  });

  it('weighs a bar as density says (π/4 d² L ρ)', () => {
    expect(partMass(built({ lengths: [bar(1000, 25)] }), 7850)).toBeCloseTo(3.8534, 4);
  });

  it('counts an external thread as its pitch cylinder', () => {
    const part = threadedShaft();
    const pitch = thread('M12').pitchDiameter;
    expect(volumeBetween(part.body, 60, 70)).toBeCloseTo((Math.PI / 4) * pitch ** 2 * 10, 8);
    expect(part.maxDiameter).toBe(24);
  });

  it('names its stations in order, each once', () => {
    expect(threadedShaft().stations.map(({ id, x }) => `${id} ${x}`)).toEqual([
      'left-face 0',
      'head-chamfer.edge 1',
      'head.end 20',
      'seat.end 50',
      'end-thread.end 54',
      'end-chamfer.edge 70.25',
      'right-face 72',
    ]);
  });

  it('runs flats out into a taper to where the round meets them', () => {
    const part = hexHandle();
    const flats = part.features.find((feature) => feature.kind === 'flats');
    expect(flats).toMatchObject({ from: 26, to: 66, roundedCorners: true, runOutFrom: 26 });
    // The taper loses 3 mm of radius in 60: 1.25 mm down is 25 along.
    expect(flats?.kind === 'flats' && flats.runOutTo).toBeCloseTo(66 + 25, 9);
    const [cut] = part.body.cuts;
    if (cut?.kind !== 'flats') throw new Error('no flats');
    expect(halfWidth(part.body, cut, 40)).toBeCloseTo(Math.sqrt(100 - 8.75 ** 2), 9);
    expect(halfWidth(part.body, cut, 91)).toBeCloseTo(0, 6);
  });

  it('stops flats at a wall within a length and at a step up', () => {
    const wall = built({
      lengths: [bar(40, 20)],
      flats: [{ id: 'f', from: 0, length: 15, count: 2, acrossFlats: 16 }],
    });
    expect(wall.body.cuts[0]).toMatchObject({ from: 0, to: 15 });
    const step = built({
      lengths: [bar(20, 20), { form: 'cylinder', id: 'b', length: 10, diameter: 30 }],
      flats: [{ id: 'f', from: 0, length: 20, count: 2, acrossFlats: 16 }],
    });
    expect(step.body.cuts[0]).toMatchObject({ from: 0, to: 20 });
  });

  it('meets a crown with the taper where both have one radius', () => {
    const crown = hexHandle().features.find((feature) => feature.kind === 'crown');
    if (crown?.kind !== 'crown') throw new Error('no crown');
    const x = crown.from;
    expect(10 - (3 * (x - 66)) / 60).toBeCloseTo(Math.sqrt(144 - (x - 114) ** 2), 9);
    expect(radiusAt(hexHandle().body.outer, 126, 'left')).toBeCloseTo(0, 6);
  });

  it('starts a chamfer on a taper at its leg from the face', () => {
    const part = built({
      lengths: [{ form: 'cone', id: 'c', length: 30, startDiameter: 20, endDiameter: 14 }],
      chamfers: [{ id: 'ch', on: 'c', end: 'right', leg: 1 }],
    });
    expect(radiusAt(part.body.outer, 29, 'left')).toBeCloseTo(7.1, 9);
    expect(radiusAt(part.body.outer, 30, 'left')).toBeCloseTo(6.1, 9);
  });

  it('cuts centre holes at their nominal form', () => {
    const part = built({
      lengths: [bar(40, 20)],
      centreHoles: [{ id: 'c', end: 'right', designation: 'A2.5' }],
    });
    expect(radiusAt(part.body.inner, 40, 'left')).toBeCloseTo(5.3 / 2, 9);
    const seat = (5.3 - 2.5) / 2 / Math.tan(Math.PI / 6);
    expect(radiusAt(part.body.inner, 40 - seat - 1, 'left')).toBeCloseTo(1.25, 9);
    expect(radiusAt(part.body.inner, 40 - seat - 2.3, 'left')).toBe(0);
  });
});

describe('what cannot be', () => {
  const refused: [string, Partial<PartInput>, string, RegExp][] = [
    [
      'a crown too small for its bar',
      { lengths: [bar(40, 20)], crowns: [{ id: 'k', end: 'right', radius: 8 }] },
      'k',
      /at least 10 mm/,
    ],
    [
      'a chamfer longer than its length',
      { lengths: [bar(2, 20)], chamfers: [{ id: 'c', on: 'bar', end: 'left', leg: 3 }] },
      'c',
      /at most 2 mm/,
    ],
    [
      'a chamfer past the axis',
      { lengths: [bar(40, 4)], chamfers: [{ id: 'c', on: 'bar', end: 'left', leg: 3 }] },
      'c',
      /at most 2 mm/,
    ],
    [
      'chamfers that overlap',
      {
        lengths: [bar(4, 20)],
        chamfers: [
          { id: 'c', on: 'bar', end: 'left', leg: 2.5 },
          { id: 'd', on: 'bar', end: 'right', leg: 2.5 },
        ],
      },
      'd',
      /at most 1.5 mm/,
    ],
    [
      'flats that touch nothing',
      { lengths: [bar(40, 20)], flats: [{ id: 'f', from: 0, length: 9, count: 6, acrossFlats: 20 }] },
      'f',
      /less than/,
    ],
    [
      'a flat past the axis',
      { lengths: [bar(40, 20)], flats: [{ id: 'f', from: 0, length: 9, count: 1, acrossFlats: 9 }] },
      'f',
      /more than 10 mm/,
    ],
    [
      'a thread on another diameter',
      { lengths: [bar(40, 20)], threads: [{ id: 't', on: 'bar', spec: thread('M10') }] },
      't',
      /10 mm, not 20 mm/,
    ],
    ['a length of nothing', { lengths: [bar(0, 20)] }, 'bar', /more than 0/],
    ['not a number', { lengths: [bar(Number.NaN, 20)] }, 'bar', /more than 0/],
    ['no length at all', {}, 'lengths', /at least one/],
    [
      'a centre larger than its face',
      { lengths: [bar(40, 5)], centreHoles: [{ id: 'h', end: 'left', designation: 'A2.5' }] },
      'h',
      /only 5 mm/,
    ],
  ];
  it.each(refused)('%s', (_name, given, id, sentence) => {
    const problems = problemsOf(given);
    expect(problems.map((problem) => problem.input)).toContain(id);
    expect(problems.find((problem) => problem.input === id)?.message).toMatch(sentence);
  });

  it('names a least crown that is itself accepted on a taper', () => {
    const lengths = [{ form: 'cone', id: 'c', length: 60, startDiameter: 20, endDiameter: 14 }] as const;
    const message = problemsOf({ lengths, crowns: [{ id: 'k', end: 'right', radius: 7 }] })[0]?.message ?? '';
    const least = Number(/at least ([\d.]+) mm/.exec(message)?.[1]);
    const angle = Math.atan(3 / 60);
    expect(least).toBeCloseTo((7 * Math.cos(angle)) / (1 - Math.sin(angle)), 2);
    expect(problemsOf({ lengths, crowns: [{ id: 'k', end: 'right', radius: least }] })).toEqual([]);
    expect(problemsOf({ lengths, crowns: [{ id: 'k', end: 'right', radius: least - 0.002 }] })).toHaveLength(
      1,
    );
  });
});
