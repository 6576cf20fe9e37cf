import type { Mark } from '../../../shared/drawing/sheet';
import type { SetUp } from '../../../shared/route/route';
import { box, lettering, rule } from './lettering';
import { BASELINE, GLYPH, LINE, PAGE, PICTURE_WIDTH } from './measures';
import type { Row } from './rows';
import { headRow } from './rows';
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
  rows: readonly Row[];
}

/** A card, or what of it stands on one page. */
export interface Block {
  height: number;
  marks: (y: number) => Mark[];
}

const HEAD = 6.6;
const AIR = 1.5;

/** The whole card; or, when it does not fit into `room` and `split` is allowed, its first rows and then the rest. */
export function setUpBlocks(card: SetUpCard, room: number, page: number): Block[] {
  const whole = blockOf(card, card.rows, false);
  if (whole.height <= room) return [whole];
  const blocks: Block[] = [];
  let rest = [...card.rows];
  let space = room;
  while (rest.length > 0) {
    const continued = blocks.length > 0;
    const fits = rowsThatFit(card, rest, space, continued);
    // A card's head with no row under it would say nothing; the first page may be too full for any.
    if (fits === 0 && !continued && space < page) {
      space = page;
      blocks.push({ height: Infinity, marks: () => [] });
      continue;
    }
    const taken = Math.max(1, fits);
    blocks.push(blockOf(card, rest.slice(0, taken), continued));
    rest = rest.slice(taken);
    space = page;
  }
  return blocks.filter((block) => block.height !== Infinity);
}

function rowsThatFit(card: SetUpCard, rows: readonly Row[], room: number, continued: boolean): number {
  let count = 0;
  while (count < rows.length && blockOf(card, rows.slice(0, count + 1), continued).height <= room) count += 1;
  return count;
}

function blockOf(card: SetUpCard, rows: readonly Row[], continued: boolean): Block {
  const head = headRow();
  const table = head.height + rows.reduce((sum, row) => sum + row.height, 0);
  const left = leftSide(card, continued);
  const height = HEAD + Math.max(table, left.height);
  return {
    height,
    marks: (y) => {
      const marks = [...headMarks(card, y, continued), ...left.marks(y + HEAD), ...head.marks(y + HEAD)];
      let at = y + HEAD + head.height;
      for (const row of rows) {
        marks.push(...row.marks(at));
        at += row.height;
      }
      const edge = PAGE.left + PICTURE_WIDTH;
      return [...marks, rule(edge, y + HEAD, edge, y + height), box(PAGE.left, y, PAGE.right, y + height, true)];
    },
  };
}

function headMarks(card: SetUpCard, y: number, continued: boolean): Mark[] {
  const baseline = y + 4.4;
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
function leftSide({ setup, picture }: SetUpCard, continued: boolean): Block {
  if (continued) return { height: 0, marks: () => [] };
  const characters = Math.floor((PICTURE_WIDTH - 3) / GLYPH);
  const texts = [setup.heldText, setup.datumText].flatMap((text) => wrap(text, characters));
  const pictureHeight = picture ? picture.height + AIR : 0;
  return {
    height: AIR + pictureHeight + texts.length * LINE + AIR,
    marks: (y) => [
      ...(picture ? picture.marks(PAGE.left + (PICTURE_WIDTH - picture.width) / 2, y + AIR) : []),
      ...texts.flatMap((text, line) => lettering(PAGE.left + 1.5, y + AIR + pictureHeight + BASELINE + line * LINE, text)),
    ],
  };
}
