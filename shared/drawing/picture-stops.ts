import { lineMark } from './arrow';
import type { PicturePart } from './picture-profile';
import type { Mark } from './sheet';
import type { XMap } from './x-map';
import { toPaper } from './x-map';

const STEP = 3;

/** Stops as a stepped line from the datum: a mark at 0 and at each stop, a step lower for each. */
export function stopLine(
  stops: readonly { fromX: number; toX: number }[],
  map: XMap,
  left: number,
  y: number,
): PicturePart {
  const marks: Mark[] = [];
  const datum = stops[0]?.fromX ?? 0;
  const at = (x: number): number => left + toPaper(map.knots, x);
  marks.push(lineMark('thin', at(datum), y - 2, at(datum), y + STEP * Math.max(1, stops.length)));
  const reached = [...new Set(stops.map((s) => s.toX))].sort(
    (a, b) => Math.abs(a - datum) - Math.abs(b - datum),
  );
  reached.slice(0, 5).forEach((x, i) => {
    const level = y + i * STEP;
    marks.push(
      lineMark('thin', at(datum), level, at(x), level),
      lineMark('thin', at(x), level - 2, at(x), level + 2),
    );
  });
  return { class: 'stops', marks };
}
