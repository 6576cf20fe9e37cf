import { largestRadius, radiusAt } from '../part/generator';
import type { Fault } from '../route/route';
import { LIMITS } from '../route/rules';
import { fault, mm } from './fault';
import type { Step } from './replay';

/** Whether the tool can come to its cut: free end to the right, the way is in from there or straight down on it. */
export function judgeWayIn(steps: readonly Step[]): Fault[] {
  return steps.flatMap((step) => step.changes.flatMap((change) => wayFaults(step, change)));
}

function wayFaults(step: Step, change: Step['changes'][number]): Fault[] {
  const { operation, after, before } = step;
  const number = operation.number;
  if (change.kind === 'inner') {
    const open = opening(step, change.to);
    const widest = largestRadius(after.inner, change.from, change.to);
    return open < widest - 1e-6
      ? [
          fault(
            'way-in',
            number,
            `The hole cannot be reached from the free end: it is ${mm(2 * open)} wide there, the cut ${mm(2 * widest)}.`,
          ),
        ]
      : [];
  }
  if (change.kind === 'thread' && change.treatment?.kind === 'thread' && !change.treatment.internal) {
    const collar = change.to < before.x1 - 1e-6 ? largestRadius(before.outer, change.to, before.x1) : 0;
    const passes = operation.method !== 'thread-die' || collar <= change.treatment.major / 2 + 1e-6;
    return passes ? [] : [fault('way-in', number, 'The die cannot pass the larger end to reach its thread.')];
  }
  if (change.kind === 'outer' && change.to < before.x1 - 1e-6) {
    const floor = radiusAt(after.outer, change.to - 1e-6, 'left');
    const collar = largestRadius(before.outer, change.to, before.x1);
    const behind = change.from > before.x0 ? radiusAt(after.outer, change.from, 'left') : 0;
    const width = change.to - change.from;
    const valley = collar > floor + LIMITS.collarClear.value && behind > floor + LIMITS.collarClear.value;
    if (valley && width < 2 * LIMITS.collarClear.value)
      return [fault('way-in', number, `No tool enters a valley ${mm(width)} wide between two collars.`)];
  }
  return [];
}

/** Narrowest radius of the hole between x and the free end. */
function opening(step: Step, x: number): number {
  const { after } = step;
  if (x >= after.x1 - 1e-6) return Infinity;
  let narrowest = radiusAt(after.inner, after.x1, 'left');
  for (const piece of after.inner) {
    if (piece.to <= x + 1e-9) continue;
    narrowest = Math.min(narrowest, radiusAt([piece], Math.max(piece.from, x)), radiusAt([piece], piece.to));
  }
  return narrowest;
}
