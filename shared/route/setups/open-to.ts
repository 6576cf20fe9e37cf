import type { RuledOut } from '../draft';
import type { View, Views } from '../features';
import { openToFreeEnd, shutIn } from '../methods/thread';
import { risesToFreeEnd, taperBehindCollar, valleysOf } from '../methods/turn';
import type { Candidate } from './candidate';

/** What the shape alone rules out of a candidate, before anything is built: each end must be open to its own work. */
export function shutOut(views: Views, candidate: Candidate): RuledOut | null {
  const view = candidate.first === 'right' ? views.right : views.left;
  const other = candidate.first === 'right' ? views.left : views.right;
  return (
    endShut(view, candidate.meets) ??
    (candidate.secondEnd ? endShut(other, view.length - candidate.meets) : null)
  );
}

function endShut(view: View, from: number): RuledOut | null {
  const rows = view.rows.filter((row) => row.from >= from - 1e-9);
  for (const row of rows) {
    if (row.thread && !openToFreeEnd(view, row, row.thread)) return shutIn(row.thread);
    if (row.kind === 'cone' && row.endR >= row.startR) return risesToFreeEnd();
  }
  return valleysOf(rows).some((row) => row.kind === 'cone') ? taperBehindCollar() : null;
}
