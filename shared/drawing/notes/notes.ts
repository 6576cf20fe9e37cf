import { formatLength } from '../../units/format';
import type { Part } from '../../part/part';
import type { Writing } from '../size-text';

/** Widest line of the notes, in characters. */
const NOTE_WIDTH = 52;
/** Edges without a size of their own. Source: common practice. */
const EDGE_MM = 0.2;
const EDGE_INCH = 0.01 * 25.4;

const POLYGON: Readonly<Record<number, string>> = {
  1: 'Flat',
  2: 'Flats',
  4: 'Square',
  6: 'Hexagon',
  8: 'Octagon',
};

/** Breaks a sentence into lines no longer than the notes are wide. */
export function wrapNote(text: string): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of text
    .split(' ')
    .flatMap((w) =>
      w.length > NOTE_WIDTH ? (w.match(new RegExp(`.{1,${NOTE_WIDTH}}`, 'gu')) ?? [w]) : [w],
    )) {
    if (line !== '' && line.length + 1 + word.length > NOTE_WIDTH) {
      lines.push(line);
      line = word;
    } else line = line === '' ? word : `${line} ${word}`;
  }
  return line === '' ? lines : [...lines, line];
}

/** What the sheet says in words, one note an entry. */
export function notesOf(part: Part, writing: Writing): string[] {
  const format = { unit: writing.unit, style: writing.style, decimalSign: writing.decimalSign };
  const notes: string[] = [];
  for (const feature of part.features) {
    if (feature.kind !== 'flats' || !feature.roundedCorners) continue;
    const round = Math.max(
      ...part.body.outer
        .filter((p) => p.to > feature.from && p.from < feature.to)
        .map((p) => (p.kind === 'line' ? Math.max(p.start, p.end) : p.radius)),
    );
    const name = POLYGON[feature.count] ?? `${feature.count} flats`;
    notes.push(`${name} milled from round ${formatLength(2 * round, format)}: corners stay round.`);
  }
  const edge = writing.unit === 'in' ? EDGE_INCH : EDGE_MM;
  notes.push(
    `Edges broken ${formatLength(edge, { ...format, decimals: writing.unit === 'in' ? 2 : 1 })} unless a size is given.`,
  );
  notes.push('SIZES NOT CHECKED FOR STRENGTH.');
  return notes;
}
