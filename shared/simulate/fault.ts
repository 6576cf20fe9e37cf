import type { Fault } from '../route/route';
import type { RuleId } from '../route/rules';

/** One finding. `operation` 0 is the route as a whole. */
export function fault(rule: RuleId, operation: number, message: string): Fault {
  return { rule, operation, message };
}

/** A length as it stands in a sentence. */
export function mm(value: number): string {
  return `${String(Math.round(value * 1000) / 1000)} mm`;
}
