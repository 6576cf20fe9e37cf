import type { Body } from '../../shared/part/body';
import type { Operation, Route, SetUp } from '../../shared/route/route';

export interface CardFacts {
  setUp: SetUp;
  operations: readonly Operation[];
  /** The work as it comes into the set-up and as it leaves it. */
  before: Body;
  after: Body;
  /** What its carriage stops reach, for the card's stepped line. */
  stops: readonly { fromX: number; toX: number }[];
}

/** The set-ups of a route as cards: each with its operations and the work before and after. */
export function cardsOf(route: Route): CardFacts[] {
  let before = route.blank;
  return route.setups.map((setUp) => {
    const operations = route.operations.filter((operation) => operation.setup === setUp.id);
    const last = operations.at(-1)?.number ?? 0;
    const after = stageAfter(route, last) ?? before;
    const card: CardFacts = { setUp, operations, before, after, stops: stopsOf(operations) };
    before = after;
    return card;
  });
}

/** The newest stage at or before an operation: events without metal leave none of their own. */
function stageAfter(route: Route, operation: number): Body | undefined {
  let found: Body | undefined;
  for (const stage of route.stages) if (stage.after <= operation) found = stage.body;
  return found;
}

function stopsOf(operations: readonly Operation[]): { fromX: number; toX: number }[] {
  const found = new Map<string, { fromX: number; toX: number }>();
  for (const { stops } of operations)
    for (const { fromX, toX } of stops) found.set(`${fromX.toFixed(3)} ${toX.toFixed(3)}`, { fromX, toX });
  return [...found.values()];
}

/** Operations as a small card prints them, neighbours of one method together: `2 grip`, `6-7 rough turn`. */
export function inShort(operations: readonly Operation[]): string[] {
  const runs: { from: number; to: number; method: string }[] = [];
  for (const { number, method } of operations) {
    const last = runs.at(-1);
    if (last && last.method === method) last.to = number;
    else runs.push({ from: number, to: number, method });
  }
  return runs.map(
    ({ from, to, method }) => `${from === to ? from : `${from}–${to}`} ${method.replaceAll('-', ' ')}`,
  );
}
