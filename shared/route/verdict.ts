import type { Capacity, Need } from './route';

/** An operation is as good as its worst need, a plan as its worst operation. */
export function verdictOf(needs: readonly Need[]): Capacity['verdict'] {
  if (needs.some((n) => n.state === 'short')) return 'cannot';
  return needs.some((n) => n.state === 'alternative') ? 'with-changes' : 'can';
}
