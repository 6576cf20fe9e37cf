import { finding } from '../reading';
import type { CheckRule } from '../reading';

/** ISO: read from the bottom or the right. ASME: upright. */
export const textDirection: CheckRule = {
  id: 'text-direction',
  check: ({ sheet, groups }) =>
    groups.flatMap((g) => {
      const wrong = g.group.marks.some(
        (mark) =>
          mark.type === 'text' &&
          mark.rotate !== undefined &&
          (sheet.style === 'asme' || mark.rotate !== -90),
      );
      return wrong
        ? [
            finding(
              'text-direction',
              `The text of ${g.name} cannot be read ${sheet.style === 'asme' ? 'upright' : 'from the bottom or the right'}.`,
              [g.name],
            ),
          ]
        : [];
    }),
};
