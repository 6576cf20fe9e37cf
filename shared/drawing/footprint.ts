import { boxesMeet, growBox } from './geometry/box';
import type { Box } from './geometry/box';
import { segmentMeetsBox, segmentsCross, sideBySide } from './geometry/segment';
import type { LineType, Mark, PolylineMark } from './sheet';
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

function stroke(line: LineType, x1: number, y1: number, x2: number, y2: number): PrintStroke {
  return {
    line,
    x1,
    y1,
    x2,
    y2,
    x0: x1 < x2 ? x1 : x2,
    y0: y1 < y2 ? y1 : y2,
    xe: x1 < x2 ? x2 : x1,
    ye: y1 < y2 ? y2 : y1,
  };
}

function addPolyline(mark: PolylineMark, out: PrintStroke[]): void {
  const { points } = mark;
  if (mark.line === 'arrow') {
    const [tip, a, b] = points;
    if (tip && a && b) out.push(stroke('arrow', tip.x, tip.y, (a.x + b.x) / 2, (a.y + b.y) / 2));
    return;
  }
  const last = mark.closed ? points.length : points.length - 1;
  for (let i = 0; i < last; i++) {
    const a = points[i];
    const b = points[i + 1] ?? points[0];
    if (a && b) out.push(stroke(mark.line, a.x, a.y, b.x, b.y));
  }
}

function solverStrokes(marks: readonly Mark[]): PrintStroke[] {
  const out: PrintStroke[] = [];
  for (const mark of marks) {
    if (mark.type === 'line') out.push(stroke(mark.line, mark.x1, mark.y1, mark.x2, mark.y2));
    else if (mark.type === 'polyline') addPolyline(mark, out);
    else if (mark.type !== 'text' && mark.type !== 'symbol')
      for (const s of strokesOf([mark])) out.push(stroke(s.line, s.x1, s.y1, s.x2, s.y2));
  }
  return out;
}

/** The footprint of marks. */
export function footprintOf(marks: readonly Mark[]): Footprint {
  return footprintWith(marks, textBoxesOf(marks));
}

/** The footprint of marks whose texts' boxes are known. */
export function footprintWith(marks: readonly Mark[], texts: readonly Box[]): Footprint {
  const strokes = solverStrokes(marks);
  let x0 = Infinity;
  let y0 = Infinity;
  let x1 = -Infinity;
  let y1 = -Infinity;
  const reach = (a: number, b: number, c: number, d: number): void => {
    if (a < x0) x0 = a;
    if (b < y0) y0 = b;
    if (c > x1) x1 = c;
    if (d > y1) y1 = d;
  };
  for (const s of strokes) {
    const half = s.line === 'arrow' ? ARROW_HALF : 0;
    reach(s.x0 - half, s.y0 - half, s.xe + half, s.ye + half);
  }
  for (const t of texts) reach(t[0], t[1], t[2], t[3]);
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
