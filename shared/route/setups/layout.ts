import type { Body } from '../../part/body';
import { constant } from '../../part/generator';
import type { FlatsFeature } from '../../part/part';
import { RuledOut } from '../draft';
import { rowMax } from '../features';
import type { View } from '../features';
import { longEnough } from '../grips';
import type { Grip } from '../grips';
import { bladeFor } from '../methods/part-off';
import { LIMITS } from '../rules';
import { holdsFor } from '../shop';
import type { Candidate } from './candidate';
import type { Shop } from '../shop';

export interface Layout {
  blank: Body;
  /** Where the piece is parted; the blade takes [cutAt − width, cutAt]. */
  cutAt: number;
  width: number;
  grip: Grip;
}

/** Blank and first grip, in the first end's view, then the blank in the part's own x. */
export function layOut(
  shop: Shop,
  view: View,
  candidate: Candidate,
  trims: { first: number; second: number },
): Layout {
  const radius = candidate.stock.radius;
  const face = LIMITS.faceAllowance.value;
  const x1 = view.length + face + trims.first;
  const held = candidate.meets > 1e-9 ? radius : Math.max(...view.rows.slice(0, 1).map(rowMax));
  const { width } = bladeFor({ build: shop }, held);
  const cutAt = candidate.secondEnd ? -(LIMITS.partedAllowance.value + trims.second) : 0;
  const reach = holdsFor(shop.register, candidate.lathe, 2 * radius, false)[0]?.reach ?? 28;
  let grip: Grip;
  let x0: number;
  if (candidate.kind === 'blank') {
    x0 = -(face + trims.second);
    const begins = workBegins(view, candidate) - 2;
    grip = { from: Math.max(x0, begins - reach), to: begins, diameter: 2 * radius };
    if (!longEnough(grip))
      throw new RuledOut(
        'grip-length',
        `Only ${shop.words.length(Math.max(0, begins - x0))} of the blank is left to hold.`,
      );
  } else {
    const to = cutAt - width - LIMITS.partingClear.value;
    const hold = Math.min(Math.max(20, 1.2 * radius), 38);
    x0 = to - hold;
    grip = { from: x0, to, diameter: 2 * radius };
  }
  const blank: Body = {
    x0: view.flipped ? view.length - x1 : x0,
    x1: view.flipped ? view.length - x0 : x1,
    outer: [],
    inner: [],
    cuts: [],
    treatments: [],
  };
  return {
    blank: { ...blank, outer: constant(blank.x0, blank.x1, radius), inner: constant(blank.x0, blank.x1, 0) },
    cutAt,
    width,
    grip,
  };
}

/** First station, from the held end, that the first end's work or its flats reach. */
function workBegins(view: View, candidate: Candidate): number {
  const milled = shareFlats(view, candidate).first.map((f) => f.runOutFrom - LIMITS.overRun.value);
  return Math.min(candidate.meets, ...milled);
}

/** Flats go to the end whose work leaves their round finished; to the first where the bar is already the round. */
export function shareFlats(
  view: View,
  candidate: Candidate,
): { first: FlatsFeature[]; second: FlatsFeature[] } {
  const first: FlatsFeature[] = [];
  const second: FlatsFeature[] = [];
  for (const flats of view.flats) {
    const under = view.rows.filter(
      (row) => row.from < flats.runOutTo - 1e-9 && row.to > flats.runOutFrom + 1e-9,
    );
    const round = under.filter((row) => row.kind === 'cylinder');
    const inFirst = (row: { from: number }) => row.from >= candidate.meets - 1e-9;
    const bar = (row: { id: string }) => candidate.stock.asDrawn.includes(row.id);
    const mayFirst = round.every((row) => inFirst(row) || bar(row));
    const maySecond = candidate.secondEnd && round.every((row) => !inFirst(row) || bar(row));
    if (mayFirst && (candidate.flatsWith === 'first' || !maySecond)) first.push(flats);
    else if (maySecond) second.push(flats);
    else
      throw new RuledOut(
        'turn-before-mill',
        'The flats lie over lengths that are turned from different ends.',
      );
  }
  return { first, second };
}
