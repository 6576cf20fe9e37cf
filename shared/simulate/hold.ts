import type { Body } from '../part/body';
import { flatsSpans } from '../part/flats';
import { largestRadius, pieceAt, radiusAt, smallestRadius } from '../part/generator';
import { flatsOf } from '../part/metal';
import type { Fault, Route } from '../route/route';
import { LIMITS } from '../route/rules';
import type { RuleId } from '../route/rules';
import { fault, mm } from './fault';
import { EVENTS } from './replay';
import type { Step } from './replay';

/** How the work is held: judged on the stage as it is clamped, and again after every cut made in that hold. */
export function judgeHold(route: Route, steps: readonly Step[]): Fault[] {
  const faults: Fault[] = [];
  for (const setup of route.setups) {
    const within = steps.filter((step) => step.setup.id === setup.id);
    const first = within[0];
    if (!first || setup.freeEnd === 'both' || !within.some((step) => isCutHeld(step))) continue;
    for (const [rule, message] of gripFaults(first.before, first, route.blank))
      faults.push(fault(rule, first.operation.number, message));
    let severed = false;
    for (const step of within) {
      if (step.changes.length === 0 && step.cut === undefined) continue;
      if (severed) {
        faults.push(
          fault(
            'part-last',
            step.operation.number,
            'The work has been cut off what is held; nothing more can be cut in this set-up.',
          ),
        );
        continue;
      }
      severed =
        step.cut?.kind === 'sever' &&
        step.after.x0 > step.gripFrom - 1e-9 &&
        step.after.x0 >= step.gripTo - 1e-9;
      faults.push(...cutInHold(step, severed));
      if (severed) continue;
      for (const [rule, message] of gripFaults(step.after, step, route.blank))
        if (!gripFaults(step.before, step, route.blank).some(([known]) => known === rule))
          faults.push(fault(rule, step.operation.number, `After this cut: ${message}`));
    }
  }
  return faults;
}

/** Sawing a piece from the bar needs no chuck; every other cut does. */
function isCutHeld(step: Step): boolean {
  return step.operation.method !== 'saw' && !EVENTS.has(step.operation.method);
}

function gripFaults(stage: Body, step: Step, blank: Body): [RuleId, string][] {
  const { gripFrom, gripTo } = step;
  const faults: [RuleId, string][] = [];
  if (!(gripTo > gripFrom)) return [['grip-length', 'Nothing is gripped: the grip has no length.']];
  if (gripFrom < stage.x0 - 1e-6 || gripTo > stage.x1 + 1e-6)
    return [
      [
        'grip-metal',
        `The jaws close where there is no metal: the work runs from ${mm(stage.x0)} to ${mm(stage.x1)}.`,
      ],
    ];
  const radius = largestRadius(stage.outer, gripFrom, gripTo);
  if (radius - smallestRadius(stage.outer, gripFrom, gripTo) > 1e-6)
    faults.push(['grip-plain', 'The jaws close on more than one diameter.']);
  for (const treatment of stage.treatments)
    if (treatment.from < gripTo - 1e-6 && treatment.to > gripFrom + 1e-6)
      faults.push(['grip-plain', `The jaws close on a finished ${treatment.kind}.`]);
  for (const cut of flatsOf(stage)) {
    const asBought = flatsOf(blank).some((own) => own.id === cut.id);
    const under = flatsSpans(stage, cut).filter(
      (span) => span.from < gripTo - 1e-6 && span.to > gripFrom + 1e-6,
    );
    if (asBought || under.length === 0) continue;
    // Three jaws sit on a polygon whose faces they divide, along the whole grip, when the route says so.
    const whole = under.some((span) => span.from <= gripFrom + 1e-6 && span.to >= gripTo - 1e-6);
    if (step.setup.heldOn === 'flats' && cut.count % 3 === 0 && whole) continue;
    faults.push(['grip-plain', 'The jaws close on milled flats.']);
  }
  const length = gripTo - gripFrom;
  const least = Math.max(LIMITS.gripMinimum.value, LIMITS.gripRatio.value * 2 * radius);
  if (length < least - 1e-6)
    faults.push(['grip-length', `A grip of ${mm(length)} is too short; at least ${mm(least)} is needed.`]);
  if (length > LIMITS.gripMost.value + 1e-6)
    faults.push(['grip-length', `No jaws close on ${mm(length)}; at most ${mm(LIMITS.gripMost.value)}.`]);
  if (gripFrom > stage.x0 + 1e-6 && largestRadius(stage.outer, stage.x0, gripFrom) > radius + 1e-6)
    faults.push(['grip-behind', 'Something larger stands behind the jaws, which cannot close past it.']);
  return faults;
}

function cutInHold(step: Step, severed: boolean): Fault[] {
  const { operation, gripTo, cut } = step;
  const faults: Fault[] = [];
  const expected = step.setup.freeEnd === 'side' ? ['side', 'left', 'right'] : [step.setup.freeEnd, 'side'];
  if (!expected.includes(operation.end))
    faults.push(
      fault(
        'free-end-only',
        operation.number,
        `The operation works the ${operation.end} end, but this set-up frees the ${step.setup.freeEnd} one.`,
      ),
    );
  if (operation.end === 'side' && !['mill-flat', 'mill-key', 'cross-drill'].includes(operation.method))
    faults.push(
      fault('free-end-only', operation.number, 'Only milling and cross drilling work from the side.'),
    );
  for (const change of step.changes) {
    if (change.kind === 'inner' || (severed && change.kind === 'left-end')) continue;
    if (change.from >= gripTo - 1e-6) continue;
    const rule: RuleId = change.to <= step.gripFrom + 1e-6 ? 'free-end-only' : 'grip-uncut';
    faults.push(
      fault(
        rule,
        operation.number,
        `Metal is cut from ${mm(change.from)} to ${mm(change.to)}, which is not clear of the grip.`,
      ),
    );
  }
  if (cut?.kind === 'sever') {
    const clear = severed
      ? cut.kerfFrom - gripTo
      : Math.max(cut.kerfFrom - gripTo, step.gripFrom - cut.kerfTo);
    if (clear < LIMITS.partingClear.value - 1e-6)
      faults.push(
        fault(
          'parting-clear',
          operation.number,
          `The blade passes ${mm(clear)} from the jaws; ${mm(LIMITS.partingClear.value)} is needed.`,
        ),
      );
  }
  return faults;
}

/** True where a step of the outline at x faces the free end or away from it: a shoulder a stop can rest on. */
export function isShoulder(body: Body, x: number): boolean {
  if (Math.abs(x - body.x0) < 1e-6 || Math.abs(x - body.x1) < 1e-6) return true;
  const piece = pieceAt(body.outer, x);
  if (!piece) return false;
  return Math.abs(radiusAt(body.outer, x - 1e-5, 'left') - radiusAt(body.outer, x + 1e-5, 'right')) > 1e-3;
}
