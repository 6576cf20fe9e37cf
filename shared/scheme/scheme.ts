/**
 * What both drawing and route need: every size once, its limits, its datum, its balloon.
 * Knows nothing of paper. Lengths mm, angles degrees (as the contract prints them).
 */
export type SizeKind =
  | 'length'
  | 'diameter'
  | 'radius'
  | 'angle'
  | 'taper'
  | 'chamfer'
  | 'thread'
  | 'across-flats'
  | 'knurl'
  | 'groove'
  | 'key'
  | 'hole'
  | 'position'
  | 'texture'
  | 'centre-hole'
  | 'geometrical'
  | 'note';

/** Where on the part a size is read, in the part's x and r. */
export type SizeAnchor =
  /** Along the axis between two stations. */
  | { kind: 'span'; from: number; to: number }
  /**
   * Across a cylinder whose outline is visible from `from` to `to` (chamfers and crowns left out). `at` is set where it
   * holds at one station only, a cone's end; a crown or chamfer may have taken the metal there, so the point may be a
   * theoretical one: the cone's own slope carried on from `from`..`to` to `at`.
   */
  | { kind: 'across'; from: number; to: number; diameter: number; internal: boolean; at?: number }
  /** On the slope of a chamfer: the middle of it, a point of the outline. */
  | { kind: 'corner'; x: number; r: number; end: 'left' | 'right' }
  /** An arc of the outline (a crown) over x; its middle is a point of the outline, its apex lies on the axis at the `end`. */
  | { kind: 'arc'; from: number; to: number; radius: number; end: 'left' | 'right' }
  /** Between opposite flats, read in an end view or a removed section; the flats really stand from `from` to `to`. */
  | { kind: 'flats'; feature: string; from: number; to: number; acrossFlats: number; phase: number }
  /** A cone's angle to the axis, read on its outline. */
  | { kind: 'slope'; from: number; to: number; startDiameter: number; endDiameter: number };

export interface SizeTolerance {
  /** How it is written: nothing, `±`, two limits, an ISO 286 code, or within the thread's designation. */
  kind: 'general' | 'symmetric' | 'limits' | 'fit' | 'thread-class' | 'none';
  /** Signed, about the nominal (mm or degrees). */
  upper: number;
  lower: number;
  code?: string;
}

export interface Size {
  /** Stable: the parameter's own path with row keys, `steps.r3.diameter`. */
  id: string;
  /** 0 for a reference size, which is not inspected. */
  balloon: number;
  kind: SizeKind;
  features: readonly string[];
  /** Parameter path as the form knows it (`steps[2].diameter`), for lighting up; absent for derived sizes. */
  parameter?: string;
  nominal: number;
  upperLimit: number;
  lowerLimit: number;
  tolerance: SizeTolerance;
  /** `as typed`, `ISO 2768-m`, `ISO 286 h6`, `ISO 965 6g`, `shop block`, `reference`. */
  toleranceSource: string;
  /** What the person typed, for the table of sizes. */
  typed: string;
  /** Designation for sizes that are names (threads): `M10x1.25-6g`. */
  designation?: string;
  reference: boolean;
  from?: string;
  to?: string;
  anchor: SizeAnchor;
}

export interface Completeness {
  /** Station or parameter that no size fixes, in words. */
  missing: readonly string[];
  /** Sizes (ids) that say again what others fix. */
  redundant: readonly string[];
}

export interface Scheme {
  sizes: readonly Size[];
  completeness: Completeness;
  /** Station id of the datum face and the general tolerance that governs untoleranced sizes. */
  datum: string;
  generalTolerance: { id: string; text: string };
}
