import type { Mark } from '../../../shared/drawing/sheet';
import type { Cells } from './cells';
import { cellLines } from './columns';
import { lettering, rule, tickBox } from './lettering';
import type { Column } from './measures';
import { BASELINE, columnStarts, GLYPH, LINE, PAGE, TABLE_LEFT } from './measures';
import { wrap } from './wrap';

/** A row of the card: its height, and its marks once it is known where it stands. */
export interface Row {
  height: number;
  marks: (y: number) => Mark[];
}

const PADDING = 0.7;

/** One operation over the ten columns, with its instructions and then its cautions under it. */
export function operationRow(
  columns: readonly Column[],
  cells: Cells,
  notes: readonly string[],
  cautions: readonly string[],
): Row {
  const starts = columnStarts(columns);
  const texts = cellLines(cells, columns);
  const placed = columns.map((column, index) => ({
    column,
    start: starts[index] ?? TABLE_LEFT,
    lines: texts.get(column.id) ?? [],
  }));
  const told = wrap(notes.join(' '), Math.floor((PAGE.right - CAUTION_LEFT) / GLYPH));
  const said = cautionLines(cautions);
  const lines = Math.max(1, ...placed.map((one) => one.lines.length));
  const height = (lines + told.length + said.length) * LINE + 2 * PADDING;
  return {
    height,
    marks: (y) => [
      ...placed.flatMap(({ column, start, lines: written }) => {
        const weight = column.id === 'number' || column.id === 'target' ? 700 : 400;
        return written.flatMap((text, line) =>
          lettering(edgeOf(column, start), y + PADDING + BASELINE + line * LINE, text, {
            anchor: column.align,
            weight,
          }),
        );
      }),
      tickBox(PAGE.right - 4.5, y + PADDING + BASELINE),
      ...told.flatMap((text, line) =>
        lettering(CAUTION_LEFT, y + PADDING + BASELINE + (lines + line) * LINE, text),
      ),
      ...cautionMarks(said, y + PADDING + (lines + told.length) * LINE),
      rule(TABLE_LEFT, y + height, PAGE.right, y + height),
    ],
  };
}

/** The names of the columns. */
export function headRow(columns: readonly Column[]): Row {
  const starts = columnStarts(columns);
  const height = LINE + 2 * PADDING;
  return {
    height,
    marks: (y) => [
      ...columns.flatMap((column, index) =>
        lettering(edgeOf(column, starts[index] ?? TABLE_LEFT), y + PADDING + BASELINE, column.head, {
          anchor: column.align,
        }),
      ),
      rule(TABLE_LEFT, y + height, PAGE.right, y + height),
    ],
  };
}

/** Where a column's texts begin, or end when they stand to the right. */
function edgeOf({ align, characters }: Column, start: number): number {
  return align === 'end' ? start + (characters - 0.6) * GLYPH : start + 0.4 * GLYPH;
}

const CAUTION = 'CAUTION';
const CAUTION_LEFT = TABLE_LEFT + 4 * GLYPH;
const CAUTION_TEXT = CAUTION_LEFT + 2 + (CAUTION.length + 1) * GLYPH;

function cautionLines(cautions: readonly string[]): string[] {
  return wrap(cautions.join(' '), Math.floor((PAGE.right - CAUTION_TEXT) / GLYPH));
}

/** A bar, the word, the sentences: seen before they are read. */
function cautionMarks(lines: readonly string[], y: number): Mark[] {
  if (lines.length === 0) return [];
  const bar = CAUTION_LEFT + 0.8;
  return [
    { type: 'line', line: 'frame', x1: bar, y1: y + 0.2, x2: bar, y2: y + lines.length * LINE - 0.2 },
    ...lettering(CAUTION_LEFT + 2, y + BASELINE, CAUTION, { weight: 800 }),
    ...lines.flatMap((text, line) => lettering(CAUTION_TEXT, y + BASELINE + line * LINE, text)),
  ];
}
