import { segmentsCross } from '../../geometry/segment';
import { dimensionPairs, finding, strokesOfKind } from '../reading';
import type { CheckRule } from '../reading';

/** No dimension line crosses another. */
export const dimensionCrossing: CheckRule = {
  id: 'dimension-crossing',
  check: (reading) =>
    dimensionPairs(reading).flatMap(([a, b]) => {
      const other = strokesOfKind(b, 'dimension');
      return strokesOfKind(a, 'dimension').some((s) => other.some((t) => segmentsCross(s, t)))
        ? [
            finding('dimension-crossing', `The dimension lines of ${a.name} and ${b.name} cross.`, [
              a.name,
              b.name,
            ]),
          ]
        : [];
    }),
};
