import { describe, expect, it } from 'vitest';
import { exampleRegister } from '../../shared/route/example-register';
import { planRoute } from '../../shared/route/plan';
import { dividingTurns, nearestSpeed } from '../../shared/route/shop';
import { simulate } from '../../shared/simulate/simulate';
import { acrossFlatsFromDepth, depthForSharpCorners } from '../../shared/standards/hexagons';
import { spindleSpeed } from '../../shared/standards/speeds';
import type { Operation } from '../../shared/route/route';
import { plannedHandle } from '../unit/route/planned';

/** Arithmetic of practice. Source where none is named: common practice; the formulas are exact. */
describe('six flats on 3/4 in round', () => {
  const inch = 25.4;

  it('milled 0.040 in deep leave 0.670 in across flats', () => {
    expect(acrossFlatsFromDepth(0.75 * inch, 0.04 * inch)).toBeCloseTo(0.67 * inch, 9);
  });

  it('need 0.0502 in for sharp corners', () => {
    expect(depthForSharpCorners(0.75 * inch, 6) / inch).toBeCloseTo(0.0502, 4);
  });

  it('are planned at that depth, with rounded corners said, before the taper they run into', () => {
    const { route, part } = plannedHandle({
      bar: 0.75 * inch,
      acrossFlats: 0.67 * inch,
      taperEnd: 0.5 * inch,
      taperLength: 89,
    });
    const mill = route.operations.find((o) => o.method === 'mill-flat');
    expect(mill?.depth).toBeCloseTo(0.04 * inch, 9);
    expect(mill?.faces).toBe(6);
    expect(mill?.notes?.join(' ')).toMatch(/corners stay round/);
    const taper = route.operations.find((o) => o.method === 'taper-turn');
    expect(taper?.number).toBeGreaterThan(mill?.number ?? Infinity);
    expect(taper?.after).toContainEqual({ operation: mill?.number, rule: 'flats-before-taper' });
    // Milled past their span: the taper trims their ends.
    const flats = part.features.find((f) => f.kind === 'flats');
    const cut = mill?.cut?.kind === 'cut' ? mill.cut.cut : undefined;
    if (flats?.kind !== 'flats' || cut?.kind !== 'flats') throw new Error('no flats');
    expect(cut.to).toBeGreaterThan(flats.runOutTo);
    expect(simulate(route, part)).toEqual([]);
  });
});

describe('a taper on the top slide', () => {
  const taperOf = (operations: readonly Operation[]): Operation => {
    const found = operations.find((o) => o.method === 'taper-turn');
    if (!found) throw new Error('no taper');
    return found;
  };

  it('is set to half the included angle: 1° half for 2° between the sides', () => {
    const length = 60;
    const end = 25 - 2 * length * Math.tan(Math.PI / 180);
    const taper = taperOf(plannedHandle({ bar: 25, taperEnd: end, taperLength: length }).route.operations);
    expect(taper.halfAngle).toBeCloseTo(1, 7);
    expect(taper.slantLength).toBeCloseTo(length / Math.cos(Math.PI / 180), 7);
  });

  it('takes one setting while the slide reaches, a second when it is longer than the travel', () => {
    const short = plannedHandle({ bar: 25, taperEnd: 16, taperLength: 60 });
    const long = plannedHandle({ bar: 25, taperEnd: 16, taperLength: 130 });
    const travel =
      exampleRegister.lathes.find((l) => l.id === taperOf(long.route.operations).machine)?.slideTravel ?? 0;
    expect(travel).toBe(90);
    expect(taperOf(short.route.operations).settings).toBe(1);
    // ceil((slant + run-off − overlap) / (travel − overlap)) with 3 mm of overlap
    expect(taperOf(long.route.operations).settings).toBe(2);
    expect(taperOf(long.route.operations).notes?.join(' ')).toMatch(
      /Setting 2: carriage on by .* cross slide out by/,
    );
    expect(long.capacity.verdict).toBe('can');
  });
});

describe('support', () => {
  it('a shaft of three diameters stands alone; a longer one gets a centre, drilled before it is leant on and cut away', () => {
    const short = plannedHandle({
      rows: [
        { diameter: 20, length: 40 },
        { diameter: 18, length: 10 },
      ],
    });
    const long = plannedHandle({
      rows: [
        { diameter: 20, length: 120 },
        { diameter: 18, length: 10 },
      ],
    });
    expect(short.route.setups.some((s) => s.support)).toBe(false);
    expect(long.route.setups.some((s) => s.support === 'centre')).toBe(true);
    const centre = long.route.operations.find((o) => o.method === 'centre-drill');
    const first = long.route.operations.find((o) => o.method === 'rough-turn' || o.method === 'turn');
    expect(centre?.number).toBeLessThan(first?.number ?? 0);
    const trim = long.route.operations.find((o) => o.reasons.includes('support-before-trim'));
    expect(trim?.cut).toMatchObject({ kind: 'trim' });
    expect(long.route.stages.at(-1)?.body.inner.every((p) => p.kind === 'line' && p.start === 0)).toBe(true);
  });
});

describe('dividing head of 40 to 1', () => {
  const plates = exampleRegister.dividingHeads[0]?.plates ?? [];
  it('turns 40/6 = 6 2/3 for six faces: 10 holes of 15, which is 12 of 18', () => {
    expect(dividingTurns(40, plates, 6)).toEqual({ turns: 6, holes: 10, circle: 15 });
    expect(10 / 15).toBeCloseTo(12 / 18, 12);
  });
  it('turns whole for four, and says when no plate divides', () => {
    expect(dividingTurns(40, plates, 4)).toEqual({ turns: 10, holes: 0, circle: 0 });
    expect(dividingTurns(40, plates, 7)).toEqual({ turns: 5, holes: 15, circle: 21 });
    expect(dividingTurns(40, [[15, 18]], 7)).toBeNull();
  });
});

describe('speeds', () => {
  it('rpm = 1000 v / (π d), and the machine’s nearest not above it', () => {
    expect(spindleSpeed(30, 25)).toBeCloseTo(381.97, 2);
    expect(nearestSpeed([60, 95, 150, 235, 370, 580], 381.97)).toBe(370);
    expect(nearestSpeed([60, 95], 30)).toBe(60);
  });
  it('no operation turns faster than its surface speed allows nor than the machine goes', () => {
    const { route } = plannedHandle({ bar: 25, acrossFlats: 22, taperEnd: 16, taperLength: 95 });
    for (const o of route.operations) {
      const machine = [...exampleRegister.lathes, ...exampleRegister.mills].find((m) => m.id === o.machine);
      if (o.speed > 0) expect(machine?.speeds).toContain(o.speed);
    }
  });
});

describe('threads', () => {
  it('the blank for an M10 die lies between the 6g limits of the major diameter, 9.968 and 9.732 (ISO 965-2)', () => {
    const { route } = plannedHandle({ bar: 25, taperEnd: 16, taperLength: 95 });
    const turned = route.operations.find((o) => o.blankDiameter !== undefined);
    expect(turned?.blankDiameter).toBeLessThan(9.968);
    expect(turned?.blankDiameter).toBeGreaterThan(9.732);
    expect(turned?.target[0]).toMatchObject({ upperLimit: 9.968, lowerLimit: 9.732 });
    // The metal stays nominal: what the die removes is the ring down to the pitch cylinder.
    const die = route.operations.find((o) => o.method === 'thread-die');
    expect(die?.removes).toBeGreaterThan(0);
  });
});

describe('holding', () => {
  it('a short shaft stays on its bar until all else is done', () => {
    const { route } = plannedHandle({
      rows: [
        { diameter: 24, length: 6 },
        { diameter: 16, length: 30 },
      ],
    });
    const parting = route.operations.findIndex((o) => o.method === 'part-off');
    const cuts = route.operations.slice(parting + 1).filter((o) => o.cut);
    expect(parting).toBeGreaterThan(0);
    expect(cuts).toEqual([]);
  });
  it('a part that cannot be had is told in words', () => {
    const { answer } = plannedHandle(
      {
        rows: [
          { diameter: 60, length: 20 },
          { diameter: 12, length: 20, thread: 'M12' },
          { diameter: 60, length: 20 },
        ],
      },
      undefined,
      true,
    );
    expect(answer.route).toBeNull();
    expect(answer.capacity.verdict).toBe('cannot');
    expect(answer.capacity.needs.map((n) => n.why).join(' ')).toMatch(/behind a larger diameter/);
  });
  it('plans again in the same words', () => {
    const { part, scheme } = plannedHandle({ bar: 25, acrossFlats: 22, taperEnd: 16, taperLength: 95 });
    const ask = () =>
      JSON.stringify(planRoute(part, scheme, exampleRegister, { quantity: 3, material: part.material }));
    expect(ask()).toBe(ask());
  });
});
