import type { Fault } from '../route/route';
import { LIMITS } from '../route/rules';
import { fault, mm } from './fault';
import { isShoulder } from './hold';
import type { Step } from './replay';

/** Ends of the work that a tool has made: x in the part's own frame. A sawn end is none of them. */
export type MadeFaces = Set<string>;

/** Stops: they start at a face that is there now and was made, have the length they say, and end where metal changed. */
export function judgeStops(steps: readonly Step[]): Fault[] {
  const faults: Fault[] = [];
  let made: number[] = [];
  for (const step of steps) {
    const { operation } = step;
    const freeMade = made.some((x) => near(step.place(x), step.before.x1));
    for (const stop of operation.stops) {
      const fromX = step.place(stop.fromX);
      const toX = step.place(stop.toX);
      if (!near(Math.abs(toX - fromX), stop.length))
        faults.push(
          fault(
            'figures-fit',
            operation.number,
            `The stop says ${mm(stop.length)}, but its ends lie ${mm(Math.abs(toX - fromX))} apart.`,
          ),
        );
      faults.push(...originFaults(step, stop.from, fromX, freeMade));
      const ends = reachedStations(step);
      if (ends.length > 0 && !ends.some((x) => near(x, toX)))
        faults.push(
          fault('figures-fit', operation.number, `The stop ends at ${mm(stop.toX)}, where no metal changes.`),
        );
    }
    made = [...made, ...facesMade(step)];
  }
  return faults;
}

function originFaults(step: Step, from: string, fromX: number, freeMade: boolean): Fault[] {
  const { operation, before, after } = step;
  const trims = step.cut?.kind === 'trim';
  if (from === `${step.setup.id}.face`) {
    const free = near(fromX, before.x1) || (trims && near(fromX, after.x1));
    if (!free)
      return [
        fault(
          'stop-from-face',
          operation.number,
          `The stop starts at ${mm(step.place(fromX))}, but the free face is not there now.`,
        ),
      ];
    if (!freeMade && !trims && operation.method !== 'saw')
      return [fault('datum-first', operation.number, 'The stop starts at an end that has not been faced.')];
    return [];
  }
  const station = step.part.stations.find((each) => swapped(each.id, step.flipped) === from);
  if (!station || !near(station.x, fromX))
    return [
      fault(
        'stop-from-face',
        operation.number,
        `The stop starts at ${from}, which does not lie where it says.`,
      ),
    ];
  return isShoulder(before, fromX)
    ? []
    : [fault('stop-from-face', operation.number, `There is no face at ${from} yet.`)];
}

/** The route speaks of faces as drawn; the turned part has their names the other way round. */
function swapped(id: string, flipped: boolean): string {
  if (!flipped) return id;
  if (id === 'left-face') return 'right-face';
  return id === 'right-face' ? 'left-face' : id;
}

function reachedStations(step: Step): number[] {
  const ends = step.changes.flatMap((change) => [change.from, change.to]);
  if (step.cut?.kind === 'sever') ends.push(step.cut.kerfFrom, step.cut.kerfTo, step.cut.from, step.cut.to);
  return ends;
}

/** Stations, in the part's own x, where this step leaves a tooled face. */
export function facesMade(step: Step): number[] {
  if (step.operation.method === 'saw') return [];
  return step.changes
    .filter((change) => change.kind === 'left-end' || change.kind === 'right-end')
    .map((change) => step.place(change.kind === 'left-end' ? step.after.x0 : step.after.x1));
}

function near(a: number, b: number): boolean {
  return Math.abs(a - b) <= LIMITS.figureTolerance.value;
}
