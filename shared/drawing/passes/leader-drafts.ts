/** Leaders: one polyline from an arrow on its feature to a shelf under (or beside) the writing, at 30 to 75 degrees. */
import { arrowHead } from '../arrow';
import type { Label, Written } from '../label';
import type { AxisPaper } from '../layout';
import { reachWithin } from '../layout';
import type { Mark, Point } from '../sheet';
import type { Draft } from './candidate';

const ANGLES = [60, 45, 70, 35];
const DENSE_ANGLES = [60, 45, 70, 35, 53, 39, 66];
const ROW_START = 7;
const ROW_STEP = 7.4;
const ROWS = 5;
const PER_ROW = 0.55;
const ASME_SHELF = 2.5;

export interface LeaderWish {
  cost: number;
  /** −1: better to the left, 1: better to the right, 0: either. */
  lean: -1 | 0 | 1;
  /** More angles and rows, for crowded sheets. */
  dense?: boolean;
}

/** Drafts that end with an arrow at `tip` on the upper outline. */
export function leaderDrafts(paper: AxisPaper, label: Label, tip: Point, wish: LeaderWish): Draft[] {
  const out: Draft[] = [];
  const local = reachWithin(paper.top, tip.x - 12, tip.x + 12);
  const heights: { y: number; cost: number }[] = [];
  for (let row = 0; row < ROWS; row++)
    heights.push({ y: paper.reach + ROW_START + row * ROW_STEP, cost: row * PER_ROW });
  for (let row = 0; row < 2; row++)
    heights.push({ y: local + 6 + row * ROW_STEP, cost: 0.4 + row * PER_ROW });
  if (wish.dense)
    for (let y = local + 5; y < paper.reach + 50; y += 2.7) heights.push({ y, cost: 1 + (y - local) * 0.03 });
  (wish.dense ? DENSE_ANGLES : ANGLES).forEach((angle, i) => {
    const cot = 1 / Math.tan((angle * Math.PI) / 180);
    for (const { y, cost } of heights) {
      const rise = y + tip.y;
      const run = rise * cot;
      if (rise < 4.5 || Math.hypot(run, rise) > paper.rules.longestLeader) continue;
      const price = wish.cost + cost + i * 0.15;
      for (const side of [-1, 1] as const) {
        const lean = wish.lean !== 0 && wish.lean !== side ? 0.8 : 0;
        out.push(new LeaderDraft(price + lean, paper, label, tip, { x: tip.x + side * run, y: -y }, side));
      }
    }
  });
  return out;
}

/** Many are drafted and few drawn, so a draft holds its figures and no function of its own. */
class LeaderDraft implements Draft {
  readonly form = 'leader';
  constructor(
    readonly cost: number,
    private readonly paper: AxisPaper,
    private readonly label: Label,
    private readonly tip: Point,
    private readonly elbow: Point,
    private readonly side: 1 | -1,
  ) {}
  build(): { strokes: Mark[]; writing: Written } {
    return leader(this.paper, this.label, this.tip, this.elbow, this.side);
  }
}

function leader(
  paper: AxisPaper,
  label: Label,
  tip: Point,
  elbow: Point,
  side: 1 | -1,
): { strokes: Mark[]; writing: Written } {
  const iso = paper.style === 'iso';
  const shelf = iso ? label.width + 0.8 : ASME_SHELF;
  const end = { x: elbow.x + side * shelf, y: elbow.y };
  const length = Math.hypot(tip.x - elbow.x, tip.y - elbow.y);
  const strokes: Mark[] = [
    { type: 'polyline', line: 'leader', points: [tip, elbow, end] },
    arrowHead(tip.x, tip.y, (tip.x - elbow.x) / length, (tip.y - elbow.y) / length, paper.style),
  ];
  const writing: Written = iso
    ? { label, x: side > 0 ? elbow.x + 0.6 : elbow.x - label.width - 0.6, y: elbow.y - 0.5 - label.down }
    : {
        label,
        x: side > 0 ? end.x + paper.rules.textGap : end.x - paper.rules.textGap - label.width,
        y: elbow.y + (label.up - label.down) / 2,
      };
  return { strokes, writing };
}
