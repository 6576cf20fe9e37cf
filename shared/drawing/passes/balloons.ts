/** A numbered circle beside each size's writing, on a short stem where it cannot hug. Afterwards none touches anything. */
import type { Box } from '../geometry/box';
import { boxesMeet } from '../geometry/box';
import { distanceToSegment } from '../geometry/segment';
import { lineMark } from '../arrow';
import type { Mark } from '../sheet';
import type { Stroke } from '../strokes';
import { CAP_HEIGHT, fontSizeFor } from '../text-metrics';

export interface BalloonWish {
  number: number;
  sizeId: string;
  /** Box of the writing it belongs to. */
  text: Box;
  rotate?: -90;
  /** Its writing stands on a line: the balloon stands under that line, as in a chain. */
  onLine?: boolean;
}
export interface Ink {
  texts: readonly Box[];
  strokes: readonly Stroke[];
}

const HUG = 0.9;
/** From the bottom of a writing, past the line it stands on, to a balloon's edge. */
const UNDER_LINE = 1.35;
const CLEAR = 0.55;
const STEMS = [6, 9, 12, 16, 20, 25, 31, 38];
const STEM_ANGLES = [45, 60, 30, 75, 15, 90, 0];

interface Circle {
  x: number;
  y: number;
}

function boxDistance(x: number, y: number, b: Box): number {
  return Math.hypot(Math.max(b[0] - x, 0, x - b[2]), Math.max(b[1] - y, 0, y - b[3]));
}

/** A coarse grid over the paper, so that a place is judged by what is near it. */
class Field {
  private readonly cells = new Map<number, { texts: Box[]; strokes: Stroke[] }>();
  private static readonly CELL = 10;
  /** More cells than any paper has down its side. */
  private static readonly ROW = 4096;
  constructor(ink: Ink) {
    for (const text of ink.texts) this.addText(text);
    for (const stroke of ink.strokes)
      this.each(
        [
          Math.min(stroke.x1, stroke.x2),
          Math.min(stroke.y1, stroke.y2),
          Math.max(stroke.x1, stroke.x2),
          Math.max(stroke.y1, stroke.y2),
        ],
        (c) => c.strokes.push(stroke),
      );
  }
  addText(text: Box): void {
    this.each(text, (c) => c.texts.push(text));
  }
  addStroke(s: Stroke): void {
    this.each([Math.min(s.x1, s.x2), Math.min(s.y1, s.y2), Math.max(s.x1, s.x2), Math.max(s.y1, s.y2)], (c) =>
      c.strokes.push(s),
    );
  }
  private each(box: Box, act: (cell: { texts: Box[]; strokes: Stroke[] }) => void): void {
    const n = (v: number): number => Math.floor(v / Field.CELL);
    for (let i = n(box[0] - 4); i <= n(box[2] + 4); i++)
      for (let j = n(box[1] - 4); j <= n(box[3] + 4); j++) {
        const key = i * Field.ROW + j;
        let cell = this.cells.get(key);
        if (!cell) this.cells.set(key, (cell = { texts: [], strokes: [] }));
        act(cell);
      }
  }
  free(x: number, y: number, r: number): boolean {
    const cell = this.cells.get(Math.floor(x / Field.CELL) * Field.ROW + Math.floor(y / Field.CELL));
    if (!cell) return true;
    return (
      cell.texts.every((t) => boxDistance(x, y, t) >= r + CLEAR) &&
      cell.strokes.every((s) => distanceToSegment(x, y, s) >= r + CLEAR)
    );
  }
  /** Stem strokes that would cross something: every cell on the way is asked. */
  openLine(s: { x1: number; y1: number; x2: number; y2: number }, own: Box): boolean {
    const box: Box = [Math.min(s.x1, s.x2), Math.min(s.y1, s.y2), Math.max(s.x1, s.x2), Math.max(s.y1, s.y2)];
    let open = true;
    this.each(box, (cell) => {
      if (!open) return;
      if (cell.texts.some((t) => t !== own && boxesMeet(t, box) && meets(s, t))) open = false;
      else if (cell.strokes.some((o) => o.line !== 'extension' && crossing(s, o))) open = false;
    });
    return open;
  }
}

function meets(s: { x1: number; y1: number; x2: number; y2: number }, b: Box): boolean {
  for (let i = 0; i <= 20; i++) {
    const t = i / 20;
    if (boxDistance(s.x1 + (s.x2 - s.x1) * t, s.y1 + (s.y2 - s.y1) * t, b) < 0.4) return true;
  }
  return false;
}

function crossing(a: { x1: number; y1: number; x2: number; y2: number }, b: Stroke): boolean {
  const side = (px: number, py: number, q: { x1: number; y1: number; x2: number; y2: number }): number =>
    (q.x2 - q.x1) * (py - q.y1) - (q.y2 - q.y1) * (px - q.x1);
  return side(a.x1, a.y1, b) * side(a.x2, a.y2, b) < 0 && side(b.x1, b.y1, a) * side(b.x2, b.y2, a) < 0;
}

/** Places beside the writing: after it, before it, under it, over it, and slid along. */
function hugging(wish: BalloonWish, r: number): Circle[] {
  const [x0, y0, x1, y1] = wish.text;
  const mx = (x0 + x1) / 2;
  const my = (y0 + y1) / 2;
  const o = HUG + r;
  const under = { x: mx, y: y1 + o };
  const over = { x: mx, y: y0 - o };
  const after = { x: x1 + o, y: my };
  const before = { x: x0 - o, y: my };
  const below = { x: mx, y: y1 + UNDER_LINE + r };
  const upright = wish.onLine ? [below, after, before, under, over] : [after, before, under, over];
  const base = wish.rotate ? [over, under, after, before] : upright;
  const slid: Circle[] = [];
  for (const d of [0.8, 1.6, 2.6]) {
    for (const p of base) {
      const ux = Math.sign(p.x - mx);
      const uy = Math.sign(p.y - my);
      slid.push({ x: p.x + ux * d, y: p.y + uy * d });
    }
    slid.push(
      { x: mx - d * 2, y: under.y },
      { x: mx + d * 2, y: under.y },
      { x: mx - d * 2, y: over.y },
      { x: mx + d * 2, y: over.y },
    );
    slid.push(
      { x: after.x, y: my - d },
      { x: after.x, y: my + d },
      { x: before.x, y: my - d },
      { x: before.x, y: my + d },
    );
    slid.push(
      { x: under.x, y: under.y + 1.6 + d },
      { x: under.x - d * 2, y: under.y + 1.6 + d },
      { x: under.x + d * 2, y: under.y + 1.6 + d },
    );
  }
  return [...base, ...slid];
}

function mark(wish: BalloonWish, at: Circle, r: number, stem: Mark[]): { sizeId: string; marks: Mark[] } {
  const size = fontSizeFor(2.5);
  return {
    sizeId: wish.sizeId,
    marks: [
      ...stem,
      { type: 'circle', line: 'thin', cx: at.x, cy: at.y, r },
      {
        type: 'text',
        x: at.x,
        y: at.y + (CAP_HEIGHT * size) / 2,
        size,
        anchor: 'middle',
        text: String(wish.number),
      },
    ],
  };
}

/** Balloons in the order given; `lost` names the sizes for which no place was free within the room. */
export function placeBalloons(
  wishes: readonly BalloonWish[],
  ink: Ink,
  room: (x: number, y: number, r: number) => boolean,
  r: number,
): { balloons: { sizeId: string; marks: Mark[] }[]; lost: string[] } {
  const field = new Field(ink);
  const balloons: { sizeId: string; marks: Mark[] }[] = [];
  const lost: string[] = [];
  const keep = (at: Circle): void => field.addText([at.x - r, at.y - r, at.x + r, at.y + r]);
  for (const wish of wishes) {
    const at = hugging(wish, r).find((c) => room(c.x, c.y, r) && field.free(c.x, c.y, r));
    if (at) {
      balloons.push(mark(wish, at, r, []));
      keep(at);
      continue;
    }
    const stemmed = onStem(wish, r, field, room);
    if (!stemmed) {
      lost.push(wish.sizeId);
      continue;
    }
    const { circle, from, to } = stemmed;
    const stem = lineMark('thin', from.x, from.y, to.x, to.y);
    balloons.push(mark(wish, circle, r, [stem]));
    keep(circle);
    field.addStroke({ line: 'thin', x1: from.x, y1: from.y, x2: to.x, y2: to.y });
  }
  return { balloons, lost };
}

function onStem(
  wish: BalloonWish,
  r: number,
  field: Field,
  room: (x: number, y: number, r: number) => boolean,
) {
  const [x0, y0, x1, y1] = wish.text;
  const starts = [
    { x: x1 + 0.5, y: y0 - 0.5, ux: 1, uy: -1 },
    { x: x0 - 0.5, y: y0 - 0.5, ux: -1, uy: -1 },
    { x: x1 + 0.5, y: y1 + 0.5, ux: 1, uy: 1 },
    { x: x0 - 0.5, y: y1 + 0.5, ux: -1, uy: 1 },
    { x: (x0 + x1) / 2, y: y0 - 0.5, ux: 1, uy: -1 },
    { x: (x0 + x1) / 2, y: y0 - 0.5, ux: -1, uy: -1 },
    { x: (x0 + x1) / 2, y: y1 + 0.5, ux: 1, uy: 1 },
    { x: (x0 + x1) / 2, y: y1 + 0.5, ux: -1, uy: 1 },
  ];
  for (const length of STEMS)
    for (const degrees of STEM_ANGLES)
      for (const s of starts) {
        const a = (degrees * Math.PI) / 180;
        const ux = s.ux * Math.cos(a);
        const uy = s.uy * Math.sin(a);
        const circle = { x: s.x + ux * (length + r), y: s.y + uy * (length + r) };
        if (!room(circle.x, circle.y, r) || !field.free(circle.x, circle.y, r)) continue;
        const from = { x: s.x, y: s.y };
        const to = { x: s.x + ux * length, y: s.y + uy * length };
        if (field.openLine({ x1: from.x, y1: from.y, x2: to.x, y2: to.y }, wish.text))
          return { circle, from, to };
      }
  return null;
}
