import { boxesMeet } from '../../geometry/box';
import { segmentsCross } from '../../geometry/segment';
import { finding, ofRole, strokesOfKind } from '../reading';
import type { CheckRule } from '../reading';

/** A leader runs clear of every outline but the one it ends on. */
export const leaderOverOutline: CheckRule = {
  id: 'leader-over-outline',
  check: (reading) => {
    const outlines = ofRole(reading, 'view').flatMap((v) => strokesOfKind(v, 'visible'));
    return ofRole(reading, 'dimension').flatMap((size) =>
      strokesOfKind(size, 'leader').some((s) =>
        outlines.some((o) => boxesMeet(s.box, o.box, 0) && segmentsCross(s, o, 0.3)),
      )
        ? [finding('leader-over-outline', `The leader of ${size.name} crosses an outline.`, [size.name])]
        : [],
    );
  },
};
