import { growBox } from '../../geometry/box';
import { segmentMeetsBox } from '../../geometry/segment';
import { finding } from '../reading';
import type { CheckRule } from '../reading';

const SLACK = 0.02;

/** No line through a text or a symbol; a group's own symbols excepted. */
export const textStroke: CheckRule = {
  id: 'text-stroke',
  check: ({ groups }) =>
    groups.flatMap((g) =>
      g.texts.flatMap((text) => {
        const [x0, y0, x1, y1] = text.box;
        const inner = growBox(text.box, -SLACK);
        for (const other of groups) {
          const ink = other.inked;
          if (!ink || ink[0] >= x1 || ink[2] <= x0 || ink[1] >= y1 || ink[3] <= y0) continue;
          for (const s of other.strokes) {
            if (s.box[0] >= x1 || s.box[2] <= x0 || s.box[1] >= y1 || s.box[3] <= y0) continue;
            if (other === g && s.line === 'symbol') continue;
            if (segmentMeetsBox(s, inner))
              return [
                finding('text-stroke', `A ${s.line} line of ${other.name} runs through “${text.text}”.`, [
                  g.name,
                  other.name,
                ]),
              ];
          }
        }
        return [];
      }),
    ),
};
