import type { Parsed } from '../../units/parsed';
import type { Source } from '../certainty';

export type ThreadSeries =
  | 'metric-coarse'
  | 'metric-fine'
  | 'unc'
  | 'unf'
  | 'unef'
  | 'un'
  | 'uns'
  | 'bsw'
  | 'bsf'
  | 'ba'
  | 'g'
  | 'tr'
  | 'acme';

export type Hand = 'right' | 'left';

/** A screw thread as designated: basic sizes in mm, angles in radians. Class and hand are as typed. */
export interface ThreadSpec {
  /** Canonical, without class and hand: `M10`, `M10x1.25`, `3/8-16 UNC`. */
  designation: string;
  series: ThreadSeries;
  /** Basic major diameter. */
  major: number;
  pitch: number;
  /** Pitch times starts. */
  lead: number;
  starts: number;
  hand: Hand;
  /** `6g`, `4g6g`, `2A`; absent when none was typed. */
  class?: string;
  /** Basic pitch diameter d2 = D2. */
  pitchDiameter: number;
  /** Basic minor diameter D1 of the internal thread. */
  minor: number;
  /** Design root d3 of the external thread. */
  root: number;
  /** Angle between the flanks. */
  includedAngle: number;
  /** Threads per inch, for inch series. */
  tpi?: number;
  /** True for a pitch its diameter is not listed with: taps and dies may be hard to find. */
  uncommon?: boolean;
  /** Where the basic sizes come from. */
  basis: Source;
}

export type ParsedThread = Parsed<ThreadSpec>;

/** Largest and smallest permitted, mm. */
export interface Limits {
  max: number;
  min: number;
}

/** The basic figures of a series from its diameter and pitch, mm. */
export interface BasicSizes {
  pitchDiameter: number;
  minor: number;
  root: number;
  includedAngle: number;
}
