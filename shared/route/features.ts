import type { Body } from '../part/body';
import { mirrorPart } from '../part/mirror';
import type {
  CentreHoleFeature,
  ChamferFeature,
  CrownFeature,
  Feature,
  FlatsFeature,
  Part,
  ThreadFeature,
} from '../part/part';

/** One length of the profile as the bench sees it, with what is cut on it. */
export interface Row {
  id: string;
  kind: 'cylinder' | 'cone';
  from: number;
  to: number;
  startR: number;
  endR: number;
  asDrawn: boolean;
  thread?: ThreadFeature;
  chamferRight?: ChamferFeature;
  chamferLeft?: ChamferFeature;
}

/** The part seen with the free end to the right: a set-up always works from there. */
export interface View {
  /** True where the part is turned end for end against the drawing. */
  flipped: boolean;
  part: Part;
  length: number;
  rows: readonly Row[];
  flats: readonly FlatsFeature[];
  crownRight?: CrownFeature;
  crownLeft?: CrownFeature;
  centreRight?: CentreHoleFeature;
  centreLeft?: CentreHoleFeature;
}

const PLANNED: ReadonlySet<Feature['kind']> = new Set([
  'cylinder',
  'cone',
  'crown',
  'chamfer',
  'thread',
  'flats',
  'centre-hole',
  'face',
]);

/** Kinds of feature that no method here cuts yet, each once. */
export function unplannedKinds(part: Part): string[] {
  return [
    ...new Set(
      part.features
        .filter((f) => !PLANNED.has(f.kind) || (f.kind === 'thread' && f.internal))
        .map((f) => f.kind),
    ),
  ];
}

export interface Views {
  right: View;
  left: View;
}

/** Both views of a part: as drawn, with its right end free, and turned round. */
export function viewsOf(part: Part): Views {
  return { right: viewOf(part, false), left: viewOf(mirrorPart(part), true) };
}

function viewOf(part: Part, flipped: boolean): View {
  const features = part.features;
  const rows = features
    .filter((f) => f.kind === 'cylinder' || f.kind === 'cone')
    .map((f): Row => {
      const onIt = features.filter((g) => 'on' in g && g.on === f.id);
      const chamfer = (end: 'left' | 'right') =>
        onIt.find((g): g is ChamferFeature => g.kind === 'chamfer' && g.end === end);
      const base =
        f.kind === 'cylinder'
          ? { startR: f.diameter / 2, endR: f.diameter / 2, asDrawn: f.asDrawn ?? false }
          : { startR: f.startDiameter / 2, endR: f.endDiameter / 2, asDrawn: false };
      return {
        id: f.id,
        kind: f.kind,
        from: f.from,
        to: f.to,
        ...base,
        thread: onIt.find((g): g is ThreadFeature => g.kind === 'thread' && !g.internal),
        chamferRight: chamfer('right'),
        chamferLeft: chamfer('left'),
      };
    })
    .sort((a, b) => a.from - b.from);
  const crown = (end: 'left' | 'right') =>
    features.find((f): f is CrownFeature => f.kind === 'crown' && f.end === end);
  const centre = (end: 'left' | 'right') =>
    features.find((f): f is CentreHoleFeature => f.kind === 'centre-hole' && f.end === end);
  return {
    flipped,
    part,
    length: part.length,
    rows,
    flats: features.filter((f) => f.kind === 'flats'),
    crownRight: crown('right'),
    crownLeft: crown('left'),
    centreRight: centre('right'),
    centreLeft: centre('left'),
  };
}

export function rowMax(row: Row): number {
  return Math.max(row.startR, row.endR);
}

export function rowMin(row: Row): number {
  return Math.min(row.startR, row.endR);
}

/** The cut of the part's body that a flats feature stands for. Ours to answer for when it is not there: throws. */
export function flatsCutOf(body: Body, id: string) {
  const cut = body.cuts.find((c) => c.kind === 'flats' && c.id === id);
  if (!cut || cut.kind !== 'flats') throw new Error(`the part has no flats called ${id}`);
  return cut;
}
