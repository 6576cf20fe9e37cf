/**
 * The title block (fields of ISO 7200) with the state's stamp at its left, where a code will say whether the paper is
 * current. Afterwards: nothing in it is cut short; a row grows where its words need a second line.
 */
import { lineMark } from '../arrow';
import type { Box } from '../geometry/box';
import type { DraftingStyle, Group, Mark, SheetSize, TitleBlock } from '../sheet';
import { projectionSymbol } from '../symbols/projection';
import { TEXTURE_ROOM, textureSymbol } from '../symbols/texture';
import { fontSizeFor, textWidth } from '../text-metrics';
import { wrapWords } from './cell-words';
import { frameBox, frameMarks } from './frame';
import { revisionTable } from './revision-table';
import { stateParts, stateStamp } from './state-stamp';

const BLOCK_WIDTH = 170;
const CODE_WIDTH = 26;
const CODE_SIDE = 22;
const STAMP_WIDTH = 24;
const ROW = 10;
const ROWS = 4;
const PAD = 1.2;
/** Baselines of a label and of one line under it; of the label and the first of several lines; and what several need. */
const ONE_LINE = { label: 3.5, first: 8.8 } as const;
const MORE_LINES = { label: 3.4, first: 7.75, under: 1 } as const;
const LINE_PITCH = 4.2;
const SMALL = fontSizeFor(2.5);
/** Title and number: as large as they fit. */
const TITLE_SIZES = [3.5, 3].map(fontSizeFor);

export interface Foot {
  groups: Group[];
  block: Box;
  /** Top of the revision table beside the block. */
  revisionsTop: number;
}

interface Cell {
  label: string;
  text: string;
  width: number;
  large?: boolean;
  /** A date, on the line of the label. */
  date?: string;
  draw?: (x: number, y: number) => Mark[];
}

interface BlockFacts {
  size: SheetSize;
  style: DraftingStyle;
  unit: 'mm' | 'in';
  scaleText: string;
  title: TitleBlock;
}

/** The square, on paper, that is kept for the code of a released sheet. */
export function codePlace(size: SheetSize): Box {
  const [, , x1, y1] = frameBox(size);
  const edge = (CODE_WIDTH - CODE_SIDE) / 2;
  const x = x1 - BLOCK_WIDTH + edge;
  const y = y1 - ROWS * ROW + edge;
  return [x, y, x + CODE_SIDE, y + CODE_SIDE];
}

function write(x: number, y: number, size: number, text: string, weight: 400 | 700 = 400): Mark {
  return { type: 'text', x, y, size, anchor: 'start', text, weight };
}

/** A cell's words in the largest letters that hold them, in as many lines as they need. */
function lettered(cell: Cell): { size: number; lines: string[] } {
  const text = cell.text === '' ? '–' : cell.text;
  const room = cell.width - 2 * PAD;
  const size = (cell.large ? TITLE_SIZES : []).find((each) => textWidth(text, each) <= room) ?? SMALL;
  return { size, lines: wrapWords(text, size, room) };
}

function fillCell(cell: Cell, x: number, y: number): Mark[] {
  const { size, lines } = cell.draw ? { size: SMALL, lines: [''] } : lettered(cell);
  const set = lines.length > 1 ? MORE_LINES : ONE_LINE;
  const marks: Mark[] = [write(x + PAD, y + set.label, SMALL, cell.label)];
  if (cell.date)
    marks.push({
      type: 'text',
      x: x + cell.width - PAD,
      y: y + set.label,
      size: SMALL,
      anchor: 'end',
      text: cell.date,
    });
  if (cell.draw) return [...marks, ...cell.draw(x, y)];
  lines.forEach((line, i) => marks.push(write(x + PAD, y + set.first + i * LINE_PITCH, size, line, 700)));
  return marks;
}

function rowHeight(cells: readonly Cell[]): number {
  const lines = Math.max(...cells.map((cell) => (cell.draw ? 1 : lettered(cell).lines.length)));
  return lines > 1 ? MORE_LINES.first + (lines - 1) * LINE_PITCH + MORE_LINES.under : ROW;
}

function signedCell(label: string, signed: TitleBlock['drawn'] | TitleBlock['checked'], width: number): Cell {
  if (signed === null) return { label, text: 'not yet', width };
  return typeof signed === 'string'
    ? { label, text: signed, width }
    : { label, text: signed.by, date: signed.date, width };
}

function rows({ size, style, unit, scaleText, title }: BlockFacts): Cell[][] {
  const material = [title.materialText, title.stockText].filter((t) => t !== '').join('; ');
  const texture = (x: number, y: number): Mark[] => [
    textureSymbol(x + PAD, y + 8.9, 2.5),
    write(x + PAD + 2.5 * TEXTURE_ROOM + 0.6, y + ONE_LINE.first, SMALL, title.texture || '–', 700),
  ];
  const projection = (x: number, y: number): Mark[] => [
    projectionSymbol(x + 15, y + 7.2, 3.6, style === 'iso' ? 'first' : 'third'),
  ];
  const brief: Cell = { label: 'GENERAL TOLERANCE', text: title.generalTolerance, width: 42 };
  // A table by decimal places takes a row of its own.
  const besides = lettered(brief).lines.length === 1;
  const tolerance: Cell = besides
    ? brief
    : { ...brief, label: 'GENERAL TOLERANCE, UNLESS A SIZE SAYS OTHERWISE', width: 144 };
  return [
    [
      { label: 'TITLE', text: title.title, width: 84, large: true },
      { label: 'DRAWING NO', text: title.number, width: 30, large: true },
      { label: 'REV', text: title.revision, width: 12, large: true },
      { label: 'SHEET', text: title.sheetOf, width: 18 },
    ],
    [
      { label: 'MATERIAL AND STOCK', text: material, width: 84 },
      { label: 'FINISH', text: title.finish, width: 30 },
      { label: 'QTY', text: title.quantity, width: 12 },
      { label: 'MASS', text: title.mass, width: 18 },
    ],
    ...(besides ? [] : [[tolerance]]),
    [
      ...(besides ? [tolerance] : []),
      { label: 'TEXTURE', text: title.texture, width: besides ? 22 : 42, draw: texture },
      { label: 'SCALE', text: scaleText, width: besides ? 20 : 42 },
      { label: 'PROJECTION', text: '', width: 30, draw: projection },
      { label: 'UNIT', text: unit, width: 12 },
      { label: 'SIZE', text: size, width: 18 },
    ],
    [
      signedCell('DRAWN', title.drawn, 49),
      signedCell('CHECKED', title.checked, 49),
      { label: 'OWNER', text: title.owner, width: 46 },
    ],
  ];
}

/** The date of a state: as the records give it, else of the signature that made it. */
function stateOf(title: TitleBlock): { word: string; date: string } {
  const { word, date } = stateParts(title.state);
  if (date !== '') return { word, date };
  if (title.stateDate) return { word, date: title.stateDate };
  const checked = typeof title.checked === 'object' && title.checked !== null ? title.checked.date : '';
  if (word === 'RELEASED') return { word, date: checked || (title.drawn?.date ?? '') };
  const open = ['DRAFT', 'TRIAL', 'IN REVIEW'].includes(word);
  return { word, date: open ? (title.drawn?.date ?? '') : '' };
}

function block(facts: BlockFacts): { marks: Mark[]; box: Box } {
  const [, , x1, y1] = frameBox(facts.size);
  const x0 = x1 - BLOCK_WIDTH;
  const table = rows(facts).map((cells) => ({ cells, height: rowHeight(cells) }));
  const y0 = y1 - table.reduce((sum, row) => sum + row.height, 0);
  const marks: Mark[] = [
    {
      type: 'polyline',
      line: 'frame',
      points: [
        { x: x0, y: y1 },
        { x: x0, y: y0 },
        { x: x1, y: y0 },
      ],
    },
    lineMark('table', x0 + CODE_WIDTH, y0, x0 + CODE_WIDTH, y1),
  ];
  let y = y0;
  for (const { cells, height } of table) {
    if (y > y0) marks.push(lineMark('table', x0 + CODE_WIDTH, y, x1, y));
    let x = x0 + CODE_WIDTH;
    cells.forEach((cell, k) => {
      if (k > 0) marks.push(lineMark('table', x, y, x, y + height));
      marks.push(...fillCell(cell, x, y));
      x += cell.width;
    });
    y += height;
  }
  const [cx0, , cx1, cy1] = codePlace(facts.size);
  const wider = (STAMP_WIDTH - CODE_SIDE) / 2;
  marks.push(
    ...stateStamp(stateOf(facts.title), [cx0 - wider, y0 + (CODE_WIDTH - CODE_SIDE) / 2, cx1 + wider, cy1]),
    write(x0 + 2, cy1 + 5.4, SMALL, 'STATE WHEN'),
    write(x0 + 2, cy1 + 9.4, SMALL, 'PRINTED'),
  );
  return { marks, box: [x0, y0, x1, y1] };
}

/** Frame, title block and revision table of one sheet. */
export function foot(facts: BlockFacts): Foot {
  const { marks, box } = block(facts);
  const revisions = revisionTable(facts.size, facts.title.revisions, box[0]);
  return {
    groups: [
      { role: 'frame', marks: frameMarks(facts.size) },
      { role: 'title-block', marks },
      { role: 'revision-table', marks: revisions.marks },
    ],
    block: box,
    revisionsTop: revisions.top,
  };
}
