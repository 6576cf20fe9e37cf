import { finding } from '../reading';
import type { CheckRule } from '../reading';
import { largerScaleFits } from '../room';

const SHORTEST = 2;
const SMALLEST = 4;

/** Steps and diameters are drawn large enough to be seen, where the sheet allows it. */
export const smallDetail: CheckRule = {
  id: 'small-detail',
  check: (reading) => {
    const { part, sheet } = reading;
    const steps = part.features.flatMap((f) => (f.kind === 'cylinder' || f.kind === 'cone' ? [f] : []));
    const shortest = Math.min(...steps.map((f) => f.to - f.from)) * sheet.scale;
    const smallest =
      Math.min(
        ...part.body.outer
          .filter((p) => p.kind === 'line' && p.start === p.end)
          .map((p) => (p.kind === 'line' ? 2 * p.start : Infinity)),
      ) * sheet.scale;
    if (shortest >= SHORTEST && smallest >= SMALLEST) return [];
    if (!largerScaleFits(reading)) return [];
    return [
      shortest < SHORTEST
        ? finding(
            'small-detail',
            `The shortest step is ${shortest.toFixed(1)} mm on paper; a larger scale fits.`,
            ['axis'],
          )
        : finding(
            'small-detail',
            `The smallest diameter is ${smallest.toFixed(1)} mm on paper; a larger scale fits.`,
            ['axis'],
          ),
    ];
  },
};
