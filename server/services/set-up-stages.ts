import type { Body } from '../../shared/part/body';
import type { Route, SetUp } from '../../shared/route/route';

/** The work as it comes into a set-up and as it leaves it; null for a set-up in which nothing is done. */
export function setUpStages(route: Route, setup: Pick<SetUp, 'id'>): { before: Body; after: Body } | null {
  const numbers = route.operations
    .filter((operation) => operation.setup === setup.id)
    .map((operation) => operation.number);
  if (numbers.length === 0) return null;
  return {
    before: stageUpTo(route, Math.min(...numbers) - 1),
    after: stageUpTo(route, Math.max(...numbers)),
  };
}

/** The stage that stands once every operation up to that number is done. */
function stageUpTo(route: Route, number: number): Body {
  let body = route.blank;
  let reached = -1;
  for (const stage of route.stages) {
    if (stage.after <= number && stage.after > reached) [body, reached] = [stage.body, stage.after];
  }
  return body;
}
