import { segmentsCross } from '../../geometry/segment';
import { finding, ofRole, strokesOfKind } from '../reading';
import type { CheckRule } from '../reading';

/** No dimension line meets the outline of a view it does not belong to. */
export const foreignOutline: CheckRule = {
  id: 'foreign-outline',
  check: (reading) =>
    ofRole(reading, 'dimension').flatMap((size) =>
      ofRole(reading, 'view')
        .filter((view) => view.group.view !== size.group.forView)
        .flatMap((view) => {
          const edges = strokesOfKind(view, 'visible');
          return strokesOfKind(size, 'dimension').some((s) => edges.some((e) => segmentsCross(s, e, 0)))
            ? [
                finding(
                  'foreign-outline',
                  `The dimension line of ${size.name} meets the outline of the view ${view.name}.`,
                  [size.name, view.name],
                ),
              ]
            : [];
        }),
    ),
};
