import type { Mark } from '../../../shared/drawing/sheet';
import type { SetUp } from '../../../shared/route/route';
import { box, lettering, rule } from './lettering';
import { BASELINE, GLYPH, LINE, PAGE, PICTURE_WIDTH } from './measures';
import type { Row } from './rows';
import { wrap } from './wrap';

/** A picture with its size (mm), its marks at the origin. */
export interface CardPicture {
  width: number;
  height: number;
  marks: (x: number, y: number) => Mark[];
}

export interface SetUpCard {
  setup: SetUp;
  /** From 1, as the cards are read. */
  number: number;
  machine: string;
  minutes: string;
  picture: CardPicture | null;
  /** The names of the columns. */
  head: Row;
  rows: readonly Row[];
}

/** A card, or what of it stands on one page. */
export interface Block {
  height: number;
  marks: (y: number) => Mark[];
}

const HEAD = 6;
const AIR = 1;

/** How many rows from `from` on fit into `room` (mm), with the card's head over them. */
export function rowsThatFit(card: SetUpCard, from: number, room: number): number {
  let count = 0;
  while (from + count < card.rows.length && cardBlock(card, from, from + count + 1).height <= room)
    count += 1;
  return count;
}

/** The card with its rows `from` up to, not with, `to`. Where rows went before, its head says `continued`. */
export function cardBlock(card: SetUpCard, from: number, to: number): Block {
  const rows = card.rows.slice(from, to);
  const table = card.head.height + rows.reduce((sum, row) => sum + row.height, 0);
  const left = from === 0 ? leftSide(card) : leftAgain(card, table);
  const height = HEAD + Math.max(table, left.height);
  return {
    height,
    marks: (y) => {
      const marks = [...headMarks(card, y, from > 0), ...left.marks(y + HEAD), ...card.head.marks(y + HEAD)];
      let at = y + HEAD + card.head.height;
      for (const row of rows) {
        marks.push(...row.marks(at));
        at += row.height;
      }
      const edge = PAGE.left + PICTURE_WIDTH;
      return [
        ...marks,
        rule(edge, y + HEAD, edge, y + height),
        box(PAGE.left, y, PAGE.right, y + height, true),
      ];
    },
  };
}

function headMarks(card: SetUpCard, y: number, continued: boolean): Mark[] {
  const baseline = y + 4.1;
  const title = `${card.machine}, ${card.setup.holding}${continued ? ', continued' : ''}`;
  const room = Math.floor((PAGE.right - PAGE.left) / GLYPH) - card.minutes.length - 10;
  return [
    ...lettering(PAGE.left + 3, baseline, String(card.number), { weight: 800 }),
    rule(PAGE.left + 9, y, PAGE.left + 9, y + HEAD),
    ...lettering(PAGE.left + 11, baseline, wrap(title, room)[0] ?? '', { weight: 700 }),
    ...lettering(PAGE.right - 2, baseline, card.minutes, { anchor: 'end' }),
    rule(PAGE.left, y + HEAD, PAGE.right, y + HEAD, true),
  ];
}

/** Pictures of the work before and after, and under them how it is held. */
function leftSide({ setup, picture }: SetUpCard): Block {
  const pictureHeight = picture ? AIR + picture.height : 0;
  const words = wordsBlock([setup.heldText, setup.datumText]);
  return {
    height: pictureHeight + words.height,
    marks: (y) => [
      ...(picture ? picture.marks(PAGE.left + (PICTURE_WIDTH - picture.width) / 2, y + AIR) : []),
      ...words.marks(y + pictureHeight),
    ],
  };
}

/** On the next page again, as far as there is room beside the rows: pictures and words, or the words, or nothing. */
function leftAgain(card: SetUpCard, room: number): Block {
  const words = wordsBlock([card.setup.heldText, card.setup.datumText]);
  const again = [leftSide(card), words].find((side) => side.height <= room);
  return again ?? { height: 0, marks: () => [] };
}

function wordsBlock(texts: readonly string[]): Block {
  const lines = texts.flatMap((text) => wrap(text, Math.floor((PICTURE_WIDTH - 3) / GLYPH)));
  return {
    height: AIR + lines.length * LINE + AIR,
    marks: (y) =>
      lines.flatMap((text, line) => lettering(PAGE.left + 1.5, y + AIR + BASELINE + line * LINE, text)),
  };
}
