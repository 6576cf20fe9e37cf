import { boxesMeet } from '../../geometry/box';
import { finding } from '../reading';
import type { CheckRule } from '../reading';

const SLACK = -0.02;

/** No text or symbol over another. */
export const textText: CheckRule = {
  id: 'text-text',
  check: ({ groups }) => {
    const all = groups
      .flatMap((g) => g.texts.map((text) => ({ g, text })))
      .sort((a, b) => a.text.box[0] - b.text.box[0]);
    return all.flatMap((a, i) => {
      const found = [];
      for (let k = i + 1; k < all.length; k++) {
        const b = all[k];
        if (!b || b.text.box[0] >= a.text.box[2]) break;
        if (boxesMeet(a.text.box, b.text.box, SLACK))
          found.push(
            finding('text-text', `“${a.text.text}” and “${b.text.text}” lie over one another.`, [
              a.g.name,
              b.g.name,
            ]),
          );
      }
      return found;
    });
  },
};
