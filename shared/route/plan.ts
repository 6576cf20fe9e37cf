import type { Part } from '../part/part';
import type { Scheme } from '../scheme/scheme';
import { RuledOut } from './draft';
import type { Build } from './draft';
import { unplannedKinds, viewsOf } from './features';
import type { View, Views } from './features';
import { finishRoute, needList, weigh } from './finish-route';
import type { WeighedPlan } from './finish-route';
import { valleysOf } from './methods/turn';
import { planNeeds } from './needs';
import type { Lathe, Register } from './register';
import type { Capacity, Need, Route } from './route';
import { LIMITS } from './rules';
import { compareOutlines, compareScores, whyOutlineWorse, whyWorse } from './score';
import type { Outline, Score } from './score';
import { buildCandidate } from './setups/build-candidate';
import { candidateText } from './setups/candidate';
import type { Candidate } from './setups/candidate';
import { shutOut } from './setups/open-to';
import { stockFor } from './stock';
import type { StockAnswer, StockOption } from './stock';
import { verdictOf } from './verdict';
import type { LengthUnit } from '../units/parsed';
import type { DraftingStyle } from '../units/format';
import type { Shop } from './shop';
import { wordsIn } from './words';

export interface PlanAsked {
  quantity: number;
  /** Id of the materials table; the part's own when it is the same. */
  material: string;
  /** Unit of the lengths in sentences, as the drawing was typed: mm unless told. Figures stay mm. */
  unit?: LengthUnit;
  /** Style of those lengths: `iso` unless told. */
  style?: DraftingStyle;
}

export type PlanAnswer = { route: Route; capacity: Capacity } | { route: null; capacity: Capacity };

const MOST_CANDIDATES = 40;

interface Built {
  candidate: Candidate;
  build: Build;
  /** What can be told before minutes and needs are worked out. */
  outline: Outline;
}

interface Weighed extends Built {
  plan: WeighedPlan;
  needs: Need[];
  score: Score;
}

/**
 * The best plan that makes the part in this shop, with what it needs, what is short and the plans that lost. The route
 * is null only when no plan exists at all; the capacity then says why, in words. Same answer every time.
 */
export function planRoute(part: Part, scheme: Scheme, register: Register, asked: PlanAsked): PlanAnswer {
  const unplanned = unplannedKinds(part);
  if (unplanned.length > 0) return noRoute([`No method here cuts a ${unplanned.join(' or a ')} yet.`]);
  if (register.lathes.length === 0) return noRoute(['The register has no lathe.'], 'machine', 'a lathe');
  const made = { ...part, material: asked.material };
  const views = viewsOf(made);
  const shop: Shop = { register, words: wordsIn(asked.unit, asked.style) };
  const stock = stockFor(made, scheme, shop, asked.material);
  const failures: { text: string; why: string }[] = [];
  let ranked: { best: Weighed; losers: Route['others'] } | null = null;
  for (const lathe of lathesFor(register, stock)) {
    const here = bestOf(
      made,
      views,
      scheme,
      shop,
      candidatesFor(views, stock, lathe),
      stock,
      asked.quantity,
      failures,
    );
    if (here && (!ranked || compareScores(here.best.score, ranked.best.score) < 0)) ranked = here;
    // The other lathe is only asked where this one leaves something short.
    if (ranked?.best.score.shorts === 0) break;
  }
  if (!ranked) return noRoute([...new Set(failures.map((f) => f.why))].slice(0, 4));
  const { best } = ranked;
  const route = finishRoute(best.plan, {
    part: made,
    scheme,
    bar: best.candidate.stock.bar,
    quantity: asked.quantity,
    others: [...ranked.losers, ...failures.slice(0, 8)],
  });
  return { route, capacity: { verdict: verdictOf(best.needs), needs: best.needs } };
}

/**
 * Builds and weighs candidates, those that promise most first. One whose promise is already beaten by a plan that
 * leaves nothing short is not built: it could not win.
 */
function bestOf(
  part: Part,
  views: Views,
  scheme: Scheme,
  shop: Shop,
  candidates: readonly Candidate[],
  stock: StockAnswer,
  quantity: number,
  failures: { text: string; why: string }[],
): { best: Weighed; losers: Route['others'] } | null {
  const promised = candidates
    .map((candidate) => ({ candidate, outline: promiseOf(views, candidate, scheme) }))
    .sort((a, b) => compareOutlines(a.outline, b.outline));
  const weighed: Weighed[] = [];
  const beaten: { candidate: Candidate; outline: Outline }[] = [];
  const cannotWin = (outline: Outline): boolean =>
    weighed.some((w) => w.score.shorts === 0 && compareOutlines(w.outline, outline) < 0);
  for (const each of promised) {
    if (cannotWin(each.outline)) {
      beaten.push(each);
      continue;
    }
    const shut = shutOut(views, each.candidate);
    if (shut) {
      failures.push({ text: candidateText(each.candidate, shop.words), why: shut.message });
      continue;
    }
    try {
      const build = buildCandidate(part, views, shop, each.candidate);
      const outline = outlineOf(build, each.outline);
      if (cannotWin(outline)) beaten.push({ candidate: each.candidate, outline });
      else weighed.push(weighBuilt({ candidate: each.candidate, build, outline }, stock, quantity, scheme));
    } catch (error) {
      if (!(error instanceof RuledOut)) throw error;
      failures.push({ text: candidateText(each.candidate, shop.words), why: error.message });
    }
  }
  weighed.sort((a, b) => compareScores(a.score, b.score));
  const [best, ...rest] = weighed;
  if (!best) return null;
  const losers = [
    ...rest.map((w) => ({
      text: candidateText(w.candidate, shop.words),
      why: whyWorse(best.score, w.score),
    })),
    ...beaten.map((u) => ({
      text: candidateText(u.candidate, shop.words),
      why: whyOutlineWorse(best.outline, u.outline) ?? 'is no better',
    })),
  ];
  return { best, losers: losers.slice(0, 8) };
}

function noRoute(
  reasons: readonly string[],
  kind: Need['kind'] = 'geometry',
  need = 'a way to make the part',
): PlanAnswer {
  return {
    route: null,
    capacity: {
      verdict: 'cannot',
      needs: reasons.map((why) => ({ operation: 0, kind, need, state: 'short', why, alternatives: [] })),
    },
  };
}

/** Lathes whose slide the bar clears, the smallest first; all of them when none does, so that the short can be said. */
function lathesFor(register: Register, stock: StockAnswer): Lathe[] {
  const diameter = stock.options[0]?.size ?? 0;
  const sorted = [...register.lathes].sort(
    (a, b) => b.swingOverSlide - a.swingOverSlide || (a.id < b.id ? -1 : 1),
  );
  const fit = sorted.filter((lathe) => lathe.swingOverSlide >= diameter);
  return fit.length > 0 ? fit : sorted;
}

function candidatesFor(views: Views, stock: StockAnswer, lathe: Lathe): Candidate[] {
  const found: Candidate[] = [];
  const option: StockOption | undefined = stock.options[0];
  if (!option) return found;
  for (const first of ['right', 'left'] as const) {
    const view = views[first];
    if (mayPartToLength(view))
      found.push({
        first,
        kind: 'stick',
        meets: 0,
        secondEnd: false,
        lathe,
        stock: option,
        flatsWith: 'first',
      });
    const boundaries = meetingPoints(view);
    for (const meets of [0, ...boundaries]) {
      for (const kind of ['stick', 'blank'] as const) {
        if (kind === 'blank' && meets === 0) continue;
        found.push({ first, kind, meets, secondEnd: true, lathe, stock: option, flatsWith: 'first' });
        if (view.flats.length > 0 && option.asDrawn.length > 0)
          found.push({ first, kind, meets, secondEnd: true, lathe, stock: option, flatsWith: 'second' });
      }
    }
  }
  return found.slice(0, MOST_CANDIDATES);
}

/** Parted to length and never turned round: nothing is drawn on the far end but a chamfer that a tool can reach beside the blade. */
function mayPartToLength(view: View): boolean {
  const row = view.rows[0];
  return row !== undefined && row.kind === 'cylinder' && !view.crownLeft && !view.centreLeft;
}

/** Stations where the work of the two ends may meet: between rows, on either side of the largest. */
function meetingPoints(view: View): number[] {
  return view.rows.slice(1).map((row) => row.from);
}

function weighBuilt(each: Built, stock: StockAnswer, quantity: number, scheme: Scheme): Weighed {
  const { build, candidate } = each;
  const plan = weigh(build, scheme, planNeeds(build, stock, candidate.stock.bar, quantity));
  const needs = needList(plan);
  const radius = build.stockRadius;
  const score: Score = {
    ...each.outline,
    shorts: needs.filter((n) => n.state === 'short').length,
    alternatives: needs.filter((n) => n.state === 'alternative').length,
    minutes: plan.setupMinutes + plan.runMinutes,
    blank: Math.PI * radius * radius * (build.blank.x1 - build.blank.x0),
  };
  return { ...each, plan, needs, score };
}

/** The least that a candidate can come to: what its shape alone says. */
function promiseOf(views: Views, candidate: Candidate, scheme: Scheme): Outline {
  return {
    rocks: 0,
    setups: (candidate.secondEnd ? 2 : 1) + (views.right.flats.length > 0 ? 1 : 0),
    awkward: awkwardRows(views, candidate),
    apart: fitsApart(views, candidate, scheme),
  };
}

function outlineOf(build: Build, promise: Outline): Outline {
  return {
    rocks: rockingHolds(build),
    setups: build.setups.length - pulledOut(build) / 2,
    awkward: promise.awkward + heavyParting(build),
    apart: promise.apart,
  };
}

/** Parting a solid larger than a small lathe likes: as bad as a row behind a collar. */
function heavyParting(build: Build): number {
  const parting = build.operations.find((o) => o.method === 'part-off');
  return (parting?.figures?.diameter ?? 0) > LIMITS.partingMost.value ? 1 : 0;
}

/** Set-ups in which long work hangs on a short grip. */
function rockingHolds(build: Build): number {
  return build.setups.filter((s) => s.rocks).length;
}

/** Settings that only pull the same bar further out: quickly done. */
function pulledOut(build: Build): number {
  return build.operations.filter((o) => o.reasons.includes('pull-out')).length;
}

/** Rows cut behind a collar, in both holdings. */
function awkwardRows(views: Views, candidate: Candidate): number {
  const view = views[candidate.first];
  const other = candidate.first === 'right' ? views.left : views.right;
  const first = view.rows.filter((row) => row.from >= candidate.meets - 1e-9);
  const second = candidate.secondEnd
    ? other.rows.filter((row) => row.from >= view.length - candidate.meets - 1e-9)
    : [];
  return valleysOf(first).length + valleysOf(second).length;
}

/** Pairs of holdings that share the part's fits between them, less one: 0 where all fits are turned together. */
function fitsApart(views: Views, candidate: Candidate, scheme: Scheme): number {
  const fitted = new Set(
    scheme.sizes
      .filter((s) => s.kind === 'diameter' && s.tolerance.kind === 'fit')
      .flatMap((s) => s.features),
  );
  const view = views[candidate.first];
  const rows = view.rows.filter((row) => fitted.has(row.id));
  const first = rows.some((row) => row.from >= candidate.meets - 1e-9);
  const second = rows.some((row) => row.from < candidate.meets - 1e-9);
  return candidate.secondEnd && first && second ? 1 : 0;
}
