import type { Body, Cut } from './body';
import { mirrorGenerator } from './generator';
import type { Feature, Part } from './part';
import type { Removal } from './removal';

/** The body turned end for end about a part of `length`: x -> length − x. Hands of threads stay, as they do on the bench. */
export function mirrorBody(body: Body, length: number): Body {
  return {
    x0: length - body.x1,
    x1: length - body.x0,
    outer: mirrorGenerator(body.outer, length),
    inner: mirrorGenerator(body.inner, length),
    cuts: body.cuts.map((cut) => mirrorCut(cut, length)),
    treatments: body.treatments.map((treatment) => mirrorSpan(treatment, length)),
  };
}

/** A removal as it is for the part turned end for end. */
export function mirrorRemoval(removal: Removal, length: number): Removal {
  switch (removal.kind) {
    case 'outer':
    case 'bore':
      return { ...removal, envelope: mirrorGenerator(removal.envelope, length) };
    case 'cut':
      return { ...removal, cut: mirrorCut(removal.cut, length) };
    case 'treatment':
      return { ...removal, treatment: mirrorSpan(removal.treatment, length) };
    case 'trim':
      return mirrorSpan(removal, length);
    case 'sever':
      return {
        ...mirrorSpan(removal, length),
        kerfFrom: length - removal.kerfTo,
        kerfTo: length - removal.kerfFrom,
      };
  }
}

function mirrorSpan<T extends { from: number; to: number }>(spanned: T, length: number): T {
  return { ...spanned, from: length - spanned.to, to: length - spanned.from };
}

/** Turned about the vertical: up stays up, left and right of the axis change places. */
function mirrorCut(cut: Cut, length: number): Cut {
  if (cut.kind === 'cross-hole') return { ...cut, at: length - cut.at, phase: -cut.phase };
  return { ...mirrorSpan(cut, length), phase: -cut.phase };
}

/** The part turned end for end; its faces change names, every other id stays with its feature. */
export function mirrorPart(part: Part): Part {
  const { length } = part;
  const stations = part.stations.map((station) => ({ id: swapFace(station.id), x: length - station.x }));
  return {
    ...part,
    body: mirrorBody(part.body, length),
    features: part.features.map((feature) => mirrorFeature(feature, length)),
    stations: stations.reverse(),
    datum: swapFace(part.datum),
  };
}

function swapFace(id: string): string {
  if (id === 'left-face') return 'right-face';
  return id === 'right-face' ? 'left-face' : id;
}

function otherEnd(end: 'left' | 'right'): 'left' | 'right' {
  return end === 'left' ? 'right' : 'left';
}

function mirrorFeature(feature: Feature, length: number): Feature {
  if (feature.kind === 'face')
    return { ...feature, id: feature.id === 'left-face' ? 'right-face' : 'left-face', x: length - feature.x };
  const turned = mirrorSpan(feature, length);
  switch (turned.kind) {
    case 'cone':
      return { ...turned, startDiameter: turned.endDiameter, endDiameter: turned.startDiameter };
    case 'flats':
      return {
        ...turned,
        phase: -turned.phase,
        runOutFrom: length - turned.runOutTo,
        runOutTo: length - turned.runOutFrom,
      };
    case 'crown':
    case 'chamfer':
    case 'centre-hole':
    case 'bore':
      return { ...turned, end: otherEnd(turned.end) };
    default:
      return turned;
  }
}
