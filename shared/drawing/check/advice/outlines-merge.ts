import { boxesMeet } from '../../geometry/box';
import { distanceToSegment, sideBySide } from '../../geometry/segment';
import { rulesFor } from '../../rules';
import { finding, ofRole, strokesOfKind } from '../reading';
import type { CheckRule, ReadStroke } from '../reading';

/** Edges this long side by side are seen as one thick line; edges on one another are one line. */
const LENGTH = 2;
const ON_ONE_ANOTHER = 0.02;
/** Share of a line's width under which the ink of two runs together. */
const INK = 0.78;

/** An edge that ends on the other leaves it there: a wedge is no blot. */
function touch(a: ReadStroke, b: ReadStroke): boolean {
  const ends = (s: ReadStroke, o: ReadStroke): number =>
    Math.min(distanceToSegment(s.x1, s.y1, o), distanceToSegment(s.x2, s.y2, o));
  return Math.min(ends(a, b), ends(b, a)) < ON_ONE_ANOTHER;
}

/** Two edges of a view stand far enough apart to print as two. */
export const outlinesMerge: CheckRule = {
  id: 'outlines-merge',
  check: (reading) => {
    // Nearer than the width of a line the ink runs together.
    const apart = rulesFor(reading.sheet.style).wideLine * INK;
    return ofRole(reading, 'view').flatMap((view) => {
      const edges = strokesOfKind(view, 'visible').filter(
        (s) => Math.hypot(s.x2 - s.x1, s.y2 - s.y1) > LENGTH,
      );
      const merged = edges.some((a, i) =>
        edges
          .slice(i + 1)
          .some(
            (b) =>
              boxesMeet(a.box, b.box, apart) &&
              !touch(a, b) &&
              sideBySide(a, b, apart) > LENGTH &&
              sideBySide(a, b, ON_ONE_ANOTHER) === 0,
          ),
      );
      return merged
        ? [
            finding('outlines-merge', `Two edges of the ${view.name} view print as one thick line.`, [
              view.name,
            ]),
          ]
        : [];
    });
  },
};
