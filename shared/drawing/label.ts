import type { Box } from './geometry/box';
import type { Mark, TextMark } from './sheet';
import { textBoxesOf } from './strokes';
import { DIAMETER_ROOM, diameterSymbol } from './symbols/diameter';
import { ASCENT, DESCENT, fontSizeFor, textWidth } from './text-metrics';

/** One piece of a size's writing. `stack` is a pair of limits one over the other. */
export type Run =
  { kind: 'text'; text: string } | { kind: 'diameter' } | { kind: 'stack'; upper: string; lower: string };

/** A size's writing before it has a place: its runs, a second line under them, and its extent about the baseline. */
export interface Label {
  runs: readonly Run[];
  /** Small words under the figure (`across flats`). */
  under?: string;
  letter: number;
  small: number;
  width: number;
  /** The figure alone, without the words under it. */
  figureWidth: number;
  /** Extent over and under the baseline, mm. */
  up: number;
  down: number;
  /** As the sheet prints it, Ø for the diameter sign. */
  text: string;
}

const AIR_AFTER_SYMBOL = 0.35;
const AIR_BEFORE_STACK = 0.6;
/** Baselines of the two stacked limits from the main baseline, in small letter heights. */
const UPPER_LIFT = 1.06;
const LOWER_DROP = 0.5;

function runWidth(run: Run, letter: number, small: number): number {
  if (run.kind === 'diameter') return letter * DIAMETER_ROOM + AIR_AFTER_SYMBOL;
  if (run.kind === 'text') return textWidth(run.text, fontSizeFor(letter));
  const longest = Math.max(run.upper.length, run.lower.length);
  return AIR_BEFORE_STACK + textWidth('0'.repeat(longest), fontSizeFor(small));
}

/** Measures a label of the given runs; heights are letter heights in mm. */
export function makeLabel(
  runs: readonly Run[],
  text: string,
  letter: number,
  small: number,
  under?: string,
): Label {
  const size = fontSizeFor(letter);
  const smallSize = fontSizeFor(small);
  let width = runs.reduce((sum, run) => sum + runWidth(run, letter, small), 0);
  const figureWidth = width;
  let up = ASCENT * size;
  let down = DESCENT * size;
  if (runs.some((run) => run.kind === 'stack')) {
    up = Math.max(up, UPPER_LIFT * small + ASCENT * smallSize);
    down = Math.max(down, LOWER_DROP * small + DESCENT * smallSize);
  }
  if (under !== undefined) {
    width = Math.max(width, textWidth(under, smallSize));
    down += (ASCENT + DESCENT) * smallSize + 0.2;
  }
  return { runs, under, letter, small, width, figureWidth, up, down, text };
}

/** A label with a place: its marks are made when they are drawn, its boxes are known before. */
export interface Written {
  label: Label;
  x: number;
  y: number;
  rotate?: -90;
}

/** Boxes of a label's texts and symbols about its own origin, upright and turned, worked out once. */
const boxesAtOrigin = new WeakMap<Label, { upright?: readonly Box[]; turned?: readonly Box[] }>();

/** The boxes that the placed label's texts and symbols will have. */
export function writtenBoxes({ label, x, y, rotate }: Written): Box[] {
  let known = boxesAtOrigin.get(label);
  if (!known) boxesAtOrigin.set(label, (known = {}));
  const boxes = rotate
    ? (known.turned ??= textBoxesOf(placeLabel(label, 0, 0, rotate)))
    : (known.upright ??= textBoxesOf(placeLabel(label, 0, 0)));
  return boxes.map((b): Box => [b[0] + x, b[1] + y, b[2] + x, b[3] + y]);
}

/** The label's marks with the left end (upright) or the lower end (turned) of its baseline at (x, y). */
export function placeLabel(label: Label, x: number, y: number, rotate?: -90): Mark[] {
  const size = fontSizeFor(label.letter);
  const smallSize = fontSizeFor(label.small);
  const marks: Mark[] = [];
  const at = (along: number, down: number): { x: number; y: number } =>
    rotate ? { x: x + down, y: y - along } : { x: x + along, y: y + down };
  const write = (text: string, along: number, down: number, fontSize: number): void => {
    const mark: TextMark = { type: 'text', ...at(along, down), size: fontSize, anchor: 'start', text };
    if (rotate) mark.rotate = rotate;
    marks.push(mark);
  };
  const runsWidth = label.runs.reduce((sum, run) => sum + runWidth(run, label.letter, label.small), 0);
  let along = (label.width - runsWidth) / 2;
  for (const run of label.runs) {
    if (run.kind === 'diameter') {
      const p = at(along, 0);
      marks.push(diameterSymbol(p.x, p.y, label.letter, rotate));
    } else if (run.kind === 'text') write(run.text, along, 0, size);
    else {
      write(run.upper, along + AIR_BEFORE_STACK, -UPPER_LIFT * label.small, smallSize);
      write(run.lower, along + AIR_BEFORE_STACK, LOWER_DROP * label.small, smallSize);
    }
    along += runWidth(run, label.letter, label.small);
  }
  if (label.under !== undefined) {
    const w = textWidth(label.under, smallSize);
    write(label.under, (label.width - w) / 2, DESCENT * size + 0.2 + ASCENT * smallSize, smallSize);
  }
  return marks;
}
