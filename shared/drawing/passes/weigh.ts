/** What a candidate costs against all that does not move: the view's own lines and the lengths. */
import { boxesMeet, growBox } from '../geometry/box';
import { segmentMeetsBox, segmentsCross, sideBySide } from '../geometry/segment';
import { compareFootprints } from '../footprint';
import type { Footprint } from '../footprint';
import type { Candidate } from '../layout';
import { strokeBox } from '../strokes';
import type { Stroke } from '../strokes';

const PRICE = { leaderOverOutline: 9, extensionHugs: 7, extensionCrosses: 1.5, dimensionCrosses: 0.3, arrowOnEdge: 2 } as const;
const TEXT_CLEAR = 0.6;
const HUG = 1.2;
const HUG_LENGTH = 4;

function strokeOnView(stroke: Stroke, view: Stroke, verdict: { clashes: number; cost: number }): void {
  if (view.line === 'centre') {
    if (stroke.line !== 'extension' && stroke.line !== 'arrow' && sideBySide(stroke, view, 0.8) > 0.5) verdict.clashes += 1;
    return;
  }
  if (stroke.line === 'arrow') {
    if (segmentsCross(stroke, view, 0.3)) verdict.cost += PRICE.arrowOnEdge;
    return;
  }
  if (stroke.line === 'dimension') {
    if (sideBySide(stroke, view, 1) > 0.8) verdict.clashes += 1;
    else if (segmentsCross(stroke, view)) verdict.cost += PRICE.dimensionCrosses;
  } else if (stroke.line === 'extension') {
    if (sideBySide(stroke, view, HUG) > HUG_LENGTH) verdict.cost += PRICE.extensionHugs;
    else if (sideBySide(stroke, view, 0.3) > 0.5) verdict.cost += PRICE.extensionHugs;
    if (segmentsCross(stroke, view)) verdict.cost += PRICE.extensionCrosses;
  } else if (stroke.line === 'leader' && segmentsCross(stroke, view, 0.3)) verdict.cost += PRICE.leaderOverOutline;
}

/** Meetings of a candidate with the strokes of the view. */
function againstView(candidate: Candidate, view: Footprint): { clashes: number; cost: number } {
  const verdict = { clashes: 0, cost: 0 };
  if (!boxesMeet(candidate.print.bounds, view.bounds, HUG)) return verdict;
  for (const text of candidate.print.texts) {
    const grown = growBox(text, TEXT_CLEAR);
    if (!boxesMeet(grown, view.bounds)) continue;
    for (const stroke of view.strokes) if (segmentMeetsBox(stroke, grown)) verdict.clashes += 1;
  }
  for (const stroke of candidate.print.strokes) {
    const box = growBox(strokeBox(stroke), HUG);
    if (!boxesMeet(box, view.bounds)) continue;
    for (const edge of view.strokes) if (boxesMeet(box, strokeBox(edge))) strokeOnView(stroke, edge, verdict);
  }
  return verdict;
}

/** The candidate with the price and the clashes of its meetings with view and lengths added. */
export function weigh(candidate: Candidate, view: Footprint, fixed: readonly Footprint[]): Candidate {
  const verdict = againstView(candidate, view);
  for (const other of fixed) {
    const met = compareFootprints(candidate.print, other);
    verdict.clashes += met.clashes;
    verdict.cost += met.cost;
  }
  return { ...candidate, cost: candidate.cost + verdict.cost, clashes: candidate.clashes + verdict.clashes };
}
