import { sideBySide } from '../../geometry/segment';
import { dimensionPairs, finding, strokesOfKind } from '../reading';
import type { CheckRule } from '../reading';

const APART = 0.3;
const LEAST = 0.3;

/** No dimension line on another. */
export const dimensionOverlap: CheckRule = {
  id: 'dimension-overlap',
  check: (reading) =>
    dimensionPairs(reading).flatMap(([a, b]) => {
      const other = strokesOfKind(b, 'dimension');
      return strokesOfKind(a, 'dimension').some((s) => other.some((t) => sideBySide(s, t, APART) > LEAST))
        ? [
            finding(
              'dimension-overlap',
              `The dimension lines of ${a.name} and ${b.name} lie on one another.`,
              [a.name, b.name],
            ),
          ]
        : [];
    }),
};
