/** Notes and the bar that shows whether the print is true to size, over the foot of the sheet on the left. */
import { lineMark } from '../arrow';
import type { Box } from '../geometry/box';
import { wrapNote } from '../notes/notes';
import type { Group, Mark } from '../sheet';
import { fontSizeFor, textWidth } from '../text-metrics';

const SMALL = fontSizeFor(2.5);
const PITCH = 4.4;

/** The column stands on `bottom`, its left edge at `left`. */
export function notesColumn(
  notes: readonly string[],
  unit: 'mm' | 'in',
  left: number,
  bottom: number,
): { group: Group; box: Box } {
  const long = unit === 'in' ? 4 * 25.4 : 100;
  const step = unit === 'in' ? 12.7 : 10;
  const words = unit === 'in' ? '4 in. Measure: prints true size' : '100 mm. Measure: prints true size';
  const barY = bottom - 6.4;
  const marks: Mark[] = [lineMark('table', left, barY, left + long, barY)];
  for (let x = 0; x <= long + 0.01; x += step) {
    const tall = x === 0 || x > long - 0.01 ? 1.8 : Math.abs(x - long / 2) < 0.01 ? 1.2 : 0.8;
    marks.push(lineMark('table', left + x, barY - tall, left + x, barY + (tall === 1.8 ? 1.4 : 0)));
  }
  marks.push({ type: 'text', x: left + 1.2, y: bottom - 1.6, size: SMALL, anchor: 'start', text: words });
  const lines = notes.flatMap(wrapNote);
  const all = lines.length > 0 ? ['NOTES', ...lines] : [];
  const last = barY - 4.2;
  all.forEach((text, i) =>
    marks.push({
      type: 'text',
      x: left,
      y: last - (all.length - 1 - i) * PITCH,
      size: SMALL,
      anchor: 'start',
      text,
      weight: i === 0 ? 700 : 400,
    }),
  );
  const top = all.length > 0 ? last - (all.length - 1) * PITCH - 0.85 * SMALL : barY - 1.8;
  const right = left + Math.max(long, ...all.map((t) => textWidth(t, SMALL)));
  return { group: { role: 'notes', marks }, box: [left, top, right, bottom] };
}
