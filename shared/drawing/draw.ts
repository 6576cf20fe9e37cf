import type { Part } from '../part/part';
import type { Problem } from '../problem';
import type { Scheme } from '../scheme/scheme';
import { INCH_SCALES, ISO_SCALES } from '../standards/scales';
import { SHEET_SIZES } from '../standards/sheets';
import { formatLength } from '../units/format';
import { adviseSheet } from './check/advise-sheet';
import type { Box } from './geometry/box';
import { moveMarks } from './move';
import { notesOf } from './notes/notes';
import { arrange, leastWidth, readySizes } from './passes/arrange';
import { axisView } from './passes/axis-view';
import type { AxisPaper } from './layout';
import type { Arrangement } from './passes/arrange';
import { attemptsFor } from './passes/choose-sheet';
import type { Attempt } from './passes/choose-sheet';
import { notesColumn } from './passes/notes-column';
import { frameBox } from './passes/frame';
import { foot } from './passes/title-block';
import type { Foot } from './passes/title-block';
import { stampGroup } from './passes/stamp';
import type { AdviceFinding, DrawingOptions, Group, Sheet, SheetSize } from './sheet';
import type { Writing } from './size-text';

/** Clean layouts compared before the best is taken; counted in work, so that the same values give the same bytes. */
const COMPARED = 4;
const MOST_TRIED = 14;
const SCORE_WEIGHT = 4;
const PRICE_WEIGHT = 1.2;
/** No arrangement has been seen under this: an attempt that could not win even so is not laid out. */
const LEAST_PRICE = 0.25;
const EDGE = 4;
const NEARLY = 28;
const OVER_FOOT = 4;
const OVER_REVISIONS = 2;

interface Tried {
  attempt: Attempt;
  arrangement: Arrangement;
  place: { dx: number; dy: number } | null;
  rank: number;
}

/** What stands on a sheet before the views do, and the rectangles left for them. */
interface Ground {
  foot: Foot;
  notes: Group;
  /** Where the notes end on the right. */
  beside: number;
  rooms: readonly Box[];
}

function ground(attempt: Attempt, part: Part, options: DrawingOptions, writing: Writing): Ground {
  const strip = foot({
    size: attempt.sheet,
    style: options.style,
    unit: options.unit,
    scaleText: attempt.scale.text,
    title: options.titleBlock,
  });
  const [x0, y0, x1] = frameBox(attempt.sheet);
  const bottom = Math.min(strip.block[1], strip.revisionsTop - OVER_REVISIONS);
  const notes = notesColumn(notesOf(part, writing), options.unit, x0 + EDGE, bottom);
  const over: Box = [x0 + EDGE, y0 + EDGE, x1 - EDGE, notes.box[1] - 3];
  const beside: Box = [notes.box[2] + 5, y0 + EDGE, x1 - EDGE, strip.block[1] - OVER_FOOT];
  return { foot: strip, notes: notes.group, beside: notes.box[2], rooms: [over, beside] };
}

/** Where the drawing goes: the middle of the first room that holds it, or nowhere. */
function placeIn(rooms: readonly Box[], bounds: Box): { dx: number; dy: number } | null {
  const w = bounds[2] - bounds[0];
  const h = bounds[3] - bounds[1];
  const room = rooms.find((r) => w <= r[2] - r[0] && h <= r[3] - r[1]);
  if (!room) return null;
  return { dx: (room[0] + room[2] - w) / 2 - bounds[0], dy: (room[1] + room[3] - h) / 2 - bounds[1] };
}

/** True where a narrower arrangement may still go in. */
function nearlyFits(rooms: readonly Box[], bounds: Box): boolean {
  return rooms.some(
    (r) => bounds[3] - bounds[1] <= r[3] - r[1] && bounds[2] - bounds[0] <= r[2] - r[0] + NEARLY,
  );
}

function better(a: Tried, b: Tried | null): boolean {
  if (!b) return true;
  const fits = Number(a.place === null) - Number(b.place === null);
  if (fits !== 0) return fits < 0;
  const clashes = a.arrangement.clashes - b.arrangement.clashes;
  return clashes !== 0 ? clashes < 0 : a.rank < b.rank;
}

function search(part: Part, scheme: Scheme, options: DrawingOptions, writing: Writing): Tried | null {
  const cache = new Map<string, Arrangement>();
  const grounds = new Map<SheetSize, Ground>();
  const papers = new Map<string, AxisPaper>();
  const readies = readySizes(scheme, writing);
  const tooBig = new Map<string, number>();
  let best: Tried | null = null;
  let clean = 0;
  let tried = 0;
  for (const attempt of attemptsFor(part, options)) {
    if (
      best &&
      best.place &&
      best.arrangement.clashes === 0 &&
      SCORE_WEIGHT * attempt.score + LEAST_PRICE >= best.rank
    )
      break;
    const key = `${attempt.scale.factor} ${attempt.map.breaks.join(' ')}`;
    const kind = `${attempt.sheet} ${attempt.map.breaks.length}`;
    if (attempt.scale.factor >= (tooBig.get(kind) ?? Infinity)) continue;
    // The rooms are the sheet's own: the scale only changes a word of the block.
    const base = grounds.get(attempt.sheet) ?? ground(attempt, part, options, writing);
    grounds.set(attempt.sheet, base);
    const least = leastWidth(part, attempt.map);
    if (base.rooms.every((room) => room[2] - room[0] < least)) {
      tooBig.set(kind, attempt.scale.factor);
      continue;
    }
    if (!cache.has(key) && ++tried > MOST_TRIED) break;
    const paper = papers.get(key) ?? axisView(part, attempt.map, writing);
    papers.set(key, paper);
    let arrangement = cache.get(key) ?? arrange(part, readies, paper, options.balloons);
    cache.set(key, arrangement);
    let place = placeIn(base.rooms, arrangement.bounds);
    if (!place && nearlyFits(base.rooms, arrangement.bounds)) {
      arrangement = cache.get(`narrow ${key}`) ?? arrange(part, readies, paper, options.balloons, true);
      cache.set(`narrow ${key}`, arrangement);
      place = placeIn(base.rooms, arrangement.bounds);
    }
    if (!place) tooBig.set(kind, attempt.scale.factor);
    const now: Tried = {
      attempt,
      arrangement,
      place,
      rank: SCORE_WEIGHT * attempt.score + PRICE_WEIGHT * arrangement.price,
    };
    if (better(now, best)) best = now;
    if (place && arrangement.clashes === 0 && ++clean >= COMPARED) break;
  }
  return best;
}

function assemble(tried: Tried, part: Part, options: DrawingOptions, writing: Writing): Sheet {
  const { attempt, arrangement } = tried;
  const base = ground(attempt, part, options, writing);
  const { dx, dy } = tried.place ?? { dx: 0, dy: 0 };
  const { width, height } = SHEET_SIZES[attempt.sheet];
  const stamp = options.stamp
    ? [stampGroup(options.stamp, base.beside, frameBox(attempt.sheet)[2], base.foot.block[1])]
    : [];
  return {
    schemaVersion: 1,
    size: attempt.sheet,
    width,
    height,
    frame: frameBox(attempt.sheet),
    style: options.style,
    unit: options.unit,
    decimalSign: writing.decimalSign,
    scale: attempt.scale.factor,
    scaleText: attempt.scale.text,
    groups: [
      ...stamp,
      ...base.foot.groups,
      base.notes,
      ...arrangement.groups.map((g) => ({ ...g, marks: moveMarks(g.marks, dx, dy) })),
    ],
    maps: arrangement.maps.map((m) => ({
      ...m,
      axisY: m.axisY + dy,
      ...(m.centreX === undefined ? {} : { centreX: m.centreX + dx }),
      knots: m.knots.map(([x, paper]) => [x, paper + dx] as const),
    })),
    choice: `${attempt.sheet} at ${attempt.scale.text}${attempt.map.breaks.length > 0 ? ', interrupted' : ''}`,
  };
}

/** Said when nothing that was asked for holds the part: its size, and what of the listed would. */
function nothingFits(part: Part, scheme: Scheme, options: DrawingOptions, writing: Writing): Problem {
  const say = (mm: number): string =>
    `${formatLength(mm, { unit: writing.unit, style: writing.style })} ${writing.unit}`;
  const size = `The part is ${say(part.length)} long and ${say(part.maxDiameter)} in diameter`;
  const pinnedSheet = options.sheet !== 'auto';
  const pinnedScale = options.scale !== 'auto';
  const path = pinnedScale ? 'scale' : 'sheet';
  if (!pinnedSheet && !pinnedScale)
    return { path, message: `${size} and does not fit any listed sheet at any listed scale.` };
  const asked = [
    ...(pinnedSheet ? [`sheet ${options.sheet}`] : []),
    ...(pinnedScale ? [`the scale ${scaleName(options)}`] : []),
  ].join(' at ');
  const free = (changed: Partial<DrawingOptions>): string | null => {
    const found = search(part, scheme, { ...options, ...changed }, writing);
    return found?.place ? `${found.attempt.sheet} at ${found.attempt.scale.text}` : null;
  };
  const ways = [
    ...new Set([
      ...(pinnedSheet && pinnedScale ? [free({ scale: 'auto' }), free({ sheet: 'auto' })] : []),
      free({ sheet: 'auto', scale: 'auto' }),
    ]),
  ].filter((way) => way !== null);
  const would =
    ways.length > 0
      ? `It would fit ${ways.join(', or ')}; choose that, or let both be chosen.`
      : 'No listed sheet holds it.';
  return { path, message: `${size} and does not fit ${asked}. ${would}` };
}

function scaleName(options: DrawingOptions): string {
  const listed = [...ISO_SCALES, ...INCH_SCALES].find(
    (s) => Math.abs(s.factor - Number(options.scale)) < 1e-9,
  );
  return listed?.text ?? String(options.scale);
}

/**
 * Part and scheme to a finished sheet: views, sizes, balloons, notes, title block, the stamp of an unreleased sheet.
 * Advice beside it: what could be lovelier. A problem when nothing listed holds the part. The same input gives the same sheet anywhere.
 */
export function drawSheet(
  part: Part,
  scheme: Scheme,
  options: DrawingOptions,
): { sheet: Sheet; advice: readonly AdviceFinding[] } | { problem: Problem } {
  const writing: Writing = {
    style: options.style,
    unit: options.unit,
    decimalSign: options.decimalSign ?? '.',
  };
  const best = search(part, scheme, options, writing);
  if (!best || !best.place) return { problem: nothingFits(part, scheme, options, writing) };
  const sheet = assemble(best, part, options, writing);
  return { sheet, advice: adviseSheet(sheet, scheme, part) };
}
