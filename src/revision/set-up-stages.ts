import type { Body } from '../../shared/part/body';
import type { Operation, Route, SetUp } from '../../shared/route/route';

export interface CardFacts {
  setUp: SetUp;
  operations: readonly Operation[];
  /** The work as it comes into the set-up and as it leaves it. */
  before: Body;
  after: Body;
}

/** The set-ups of a route as cards: each with its operations and the work before and after. */
export function cardsOf(route: Route): CardFacts[] {
  let before = route.blank;
  return route.setups.map((setUp) => {
    const operations = route.operations.filter((operation) => operation.setup === setUp.id);
    const last = operations.at(-1)?.number ?? 0;
    const after = stageAfter(route, last) ?? before;
    const card: CardFacts = { setUp, operations, before, after };
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
