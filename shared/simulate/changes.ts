import type { Body, FlatsCut, Generator, Treatment } from '../part/body';
import { STATION_TOLERANCE } from '../part/body';
import { breaks, radiusAt, spansAbove } from '../part/generator';
import { flatsOf } from '../part/metal';
import { unequalSpans } from '../part/same-metal';

/**
 * What really became of the metal between two stages, whatever the operation says of itself.
 * `deepest` is how far the surface moved at most: radially, along the axis for an end, square to the face for flats.
 */
export interface Change {
  kind: 'outer' | 'inner' | 'left-end' | 'right-end' | 'flats' | 'thread' | 'knurl';
  from: number;
  to: number;
  deepest: number;
  cut?: FlatsCut;
  treatment?: Treatment;
}

export function changesBetween(before: Body, after: Body): Change[] {
  const changes: Change[] = [];
  if (after.x0 > before.x0 + STATION_TOLERANCE)
    changes.push({ kind: 'left-end', from: before.x0, to: after.x0, deepest: after.x0 - before.x0 });
  if (after.x1 < before.x1 - STATION_TOLERANCE)
    changes.push({ kind: 'right-end', from: after.x1, to: before.x1, deepest: before.x1 - after.x1 });
  for (const kind of ['outer', 'inner'] as const) {
    for (const span of unequalSpans(before[kind], after[kind], after.x0, after.x1))
      changes.push({ kind, ...span, deepest: furthestApart(before[kind], after[kind], span.from, span.to) });
  }
  changes.push(...newFlats(before, after), ...newTreatments(before, after));
  return changes;
}

function furthestApart(p: Generator, q: Generator, from: number, to: number): number {
  const stations = [from, to, ...breaks(p), ...breaks(q)].filter((x) => x >= from && x <= to);
  let most = 0;
  for (const x of stations) {
    if (x < to) most = Math.max(most, Math.abs(radiusAt(p, x, 'right') - radiusAt(q, x, 'right')));
    if (x > from) most = Math.max(most, Math.abs(radiusAt(p, x, 'left') - radiusAt(q, x, 'left')));
  }
  return most;
}

function newFlats(before: Body, after: Body): Change[] {
  const had = flatsOf(before);
  return flatsOf(after).flatMap((cut) =>
    spansAbove(before.outer, cut.distance, Math.max(cut.from, after.x0), Math.min(cut.to, after.x1))
      .filter(
        (span) =>
          !had.some((old) => isSame(old, cut) && old.from <= span.from + 1e-9 && old.to >= span.to - 1e-9),
      )
      .map((span): Change => ({
        kind: 'flats',
        ...span,
        cut,
        deepest: roundOver(before, span.from, span.to) - cut.distance,
      })),
  );
}

function roundOver(body: Body, from: number, to: number): number {
  return furthestApart(body.outer, [{ kind: 'line', from, to, start: 0, end: 0 }], from, to);
}

function isSame(p: FlatsCut, q: FlatsCut): boolean {
  return p.count === q.count && p.distance === q.distance && p.phase === q.phase;
}

function newTreatments(before: Body, after: Body): Change[] {
  const covers = (old: Treatment, now: Treatment): boolean =>
    old.kind === now.kind && old.id === now.id && old.from <= now.from + 1e-9 && old.to >= now.to - 1e-9;
  return after.treatments
    .filter((treatment) => !before.treatments.some((old) => covers(old, treatment)))
    .map((treatment): Change => ({
      kind: treatment.kind,
      from: treatment.from,
      to: treatment.to,
      treatment,
      deepest: treatment.kind === 'thread' ? Math.abs(treatment.major - treatment.root) / 2 : 0,
    }));
}
