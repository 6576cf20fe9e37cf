import type { Mark } from '../../../shared/drawing/sheet';
import { STANDING_CAUTIONS } from '../../../shared/route/cautions';
import type { Operation } from '../../../shared/route/route';
import type { Cells } from './cells';
import { lettering, rule, tickBox } from './lettering';
import { BASELINE, COLUMNS, columnStarts, GLYPH, LINE, PAGE, PICTURE_WIDTH } from './measures';
import { wrap } from './wrap';

/** A row of the card: its height, and its marks once it is known where it stands. */
export interface Row {
  height: number;
  marks: (y: number) => Mark[];
}

const PADDING = 0.8;
const STARTS = columnStarts();
const TABLE_LEFT = PAGE.left + PICTURE_WIDTH;

/** One operation over the ten columns, with its cautions under it. */
export function operationRow(operation: Operation, cells: Cells): Row {
  const columns = COLUMNS.map((column, index) => ({
    column,
    start: STARTS[index] ?? TABLE_LEFT,
    lines: cells[column.id].split('\n').flatMap((text) => wrap(text, column.characters - 1)),
  }));
  // What stands at the foot of every card need not stand in it again.
  const own = operation.cautions.filter((caution) => !STANDING_CAUTIONS.includes(caution));
  const cautions = own.flatMap((caution) => cautionLines(caution));
  const lines = Math.max(1, ...columns.map((one) => one.lines.length));
  const height = (lines + cautions.length) * LINE + 2 * PADDING;
  return {
    height,
    marks: (y) => [
      ...columns.flatMap(({ column, start, lines: texts }) => {
        const x = column.align === 'end' ? start + (column.characters - 0.5) * GLYPH : start + 0.4 * GLYPH;
        const weight = column.id === 'number' || column.id === 'target' ? 700 : 400;
        return texts.flatMap((text, line) =>
          lettering(x, y + PADDING + BASELINE + line * LINE, text, { anchor: column.align, weight }),
        );
      }),
      tickBox(PAGE.right - 4.5, y + PADDING + BASELINE),
      ...cautions.flatMap((caution, line) => cautionMarks(caution, y + PADDING + (lines + line) * LINE)),
      rule(TABLE_LEFT, y + height, PAGE.right, y + height),
    ],
  };
}

/** The names of the columns. */
export function headRow(): Row {
  const height = LINE + 2 * PADDING;
  return {
    height,
    marks: (y) => [
      ...COLUMNS.flatMap((column, index) => {
        const start = STARTS[index] ?? TABLE_LEFT;
        const x = column.align === 'end' ? start + (column.characters - 0.5) * GLYPH : start + 0.4 * GLYPH;
        return lettering(x, y + PADDING + BASELINE, column.head, { anchor: column.align });
      }),
      rule(TABLE_LEFT, y + height, PAGE.right, y + height),
    ],
  };
}

interface CautionLine {
  text: string;
  first: boolean;
}

const CAUTION = 'CAUTION';
const CAUTION_LEFT = TABLE_LEFT + 4 * GLYPH;

function cautionLines(text: string): CautionLine[] {
  const room = Math.floor((PAGE.right - CAUTION_LEFT) / GLYPH) - CAUTION.length - 2;
  return wrap(text, room).map((line, index) => ({ text: line, first: index === 0 }));
}

/** A bar, the word, the sentence: seen before it is read. */
function cautionMarks({ text, first }: CautionLine, y: number): Mark[] {
  const baseline = y + BASELINE;
  return [
    { type: 'line', line: 'frame', x1: CAUTION_LEFT + 0.8, y1: y + 0.2, x2: CAUTION_LEFT + 0.8, y2: y + LINE - 0.2 },
    ...(first ? lettering(CAUTION_LEFT + 2, baseline, CAUTION, { weight: 800 }) : []),
    ...lettering(CAUTION_LEFT + 2 + (CAUTION.length + 1) * GLYPH, baseline, text),
  ];
}
