import { rulesFor } from '../../rules';
import { CAP_HEIGHT } from '../../text-metrics';
import { finding } from '../reading';
import type { CheckRule } from '../reading';

const SLACK = 0.003;

/** No letter lower than the smallest a copy keeps readable. */
export const textSize: CheckRule = {
  id: 'text-size',
  check: ({ sheet, groups }) => {
    const least = rulesFor(sheet.style).smallestText;
    return groups.flatMap((g) =>
      g.group.marks.flatMap((mark) =>
        mark.type === 'text' && mark.size * CAP_HEIGHT < least - SLACK
          ? [
              finding(
                'text-size',
                `“${mark.text}” is ${(mark.size * CAP_HEIGHT).toFixed(2)} mm high; the least is ${least} mm.`,
                [g.name],
              ),
            ]
          : [],
      ),
    );
  },
};
