import { ADVANCE, fontSizeFor } from '../../../shared/drawing/text-metrics';

/** Landscape A4 with the sheet's own frame (mm): wide at the left for filing. */
export const PAGE = { width: 297, height: 210, left: 16, right: 287, top: 10, bottom: 198 } as const;

/** Letters of 2.5 mm, as on the sheet; a glyph is this wide (mm). */
export const LETTER = 2.5;
export const FONT = fontSizeFor(LETTER);
export const GLYPH = ADVANCE * FONT;
/** One line of text, and what stands above its baseline (mm). */
export const LINE = 4.3;
export const BASELINE = 3.2;

/** Room of pictures and of how the work is held, left of the operations. */
export const PICTURE_WIDTH = 58;
/** Left edge of the table of operations, and how many characters stand in it side by side. */
export const TABLE_LEFT = PAGE.left + PICTURE_WIDTH;
export const CHARACTERS = Math.floor((PAGE.right - TABLE_LEFT) / GLYPH);

export interface Column {
  id: 'number' | 'operation' | 'stop' | 'target' | 'tool' | 'speed' | 'feed' | 'passes' | 'check' | 'tick';
  head: string;
  /** Characters of room, with one for the gap; in the list below the most that its longest word is given. */
  characters: number;
  align: 'start' | 'end';
}

/** Ten columns, in the order the machinist reads them. */
export const COLUMNS: readonly Column[] = [
  { id: 'number', head: 'no', characters: 4, align: 'end' },
  { id: 'operation', head: 'operation', characters: 18, align: 'start' },
  { id: 'stop', head: 'stop', characters: 9, align: 'end' },
  { id: 'target', head: 'target and limits', characters: 22, align: 'start' },
  { id: 'tool', head: 'tool', characters: 16, align: 'start' },
  { id: 'speed', head: 'rpm', characters: 5, align: 'end' },
  { id: 'feed', head: 'feed', characters: 8, align: 'end' },
  { id: 'passes', head: 'cuts', characters: 5, align: 'end' },
  { id: 'check', head: 'check with', characters: 13, align: 'start' },
  { id: 'tick', head: '', characters: 3, align: 'start' },
];

/** Left edge of each column on paper (mm). */
export function columnStarts(columns: readonly Column[]): number[] {
  const starts: number[] = [];
  let x: number = TABLE_LEFT;
  for (const column of columns) {
    starts.push(x);
    x += column.characters * GLYPH;
  }
  return starts;
}
