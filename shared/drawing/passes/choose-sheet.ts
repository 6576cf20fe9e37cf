/** Which sheets and scales are worth trying, best first. A number is a price: the least is tried first. */
import { INCH_SCALES, ISO_SCALES } from '../../standards/scales';
import type { DrawingScale } from '../../standards/scales';
import type { Part } from '../../part/part';
import { INCH_SHEETS, ISO_SHEETS } from '../../standards/sheets';
import type { DrawingOptions, SheetSize } from '../sheet';
import { makeXMap } from '../x-map';
import type { XMap } from '../x-map';
import { frameBox } from './frame';

export interface Attempt {
  sheet: SheetSize;
  scale: DrawingScale;
  map: XMap;
  score: number;
}

/** Lengths of the drawn part that look right on each sheet, mm, and what a larger sheet costs. Source: trial sheets. */
const SHEETS: Readonly<Record<SheetSize, { target: number; price: number }>> = {
  A4: { target: 165, price: 0 },
  A3: { target: 260, price: 0.9 },
  A2: { target: 380, price: 2.2 },
  A1: { target: 560, price: 3.6 },
  A: { target: 155, price: 0 },
  B: { target: 265, price: 0.9 },
  C: { target: 360, price: 2.2 },
  D: { target: 560, price: 3.6 },
};
const NOT_FULL_SIZE = 0.15;
const BROKEN = 0.35;
const TALLEST = 0.7;
const FOOT_HEIGHT = 40;
const SIDE_ROOM = 24;
const BREAK_SLENDER = 6;
const BREAK_LENGTH = 3;
const BREAK_KEEPS = 34;
const BREAK_SAVES = 15;
const BREAK_GAP = 3;
/** Share of what stays that stands left of the break: a diameter goes there. */
const LEFT_OF_BREAK = 0.6;
/** A short wide part is judged by its diameter, in lengths. */
const WIDE = 1.6;

/** Diameter of the metal over most of the part, for slenderness. */
function breaksFor(part: Part, scale: number, target: number): [number, number][] {
  if (part.length <= BREAK_SLENDER * part.maxDiameter) return [];
  let excess = part.length * scale - target;
  const busy = part.features.filter((f) => f.kind === 'thread' || f.kind === 'flats' || f.kind === 'knurl');
  const plain = part.features
    .filter((f) => f.kind === 'cylinder')
    .filter((f) => f.to - f.from > BREAK_LENGTH * part.maxDiameter)
    .filter((f) => !busy.some((b) => 'from' in b && b.from < f.to - 1e-6 && b.to > f.from + 1e-6))
    .sort((a, b) => b.to - b.from - (a.to - a.from) || a.from - b.from);
  const found: [number, number][] = [];
  for (const f of plain) {
    const most = (f.to - f.from) * scale - BREAK_KEEPS - BREAK_GAP;
    const take = Math.min(excess, most);
    if (take < BREAK_SAVES) continue;
    const from = f.from + (f.to - f.from - take / scale) * LEFT_OF_BREAK;
    found.push([from, from + take / scale]);
    excess -= take;
  }
  return found.sort((a, b) => a[0] - b[0]);
}

/** What the score asks of a part, worked out once. */
interface PartFacts {
  part: Part;
  shortest: number;
  smallest: number;
}

function factsOf(part: Part): PartFacts {
  const steps = part.features.flatMap((f) =>
    f.kind === 'cylinder' || f.kind === 'cone' ? [f.to - f.from] : [],
  );
  const diameters = part.body.outer.map((p) =>
    p.kind === 'line' ? 2 * Math.max(p.start, p.end) : 2 * p.radius,
  );
  return { part, shortest: Math.min(...steps, part.length), smallest: Math.min(...diameters) };
}

function score(
  facts: PartFacts,
  sheet: SheetSize,
  scale: DrawingScale,
  drawnLength: number,
  height: number,
): number {
  const { part } = facts;
  const { target, price } = SHEETS[sheet];
  const shortest = facts.shortest * scale.factor;
  const smallest = facts.smallest * scale.factor;
  let sum =
    price + 0.9 * Math.abs(Math.log(Math.max(drawnLength, WIDE * part.maxDiameter * scale.factor) / target));
  if (scale.factor !== 1) sum += NOT_FULL_SIZE;
  if (shortest < 4) sum += 0.45 * Math.log(4 / Math.max(shortest, 0.01));
  if (smallest < 7) sum += 1.1 * Math.log(7 / Math.max(smallest, 0.01));
  if (part.maxDiameter * scale.factor > height / 2) sum += 0.5;
  return sum;
}

/** Every sheet and scale the part may be tried at, the most promising first. */
export function attemptsFor(part: Part, options: DrawingOptions): Attempt[] {
  const iso = options.style === 'iso';
  const sheets = options.sheet === 'auto' ? (iso ? ISO_SHEETS : INCH_SHEETS) : [options.sheet];
  const series = options.unit === 'in' && !iso ? INCH_SCALES : iso ? ISO_SCALES : INCH_SCALES;
  const scales =
    options.scale === 'auto'
      ? series
      : series.filter((s) => Math.abs(s.factor - Number(options.scale)) < 1e-9);
  const forced = options.scale !== 'auto' && options.sheet !== 'auto';
  const attempts: Attempt[] = [];
  const facts = factsOf(part);
  for (const sheet of sheets) {
    const [x0, y0, x1, y1] = frameBox(sheet);
    const width = x1 - x0 - SIDE_ROOM;
    const height = y1 - y0 - FOOT_HEIGHT;
    for (const scale of scales) {
      if (!forced && part.maxDiameter * scale.factor > height * TALLEST) continue;
      const full = part.length * scale.factor;
      if (full <= width || forced) add(attempts, facts, sheet, scale, [], height);
      if (full > width * 0.7) {
        const breaks = breaksFor(part, scale.factor, SHEETS[sheet].target);
        if (breaks.length > 0) add(attempts, facts, sheet, scale, breaks, height, width);
      }
    }
  }
  return attempts.sort((a, b) => a.score - b.score);
}

function add(
  attempts: Attempt[],
  facts: PartFacts,
  sheet: SheetSize,
  scale: DrawingScale,
  breaks: readonly (readonly [number, number])[],
  height: number,
  width = Infinity,
): void {
  const map = makeXMap(0, facts.part.length, scale.factor, breaks, BREAK_GAP);
  const drawn = map.knots[map.knots.length - 1]?.[1] ?? 0;
  if (drawn > width) return;
  attempts.push({
    sheet,
    scale,
    map,
    score: score(facts, sheet, scale, drawn, height) + (breaks.length > 0 ? BROKEN : 0),
  });
}
