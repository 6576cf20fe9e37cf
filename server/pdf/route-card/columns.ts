import type { Cells } from './cells';
import type { Column } from './measures';
import { CHARACTERS, COLUMNS } from './measures';
import { charactersOf, wrap } from './wrap';

type Id = Column['id'];
/** Columns whose texts may break over lines; the others hold figures and take what the longest needs. */
const WORDS: readonly Id[] = ['operation', 'target', 'tool', 'check'];
/** Between targets that stand in one line. */
const BETWEEN = '   ';

/**
 * Columns as wide as these operations need, so that the card takes the fewest lines: each begins with its longest word,
 * then room goes, step by step, where it saves most.
 */
export function fitColumns(cells: readonly Cells[]): Column[] {
  const widths = new Map(COLUMNS.map((column) => [column.id, leastOf(column, cells)]));
  const known = new Map<string, number>();
  const weigh = (id?: Id, more = 0) =>
    cells.reduce(
      (sum, row) => sum + weightOf(row, (one) => (widths.get(one) ?? 0) + (one === id ? more : 0), known),
      0,
    );
  let left = CHARACTERS - [...widths.values()].reduce((sum, width) => sum + width, 0);
  for (;;) {
    const now = weigh();
    let best: { id: Id; more: number; gain: number } | null = null;
    for (const id of WORDS) {
      for (let more = 1; more <= left; more += 1) {
        const gain = (now - weigh(id, more)) / more;
        if (gain > (best?.gain ?? 0)) best = { id, more, gain };
      }
    }
    if (!best) break;
    widths.set(best.id, (widths.get(best.id) ?? 0) + best.more);
    left -= best.more;
  }
  // What saves nothing more is air, shared out where texts stand side by side.
  WORDS.forEach((id, index) =>
    widths.set(id, (widths.get(id) ?? 0) + Math.max(0, Math.floor((left + index) / WORDS.length))),
  );
  return COLUMNS.map((column) => ({ ...column, characters: widths.get(column.id) ?? 0 }));
}

/** The longest word and the head, with one character for the gap; never more than the column has at most. */
function leastOf(column: Column, cells: readonly Cells[]): number {
  // A box to tick has no text, and three figures of a number are enough for any route.
  if (column.id === 'tick' || column.id === 'number') return column.characters;
  // A size and its limits are read as one.
  const between = column.id === 'target' ? /\n|, / : /\s+/;
  const words = cells.flatMap((row) => row[column.id].split(between)).map(charactersOf);
  return Math.min(column.characters, Math.max(column.head.length, ...words) + 1);
}

/** Lines of a row, its tallest cell counting most. */
function weightOf(row: Cells, widthOf: (id: Id) => number, known: Map<string, number>): number {
  const lines = WORDS.map((id) => {
    const [room, shared] = roomOf(row, id, widthOf);
    const key = `${room} ${shared} ${row[id]}`;
    const count = known.get(key) ?? linesOf(row[id], room, shared).length;
    known.set(key, count);
    return count;
  });
  return 4 * Math.max(...lines) + lines.reduce((all, one) => all + one, 0);
}

/** The lines of each column's cell in that row. A text of words takes the room of empty cells beside it too. */
export function cellLines(row: Cells, columns: readonly Column[]): Map<Id, string[]> {
  const widths = new Map(columns.map((column) => [column.id, column.characters]));
  const entries = columns.map(({ id }): [Id, string[]] => {
    const [room, shared] = roomOf(row, id, (one) => widths.get(one) ?? 0);
    return [id, linesOf(row[id], room, shared)];
  });
  return new Map(entries);
}

/** Characters of room, and whether they reach over other columns. */
function roomOf(row: Cells, id: Id, widthOf: (id: Id) => number): [number, boolean] {
  let room = widthOf(id);
  if (!WORDS.includes(id)) return [room, false];
  let shared = false;
  for (let next = COLUMNS.findIndex((column) => column.id === id) + 1; next < COLUMNS.length; next += 1) {
    const beside = COLUMNS[next];
    // The box to tick stands in a cell without text.
    if (!beside || beside.id === 'tick' || row[beside.id] !== '') break;
    room += widthOf(beside.id);
    shared = true;
  }
  return [room, shared];
}

/** The last character of the room is the gap. Pieces have a line each, unless the room is wide enough for several. */
function linesOf(text: string, room: number, shared: boolean): string[] {
  const pieces = text.split('\n').flatMap((piece) => wrap(piece, room - 1));
  if (!shared) return pieces;
  return pieces.reduce<string[]>((lines, piece) => {
    const last = lines.at(-1);
    const joined = last === undefined ? piece : `${last}${BETWEEN}${piece}`;
    if (text.includes('\n') && last !== undefined && charactersOf(joined) < room)
      lines[lines.length - 1] = joined;
    else lines.push(piece);
    return lines;
  }, []);
}
