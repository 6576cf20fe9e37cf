import { boxAround, boxesMeet, growBox } from './geometry/box';
import type { Box } from './geometry/box';
import { segmentMeetsBox, segmentsCross, sideBySide } from './geometry/segment';
import type { Mark } from './sheet';
import { strokeBox, strokesOf, textBoxesOf } from './strokes';
import type { Stroke } from './strokes';

/** What a set of marks takes up on paper, as solver, interrupt pass and check all see it. */
export interface Footprint {
  texts: readonly Box[];
  strokes: readonly Stroke[];
  bounds: Box;
}

/** The footprint of marks. */
export function footprintOf(marks: readonly Mark[]): Footprint {
  const texts = textBoxesOf(marks);
  const strokes = strokesOf(marks);
  const bounds = boxAround([...texts, ...strokes.map(strokeBox)]) ?? [0, 0, 0, 0];
  return { texts, strokes, bounds };
}

/** What two placed sizes do to one another: refused clashes, and the price of what is merely unlovely. */
export interface Verdict {
  clashes: number;
  cost: number;
}

/** Prices of meetings that the sheet check allows. Source: trial sheets, looked at. */
const PRICE = {
  textOnExtension: 9,
  arrowOnExtension: 4,
  extensionExtension: 0.7,
  extensionDimension: 3,
  leaderExtension: 2,
  leaderDimension: 5,
} as const;

const TEXT_CLEAR = 0.45;
const TEXT_APART = 0.8;
const LINES_APART = 1.2;

function textAgainstStrokes(texts: readonly Box[], other: Footprint, verdict: Verdict): void {
  for (const text of texts) {
    const grown = growBox(text, TEXT_CLEAR);
    if (!boxesMeet(grown, other.bounds)) continue;
    for (const stroke of other.strokes) {
      if (!segmentMeetsBox(stroke, grown)) continue;
      if (stroke.line === 'extension') verdict.cost += PRICE.textOnExtension;
      else verdict.clashes += 1;
    }
  }
}

function strokePair(a: Stroke, b: Stroke, verdict: Verdict): void {
  const kinds = [a.line, b.line];
  const has = (line: string): boolean => kinds.includes(line as never);
  if (has('arrow')) {
    if (!segmentsCross(a, b, 0)) return;
    if (has('extension')) verdict.cost += PRICE.arrowOnExtension;
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
  if (has('leader')) {
    if (has('extension')) verdict.cost += PRICE.leaderExtension;
    else if (has('dimension')) verdict.cost += PRICE.leaderDimension;
    else verdict.clashes += 1;
    return;
  }
  if (has('extension')) verdict.cost += PRICE.extensionDimension;
  else verdict.clashes += 1;
}

/** How two sizes stand to one another; symmetric. */
export function compareFootprints(a: Footprint, b: Footprint): Verdict {
  const verdict: Verdict = { clashes: 0, cost: 0 };
  if (!boxesMeet(a.bounds, b.bounds, LINES_APART)) return verdict;
  for (const one of a.texts) for (const two of b.texts) if (boxesMeet(one, two, TEXT_APART)) verdict.clashes += 1;
  textAgainstStrokes(a.texts, b, verdict);
  textAgainstStrokes(b.texts, a, verdict);
  const near = growBox(b.bounds, LINES_APART);
  for (const one of a.strokes) {
    if (!boxesMeet(strokeBox(one), near)) continue;
    for (const two of b.strokes) strokePair(one, two, verdict);
  }
  return verdict;
}

/** True where a text of the marks lies on a stroke of the same marks: a candidate must be clean in itself. */
export function clashesWithItself(print: Footprint): boolean {
  for (let i = 0; i < print.texts.length; i++) {
    const text = print.texts[i];
    if (!text) continue;
    for (const stroke of print.strokes) if (segmentMeetsBox(stroke, growBox(text, 0.1))) return true;
    for (let j = i + 1; j < print.texts.length; j++) {
      const other = print.texts[j];
      if (other && boxesMeet(text, other, -0.02)) return true;
    }
  }
  return false;
}
