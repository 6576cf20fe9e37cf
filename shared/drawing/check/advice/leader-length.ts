import { rulesFor } from '../../rules';
import { finding, ofRole, strokesOfKind } from '../reading';
import type { CheckRule } from '../reading';

const LEVEL = 1e-6;

/** A leader is short enough for the eye to follow. */
export const leaderLength: CheckRule = {
  id: 'leader-length',
  check: (reading) => {
    const most = rulesFor(reading.sheet.style).longestLeader;
    return ofRole(reading, 'dimension').flatMap((size) => {
      const long = strokesOfKind(size, 'leader').find(
        (s) => Math.abs(s.y1 - s.y2) > LEVEL && Math.hypot(s.x2 - s.x1, s.y2 - s.y1) > most + 0.01,
      );
      return long
        ? [finding('leader-length', `The leader of ${size.name} is longer than ${most} mm.`, [size.name])]
        : [];
    });
  },
};
