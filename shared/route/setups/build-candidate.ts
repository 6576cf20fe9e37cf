import type { Part } from '../../part/part';
import type { Build } from '../draft';
import { RuledOut } from '../draft';
import { rowMax } from '../features';
import type { View, Views } from '../features';
import { trimFor } from '../methods/ends';
import { partOff } from '../methods/part-off';
import { LIMITS } from '../rules';
import { firstMill } from '../shop';
import type { Shop } from '../shop';
import { finishPiece, sawPiece } from './bench';
import type { Candidate, Tails } from './candidate';
import { inspectSetUp } from './end-work';
import { firstEnd } from './first-end';
import { layOut, shareFlats } from './layout';
import { secondEnd } from './second-end';

/** Builds the plan; where work stands out too far it is planned again with a centre. Throws RuledOut when it cannot be. */
export function buildCandidate(part: Part, views: Views, shop: Shop, candidate: Candidate): Build {
  const view = candidate.first === 'right' ? views.right : views.left;
  const other = candidate.first === 'right' ? views.left : views.right;
  let tails: Tails = {
    first: surelyNeedsCentre(view, candidate.meets, candidate),
    second: candidate.secondEnd && surelyNeedsCentre(other, view.length - candidate.meets, candidate),
  };
  for (let attempt = 0; ; attempt += 1) {
    const where = { end: 'first' as 'first' | 'second' };
    try {
      return attemptPlan(part, views, shop, candidate, tails, where);
    } catch (error) {
      if (!(error instanceof RuledOut) || attempt >= 3) throw error;
      const wantsCentre = error.rule === 'support-overhang' || error.rule === 'support-bend';
      if (!wantsCentre || tails[where.end]) throw error;
      tails = { ...tails, [where.end]: true };
    }
  }
}

/**
 * True where the free end, roughed down to its last length, stands out too far for the cut that brings it to size:
 * spares a vain attempt.
 */
function surelyNeedsCentre(view: View, from: number, { stock }: Candidate): boolean {
  const last = view.rows[view.rows.length - 1];
  if (!last || last.from < from - 1e-9 || stock.asDrawn.includes(last.id)) return false;
  const roughed = Math.min(stock.radius, rowMax(last) + LIMITS.roughAllowance.value);
  return (view.length - from) / (2 * roughed) > LIMITS.overhang.value;
}

function attemptPlan(
  part: Part,
  views: Views,
  shop: Shop,
  candidate: Candidate,
  tails: Tails,
  where: { end: 'first' | 'second' },
): Build {
  const view = candidate.first === 'right' ? views.right : views.left;
  const other = candidate.first === 'right' ? views.left : views.right;
  const trims = {
    first: tails.first ? trimFor(view) : 0,
    second: tails.second ? trimFor(other) : 0,
  };
  const { register } = shop;
  const layout = layOut(shop, view, candidate, trims);
  const build: Build = {
    register,
    words: shop.words,
    lathe: candidate.lathe,
    mill: firstMill(register),
    saw: register.saws[0] ?? null,
    stock: {
      shape: candidate.stock.shape,
      size: candidate.stock.size,
      material: part.material,
      ...(candidate.stock.bar ? { bar: candidate.stock.bar.id } : {}),
      certified: candidate.stock.bar?.certified ?? false,
    },
    stockRadius: candidate.stock.radius,
    views,
    blank: layout.blank,
    stage: layout.blank,
    setups: [],
    operations: [],
    planNeeds: [],
    notes: [],
  };
  const sides = shareFlats(view, candidate);
  sawPiece(build, view, candidate.kind);
  const end = firstEnd(build, view, candidate, tails, trims, layout, sides.first);
  if (candidate.kind !== 'blank') {
    inspectSetUp(end);
    partOff(end, layout.cutAt, layout.width, !candidate.secondEnd);
  } else inspectSetUp(end);
  let last = end;
  if (candidate.secondEnd) {
    where.end = 'second';
    last = secondEnd(build, other, candidate, tails, trims, sides.second);
    inspectSetUp(last);
  }
  finishPiece(build, last);
  return build;
}
