import { lineMark } from '../arrow';
import type { Mark, SheetSize, TitleBlock } from '../sheet';
import { fontSizeFor } from '../text-metrics';
import { wrapWords } from './cell-words';
import { frameBox } from './frame';

const LEAST_ROW = 6;
const LINE_PITCH = 4.2;
const WIDTH = 96;
const MOST_REVISIONS = 4;
const LETTER = 8.6;
const DATE = 23.2;
const BY = 25.2;
const SMALL = fontSizeFor(2.5);

/** The last revisions, newest on top, each row as high as its words need; beside a block whose left edge is `right`. */
export function revisionTable(
  size: SheetSize,
  revisions: TitleBlock['revisions'],
  right: number,
): { marks: Mark[]; top: number } {
  const [frameLeft, , , bottom] = frameBox(size);
  const left = right - WIDTH < frameLeft + 3 ? frameLeft : right - WIDTH;
  const widths = [LETTER, right - left - LETTER - BY - DATE, BY, DATE];
  const rows = [
    ...revisions
      .slice(-MOST_REVISIONS)
      .reverse()
      .map((r) => [r.letter, r.change, r.by, r.date]),
    ['REV', 'WHAT CHANGED', 'BY', 'DATE'],
  ].map((texts) => {
    const cells = texts.map((text, k) => wrapWords(text, SMALL, (widths[k] ?? 0) - 1.4));
    const lines = Math.max(...cells.map((cell) => cell.length));
    return { cells, height: LEAST_ROW + (lines - 1) * LINE_PITCH };
  });
  const top = bottom - rows.reduce((sum, row) => sum + row.height, 0);
  const marks: Mark[] = [lineMark('table', left, top, left, bottom)];
  let y = top;
  for (const { cells, height } of rows) {
    marks.push(lineMark('table', left, y, right, y));
    let x = left;
    cells.forEach((lines, k) => {
      if (k > 0) marks.push(lineMark('table', x, y, x, y + height));
      lines.forEach((text, i) => {
        if (text !== '')
          marks.push({
            type: 'text',
            x: x + 0.8,
            y: y + 4.2 + i * LINE_PITCH,
            size: SMALL,
            anchor: 'start',
            text,
          });
      });
      x += widths[k] ?? 0;
    });
    y += height;
  }
  return { marks, top };
}
