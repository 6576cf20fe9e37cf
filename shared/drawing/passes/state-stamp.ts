/** The state of a sheet as a stamp: a ruled box with the word and its date; the border says the state too, in one ink. */
import { lineMark } from '../arrow';
import type { Box } from '../geometry/box';
import { growBox } from '../geometry/box';
import { segmentWithinBox } from '../geometry/segment';
import type { LineType, Mark, TextMark } from '../sheet';
import { CAP_HEIGHT, fontSizeFor, textBox, textWidth } from '../text-metrics';

type Border = 'dashed' | 'dotted' | 'solid' | 'double' | 'struck' | 'thick';

/** Borders by state; words that are not listed get a plain one. */
const BORDERS: Readonly<Record<string, Border>> = {
  DRAFT: 'dashed',
  TRIAL: 'dotted',
  RETURNED: 'dashed',
  'IN REVIEW': 'solid',
  RELEASED: 'double',
  SUPERSEDED: 'struck',
  WITHDRAWN: 'thick',
};
/** Letter heights tried, mm: the word is as large as the box allows. */
const LETTERS = [5, 3.5, 3, 2.5];
const DATE_LETTER = 2.5;
const AIR = 1.5;
const BETWEEN = 2.2;
const DOUBLE = 0.9;
const DASH = [2.4, 1.4] as const;
const DOT = [0.05, 1.1] as const;
const DATED = /^(.*?)[\s,]*(\d{4}-\d{2}-\d{2})$/;

/** A state as the records say it, `RELEASED 2026-03-09`, as word and date. */
export function stateParts(state: string): { word: string; date: string } {
  const found = DATED.exec(state.trim());
  return found ? { word: found[1] ?? '', date: found[2] ?? '' } : { word: state.trim(), date: '' };
}

function sides([x0, y0, x1, y1]: Box): (readonly [number, number, number, number])[] {
  return [
    [x0, y0, x1, y0],
    [x1, y0, x1, y1],
    [x1, y1, x0, y1],
    [x0, y1, x0, y0],
  ];
}

function rectangle(line: LineType, box: Box): Mark[] {
  return sides(box).map(([x1, y1, x2, y2]) => lineMark(line, x1, y1, x2, y2));
}

/** Dashes drawn one by one, each side begun and ended on a whole dash, so that the corners close. */
function dashes(box: Box, [ink, gap]: readonly [number, number]): Mark[] {
  return sides(box).flatMap(([x1, y1, x2, y2]) => {
    const length = Math.hypot(x2 - x1, y2 - y1);
    const n = Math.max(1, Math.round((length - ink) / (ink + gap)));
    const step = (length - ink) / n;
    const at = (along: number): readonly [number, number] => [
      x1 + ((x2 - x1) * along) / length,
      y1 + ((y2 - y1) * along) / length,
    ];
    return Array.from({ length: n + 1 }, (_, i) =>
      lineMark('symbol', ...at(i * step), ...at(i * step + ink)),
    );
  });
}

/** A stroke from corner to corner that stops beside the writing. */
function strike([x0, y0, x1, y1]: Box, texts: readonly TextMark[]): Mark[] {
  let pieces: (readonly [number, number])[] = [[0, 1]];
  const line = { x1: x0, y1: y1, x2: x1, y2: y0 };
  for (const text of texts) {
    const hole = segmentWithinBox(line, growBox(textBox(text), 0.4));
    if (!hole) continue;
    pieces = pieces.flatMap(([a, b]) => [
      ...(hole[0] > a ? [[a, Math.min(b, hole[0])] as const] : []),
      ...(hole[1] < b ? [[Math.max(a, hole[1]), b] as const] : []),
    ]);
  }
  const at = (t: number): readonly [number, number] => [x0 + (x1 - x0) * t, y1 + (y0 - y1) * t];
  return pieces.filter(([a, b]) => b > a).map(([a, b]) => lineMark('table', ...at(a), ...at(b)));
}

function border(kind: Border, box: Box, texts: readonly TextMark[]): Mark[] {
  switch (kind) {
    case 'dashed':
      return dashes(box, DASH);
    case 'dotted':
      return dashes(box, DOT);
    case 'double':
      return [...rectangle('symbol', box), ...rectangle('symbol', growBox(box, -DOUBLE))];
    case 'thick':
      return rectangle('frame', box);
    case 'struck':
      return [...rectangle('table', box), ...strike(box, texts)];
    case 'solid':
      return rectangle('symbol', box);
  }
}

/** The stamp in its place on paper. */
export function stateStamp(state: { word: string; date: string }, box: Box): Mark[] {
  const [x0, y0, x1, y1] = box;
  const room = x1 - x0 - 2 * AIR;
  const letter = LETTERS.find((each) => textWidth(state.word, fontSizeFor(each)) <= room) ?? DATE_LETTER;
  const size = fontSizeFor(letter);
  const dateSize = fontSizeFor(DATE_LETTER);
  const tall = letter + (state.date === '' ? 0 : BETWEEN + DATE_LETTER);
  const top = (y0 + y1 - tall) / 2;
  const x = (x0 + x1) / 2;
  const texts: TextMark[] = [
    {
      type: 'text',
      x,
      y: top + CAP_HEIGHT * size,
      size,
      anchor: 'middle',
      weight: 800,
      text: state.word === '' ? '–' : state.word,
    },
  ];
  if (state.date !== '')
    texts.push({ type: 'text', x, y: top + tall, size: dateSize, anchor: 'middle', text: state.date });
  return [...border(BORDERS[state.word.toUpperCase()] ?? 'solid', box, texts), ...texts];
}
