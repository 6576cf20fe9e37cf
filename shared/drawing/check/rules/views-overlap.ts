import { boxAround, boxesMeet } from '../../geometry/box';
import { finding, ofRole } from '../reading';
import type { CheckRule } from '../reading';

/** No view over another. */
export const viewsOverlap: CheckRule = {
  id: 'views-overlap',
  check: (reading) => {
    const views = ofRole(reading, 'view').flatMap((v) => {
      const box = boxAround(v.strokes.map((s) => s.box));
      return box ? [{ name: v.name, box }] : [];
    });
    return views.flatMap((a, i) =>
      views
        .slice(i + 1)
        .flatMap((b) =>
          boxesMeet(a.box, b.box)
            ? [
                finding('views-overlap', `The views ${a.name} and ${b.name} lie over one another.`, [
                  a.name,
                  b.name,
                ]),
              ]
            : [],
        ),
    );
  },
};
