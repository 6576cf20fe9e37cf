import { applyRemoval, removedVolume } from '../part/apply';
import type { Body } from '../part/body';
import { mirrorBody, mirrorPart, mirrorRemoval } from '../part/mirror';
import type { Part } from '../part/part';
import type { Removal } from '../part/removal';
import { sameMetal } from '../part/same-metal';
import type { Fault, Method, Operation, Route, SetUp } from '../route/route';
import { changesBetween } from './changes';
import type { Change } from './changes';
import { fault } from './fault';

/**
 * One operation with the metal before and after it, turned so that the set-up's free end is to the right:
 * every rule is then said once.
 */
export interface Step {
  operation: Operation;
  setup: SetUp;
  flipped: boolean;
  /** The part in the same frame. */
  part: Part;
  before: Body;
  after: Body;
  cut?: Removal;
  changes: readonly Change[];
  gripFrom: number;
  gripTo: number;
  /** Chips by the simulator's own integral (mm³). */
  chips: number;
  /** A station of the part's own x in this frame. */
  place: (x: number) => number;
}

export interface Replay {
  steps: readonly Step[];
  /** What is left at the end, in the part's own x. */
  end: Body;
  faults: Fault[];
  /** False where the replay had to stop: nothing after it can be judged. */
  complete: boolean;
}

/** Methods that leave the metal as it is. */
export const EVENTS: ReadonlySet<Method> = new Set<Method>(['grip', 'turn-round', 'mark-out', 'indicate', 'deburr', 'fit-check', 'inspect', 'file', 'polish']); // prettier-ignore

export function replay(route: Route, part: Part): Replay {
  const faults: Fault[] = [];
  const steps: Step[] = [];
  const views = { drawn: part, turned: mirrorPart(part) };
  // A stage is the end of one step and the beginning of the next: it is turned round once.
  const round = new Map<Body, Body>();
  const turned = (body: Body): Body => {
    const known = round.get(body);
    if (known) return known;
    const made = mirrorBody(body, part.length);
    round.set(body, made);
    return made;
  };
  let stage = route.blank;
  checkStage(route, 0, stage, faults);
  for (const [index, operation] of route.operations.entries()) {
    const { number } = operation;
    const stop = (message: string): Replay => {
      faults.push(fault('can-be-replayed', number, message));
      return { steps, end: stage, faults, complete: false };
    };
    if (number !== index + 1)
      return stop(`Operations are numbered 1, 2, 3 …; place ${index + 1} has ${number}.`);
    const setup = route.setups.find((each) => each.id === operation.setup);
    if (!setup) return stop(`Set-up ${operation.setup} is not on the route.`);
    try {
      const after = operation.cut ? applyRemoval(stage, operation.cut) : stage;
      steps.push(stepOf(operation, setup, views, stage, after, part.length, turned));
      stage = after;
    } catch (error) {
      return stop(
        `The cut cannot be made on this stage: ${error instanceof Error ? error.message : 'unknown'}.`,
      );
    }
    checkStage(route, number, stage, faults, operation.cut !== undefined);
  }
  return { steps, end: stage, faults, complete: true };
}

function stepOf(
  operation: Operation,
  setup: SetUp,
  views: { drawn: Part; turned: Part },
  before: Body,
  after: Body,
  length: number,
  turned: (body: Body) => Body,
): Step {
  const flipped = isFlipped(setup, length);
  const turn = (body: Body): Body => (flipped ? turned(body) : body);
  const place = (x: number): number => (flipped ? length - x : x);
  const start = turn(before);
  const end = before === after ? start : turn(after);
  return {
    operation,
    setup,
    flipped,
    part: flipped ? views.turned : views.drawn,
    before: start,
    after: end,
    cut: operation.cut && flipped ? mirrorRemoval(operation.cut, length) : operation.cut,
    changes: before === after ? [] : changesBetween(start, end),
    gripFrom: Math.min(place(setup.gripFrom), place(setup.gripTo)),
    gripTo: Math.max(place(setup.gripFrom), place(setup.gripTo)),
    chips: operation.cut ? removedVolume(before, operation.cut) : 0,
    place,
  };
}

/** Work held by both ends or worked from the side is looked at from the end that is held. */
function isFlipped(setup: SetUp, length: number): boolean {
  if (setup.freeEnd === 'left' || setup.freeEnd === 'right') return setup.freeEnd === 'left';
  return (setup.gripFrom + setup.gripTo) / 2 > length / 2;
}

function checkStage(route: Route, number: number, stage: Body, faults: Fault[], needed = true): void {
  const recorded = route.stages.filter((each) => each.after === number);
  if (recorded.length === 0 && needed)
    faults.push(fault('stages-recorded', number, 'No stage is recorded after this operation.'));
  if (recorded.some((each) => !sameMetal(each.body, stage)))
    faults.push(fault('stages-recorded', number, 'The recorded stage is not what the cuts so far leave.'));
}
