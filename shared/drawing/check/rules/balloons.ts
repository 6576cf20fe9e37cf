import { boxesMeet } from '../../geometry/box';
import { distanceToSegment } from '../../geometry/segment';
import { finding, ofRole } from '../reading';
import type { CheckRule } from '../reading';

const CLEAR = 0;

/** On a numbered sheet every inspected size has its balloon once, and no balloon touches anything. */
export const balloons: CheckRule = {
  id: 'balloons',
  check: (reading) => {
    const drawn = ofRole(reading, 'balloon');
    if (drawn.length === 0) return [];
    const found = reading.scheme.sizes
      .filter((s) => s.balloon > 0)
      .flatMap((s) => {
        const own = drawn.filter((b) => b.group.sizeId === s.id);
        const right = own.length === 1 && own[0]?.texts.some((t) => t.text === String(s.balloon));
        return right
          ? []
          : [finding('balloons', `Balloon ${s.balloon} of ${s.id} must stand on the sheet once.`, [s.id])];
      });
    for (const balloon of drawn)
      for (const mark of balloon.group.marks) {
        if (mark.type !== 'circle') continue;
        const hit = reading.groups.find(
          (g) =>
            g !== balloon &&
            (g.strokes.some(
              (s) =>
                s.box[0] <= mark.cx + mark.r &&
                s.box[2] >= mark.cx - mark.r &&
                distanceToSegment(mark.cx, mark.cy, s) < mark.r + CLEAR,
            ) ||
              g.texts.some((t) =>
                boxesMeet(
                  t.box,
                  [mark.cx - mark.r, mark.cy - mark.r, mark.cx + mark.r, mark.cy + mark.r],
                  -0.6,
                ),
              )),
        );
        if (hit)
          found.push(
            finding('balloons', `The balloon of ${balloon.name} touches ${hit.name}.`, [
              balloon.name,
              hit.name,
            ]),
          );
      }
    return found;
  },
};
