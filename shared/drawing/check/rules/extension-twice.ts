import { sideBySide } from '../../geometry/segment';
import { dimensionPairs, finding, strokesOfKind } from '../reading';
import type { CheckRule } from '../reading';

const ON_ONE_ANOTHER = 0.05;
const LENGTH = 0.5;

/** No extension line over another: it would print thicker than the rest. */
export const extensionTwice: CheckRule = {
  id: 'extension-twice',
  check: (reading) =>
    dimensionPairs(reading).flatMap(([a, b]) => {
      const ours = strokesOfKind(a, 'extension');
      const theirs = strokesOfKind(b, 'extension');
      return ours.some((s) => theirs.some((o) => sideBySide(s, o, ON_ONE_ANOTHER) > LENGTH))
        ? [
            finding('extension-twice', `${a.name} and ${b.name} draw one extension line twice.`, [
              a.name,
              b.name,
            ]),
          ]
        : [];
    }),
};
