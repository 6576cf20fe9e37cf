import type { ThreadSpec } from '../standards/threads';

/**
 * What a template says of a part, length by length from the left, before envelopes are intersected.
 * Lengths mm, angles radians. `buildPart` turns it into a Part or says which input cannot be.
 */
export type LengthInput =
  | { form: 'cylinder'; id: string; length: number; diameter: number; asDrawn?: boolean }
  | { form: 'cone'; id: string; length: number; startDiameter: number; endDiameter: number };

export interface ChamferInput {
  id: string;
  /** The length it is cut on. */
  on: string;
  end: 'left' | 'right';
  leg: number;
  /** To the axis, 45° where absent. */
  angle?: number;
}
/** A spherical crown centred on the axis whose apex is the part's end face. */
export interface CrownInput {
  id: string;
  end: 'left' | 'right';
  radius: number;
}
export interface ThreadInput {
  id: string;
  on: string;
  spec: ThreadSpec;
  /** Over the whole length where absent, else from the free end of the length (`end`). */
  fullThread?: number;
  end?: 'left' | 'right';
}
export interface FlatsInput {
  id: string;
  from: number;
  /** Declared length; the flats really end where r(x) falls to their distance or at a wall. */
  length: number;
  count: number;
  acrossFlats: number;
  phase?: number;
}
export interface CentreHoleInput {
  id: string;
  end: 'left' | 'right';
  designation: string;
}

export interface PartInput {
  lengths: readonly LengthInput[];
  chamfers: readonly ChamferInput[];
  crowns: readonly CrownInput[];
  threads: readonly ThreadInput[];
  flats: readonly FlatsInput[];
  centreHoles: readonly CentreHoleInput[];
  material: string;
  /** x of the datum face. */
  datum: number;
}
