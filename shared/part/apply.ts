import type { Body, Cut, Generator, Treatment } from './body';
import { maxInner, minOuter } from './envelope';
import { constant, slice, spanOf } from './generator';
import { flatsOf, metalInner, metalOuter } from './metal';
import type { Removal } from './removal';
import { shellVolume } from './shell';
import { volumeBetween } from './volume';

/** The body after a removal. Removals only ever take metal away; one that touches nothing returns equal metal. */
export function applyRemoval(body: Body, removal: Removal): Body {
  switch (removal.kind) {
    case 'outer':
      return { ...body, outer: minOuter(body.outer, removal.envelope) };
    case 'bore':
      return { ...body, inner: maxInner(body.inner, removal.envelope) };
    case 'cut':
      return { ...body, cuts: [...body.cuts, removal.cut] };
    case 'treatment':
      return { ...body, treatments: [...body.treatments, removal.treatment] };
    case 'trim':
    case 'sever':
      return restrict(body, removal.from, removal.to);
  }
}

/** The body over [from, to] only. A span that holds none of it is ours to answer for: throws. */
export function restrict(body: Body, from: number, to: number): Body {
  const a = Math.max(from, body.x0);
  const b = Math.min(to, body.x1);
  if (b <= a) throw new Error(`No metal of the body lies between ${from} and ${to}`);
  return {
    x0: a,
    x1: b,
    outer: slice(body.outer, a, b),
    inner: slice(body.inner, a, b),
    cuts: body.cuts.map((cut) => clipCut(cut, a, b)).filter((cut) => cut !== null),
    treatments: body.treatments
      .map((treatment) => clipSpan(treatment, a, b))
      .filter((treatment) => treatment !== null),
  };
}

function clipCut(cut: Cut, a: number, b: number): Cut | null {
  if (cut.kind === 'cross-hole')
    return cut.at + cut.diameter / 2 > a && cut.at - cut.diameter / 2 < b ? cut : null;
  return clipSpan(cut, a, b);
}

function clipSpan<T extends Treatment | Exclude<Cut, { kind: 'cross-hole' }>>(
  spanned: T,
  a: number,
  b: number,
): T | null {
  const from = Math.max(spanned.from, a);
  const to = Math.min(spanned.to, b);
  return to > from ? { ...spanned, from, to } : null;
}

/**
 * Volume that a removal turns to chips (mm³), integrated over what it takes itself: the section inside the
 * body and outside the result, never one volume less another. Parting and sawing remove 0 (their chips are kerf).
 */
export function removedVolume(body: Body, removal: Removal): number {
  const outer = metalOuter(body);
  const inner = metalInner(body);
  const outerFlats = flatsOf(body);
  /** Metal between two generators, within the body's flats. */
  const shell = (far: Generator, near: Generator, from: number, to: number): number =>
    shellVolume(
      { outer: far, outerFlats, inner: near, innerFlats: [] },
      Math.max(from, body.x0),
      Math.min(to, body.x1),
    );
  const outside = (envelope: Generator): number => {
    const { from, to } = spanOf(envelope);
    return shell(outer, maxInner(inner, envelope), from, to);
  };
  const inside = (envelope: Generator): number => {
    const { from, to } = spanOf(envelope);
    return shell(minOuter(outer, envelope), inner, from, to);
  };
  switch (removal.kind) {
    case 'outer':
      return outside(removal.envelope);
    case 'bore':
      return inside(removal.envelope);
    case 'treatment': {
      const treatment = removal.treatment;
      if (treatment.kind === 'knurl') return 0;
      const pitchCylinder = constant(treatment.from, treatment.to, treatment.pitchDiameter / 2);
      return treatment.internal ? inside(pitchCylinder) : outside(pitchCylinder);
    }
    case 'cut':
      return flatsVolume(body, removal.cut);
    case 'trim':
      return volumeBetween(body, body.x0, removal.from) + volumeBetween(body, removal.to, body.x1);
    case 'sever':
      return 0;
  }
}

function flatsVolume(body: Body, cut: Cut): number {
  if (cut.kind !== 'flats') throw new Error(`The volume of a ${cut.kind} is not built`);
  const from = Math.max(cut.from, body.x0);
  const to = Math.min(cut.to, body.x1);
  if (to <= from) return 0;
  const outer = metalOuter(body);
  return shellVolume(
    { outer, outerFlats: flatsOf(body), inner: outer, innerFlats: [cut], bore: metalInner(body) },
    from,
    to,
  );
}
