import { boxesMeet, growBox } from './geometry/box';
import type { Box } from './geometry/box';
import { segmentMeetsBox, segmentsCross, sideBySide } from './geometry/segment';
import type { Mark } from './sheet';
import { strokesOf, textBoxesOf } from './strokes';
import type { Stroke } from './strokes';

/** A stroke with its own box, so that the solver need not work it out again and again. */
export interface PrintStroke extends Stroke {
  x0: number;
  y0: number;
  xe: number;
  ye: number;
}

/** What a set of marks takes up on paper, as the solver sees it: an arrowhead is its own axis. */
export interface Footprint {
  texts: readonly Box[];
  strokes: readonly PrintStroke[];
  bounds: Box;
}

function printStroke(s: Stroke): PrintStroke {
  return {
    line: s.line,
    x1: s.x1,
    y1: s.y1,
    x2: s.x2,
    y2: s.y2,
    x0: Math.min(s.x1, s.x2),
    y0: Math.min(s.y1, s.y2),
    xe: Math.max(s.x1, s.x2),
    ye: Math.max(s.y1, s.y2),
  };
}

function solverStrokes(marks: readonly Mark[]): PrintStroke[] {
  const out: PrintStroke[] = [];
  const drawn: Mark[] = [];
  for (const mark of marks) {
    if (mark.type === 'polyline' && mark.line === 'arrow') {
      const [tip, a, b] = mark.points;
      if (tip && a && b)
        out.push(
          printStroke({ line: 'arrow', x1: tip.x, y1: tip.y, x2: (a.x + b.x) / 2, y2: (a.y + b.y) / 2 }),
        );
    } else if (mark.type === 'line') out.push(printStroke(mark));
    else if (mark.type !== 'text' && mark.type !== 'symbol') drawn.push(mark);
  }
  for (const stroke of strokesOf(drawn)) out.push(printStroke(stroke));
  return out;
}

/** The footprint of marks. */
export function footprintOf(marks: readonly Mark[]): Footprint {
  const texts = textBoxesOf(marks);
  const strokes = solverStrokes(marks);
  let x0 = Infinity;
  let y0 = Infinity;
  let x1 = -Infinity;
  let y1 = -Infinity;
  for (const s of strokes) {
    const half = s.line === 'arrow' ? ARROW_HALF : 0;
    x0 = Math.min(x0, s.x0 - half);
    y0 = Math.min(y0, s.y0 - half);
    x1 = Math.max(x1, s.xe + half);
    y1 = Math.max(y1, s.ye + half);
  }
  for (const t of texts) {
    x0 = Math.min(x0, t[0]);
    y0 = Math.min(y0, t[1]);
    x1 = Math.max(x1, t[2]);
    y1 = Math.max(y1, t[3]);
  }
  return { texts, strokes, bounds: x0 <= x1 ? [x0, y0, x1, y1] : [0, 0, 0, 0] };
}

/** What two placed sizes do to one another: refused clashes, and the price of what is merely unlovely. */
export interface Verdict {
  clashes: number;
  cost: number;
}

/** Prices of meetings that the sheet check allows. Source: trial sheets, looked at. */
const PRICE = {
  textOnExtension: 9,
  textBesideText: 2.5,
  arrowOnExtension: 4,
  extensionExtension: 0.7,
  extensionDimension: 3,
  leaderExtension: 2,
} as const;

const TEXT_CLEAR = 0.45;
const TEXT_APART = 0.8;
const LINES_APART = 1.2;
/** Two writings of one row closer than this read as one note. */
const ONE_NOTE = 4;
const OWN_CLEAR = 0.1;
/** Half the width of an arrowhead. */
const ARROW_HALF = 0.5;
const CLEAR: Verdict = { clashes: 0, cost: 0 };

/** True where the stroke comes within `clear` of the box; an arrow is as wide as its head. */
export function strokeNearBox(s: PrintStroke, box: Box, clear: number): boolean {
  const c = s.line === 'arrow' ? clear + ARROW_HALF : clear;
  if (s.x0 >= box[2] + c || s.xe <= box[0] - c || s.y0 >= box[3] + c || s.ye <= box[1] - c) return false;
  if (s.x1 === s.x2 || s.y1 === s.y2) return true;
  return segmentMeetsBox(s, growBox(box, c));
}

function textAgainstStrokes(texts: readonly Box[], other: Footprint, verdict: Verdict): void {
  for (const text of texts) {
    if (!boxesMeet(text, other.bounds, TEXT_CLEAR)) continue;
    for (const stroke of other.strokes) {
      if (!strokeNearBox(stroke, text, TEXT_CLEAR)) continue;
      if (stroke.line === 'extension') verdict.cost += PRICE.textOnExtension;
      else verdict.clashes += 1;
    }
  }
}

function strokePair(a: PrintStroke, b: PrintStroke, verdict: Verdict): void {
  if (a.line === 'arrow' || b.line === 'arrow') {
    if (!segmentsCross(a, b, 0)) return;
    if (a.line === 'extension' || b.line === 'extension') verdict.cost += PRICE.arrowOnExtension;
    else verdict.clashes += 1;
    return;
  }
  if (a.line === 'extension' && b.line === 'extension') {
    if (segmentsCross(a, b)) verdict.cost += PRICE.extensionExtension;
    return;
  }
  if (sideBySide(a, b, LINES_APART) > 0.3) {
    verdict.clashes += 1;
    return;
  }
  if (!segmentsCross(a, b, 0)) return;
  const extension = a.line === 'extension' || b.line === 'extension';
  if (a.line === 'leader' || b.line === 'leader') {
    if (extension) verdict.cost += PRICE.leaderExtension;
    else verdict.clashes += 1;
    return;
  }
  if (extension) verdict.cost += PRICE.extensionDimension;
  else verdict.clashes += 1;
}

/** How two sizes stand to one another; symmetric. */
export function compareFootprints(a: Footprint, b: Footprint): Verdict {
  if (!boxesMeet(a.bounds, b.bounds, ONE_NOTE)) return CLEAR;
  const verdict: Verdict = { clashes: 0, cost: 0 };
  for (const one of a.texts)
    for (const two of b.texts) {
      if (boxesMeet(one, two, TEXT_APART)) verdict.clashes += 1;
      else if (one[1] < two[3] && two[1] < one[3] && one[0] < two[2] + ONE_NOTE && two[0] < one[2] + ONE_NOTE)
        verdict.cost += PRICE.textBesideText;
    }
  textAgainstStrokes(a.texts, b, verdict);
  textAgainstStrokes(b.texts, a, verdict);
  const n = b.bounds;
  for (const one of a.strokes) {
    if (
      one.x0 >= n[2] + LINES_APART ||
      one.xe <= n[0] - LINES_APART ||
      one.y0 >= n[3] + LINES_APART ||
      one.ye <= n[1] - LINES_APART
    )
      continue;
    for (const two of b.strokes) {
      if (
        one.x0 >= two.xe + LINES_APART ||
        one.xe <= two.x0 - LINES_APART ||
        one.y0 >= two.ye + LINES_APART ||
        one.ye <= two.y0 - LINES_APART
      )
        continue;
      strokePair(one, two, verdict);
    }
  }
  return verdict;
}

/** True where a text of the marks lies on a stroke of the same marks: a candidate must be clean in itself. */
export function clashesWithItself(print: Footprint): boolean {
  for (let i = 0; i < print.texts.length; i++) {
    const text = print.texts[i];
    if (!text) continue;
    for (const stroke of print.strokes) if (strokeNearBox(stroke, text, OWN_CLEAR)) return true;
    for (let j = i + 1; j < print.texts.length; j++) {
      const other = print.texts[j];
      if (other && boxesMeet(text, other, -0.02)) return true;
    }
  }
  return false;
}
