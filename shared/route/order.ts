import type { DraftOperation } from './draft';
import { RuledOut } from './draft';

/**
 * Operations in an order that keeps every reason, as near as may be to the order they were thought of. Reasons that
 * go round in a ring rule the plan out by the rule that closes it.
 */
export function inOrder(operations: readonly DraftOperation[]): DraftOperation[] {
  const known = new Map(operations.map((o) => [o.key, o]));
  if (known.size !== operations.length) throw new Error('two operations share a key');
  const placed = new Set<string>();
  const ordered: DraftOperation[] = [];
  const waiting = [...operations];
  while (waiting.length > 0) {
    const index = waiting.findIndex((o) => o.after.every(({ key }) => placed.has(key) || !known.has(key)));
    const next = waiting[index];
    if (!next) {
      const stuck = waiting[0];
      throw new RuledOut(
        stuck?.after[0]?.rule ?? 'set-up-whole',
        'The reasons for the order go round in a ring.',
      );
    }
    waiting.splice(index, 1);
    placed.add(next.key);
    ordered.push(next);
  }
  return ordered;
}
