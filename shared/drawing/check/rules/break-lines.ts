import { finding, mapOf, ofRole } from '../reading';
import type { CheckRule } from '../reading';

/** An interrupted view says so and shows two break lines for each gap. */
export const brokenView: CheckRule = {
  id: 'break-lines',
  check: (reading) =>
    ofRole(reading, 'view').flatMap((view) => {
      const map = mapOf(reading, view.group.view);
      const gaps = map && map.knots.length > 2 ? (map.knots.length - 2) / 2 : 0;
      const lines = view.group.marks.filter(
        (m) => m.type !== 'text' && m.type !== 'symbol' && m.line === 'break',
      ).length;
      if (gaps > 0 !== (view.group.broken === true))
        return [
          finding('break-lines', `The view ${view.name} does not say truly whether it is interrupted.`, [
            view.name,
          ]),
        ];
      return lines < 2 * gaps
        ? [
            finding('break-lines', `The view ${view.name} is interrupted without its break lines.`, [
              view.name,
            ]),
          ]
        : [];
    }),
};
