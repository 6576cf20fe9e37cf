import type { Group, Mark, Sheet } from '../../../shared/drawing/sheet';
import { STANDING_CAUTIONS } from '../../../shared/route/cautions';
import type { Register } from '../../../shared/route/register';
import type { Operation, Route, SetUp } from '../../../shared/route/route';
import type { Scheme } from '../../../shared/scheme/scheme';
import type { LengthFormat } from '../../../shared/units/format';
import { formatLength, formatNumber } from '../../../shared/units/format';
import { cellsOf } from './cells';
import { fitColumns } from './columns';
import { lettering } from './lettering';
import { BASELINE, GLYPH, LINE, PAGE } from './measures';
import type { HeadFacts } from './page-head';
import { kittingStrip, titleStrip } from './page-head';
import type { Row } from './rows';
import { headRow, operationRow } from './rows';
import type { Block, CardPicture, SetUpCard } from './setup-block';
import { cardBlock, rowsThatFit } from './setup-block';
import { setUpPicture } from './setup-picture';
import { wrap } from './wrap';

export interface CardFacts {
  number: string;
  letter: string;
  title: string;
  state: string;
  /** Words across a card that must not be worked from. */
  stamp: string | undefined;
  format: LengthFormat;
  /** What the sentences of the route are written in: the unit the drawing was typed in. */
  entryUnit: LengthFormat['unit'];
  register: Register;
}

const GAP = 2;

/** The route as cards on landscape A4, one page after another, drawn with the marks every sheet is made of. */
export function routeCard(route: Route, scheme: Scheme, facts: CardFacts): Sheet[] {
  const caution = standingCaution(facts);
  const bottom = PAGE.bottom - caution.height;
  const head: HeadFacts = { ...facts, bar: barText(route, facts.format) };
  const first = titleStrip(head, '').height + GAP;
  const pages: Mark[][] = [];
  let y: number = PAGE.top + first;
  let marks: Mark[] = [];
  const turn = () => {
    pages.push(marks);
    marks = [];
    y = PAGE.top + first;
  };
  const put = (block: Block) => {
    marks.push(...block.marks(y));
    y += block.height + GAP;
  };
  put(kittingStrip(route.kitting));
  for (const card of cardsOf(route, scheme, facts)) {
    for (let from = 0; from < card.rows.length;) {
      const count = rowsHere(card, from, bottom - y, marks.length === 0);
      if (count > 0) put(cardBlock(card, from, from + count));
      from += count;
      if (from < card.rows.length) turn();
    }
  }
  pages.push(marks);
  return pages.map((content, index) => {
    const strip = titleStrip(head, `${index + 1} of ${pages.length}`);
    return pageSheet([...strip.marks(PAGE.top), ...content, ...caution.marks(bottom + 1)], facts);
  });
}

/** Rows of the card for the rest of this page: none rather than one alone, and no last one left alone for the next. */
function rowsHere(card: SetUpCard, from: number, room: number, pageIsEmpty: boolean): number {
  const left = card.rows.length - from;
  const fit = rowsThatFit(card, from, room);
  if (fit === left) return left;
  const kept = fit === left - 1 ? fit - 1 : fit;
  if (kept >= 2) return kept;
  return pageIsEmpty ? Math.max(1, fit) : 0;
}

function cardsOf(route: Route, scheme: Scheme, facts: CardFacts): SetUpCard[] {
  const holdings = new Map(route.setups.map((setup) => [setup.id, setup.holding]));
  const cells = (operation: Operation) =>
    cellsOf(operation, scheme, facts.format, holdings.get(operation.setup) ?? '');
  const columns = fitColumns(route.operations.map(cells));
  return route.setups.map((setup, index) => {
    // What stands at the foot of every page, or further up on this card, is not said again.
    const said = new Set<string>(STANDING_CAUTIONS);
    const row = (operation: Operation): Row => {
      const own = operation.cautions.filter((caution) => !said.has(caution));
      own.forEach((caution) => said.add(caution));
      return operationRow(columns, cells(operation), operation.notes ?? [], own);
    };
    const operations = route.operations.filter((operation) => operation.setup === setup.id);
    const minutes = operations.reduce((sum, operation) => sum + operation.minutes, 0);
    const picture: CardPicture | null = setUpPicture(route, setup);
    return {
      setup,
      number: index + 1,
      machine: machineName(setup, facts.register),
      minutes: `${formatNumber(setup.minutes, 0)} min, then ${formatNumber(Math.max(minutes, 1), 0)}`,
      picture,
      head: headRow(columns),
      rows: operations.map(row),
    };
  });
}

function machineName(setup: SetUp, { lathes, mills, saws }: Register): string {
  const machine = [...lathes, ...mills, ...saws].find((one) => one.id === setup.machine);
  const name = machine?.name ?? setup.machine;
  return `${name.charAt(0).toUpperCase()}${name.slice(1)}`;
}

function barText(route: Route, format: LengthFormat): string {
  const { shape, size } = route.stock;
  return `${formatLength(size, format)} ${shape}, ${formatLength(route.blankLength, { ...format, decimals: 1 })} long`;
}

const UNIT_NAMES = { mm: 'millimetres', in: 'inches' } as const;

/** Said only where the sheet shows another unit than the drawing was typed in. */
function mixedUnits({ format, entryUnit }: CardFacts): string[] {
  if (format.unit === entryUnit) return [];
  return [
    `Columns and bar are in ${UNIT_NAMES[format.unit]}; figures within sentences are in ${UNIT_NAMES[entryUnit]}.`,
  ];
}

/** What stands on every card, at its foot. */
function standingCaution(facts: CardFacts): Block {
  const room = Math.floor((PAGE.right - PAGE.left) / GLYPH);
  const lines = wrap([...STANDING_CAUTIONS, ...mixedUnits(facts)].join(' '), room);
  return {
    height: lines.length * LINE,
    marks: (y) => lines.flatMap((text, line) => lettering(PAGE.left, y + BASELINE + line * LINE, text)),
  };
}

function pageSheet(marks: readonly Mark[], { stamp, format }: CardFacts): Sheet {
  const groups: Group[] = [{ role: 'notes', marks }];
  if (stamp) {
    const size = Math.min(20, ((PAGE.right - PAGE.left) * 0.8) / (0.6 * stamp.length));
    const text: Mark = {
      type: 'text',
      x: PAGE.width / 2,
      y: PAGE.height / 2,
      size,
      anchor: 'middle',
      weight: 800,
      text: stamp,
      faint: true,
    };
    groups.push({ role: 'stamp', marks: [text] });
  }
  return {
    schemaVersion: 1,
    size: 'A4',
    width: PAGE.width,
    height: PAGE.height,
    frame: [PAGE.left, PAGE.top, PAGE.right, PAGE.bottom],
    style: format.style,
    unit: format.unit,
    decimalSign: format.decimalSign ?? '.',
    scale: 1,
    scaleText: '',
    groups,
    maps: [],
    choice: 'Route cards are landscape A4: ten columns do not fit upright in letters of 2.5 mm.',
  };
}
