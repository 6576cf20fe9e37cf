import { boxAround, boxesMeet, boxInside } from '../../geometry/box';
import type { Box } from '../../geometry/box';
import type { Group } from '../../sheet';
import { finding } from '../reading';
import type { CheckRule, ReadGroup } from '../reading';

const FREE: readonly Group['role'][] = ['frame', 'stamp'];
const FOOT: readonly Group['role'][] = ['title-block', 'revision-table', 'frame', 'stamp'];

function boxesOf(group: ReadGroup): Box[] {
  return [...group.texts.map((t) => t.box), ...group.strokes.map((s) => s.box)];
}

/** Nothing outside the frame, nothing in the title block or the revision table but their own words. */
export const insideFrame: CheckRule = {
  id: 'inside-frame',
  check: (reading) => {
    const { frame } = reading.sheet;
    const foot = reading.groups
      .filter((g) => g.group.role === 'title-block' || g.group.role === 'revision-table')
      .flatMap((g) => {
        const box = boxAround(boxesOf(g));
        return box ? [{ name: g.name, box }] : [];
      });
    return reading.groups.flatMap((g) => {
      if (FREE.includes(g.group.role)) return [];
      const boxes = boxesOf(g);
      if (boxes.some((b) => !boxInside(b, frame, 0.001)))
        return [finding('inside-frame', `${g.name} reaches over the frame.`, [g.name])];
      if (FOOT.includes(g.group.role)) return [];
      const hit = foot.find((f) => boxes.some((b) => boxesMeet(b, f.box, -0.01)));
      return hit
        ? [finding('inside-frame', `${g.name} reaches into the ${hit.name}.`, [g.name, hit.name])]
        : [];
    });
  },
};
