import { finding } from '../reading';
import type { CheckRule } from '../reading';

const SLENDER = 3;
const SAME = 1e-6;

/** Only a long plain length is interrupted. */
export const breakInStubby: CheckRule = {
  id: 'break-in-stubby',
  check: ({ sheet, part }) => {
    const knots = sheet.maps.find((m) => m.view === 'axis')?.knots ?? [];
    const breaks = knots.flatMap((a, i): [number, number][] => {
      const b = knots[i + 1];
      return b && (b[1] - a[1]) / (b[0] - a[0]) < sheet.scale * 0.9 ? [[a[0], b[0]]] : [];
    });
    return breaks.flatMap(([from, to]) => {
      const length = part.features.find(
        (f) => f.kind === 'cylinder' && f.from <= from + SAME && f.to >= to - SAME,
      );
      const slender =
        length?.kind === 'cylinder' && length.to - length.from > SLENDER * Math.max(length.diameter, SAME);
      return slender
        ? []
        : [finding('break-in-stubby', 'The view is interrupted in a length that is not slender.', ['axis'])];
    });
  },
};
