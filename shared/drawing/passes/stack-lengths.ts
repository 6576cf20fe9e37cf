/**
 * Lengths in lanes under the view; those that overlap the chain in part go over it.
 * Afterwards: every length has a lane, no two share a stretch of one, shorter ones lie inside longer ones.
 */
import { arrowHead, lineMark } from '../arrow';
import { placeLabel } from '../label';
import type { AxisPaper, PlacedSize, ReadySize } from '../layout';
import { reachWithin } from '../layout';
import type { Mark } from '../sheet';
import { toPaper } from '../x-map';
import { candidateOf } from './candidate';

type Mode = 'in' | 'between' | 'left' | 'right';

interface Span {
  ready: ReadySize;
  x1: number;
  x2: number;
  mode: Mode;
  /** What it takes up along its lane. */
  lo: number;
  hi: number;
  lane: number;
}

const MOST_LANES = 14;
const SAME = 0.01;
const NARROW_AIR = 1.4;
const ISO_IN_AIR = 1.6;
const ISO_LEAST_IN = 8;
const ASME_IN_AIR = 9.6;
const OUTSIDE_TEXT = 4.2;
const LANE_AIR = 0.9;
const BESIDE_END = 1.3;
/** What a plain figure reaches under its baseline; stacked limits reach lower and are lifted. */
const PLAIN_DOWN = 1.06;

function modeOf(paper: AxisPaper, ready: ReadySize, x1: number, x2: number): Mode {
  const w = x2 - x1;
  const text = ready.label.width;
  const roomy =
    paper.style === 'iso' ? w >= Math.max(text + ISO_IN_AIR, ISO_LEAST_IN) : w >= text + ASME_IN_AIR;
  if (roomy) return 'in';
  if (w >= text + NARROW_AIR) return 'between';
  return (x1 + x2) / 2 <= (paper.left + paper.right) / 2 ? 'left' : 'right';
}

function spread(paper: AxisPaper, span: Span): void {
  const { arrowTail } = paper.rules;
  const text = span.ready.label.width;
  const out = paper.style === 'iso' ? OUTSIDE_TEXT + text + 0.4 : arrowTail + paper.rules.textGap + text;
  span.lo = span.x1;
  span.hi = span.x2;
  if (span.mode === 'in') return;
  span.lo -= span.mode === 'left' ? Math.max(arrowTail, out) : arrowTail;
  span.hi += span.mode === 'right' ? Math.max(arrowTail, out) : arrowTail;
}

function spanOf(paper: AxisPaper, ready: ReadySize): Span | null {
  const { anchor } = ready.size;
  if (anchor.kind !== 'span') return null;
  const x1 = toPaper(paper.map.knots, Math.min(anchor.from, anchor.to));
  const x2 = toPaper(paper.map.knots, Math.max(anchor.from, anchor.to));
  const span: Span = { ready, x1, x2, mode: modeOf(paper, ready, x1, x2), lo: x1, hi: x2, lane: -1 };
  spread(paper, span);
  return span;
}

const overlapInPart = (a: Span, b: Span): boolean => {
  const meet = Math.min(a.x2, b.x2) - Math.max(a.x1, b.x1) > SAME;
  const nested = (a.x1 >= b.x1 - SAME && a.x2 <= b.x2 + SAME) || (b.x1 >= a.x1 - SAME && b.x2 <= a.x2 + SAME);
  return meet && !nested;
};

/** How many other sizes end at the ends of this one: a link of the chain has neighbours on both sides. */
function neighbours(span: Span, all: readonly Span[], paper: AxisPaper): number {
  const ends = (x: number): number =>
    Math.abs(x - paper.left) < SAME || Math.abs(x - paper.right) < SAME
      ? 1
      : Math.min(
          1,
          all.filter((o) => o !== span && (Math.abs(o.x1 - x) < SAME || Math.abs(o.x2 - x) < SAME)).length,
        );
  return ends(span.x1) + ends(span.x2);
}

/** Splits off the sizes that would cross the chain: they are laid over the view. */
function splitSides(spans: readonly Span[], paper: AxisPaper): { under: Span[]; over: Span[] } {
  const under = [...spans];
  const over: Span[] = [];
  for (;;) {
    const counted = under
      .filter((s) => !s.ready.size.reference)
      .map((s) => ({
        s,
        n: under.filter((o) => o !== s && overlapInPart(s, o)).length,
        k: neighbours(s, under, paper),
      }))
      .filter(({ n }) => n > 0)
      .sort((a, b) => a.k - b.k || b.n - a.n || a.s.x2 - a.s.x1 - (b.s.x2 - b.s.x1));
    const worst = counted[0];
    if (!worst) break;
    under.splice(under.indexOf(worst.s), 1);
    over.push(worst.s);
  }
  const nested = under.filter(
    (s) =>
      !s.ready.size.reference &&
      neighbours(s, under, paper) < 2 &&
      under.some((o) => o !== s && !o.ready.size.reference && o.x1 <= s.x1 + SAME && o.x2 >= s.x2 - SAME),
  );
  if (nested.length <= 2)
    for (const span of nested) {
      under.splice(under.indexOf(span), 1);
      over.push(span);
    }
  return { under, over };
}

/** From both ends towards the middle. */
function inwards(spans: readonly Span[], paper: AxisPaper): Span[] {
  const middle = (paper.left + paper.right) / 2;
  const from = (s: Span): number => Math.abs((s.x1 + s.x2) / 2 - middle);
  return [...spans].sort((a, b) => from(b) - from(a) || a.x1 - b.x1);
}

function fits(span: Span, lane: number, placed: readonly Span[], strict: boolean): boolean {
  return placed.every((other) => {
    if (other.lane === lane) {
      const touching = span.mode === 'in' && other.mode === 'in';
      const air = touching ? -SAME : LANE_AIR;
      return span.hi <= other.lo - air || span.lo >= other.hi + air;
    }
    if (!strict) return true;
    const [near, far] = other.lane < lane ? [other, span] : [span, other];
    const crossed = (x: number): boolean => x > near.lo + SAME && x < near.hi - SAME;
    return !crossed(far.x1) && !crossed(far.x2);
  });
}

function lowest(span: Span, placed: readonly Span[]): void {
  const contained = placed.filter((o) => o.x1 >= span.x1 - SAME && o.x2 <= span.x2 + SAME);
  const start = contained.reduce(
    (lane, o) => Math.max(lane, o.x2 - o.x1 < span.x2 - span.x1 - SAME ? o.lane + 1 : lane),
    0,
  );
  for (const strict of [true, false])
    for (let lane = start; lane < MOST_LANES; lane++)
      if (fits(span, lane, placed, strict)) {
        span.lane = lane;
        return;
      }
  span.lane = MOST_LANES;
}

function assignLanes(spans: readonly Span[], paper: AxisPaper): void {
  const references = spans.filter((s) => s.ready.size.reference);
  const sizes = spans.filter((s) => !s.ready.size.reference);
  const datum = sizes.some((a) => sizes.some((b) => a !== b && a.x1 >= b.x1 - SAME && a.x2 <= b.x2 + SAME));
  const placed: Span[] = [];
  const order = datum
    ? [...sizes].sort((a, b) => a.x2 - a.x1 - (b.x2 - b.x1) || a.x1 - b.x1)
    : [
        ...sizes.filter((s) => s.mode === 'in').sort((a, b) => a.x1 - b.x1),
        ...inwards(
          sizes.filter((s) => s.mode !== 'in'),
          paper,
        ),
      ];
  for (const span of order) {
    if (span.mode === 'left' || span.mode === 'right') outsideSide(span, placed, paper);
    lowest(span, placed);
    placed.push(span);
  }
  for (const span of references) {
    lowest(span, placed);
    span.lane = Math.max(span.lane, ...placed.map((o) => o.lane + 1), 0);
    placed.push(span);
  }
}

/** The side whose lane is nearer; the end of the part is free air. */
function outsideSide(span: Span, placed: readonly Span[], paper: AxisPaper): void {
  const wish = span.mode;
  const tried = (['left', 'right'] as const).map((mode) => {
    const trial: Span = { ...span, mode };
    spread(paper, trial);
    lowest(trial, placed);
    return trial;
  });
  tried.sort((a, b) => a.lane - b.lane || (a.mode === wish ? -1 : 1));
  const best = tried[0];
  if (!best) return;
  span.mode = best.mode;
  spread(paper, span);
}

function extension(paper: AxisPaper, x: number, y: number): Mark {
  const { extensionGap, extensionPast } = paper.rules;
  const way = Math.sign(y);
  // At an end that falls away (a crown, a chamfer) the line starts clear of the metal beside it.
  const atEnd = Math.abs(x - paper.left) < SAME || Math.abs(x - paper.right) < SAME;
  const beside = atEnd ? BESIDE_END : 0.02;
  const from = reachWithin(way > 0 ? paper.bottom : paper.top, x - beside, x + beside);
  return lineMark('extension', x, way * (from + extensionGap), x, y + way * extensionPast);
}

function draw(paper: AxisPaper, span: Span, y: number): PlacedSize {
  const { style, rules } = paper;
  const { label } = span.ready;
  const { x1, x2, mode } = span;
  const marks: Mark[] = [extension(paper, x1, y), extension(paper, x2, y)];
  const middle = (x1 + x2) / 2;
  const half = label.width / 2;
  const centred = style === 'iso' ? 0 : (label.up - label.down) / 2;
  const baseline = style === 'iso' ? y - rules.textLift - Math.max(0, label.down - PLAIN_DOWN) : y + centred;
  let textX = middle - half;
  const line = (a: number, b: number): void => {
    marks.push(lineMark('dimension', a, y, b, y));
  };
  if (mode === 'in') {
    if (style === 'iso') line(x1, x2);
    else {
      line(x1, middle - half - rules.textGap);
      line(middle + half + rules.textGap, x2);
    }
    marks.push(arrowHead(x1, y, -1, 0, style), arrowHead(x2, y, 1, 0, style));
  } else {
    const tail = rules.arrowTail;
    const iso = style === 'iso';
    const lo = mode === 'left' && iso ? span.lo : x1 - tail;
    const hi = mode === 'right' && iso ? span.hi : x2 + tail;
    if (iso) line(lo, hi);
    else {
      line(lo, x1);
      if (mode !== 'between') line(x1, x2);
      line(x2, hi);
    }
    if (mode === 'left')
      textX = iso ? x1 - OUTSIDE_TEXT - label.width : x1 - tail - rules.textGap - label.width;
    if (mode === 'right') textX = iso ? x2 + OUTSIDE_TEXT : x2 + tail + rules.textGap;
    marks.push(arrowHead(x1, y, 1, 0, style), arrowHead(x2, y, -1, 0, style));
  }
  return {
    ready: span.ready,
    candidate: candidateOf('lane', marks, placeLabel(label, textX, baseline), 0.3 * span.lane),
    forView: 'axis',
  };
}

function drawSide(paper: AxisPaper, spans: readonly Span[], way: 1 | -1): PlacedSize[] {
  if (spans.length === 0) return [];
  assignLanes(spans, paper);
  const { rules, style } = paper;
  const up = Math.max(...spans.map((s) => s.ready.label.up));
  const down = Math.max(...spans.map((s) => s.ready.label.down));
  // From a line to the top of the writing on it, and past the arrows of the line before.
  const rise = up + rules.textLift + Math.max(0, down - PLAIN_DOWN) + rules.arrowHalfWidth + 0.7;
  const pitch = style === 'iso' ? Math.max(rules.lanePitch, rise) : Math.max(rules.lanePitch, up + down + 2);
  const first = Math.max(rules.firstLine, style === 'iso' ? rise : (up + down) / 2 + 1.2);
  return spans.map((span) => draw(paper, span, way * (paper.reach + first + span.lane * pitch)));
}

/** Lays out every size along the axis. */
export function stackLengths(paper: AxisPaper, sizes: readonly ReadySize[]): PlacedSize[] {
  const spans = sizes.map((ready) => spanOf(paper, ready)).filter((s): s is Span => s !== null);
  const { under, over } = splitSides(spans, paper);
  return [...drawSide(paper, under, 1), ...drawSide(paper, over, -1)];
}
