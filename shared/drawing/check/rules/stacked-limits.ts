import { finding, ofRole } from '../reading';
import type { CheckRule } from '../reading';

const SIGNED = /^[+-]\d*(?:[.,](\d+))?$/;

/** Limits written one over the other show the same number of decimals; a plain zero has none. */
export const stackedLimits: CheckRule = {
  id: 'stacked-limits',
  check: (reading) =>
    ofRole(reading, 'dimension').flatMap((group) => {
      const decimals = group.texts.flatMap(({ text }) => {
        const found = SIGNED.exec(text);
        return found ? [found[1]?.length ?? 0] : [];
      });
      return new Set(decimals).size > 1
        ? [finding('stacked-limits', `The limits of ${group.name} differ in their decimals.`, [group.name])]
        : [];
    }),
};
