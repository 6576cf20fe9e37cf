import type { Body } from './body';

/** `fit` as typed: an ISO 286 code, or limits in mm about the nominal. */
export type Tolerance =
  | { kind: 'fit'; code: string }
  | { kind: 'limits'; upper: number; lower: number }
  | { kind: 'symmetric'; value: number };

interface Spanned {
  id: string;
  from: number;
  to: number;
}

export interface CylinderFeature extends Spanned {
  kind: 'cylinder';
  diameter: number;
  /** The designer allows the bar's own surface to stay where size and tolerance permit. */
  asDrawn?: boolean;
}
export interface ConeFeature extends Spanned {
  kind: 'cone';
  /** Diameters where the cone meets its own ends, before crown or chamfer. */
  startDiameter: number;
  endDiameter: number;
  /** Radians, always positive. */
  halfAngle: number;
}
export interface CrownFeature extends Spanned {
  kind: 'crown';
  end: 'left' | 'right';
  radius: number;
}
export interface ChamferFeature extends Spanned {
  kind: 'chamfer';
  end: 'left' | 'right';
  leg: number;
  /** Radians to the axis; 45° unless it says otherwise. */
  angle: number;
  /** The feature it is cut on. */
  on: string;
}
export interface ThreadFeature extends Spanned {
  kind: 'thread';
  internal: boolean;
  designation: string;
  major: number;
  pitchDiameter: number;
  root: number;
  pitch: number;
  lead: number;
  starts: number;
  hand: 'right' | 'left';
  threadClass?: string;
  /** The cylinder (or bore) it is cut on. */
  on: string;
}
export interface FlatsFeature extends Spanned {
  kind: 'flats';
  count: number;
  acrossFlats: number;
  distance: number;
  phase: number;
  /** Where the flats really stop: where r(x) falls to the distance, or the end of the declared span at a wall. */
  runOutTo: number;
  /** The same at their left end. */
  runOutFrom: number;
  /** True where the round they are milled from leaves rounded corners. */
  roundedCorners: boolean;
}
export interface GrooveFeature extends Spanned {
  kind: 'groove';
  diameter: number;
}
export interface CentreHoleFeature extends Spanned {
  kind: 'centre-hole';
  end: 'left' | 'right';
  designation: string;
}
export interface BoreFeature extends Spanned {
  kind: 'bore';
  form: 'drill' | 'bore' | 'ream' | 'tap' | 'counterbore';
  end: 'left' | 'right';
  diameter: number;
  depth: number;
  through: boolean;
}
export interface KnurlFeature extends Spanned {
  kind: 'knurl';
  pattern: 'straight' | 'diamond';
  pitch: number;
  on: string;
}
export interface FaceFeature {
  kind: 'face';
  id: 'left-face' | 'right-face';
  x: number;
}

export type Feature =
  | CylinderFeature
  | ConeFeature
  | CrownFeature
  | ChamferFeature
  | ThreadFeature
  | FlatsFeature
  | GrooveFeature
  | CentreHoleFeature
  | BoreFeature
  | KnurlFeature
  | FaceFeature;

export type FeatureKind = Feature['kind'];

/** A change of profile, named. `x0` is always the left face. */
export interface Station {
  id: string;
  x: number;
}

/** The finished part: a Body with x0 = 0, and what its metal is called. */
export interface Part {
  body: Body;
  length: number;
  /** Threads at their basic major diameter (mm). */
  maxDiameter: number;
  material: string;
  features: readonly Feature[];
  stations: readonly Station[];
  /** Face that lengths are measured from where the template names one (a station's id). */
  datum: string;
}
