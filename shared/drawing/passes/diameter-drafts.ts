/**
 * Every way a diameter may be drawn on the axis view: inside its step, at an end face, through the step and out,
 * or by a leader. Afterwards: each candidate is complete and clean in itself.
 */
import { arrowHead, lineMark } from '../arrow';
import type { Label, Written } from '../label';
import type { AxisPaper, ReadySize } from '../layout';
import { reachWithin } from '../layout';
import type { Mark } from '../sheet';
import { toPaper } from '../x-map';
import type { Draft, Drafts } from './candidate';
import { leaderDrafts } from './leader-drafts';

/** Prices of the forms and of their variants. Source: trial sheets, looked at. */
const PRICE = {
  inside: 0.5,
  end: 1,
  slot: 1.3,
  perMm: 0.03,
  through: 2.2,
  offMiddle: 1.5,
  leader: 3.2,
  cornerLeader: 6.5,
} as const;
const POSITIONS = [0.5, 0.3, 0.7, 0.15, 0.85];
const LIFTS = [0, 6.5, 13, 20, 27];
const SLOTS = 4;
/** Least diameters on paper for arrows inside. */
const ARROWS_IN = 9;
const TURNED_TEXT_FROM_ARROW = 4.3;
const TAIL = 5.5;

interface Across {
  paper: AxisPaper;
  ready: ReadySize;
  /** Ends of the step on paper, and the radius. */
  x0: number;
  x1: number;
  r: number;
  at: number | null;
}

function acrossOf(paper: AxisPaper, ready: ReadySize): Across | null {
  const { anchor } = ready.size;
  if (anchor.kind !== 'across') return null;
  const a = toPaper(paper.map.knots, anchor.from);
  const b = toPaper(paper.map.knots, anchor.to);
  const at = anchor.at === undefined ? null : toPaper(paper.map.knots, anchor.at);
  return {
    paper,
    ready,
    x0: Math.min(a, b),
    x1: Math.max(a, b),
    r: (anchor.diameter / 2) * paper.map.scale,
    at,
  };
}

/** True where the drawn outline really lies at this radius over x. */
function onOutline({ paper, r }: Across, x: number): boolean {
  const eps = 0.02;
  return (
    Math.abs(reachWithin(paper.top, x - 0.001, x + 0.001) - r) < eps &&
    Math.abs(reachWithin(paper.bottom, x - 0.001, x + 0.001) - r) < eps
  );
}

const written = (label: Label, x: number, y: number, rotate?: -90): Written => ({ label, x, y, rotate });

/** The vertical dimension line between the outlines, arrows in or out. */
function crossLine(
  a: Across,
  x: number,
  inside: boolean,
  topTo: number,
  gap: readonly [number, number] | null,
): Mark[] {
  const { r, paper } = a;
  const { style } = paper;
  const marks: Mark[] = [];
  const bottom = inside ? r : r + TAIL;
  const top = Math.min(inside ? -r : -r - TAIL, topTo);
  if (gap) marks.push(lineMark('dimension', x, top, x, gap[0]), lineMark('dimension', x, gap[1], x, bottom));
  else marks.push(lineMark('dimension', x, top, x, bottom));
  marks.push(arrowHead(x, -r, 0, inside ? -1 : 1, style), arrowHead(x, r, 0, inside ? 1 : -1, style));
  return marks;
}

function inside(a: Across): Draft[] {
  const { paper, ready, r } = a;
  if (a.at !== null) return [];
  const { label } = ready;
  const { style, rules } = paper;
  const out: Draft[] = [];
  const iso = style === 'iso';
  const room = iso ? rules.textLift + label.up + 3 + 2 : label.width + 3;
  if (a.x1 - a.x0 < room) return out;
  if (iso ? r < label.width + 4.6 : r < 2 * ((label.up + label.down) / 2 + 4)) return out;
  for (const t of POSITIONS) {
    const x = a.x0 + (a.x1 - a.x0) * t;
    if (
      iso
        ? x - a.x0 < rules.textLift + label.up + 1.2 || a.x1 - x < 2
        : Math.min(x - a.x0, a.x1 - x) < label.width / 2 + 1.2
    )
      continue;
    if (!onOutline(a, x)) continue;
    const cost = PRICE.inside + Math.abs(t - 0.5) * PRICE.offMiddle;
    if (iso) {
      out.push({
        form: 'inside',
        cost,
        rotate: -90,
        build: () => ({
          strokes: crossLine(a, x, true, 0, null),
          writing: written(label, x - rules.textLift - Math.max(0, label.down - 1.06), -1.4, -90),
        }),
      });
    } else {
      const middle = -r / 2;
      const tall = (label.up + label.down) / 2;
      out.push({
        form: 'inside',
        cost,
        build: () => ({
          strokes: crossLine(a, x, true, 0, [middle - tall - rules.textGap, middle + tall + rules.textGap]),
          writing: written(label, x - label.width / 2, middle + (label.up - label.down) / 2),
        }),
      });
    }
  }
  return out;
}

function through(a: Across): Draft[] {
  const { paper, ready, r } = a;
  if (a.at !== null) return [];
  const { label } = ready;
  const { style, rules } = paper;
  const iso = style === 'iso';
  const arrowsIn = 2 * r >= ARROWS_IN;
  const out: Draft[] = [];
  const shift = rules.textLift + Math.max(0, label.down - 1.06);
  for (const t of POSITIONS) {
    const x = a.x0 + (a.x1 - a.x0) * t;
    if (Math.min(x - a.x0, a.x1 - x) < 1.3 || !onOutline(a, x)) continue;
    const column: [number, number] = iso
      ? [x - shift - label.up - 0.5, x + 0.5]
      : [x - label.width / 2 - 0.5, x + label.width / 2 + 0.5];
    const own = r + (arrowsIn ? 1.2 : TURNED_TEXT_FROM_ARROW);
    const base = Math.max(own, reachWithin(paper.top, ...column) + 1.2);
    for (const lift of LIFTS) {
      const start = -(base + lift);
      const cost = PRICE.through + Math.abs(t - 0.5) * PRICE.offMiddle + lift * 0.09 + (base - own) * 0.05;
      if (iso) {
        out.push({
          form: 'through',
          cost,
          rotate: -90,
          build: () => ({
            strokes: crossLine(a, x, arrowsIn, start - label.width - 0.3, null),
            writing: written(label, x - shift, start, -90),
          }),
        });
      } else {
        const lineEnd = Math.min(start, arrowsIn ? -r - 2 : -r - TAIL);
        out.push({
          form: 'through',
          cost,
          build: () => ({
            strokes: crossLine(a, x, arrowsIn, lineEnd, null),
            writing: written(label, x - label.width / 2, lineEnd - rules.textGap - label.down),
          }),
        });
      }
    }
  }
  return out;
}

/** Where the outline towards an end last reaches the radius: the extension line starts beside it. */
function cornerTowards(a: Across, side: 1 | -1): number {
  const points = side > 0 ? [...a.paper.top].reverse() : a.paper.top;
  for (const p of points) if (-p.y >= a.r - 0.05) return p.x;
  return side > 0 ? a.x1 : a.x0;
}

function atEnd(a: Across, side: 1 | -1): Draft[] {
  const { paper, ready, r } = a;
  const { label } = ready;
  const { style, rules } = paper;
  const end = side > 0 ? paper.right : paper.left;
  const own = a.at ?? (side > 0 ? a.x1 : a.x0);
  // Only metal smaller than this one may lie between the step and the end.
  const between =
    side > 0 ? reachWithin(paper.top, own + 0.05, end) : reachWithin(paper.top, end, own - 0.05);
  if (between > r + 0.02 || (Math.abs(own - end) > 0.05 && between > r - 0.25)) return [];
  const corner =
    a.at === null
      ? own
      : side > 0
        ? Math.min(own, cornerTowards(a, side))
        : Math.max(own, cornerTowards(a, side));
  const iso = style === 'iso';
  const arrowsIn = 2 * r >= (iso ? ARROWS_IN - 1 : ARROWS_IN);
  const tall = label.up + label.down;
  const out: Draft[] = [];
  const shift = rules.textLift + Math.max(0, label.down - 1.06);
  const first = iso
    ? Math.max(rules.firstLine, side > 0 ? rules.centrePast + 0.8 + shift + label.up : rules.centrePast + 1.6)
    : Math.max(rules.firstLine, label.width / 2 + 4.6);
  const step = iso ? label.up + shift + 1.5 : label.width / 2 + 3.5;
  for (let slot = 0; slot < SLOTS; slot++) {
    const x = end + side * (first + slot * step);
    const reach = Math.abs(x - corner);
    const hug = Math.abs(own - end) > 4 && between > r - 1.2 ? 7 : 0;
    const price = PRICE.end + slot * PRICE.slot + reach * PRICE.perMm + hug;
    const ext = (y: number): Mark =>
      lineMark('extension', corner + side * rules.extensionGap, y, x + side * rules.extensionPast, y);
    const push = (more: () => Mark[], writing: () => Written, extra: number, rotate?: -90): void => {
      out.push({
        form: 'end',
        cost: price + extra,
        rotate,
        build: () => ({ strokes: [ext(-r), ext(r), ...more()], writing: writing() }),
      });
    };
    if (iso) {
      if (2 * r >= label.width + 1.6)
        push(
          () => crossLine(a, x, arrowsIn, 0, null),
          () => written(label, x - shift, label.width / 2, -90),
          0,
          -90,
        );
      else {
        const from = r + TURNED_TEXT_FROM_ARROW;
        push(
          () => crossLine(a, x, arrowsIn, -from - label.width - 0.3, null),
          () => written(label, x - shift, -from, -90),
          0.5,
          -90,
        );
        push(
          () => [
            ...crossLine(a, x, arrowsIn, 0, null),
            lineMark('dimension', x, r, x, from + label.width + 0.3),
          ],
          () => written(label, x - shift, from + label.width, -90),
          0.7,
          -90,
        );
      }
    } else {
      const gapHalf = tall / 2 + rules.textGap;
      if (2 * r >= 2 * gapHalf + (arrowsIn ? 7 : 1))
        push(
          () => crossLine(a, x, arrowsIn, 0, [-gapHalf, gapHalf]),
          () => written(label, x - label.width / 2, (label.up - label.down) / 2),
          0,
        );
      else {
        const top = -(r + (arrowsIn ? 3 : TAIL));
        push(
          () => crossLine(a, x, arrowsIn, top, null),
          () => written(label, x - label.width / 2, top - rules.textGap - label.down),
          0.5,
        );
      }
    }
  }
  return out;
}

function byLeader(a: Across): Draft[] {
  const { paper, ready, r } = a;
  const places = a.at !== null ? [a.at] : [0.5, 0.25, 0.75].map((t) => a.x0 + (a.x1 - a.x0) * t);
  return places.flatMap((x, i) =>
    a.at === null && !onOutline(a, x)
      ? []
      : leaderDrafts(
          paper,
          ready.label,
          { x, y: -r },
          { cost: (a.at === null ? PRICE.leader : PRICE.cornerLeader) + i * 0.4, lean: 0 },
        ),
  );
}

/** Every draft of a diameter or a thread: leaders, the dearest and by far the most, only where they are asked for. */
export function diameterDrafts(paper: AxisPaper, ready: ReadySize): Drafts {
  const across = acrossOf(paper, ready);
  if (!across) return { first: [] };
  return {
    first: [...inside(across), ...atEnd(across, 1), ...atEnd(across, -1), ...through(across)],
    later: {
      from: across.at === null ? PRICE.leader : PRICE.cornerLeader,
      make: () => byLeader(across),
    },
  };
}
