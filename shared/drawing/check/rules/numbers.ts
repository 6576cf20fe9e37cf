import { finding } from '../reading';
import type { CheckRule } from '../reading';

function numbersIn(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  if (Array.isArray(value)) return value.flatMap(numbersIn);
  return value && typeof value === 'object' ? Object.values(value).flatMap(numbersIn) : [];
}

/** Every coordinate of the sheet is a number. */
export const numbers: CheckRule = {
  id: 'numbers',
  check: ({ groups }) =>
    groups
      .filter(
        (g) =>
          g.strokes.some((s) => !Number.isFinite(s.x1 + s.y1 + s.x2 + s.y2)) ||
          numbersIn(g.texts.map((t) => t.box)).some((n) => !Number.isFinite(n)),
      )
      .map((g) => finding('numbers', `${g.name} has a place that is no number.`, [g.name])),
};
