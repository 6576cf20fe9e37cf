import { boxAround } from '../../geometry/box';
import { finding, mapOf, ofRole, strokesOfKind } from '../reading';
import type { CheckRule } from '../reading';

const LEAST = 1.9;
const MOST = 3.6;

/** Every view of a turned part has its centre line, a little longer than the view. */
export const centreLine: CheckRule = {
  id: 'centre-line',
  check: (reading) =>
    ofRole(reading, 'view').flatMap((view) => {
      const map = mapOf(reading, view.group.view);
      const outline = boxAround(strokesOfKind(view, 'visible').map((s) => s.box));
      if (!map || !outline) return [];
      const line = strokesOfKind(view, 'centre').find(
        (s) => Math.abs(s.y1 - map.axisY) < 0.01 && Math.abs(s.y2 - map.axisY) < 0.01,
      );
      if (!line) return [finding('centre-line', `The view ${view.name} has no centre line.`, [view.name])];
      const past = [outline[0] - line.box[0], line.box[2] - outline[2]];
      return past.some((p) => p < LEAST || p > MOST)
        ? [
            finding('centre-line', `The centre line of ${view.name} must pass its outline by 2 to 3 mm.`, [
              view.name,
            ]),
          ]
        : [];
    }),
};
