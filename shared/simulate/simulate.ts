import type { Part } from '../part/part';
import { maxInner, minOuter } from '../part/envelope';
import { differences, unequalSpans } from '../part/same-metal';
import { constant } from '../part/generator';
import type { Fault, Route } from '../route/route';
import { judgeBalance } from './balance';
import { missingMetal } from './containment';
import { judgeStops } from './datum';
import { fault, mm } from './fault';
import { judgeFigures } from './figures';
import { judgeHold } from './hold';
import { judgeFeatures } from './named-features';
import { judgeOrder } from './order';
import { replay } from './replay';
import type { Replay, Step } from './replay';
import { judgeSupport } from './support';
import { judgeTechnology } from './technology';
import { judgeWayIn } from './way-in';

/**
 * Judges any route for a part: an empty list accepts it. Knows the part's metal and the table of named limits,
 * nothing of how the route was planned. Faults are in the order of the operations, 0 the route as a whole.
 */
export function simulate(route: Route, part: Part): Fault[] {
  const replayed = replay(route, part);
  const faults = [...replayed.faults, ...judgeOrder(route)];
  if (replayed.complete) {
    const { steps } = replayed;
    faults.push(
      ...judgeBlank(route, part),
      ...judgeEnd(replayed, part),
      ...judgeHold(route, steps),
      ...judgeStops(steps),
      ...judgeTechnology(steps),
      ...judgeWayIn(steps),
      ...judgeFigures(steps),
      ...judgeFeatures(route, part, steps),
      ...judgeSupport(steps),
      ...judgeBalance(route, part, replayed),
    );
  }
  return faults.sort((a, b) => a.operation - b.operation);
}

/** True where the cut alone, laid on the finished part, would take nothing off it: no more has to be looked at. */
function staysClear({ cut, part }: Step): boolean {
  const { outer, inner, x0, x1 } = part.body;
  switch (cut?.kind) {
    case 'outer':
      return unequalSpans(minOuter(outer, cut.envelope), outer, x0, x1).length === 0;
    case 'bore':
      return unequalSpans(maxInner(inner, cut.envelope), inner, x0, x1).length === 0;
    case 'trim':
    case 'sever':
      return cut.from <= x0 && cut.to >= x1;
    default:
      return false;
  }
}

/** The part is cut out of the blank and nothing else: below it at no operation, the same metal at the end. */
function judgeEnd(replayed: Replay, part: Part): Fault[] {
  const faults: Fault[] = [];
  let lost = 0;
  for (const step of replayed.steps) {
    if (step.changes.length === 0 || staysClear(step)) continue;
    const missing = missingMetal(step.after, step.part.body);
    const first = missing[0];
    if (first && missing.length > lost)
      faults.push(
        fault(
          'not-below-part',
          step.operation.number,
          `The part is cut into from ${mm(first.from)} to ${mm(first.to)}: ${first.message}.`,
        ),
      );
    lost = missing.length;
  }
  const [left] = differences(replayed.end, part.body);
  if (left)
    faults.push(
      fault(
        'stage-is-part',
        0,
        `What is left is not the part from ${mm(left.from)} to ${mm(left.to)}: ${left.message}.`,
      ),
    );
  return faults;
}

function judgeBlank(route: Route, part: Part): Fault[] {
  const { blank, stock } = route;
  const faults: Fault[] = [];
  const [missing] = missingMetal(blank, part.body);
  if (missing)
    faults.push(
      fault(
        'not-below-part',
        0,
        `The blank does not cover the part from ${mm(missing.from)} to ${mm(missing.to)}.`,
      ),
    );
  if (Math.abs(blank.x1 - blank.x0 - route.blankLength) > 1e-6)
    faults.push(
      fault('figures-fit', 0, `The blank is ${mm(blank.x1 - blank.x0)} long, not ${mm(route.blankLength)}.`),
    );
  const round = constant(blank.x0, blank.x1, stock.size / 2);
  if (
    stock.shape === 'round' &&
    differences(blank, { ...blank, outer: round, cuts: [], treatments: [] }).length > 0
  )
    faults.push(fault('figures-fit', 0, `The blank is not a round bar of ${mm(stock.size)}.`));
  return faults;
}
