import { rulesFor } from '../../rules';
import { finding, ofRole } from '../reading';
import type { CheckRule } from '../reading';

const SLACK = 0.01;

/** A leader leaves its feature at 30 to 75 degrees. */
export const leaderAngle: CheckRule = {
  id: 'leader-angle',
  check: (reading) => {
    const { leastLeaderAngle, mostLeaderAngle } = rulesFor(reading.sheet.style);
    return ofRole(reading, 'dimension').flatMap((size) =>
      size.group.marks.flatMap((mark) => {
        if (mark.type !== 'polyline' || mark.line !== 'leader') return [];
        const [a, b] = mark.points;
        if (!a || !b) return [];
        const angle = (Math.atan2(Math.abs(b.y - a.y), Math.abs(b.x - a.x)) * 180) / Math.PI;
        return angle < leastLeaderAngle - SLACK || angle > mostLeaderAngle + SLACK
          ? [
              finding(
                'leader-angle',
                `The leader of ${size.name} leaves at ${angle.toFixed(1)}°; it must be ${leastLeaderAngle} to ${mostLeaderAngle}°.`,
                [size.name],
              ),
            ]
          : [];
      }),
    );
  },
};
