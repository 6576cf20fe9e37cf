/**
 * One way of drawing for every size, all together at the least price: greedy, then each in turn answers the others,
 * and where they cannot agree the clashing pairs grow heavier until they do. Counted in work, never in time.
 */
import { compareFootprints } from '../footprint';
import type { Verdict } from '../footprint';
import { boxesMeet } from '../geometry/box';
import type { Candidate } from '../layout';

const CLASH = 100;
const SWEEPS = 6;
const ROUNDS = 24;
const BREAKOUT = 0.7;
/** Sizes further apart than this cannot disturb one another. */
const APART = 4;

export interface Choice {
  chosen: readonly number[];
  clashes: number;
  cost: number;
}

const NOTHING: Verdict = { clashes: 0, cost: 0 };

/** Verdicts of pairs, each worked out once; pairs that lie apart are never kept. */
class Verdicts {
  private readonly known = new Map<number, Verdict>();
  private readonly total: number;
  private readonly offsets: number[] = [];
  constructor(private readonly options: readonly (readonly Candidate[])[]) {
    let sum = 0;
    for (const list of options) {
      this.offsets.push(sum);
      sum += list.length;
    }
    this.total = sum + 1;
  }
  between(i: number, a: number, j: number, b: number): Verdict {
    const one = this.options[i]?.[a];
    const two = this.options[j]?.[b];
    if (!one || !two) return NOTHING;
    if (!boxesMeet(one.print.bounds, two.print.bounds, APART)) return NOTHING;
    const p = (this.offsets[i] ?? 0) + a;
    const q = (this.offsets[j] ?? 0) + b;
    const key = p < q ? p * this.total + q : q * this.total + p;
    const found = this.known.get(key);
    if (found) return found;
    const verdict = compareFootprints(one.print, two.print);
    this.known.set(key, verdict);
    return verdict;
  }
}

/** Chooses one candidate a size; `options` must hold at least one for each. */
export function choose(options: readonly (readonly Candidate[])[]): Choice {
  const verdicts = new Verdicts(options);
  const n = options.length;
  const weights = new Map<number, number>();
  const chosen: number[] = options.map(() => -1);

  const price = (i: number, a: number): number => {
    const own = options[i]?.[a];
    if (!own) return Infinity;
    let sum = own.cost + own.clashes * CLASH;
    for (let j = 0; j < n; j++) {
      const b = chosen[j] ?? -1;
      if (j === i || b < 0) continue;
      const v = verdicts.between(i, a, j, b);
      const weight = v.clashes > 0 ? (weights.get(Math.min(i, j) * n + Math.max(i, j)) ?? 1) : 1;
      sum += v.cost + v.clashes * CLASH * weight;
    }
    return sum;
  };
  const answer = (i: number): boolean => {
    let best = chosen[i] ?? -1;
    let least = best < 0 ? Infinity : price(i, best) - 1e-9;
    options[i]?.forEach((candidate, a) => {
      if (candidate.cost + candidate.clashes * CLASH >= least) return;
      const p = price(i, a);
      if (p < least) {
        least = p;
        best = a;
      }
    });
    const changed = best !== chosen[i];
    chosen[i] = best;
    return changed;
  };
  const state = (): Choice => {
    let clashes = 0;
    let cost = 0;
    for (let i = 0; i < n; i++) {
      const a = chosen[i] ?? 0;
      const own = options[i]?.[a];
      clashes += own?.clashes ?? 0;
      cost += own?.cost ?? 0;
      for (let j = 0; j < i; j++) {
        const v = verdicts.between(i, a, j, chosen[j] ?? 0);
        clashes += v.clashes;
        cost += v.cost;
      }
    }
    return { chosen: [...chosen], clashes, cost };
  };

  const order = options.map((list, i) => ({ i, n: list.length })).sort((a, b) => a.n - b.n || a.i - b.i);
  for (const { i } of order) answer(i);
  let best: Choice | null = null;
  for (let round = 0; round < ROUNDS; round++) {
    for (let sweep = 0; sweep < SWEEPS; sweep++) {
      let changed = false;
      for (let i = 0; i < n; i++) changed = answer(i) || changed;
      if (!changed) break;
    }
    const now = state();
    if (!best || now.clashes < best.clashes || (now.clashes === best.clashes && now.cost < best.cost - 1e-9))
      best = now;
    if (now.clashes === 0) break;
    for (let i = 0; i < n; i++)
      for (let j = 0; j < i; j++)
        if (verdicts.between(i, chosen[i] ?? 0, j, chosen[j] ?? 0).clashes > 0) {
          const key = j * n + i;
          weights.set(key, (weights.get(key) ?? 1) + BREAKOUT);
        }
  }
  return best ?? state();
}
