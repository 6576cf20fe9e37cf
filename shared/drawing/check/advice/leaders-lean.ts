import type { CheckRule, ReadGroup, ReadStroke } from '../reading';
import { finding, ofRole, strokesOfKind } from '../reading';

/** Leaders whose tips are nearer than this are neighbours, mm. */
const NEAR = 12;
const LEVEL = 1e-6;

interface Leader {
  size: ReadGroup;
  x: number;
  y: number;
  lean: number;
}

function leaderOf(size: ReadGroup): Leader[] {
  const shaft = strokesOfKind(size, 'leader').find((s: ReadStroke) => Math.abs(s.y1 - s.y2) > LEVEL);
  return shaft ? [{ size, x: shaft.x1, y: shaft.y1, lean: Math.sign(shaft.x2 - shaft.x1) }] : [];
}

/**
 * Neighbouring leaders lean alike, or away from one another with the left one leaning left; they never lean together
 * over one another.
 */
export const leadersLean: CheckRule = {
  id: 'leaders-lean',
  check: (reading) => {
    const leaders = ofRole(reading, 'dimension')
      .flatMap(leaderOf)
      .sort((a, b) => a.x - b.x);
    return leaders.flatMap((a, i) => {
      const b = leaders[i + 1];
      if (!b || Math.abs(b.x - a.x) > NEAR || Math.abs(b.y - a.y) > NEAR) return [];
      if (!(a.lean > 0 && b.lean < 0)) return [];
      return [
        finding('leaders-lean', `The leaders of ${a.size.name} and ${b.size.name} lean into one another.`, [
          a.size.name,
          b.size.name,
        ]),
      ];
    });
  },
};
