import type { Body } from '../part/body';
import { breaks, pieceAt, radiusAt, smallestRadius } from '../part/generator';
import { flatsOf } from '../part/metal';
import { pieceRadius } from '../part/piece';
import { integrate } from '../part/quadrature';
import type { Fault, Method } from '../route/route';
import { LIGHT_METHODS, LIMITS, SIDE_METHODS } from '../route/rules';
import { fault, mm } from './fault';
import type { Step } from './replay';

/** A declared depth is rounded down by the planner; two quadratures may differ by this share. */
const SLACK = 1.005;
/** The tail is out of the way of these. */
const AT_THE_END: readonly Method[] = ['face', 'form-turn', 'thread-die', 'part-off'];

/** Free length and bending under each cut, on the stage before it. */
export function judgeSupport(steps: readonly Step[]): Fault[] {
  return steps.flatMap((step, index) => [
    ...supportFaults(step),
    ...holeToCome(step, steps.slice(index + 1)),
    ...neverAHole(step, steps),
  ]);
}

/** A tail centre is set up for a hole that is there at some time in the set-up; said once, at its first operation. */
function neverAHole(step: Step, steps: readonly Step[]): Fault[] {
  if (step.setup.support !== 'centre') return [];
  const within = steps.filter((each) => each.setup.id === step.setup.id);
  const hole = within.some(({ before, after }) =>
    [before, after].some((stage) => radiusAt(stage.inner, stage.x1, 'left') > 0),
  );
  if (within[0] !== step || hole) return [];
  return [
    fault(
      'centre-before-support',
      step.operation.number,
      'A centre is set up, but there is never a hole for it to enter.',
    ),
  ];
}

/** Work that the set-up means to support is not done before the hole for the centre is there. */
function holeToCome(step: Step, later: readonly Step[]): Fault[] {
  const { operation, setup, changes } = step;
  if (setup.support !== 'centre' || changes.length === 0 || standsInTail(step)) return [];
  if (!(SIDE_METHODS as readonly Method[]).includes(operation.method)) return [];
  const comes = later.some((each) => each.setup.id === setup.id && each.operation.method === 'centre-drill');
  return comes
    ? [
        fault(
          'centre-before-support',
          operation.number,
          'The centre hole that this set-up leans on is drilled only later.',
        ),
      ]
    : [];
}

function supportFaults(step: Step): Fault[] {
  const { operation, before, gripTo, changes, setup } = step;
  const sideways = (SIDE_METHODS as readonly Method[]).includes(operation.method);
  const light = (LIGHT_METHODS as readonly Method[]).includes(operation.method);
  if ((!sideways && !light) || changes.length === 0 || setup.freeEnd === 'both') return [];
  const far = Math.min(before.x1, Math.max(...changes.map((change) => change.to)));
  if (far <= gripTo) return [];
  const number = operation.number;
  const ratio =
    (far - gripTo) /
    smallestAcross(
      before,
      gripTo,
      operation.method === 'thread-single-point' ? withoutLead(before, far) : far,
    );
  const tail = standsInTail(step);
  const steadied =
    setup.support === 'steady' || (setup.support === 'outboard' && operation.method === 'mill-flat');
  const faults: Fault[] = [];
  if (sideways && ratio > LIMITS.overhang.value * SLACK && !tail && !steadied) {
    const rule = setup.support === 'centre' ? 'centre-before-support' : 'support-overhang';
    const why =
      setup.support === 'centre'
        ? 'there is no centre hole for the tail to stand in'
        : 'nothing stands at its end';
    faults.push(
      fault(rule, number, `The work stands out ${round(ratio)} of its smallest diameters, and ${why}.`),
    );
  }
  const depth = operation.depthOfCut;
  if (
    light &&
    operation.method !== 'face' &&
    ratio > LIMITS.overhang.value * SLACK &&
    depth > LIMITS.lightDepth.value + 1e-9
  )
    faults.push(
      fault(
        'support-overhang',
        number,
        `A cut of ${mm(depth)} is too much for an end that stands out ${round(ratio)} of its smallest diameters.`,
      ),
    );
  const bend = bendUnder(before, gripTo, far, depth) * (tail || steadied ? LIMITS.tailFactor.value : 1);
  const limit = depth > LIMITS.lightDepth.value ? LIMITS.bendRough.value : LIMITS.bendFinish.value;
  if (bend > limit * SLACK)
    faults.push(
      fault(
        'support-bend',
        number,
        `The work bends ${mm(bend)} under this cut; at most ${mm(limit)} is allowed.`,
      ),
    );
  return faults;
}

/** A centre stands in the free end: the set-up has one, and the stage has a hole for it. */
export function standsInTail(step: Step): boolean {
  const { setup, before, operation } = step;
  if (setup.support !== 'centre' || AT_THE_END.includes(operation.method)) return false;
  return radiusAt(before.inner, before.x1, 'left') > 0;
}

/** Where a chamfer at the tip begins: the lead of a thread carries nothing, so its small end does not count. */
function withoutLead(body: Body, far: number): number {
  const tip = body.outer[body.outer.length - 1];
  return tip?.kind === 'line' && tip.end < tip.start && tip.to <= far + 1e-9 ? tip.from : far;
}

function round(ratio: number): string {
  return String(Math.round(ratio * 10) / 10);
}

function smallestAcross(body: Body, from: number, to: number): number {
  let radius = smallestRadius(body.outer, Math.max(from, body.x0), Math.min(to, body.x1));
  for (const cut of flatsOf(body))
    if (cut.from < to && cut.to > from) radius = Math.min(radius, cut.distance);
  return 2 * radius;
}

/** F/E · ∫ (xc − x)² / I dx from the grip to the cut (mm), I = π (r⁴ − b⁴) / 4, r held to the flats. */
function bendUnder(body: Body, from: number, to: number, depth: number): number {
  const flats = flatsOf(body);
  const stations = [
    from,
    to,
    ...breaks(body.outer),
    ...breaks(body.inner),
    ...flats.flatMap((cut) => [cut.from, cut.to]),
  ]
    .filter((x) => x >= from && x <= to)
    .sort((a, b) => a - b);
  let sum = 0;
  for (let i = 0; i + 1 < stations.length; i += 1) {
    const a = stations[i] ?? from;
    const b = stations[i + 1] ?? to;
    if (b - a < 1e-9) continue;
    const middle = (a + b) / 2;
    const outer = pieceAt(body.outer, middle);
    if (!outer) continue;
    const held = Math.min(
      Infinity,
      ...flats.filter((cut) => middle > cut.from && middle < cut.to).map((cut) => cut.distance),
    );
    const compliance = (x: number): number => {
      const r = Math.min(pieceRadius(outer, x), held);
      const hole = Math.min(radiusAt(body.inner, x), 0.95 * r);
      return (to - x) ** 2 / Math.max(1e-9, (Math.PI * (r ** 4 - hole ** 4)) / 4);
    };
    sum += integrate(compliance, a, b);
  }
  return ((LIMITS.forcePerDepth.value * depth) / LIMITS.elasticModulus.value) * sum;
}
