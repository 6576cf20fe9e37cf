/** What a candidate costs against all that does not move: the view's own lines and the lengths. */
import { boxesMeet } from '../geometry/box';
import { segmentsCross, sideBySide } from '../geometry/segment';
import { clashesWithItself, compareFootprints, strokeNearBox } from '../footprint';
import type { Footprint, PrintStroke } from '../footprint';
import type { Candidate } from '../layout';
import { realise } from './candidate';
import type { Draft, Drafts } from './candidate';

const PRICE = {
  leaderOverOutline: 9,
  extensionHugs: 7,
  extensionCrosses: 1.5,
  dimensionCrosses: 0.3,
  arrowOnEdge: 2,
} as const;
const TEXT_CLEAR = 0.6;
const HUG = 1.2;
const HUG_LENGTH = 4;

function strokeOnView(
  stroke: PrintStroke,
  view: PrintStroke,
  verdict: { clashes: number; cost: number },
): void {
  if (view.line === 'centre') {
    if (stroke.line !== 'extension' && stroke.line !== 'arrow' && sideBySide(stroke, view, 0.8) > 0.5)
      verdict.clashes += 1;
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
  } else if (stroke.line === 'leader' && segmentsCross(stroke, view, 0.3))
    verdict.cost += PRICE.leaderOverOutline;
}

/** Meetings of a candidate with the strokes of the view. */
function againstView(candidate: Candidate, view: Footprint): { clashes: number; cost: number } {
  const verdict = { clashes: 0, cost: 0 };
  if (!boxesMeet(candidate.print.bounds, view.bounds, HUG)) return verdict;
  for (const text of candidate.print.texts) {
    if (!boxesMeet(text, view.bounds, TEXT_CLEAR)) continue;
    for (const stroke of view.strokes) if (strokeNearBox(stroke, text, TEXT_CLEAR)) verdict.clashes += 1;
  }
  const n = view.bounds;
  for (const s of candidate.print.strokes) {
    if (s.x0 >= n[2] + HUG || s.xe <= n[0] - HUG || s.y0 >= n[3] + HUG || s.ye <= n[1] - HUG) continue;
    for (const e of view.strokes)
      if (s.x0 < e.xe + HUG && s.xe > e.x0 - HUG && s.y0 < e.ye + HUG && s.ye > e.y0 - HUG)
        strokeOnView(s, e, verdict);
  }
  return verdict;
}

/** How much work goes into one size, and what reaching past the ends of the view costs. */
export interface Work {
  enough: number;
  most: number;
  overhang: number;
}

function weigh(candidate: Candidate, view: Footprint, fixed: readonly Footprint[], overhang: number): void {
  const verdict = againstView(candidate, view);
  const { bounds } = candidate.print;
  verdict.cost +=
    overhang * (Math.max(0, view.bounds[0] - bounds[0]) + Math.max(0, bounds[2] - view.bounds[2]));
  for (const other of fixed) {
    const met = compareFootprints(candidate.print, other);
    verdict.clashes += met.clashes;
    verdict.cost += met.cost;
  }
  candidate.cost += verdict.cost;
  candidate.clashes += verdict.clashes;
}

/** Cheapest first; sorting keeps equals in their order. */
function byCost(drafts: readonly Draft[]): Draft[] {
  return [...drafts].sort((a, b) => a.cost - b.cost);
}

/**
 * Drafts worked out and weighed, cheapest first, until `enough` are free of clashes with what is fixed; sorted by
 * clashes, then price. `most` bounds the work; `overhang` is the price of a millimetre beyond the ends of the view.
 */
export function weighDrafts(
  drafts: Drafts,
  view: Footprint,
  fixed: readonly Footprint[],
  work: Work,
): Candidate[] {
  const { enough, most, overhang } = work;
  let order = byCost(drafts.first);
  let later = drafts.later;
  const weighed: Candidate[] = [];
  let clean = 0;
  for (let i = 0; clean < enough && weighed.length < most; i++) {
    if (later && (order[i]?.cost ?? Infinity) >= later.from) {
      order = byCost([...order.slice(i), ...later.make()]);
      later = undefined;
      i = 0;
    }
    const draft = order[i];
    if (!draft) break;
    const candidate = realise(draft);
    if (clashesWithItself(candidate.print)) continue;
    weigh(candidate, view, fixed, overhang);
    if (candidate.clashes === 0) clean++;
    weighed.push(candidate);
  }
  return weighed.sort((a, b) => a.clashes - b.clashes || a.cost - b.cost);
}
