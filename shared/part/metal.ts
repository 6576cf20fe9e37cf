import type { Body, FlatsCut, Generator } from './body';
import { maxInner, minOuter } from './envelope';
import { constant } from './generator';

/**
 * The generators that metal is counted by: an external thread as its pitch cylinder where r is larger, a
 * tapped hole as its pitch cylinder where b is smaller, over the thread's own span (the house's convention).
 */
export function metalOuter(body: Body): Generator {
  let outer = body.outer;
  for (const treatment of body.treatments) {
    if (treatment.kind !== 'thread' || treatment.internal) continue;
    outer = minOuter(outer, constant(treatment.from, treatment.to, treatment.pitchDiameter / 2));
  }
  return outer;
}

export function metalInner(body: Body): Generator {
  let inner = body.inner;
  for (const treatment of body.treatments) {
    if (treatment.kind !== 'thread' || !treatment.internal) continue;
    inner = maxInner(inner, constant(treatment.from, treatment.to, treatment.pitchDiameter / 2));
  }
  return inner;
}

/** Flats of a body. Key seats and cross holes have no section here yet: a body that has one is ours to answer for. */
export function flatsOf(body: Body): FlatsCut[] {
  return body.cuts.map((cut) => {
    if (cut.kind !== 'flats') throw new Error(`The section through a ${cut.kind} is not built`);
    return cut;
  });
}
