/** The strip at the foot of the sheet: title block (fields of ISO 7200), revision table, place for the code that says whether the paper is current. */
import { frameOf, SHEET_SIZES } from '../../standards/sheets';
import { lineMark } from '../arrow';
import type { Box } from '../geometry/box';
import type { DraftingStyle, Group, Mark, SheetSize, TitleBlock } from '../sheet';
import { projectionSymbol } from '../symbols/projection';
import { TEXTURE_ROOM, textureSymbol } from '../symbols/texture';
import { fontSizeFor, textWidth } from '../text-metrics';

const BLOCK_WIDTH = 170;
const CODE_WIDTH = 26;
const CODE_SIDE = 22;
const ROW = 10;
const REVISION_ROW = 6;
const REVISION_WIDTH = 96;
const MOST_REVISIONS = 4;
const PAD = 1.2;
const SMALL = fontSizeFor(2.5);
/** Title and number: as large as they fit. */
const TITLE_SIZES = [3.5, 3].map(fontSizeFor);

/** A field whose words are longer than its room: they are said in the notes. */
export interface Overflow {
  label: string;
  text: string;
}

export interface Foot {
  groups: Group[];
  block: Box;
  /** Top of the revision table beside the block. */
  revisionsTop: number;
  overflow: Overflow[];
}

interface Cell {
  label: string;
  text: string;
  width: number;
  large?: boolean;
  /** Figures are never cut short: the cell points to the notes instead. */
  inNotes?: boolean;
  draw?: (x: number, y: number) => Mark[];
}

/** The frame of a sheet: x0, y0, x1, y1. */
export function frameBox(size: SheetSize): Box {
  const f = frameOf(SHEET_SIZES[size]);
  return [f.x, f.y, f.x + f.width, f.y + f.height];
}

function blockBox(size: SheetSize): Box {
  const [, , x1, y1] = frameBox(size);
  return [x1 - BLOCK_WIDTH, y1 - 4 * ROW, x1, y1];
}

/** The square, on paper, that is kept for the code of a released sheet. */
export function codePlace(size: SheetSize): Box {
  const [x0, y0] = blockBox(size);
  const edge = (CODE_WIDTH - CODE_SIDE) / 2;
  return [x0 + edge, y0 + edge, x0 + edge + CODE_SIDE, y0 + edge + CODE_SIDE];
}

function fitted(text: string, size: number, room: number): string {
  if (textWidth(text, size) <= room) return text;
  return `${[...text].slice(0, Math.max(1, Math.floor(room / (0.6 * size)) - 1)).join('')}…`;
}

function write(x: number, y: number, size: number, text: string, weight: 400 | 700 = 400): Mark {
  return { type: 'text', x, y, size, anchor: 'start', text, weight };
}

function fillCell(cell: Cell, x: number, y: number, overflow: Overflow[]): Mark[] {
  const marks: Mark[] = [write(x + PAD, y + 3.6, SMALL, cell.label)];
  if (cell.draw) return [...marks, ...cell.draw(x, y)];
  const text = cell.text === '' ? '–' : cell.text;
  const room = cell.width - 2 * PAD;
  const size = (cell.large ? TITLE_SIZES : []).find((each) => textWidth(text, each) <= room) ?? SMALL;
  const whole = textWidth(text, size) <= room;
  if (!whole) overflow.push({ label: cell.label, text });
  const shown = whole ? text : cell.inNotes ? 'see notes' : fitted(text, size, room);
  return [...marks, write(x + PAD, y + 8.7, size, shown, 700)];
}

function person(signed: TitleBlock['drawn'] | TitleBlock['checked']): string {
  if (signed === null) return 'not yet';
  return typeof signed === 'string' ? signed : `${signed.by}, ${signed.date}`;
}

interface BlockFacts {
  size: SheetSize;
  style: DraftingStyle;
  unit: 'mm' | 'in';
  scaleText: string;
  title: TitleBlock;
}

function rows({ size, style, unit, scaleText, title }: BlockFacts): Cell[][] {
  const material = [title.materialText, title.stockText].filter((t) => t !== '').join('; ');
  const texture = (x: number, y: number): Mark[] => [
    textureSymbol(x + PAD, y + 8.9, 2.5),
    write(x + PAD + 2.5 * TEXTURE_ROOM + 0.6, y + 8.7, SMALL, fitted(title.texture || '–', SMALL, 15), 700),
  ];
  const projection = (x: number, y: number): Mark[] => [
    projectionSymbol(x + 15, y + 7.2, 3.6, style === 'iso' ? 'first' : 'third'),
  ];
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
    [
      { label: 'GENERAL TOLERANCE', text: title.generalTolerance, width: 42, inNotes: true },
      { label: 'TEXTURE', text: title.texture, width: 22, draw: texture },
      { label: 'SCALE', text: scaleText, width: 20 },
      { label: 'PROJECTION', text: '', width: 30, draw: projection },
      { label: 'UNIT', text: unit, width: 12 },
      { label: 'SIZE', text: size, width: 18 },
    ],
    [
      { label: 'DRAWN', text: person(title.drawn), width: 49 },
      { label: 'CHECKED', text: person(title.checked), width: 49 },
      { label: 'STATE', text: title.state, width: 46 },
    ],
  ];
}

function block(facts: BlockFacts, overflow: Overflow[]): Mark[] {
  const [x0, y0, x1, y1] = blockBox(facts.size);
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
  rows(facts).forEach((cells, i) => {
    const y = y0 + i * ROW;
    if (i > 0) marks.push(lineMark('table', x0 + CODE_WIDTH, y, x1, y));
    let x = x0 + CODE_WIDTH;
    cells.forEach((cell, k) => {
      if (k > 0) marks.push(lineMark('table', x, y, x, y + ROW));
      marks.push(...fillCell(cell, x, y, overflow));
      x += cell.width;
    });
  });
  const code = codePlace(facts.size);
  marks.push({
    type: 'polyline',
    line: 'table',
    closed: true,
    points: [
      { x: code[0], y: code[1] },
      { x: code[2], y: code[1] },
      { x: code[2], y: code[3] },
      { x: code[0], y: code[3] },
    ],
  });
  ['IS THIS', 'PAPER', 'CURRENT?'].forEach((line, i) =>
    marks.push(write(x0 + 2, y0 + 29.4 + i * 4, SMALL, line, i === 2 ? 700 : 400)),
  );
  return marks;
}

function revisionTable(size: SheetSize, title: TitleBlock): { marks: Mark[]; top: number } {
  const [bx0, , , y1] = blockBox(size);
  const frameLeft = frameBox(size)[0];
  const x0 = bx0 - REVISION_WIDTH < frameLeft + 3 ? frameLeft : bx0 - REVISION_WIDTH;
  const widths = [8.6, bx0 - x0 - 8.6 - 22.5 - 23.2, 22.5, 23.2];
  const lines = [
    ...title.revisions
      .slice(-MOST_REVISIONS)
      .reverse()
      .map((r) => [r.letter, r.change, r.by, r.date]),
    ['REV', 'WHAT CHANGED', 'BY', 'DATE'],
  ];
  const top = y1 - lines.length * REVISION_ROW;
  const marks: Mark[] = [lineMark('table', x0, top, x0, y1)];
  lines.forEach((texts, i) => {
    const y = top + i * REVISION_ROW;
    marks.push(lineMark('table', x0, y, bx0, y));
    let x = x0;
    texts.forEach((text, k) => {
      const width = widths[k] ?? 0;
      if (k > 0) marks.push(lineMark('table', x, y, x, y + REVISION_ROW));
      if (text !== '') marks.push(write(x + 0.8, y + 4.2, SMALL, fitted(text, SMALL, width - 1.4)));
      x += width;
    });
  });
  return { marks, top };
}

function frame(size: SheetSize): Mark[] {
  const [x0, y0, x1, y1] = frameBox(size);
  const { width, height } = SHEET_SIZES[size];
  const mx = width / 2;
  const my = height / 2;
  const rect: Mark = {
    type: 'polyline',
    line: 'frame',
    closed: true,
    points: [
      { x: x0, y: y0 },
      { x: x1, y: y0 },
      { x: x1, y: y1 },
      { x: x0, y: y1 },
    ],
  };
  // Centring marks, from the paper's edge into the frame (ISO 5457).
  return [
    rect,
    lineMark('table', mx, Math.max(0, y0 - 5), mx, y0 + 3),
    lineMark('table', mx, y1, mx, Math.min(height, y1 + 5)),
    lineMark('table', Math.max(0, x0 - 5), my, x0 + 3, my),
    lineMark('table', x1 - 3, my, Math.min(width, x1 + 5), my),
  ];
}

/** Frame, title block and revision table of one sheet. */
export function foot(facts: BlockFacts): Foot {
  const overflow: Overflow[] = [];
  const blockMarks = block(facts, overflow);
  const revisions = revisionTable(facts.size, facts.title);
  return {
    groups: [
      { role: 'frame', marks: frame(facts.size) },
      { role: 'title-block', marks: blockMarks },
      { role: 'revision-table', marks: revisions.marks },
    ],
    block: blockBox(facts.size),
    revisionsTop: revisions.top,
    overflow,
  };
}
