import { finding, ofRole } from '../reading';
import type { CheckRule } from '../reading';

/** Every size once, and no size that says again what others fix. */
export const sizeTwice: CheckRule = {
  id: 'size-twice',
  check: (reading) => {
    const counts = new Map<string, number>();
    for (const g of ofRole(reading, 'dimension')) counts.set(g.name, (counts.get(g.name) ?? 0) + 1);
    const twice = [...counts]
      .filter(([, n]) => n > 1)
      .map(([id, n]) => finding('size-twice', `${id} stands on the sheet ${n} times.`, [id]));
    const again = reading.scheme.completeness.redundant.map((id) =>
      finding('size-twice', `${id} says again what other sizes fix.`, [id]),
    );
    return [...twice, ...again];
  },
};
