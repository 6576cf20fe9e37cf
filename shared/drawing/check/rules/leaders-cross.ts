import { segmentsCross } from '../../geometry/segment';
import { dimensionPairs, finding, strokesOfKind } from '../reading';
import type { CheckRule } from '../reading';

/** No leader crosses another. */
export const leadersCross: CheckRule = {
  id: 'leaders-cross',
  check: (reading) =>
    dimensionPairs(reading).flatMap(([a, b]) => {
      const other = strokesOfKind(b, 'leader');
      return strokesOfKind(a, 'leader').some((s) => other.some((t) => segmentsCross(s, t)))
        ? [finding('leaders-cross', `The leaders of ${a.name} and ${b.name} cross.`, [a.name, b.name])]
        : [];
    }),
};
