import { rulesFor } from '../../rules';
import type { CheckFinding } from '../../sheet';
import { dimensionPairs, finding, ofRole, strokesOfKind } from '../reading';
import type { CheckRule, ReadGroup } from '../reading';

const SLACK = 0.01;
const LEVEL = 1e-6;

type Way = 'level' | 'upright';

interface Span {
  at: number;
  lo: number;
  hi: number;
}

function spansOf(group: ReadGroup, way: Way): Span[] {
  return strokesOfKind(group, 'dimension').flatMap((s) => {
    const level = Math.abs(s.y1 - s.y2) < LEVEL;
    const upright = Math.abs(s.x1 - s.x2) < LEVEL;
    if (way === 'level' && level) return [{ at: s.y1, lo: s.box[0], hi: s.box[2] }];
    if (way === 'upright' && upright) return [{ at: s.x1, lo: s.box[1], hi: s.box[3] }];
    return [];
  });
}

/** Distance from a dimension line to the nearest outline beside it; null for a line that runs over its own view. */
function clearOf(span: Span, way: Way, view: ReadGroup): number | null {
  let least = Infinity;
  const outline = strokesOfKind(view, 'visible');
  const [a, b] = way === 'level' ? ([1, 3] as const) : ([0, 2] as const);
  const [c, d] = way === 'level' ? ([0, 2] as const) : ([1, 3] as const);
  const low = Math.min(...outline.map((s) => s.box[a]));
  const high = Math.max(...outline.map((s) => s.box[b]));
  if (span.at > low && span.at < high) return null;
  for (const s of outline) {
    if (s.box[d] < span.lo || s.box[c] > span.hi) continue;
    least = Math.min(least, Math.abs(span.at - s.box[a]), Math.abs(span.at - s.box[b]));
  }
  return Number.isFinite(least) ? least : null;
}

/** The first dimension line stands clear of the outline, and parallel ones clear of one another. */
export const spacing: CheckRule = {
  id: 'spacing',
  check: (reading) => {
    const rules = rulesFor(reading.sheet.style);
    const found: CheckFinding[] = [];
    for (const size of ofRole(reading, 'dimension')) {
      const view = ofRole(reading, 'view').find((v) => v.group.view === size.group.forView);
      for (const way of ['level', 'upright'] as const)
        for (const span of spansOf(size, way)) {
          const clear = view ? clearOf(span, way, view) : null;
          if (clear !== null && clear < rules.leastFirstLine - SLACK) {
            found.push(
              finding(
                'spacing',
                `The dimension line of ${size.name} stands ${clear.toFixed(2)} mm off the outline; the least is ${rules.leastFirstLine} mm.`,
                [size.name],
              ),
            );
            break;
          }
        }
    }
    for (const [a, b] of dimensionPairs(reading))
      for (const way of ['level', 'upright'] as const) {
        const close = spansOf(a, way).some((s) =>
          spansOf(b, way).some((t) => {
            const apart = Math.abs(s.at - t.at);
            return (
              Math.min(s.hi, t.hi) - Math.max(s.lo, t.lo) > 0.3 &&
              apart > 0.3 &&
              apart < rules.leastPitch - SLACK
            );
          }),
        );
        if (close)
          found.push(
            finding(
              'spacing',
              `The dimension lines of ${a.name} and ${b.name} stand closer than ${rules.leastPitch} mm.`,
              [a.name, b.name],
            ),
          );
      }
    return found;
  },
};
