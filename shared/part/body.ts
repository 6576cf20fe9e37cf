/**
 * The one solid that blank, stage and finished part all are: an interval of the part's own x, an
 * outer and an inner generator, cuts and treatments. Lengths in mm, angles in radians, doubles.
 * A stage keeps the finished part's x: a blank starts below 0 and ends beyond the part's length.
 */

/** Two stations closer than this are one (mm). */
export const STATION_TOLERANCE = 1e-6;

/** r runs straight from `start` at `from` to `end` at `to`. */
export interface LinePiece {
  kind: 'line';
  from: number;
  to: number;
  start: number;
  end: number;
}

/** r(x) = centreR + sign · sqrt(radius² − (x − centreX)²). A crown has centreR 0 and sign 1; an inside fillet sign −1. */
export interface ArcPiece {
  kind: 'arc';
  from: number;
  to: number;
  centreX: number;
  centreR: number;
  radius: number;
  sign: 1 | -1;
}

export type Piece = LinePiece | ArcPiece;

/** Contiguous pieces that cover [x0, x1] from left to right. */
export type Generator = readonly Piece[];

/**
 * `count` flats at `distance` from the axis over [from, to]: 1 a single flat, 2 a pair, 3 and more a
 * regular polygon. `phase` is the angle about the axis of the first flat's normal, 0 = up (towards +y of
 * the axis view), counted anticlockwise seen from the right end.
 */
export interface FlatsCut {
  kind: 'flats';
  id: string;
  from: number;
  to: number;
  count: number;
  distance: number;
  phase: number;
}

/** A seat for a parallel key: a slot of `width` whose floor lies `floor` mm from the axis. */
export interface KeySeatCut {
  kind: 'key-seat';
  id: string;
  from: number;
  to: number;
  width: number;
  floor: number;
  phase: number;
  /** Ends: rounded by the end mill, or run out by a disc cutter. */
  ends: 'round' | 'square';
}

/** A round hole square to the axis and through it (`through`), or from the surface at `phase` to the axis. */
export interface CrossHoleCut {
  kind: 'cross-hole';
  id: string;
  at: number;
  diameter: number;
  phase: number;
  through: boolean;
}

export type Cut = FlatsCut | KeySeatCut | CrossHoleCut;

/** Thread over a span. Metal counts as the basic pitch cylinder (house rule for volume and mass). */
export interface ThreadTreatment {
  kind: 'thread';
  id: string;
  from: number;
  to: number;
  internal: boolean;
  /** As the sheet names it: `M10x1.25-6g`. */
  designation: string;
  major: number;
  pitchDiameter: number;
  /** Root of an external thread, minor of an internal one: what the thin line is drawn at. */
  root: number;
  pitch: number;
  lead: number;
  starts: number;
  hand: 'right' | 'left';
}

/** Knurl over a span; no metal (blank diameter counts). */
export interface KnurlTreatment {
  kind: 'knurl';
  id: string;
  from: number;
  to: number;
  pattern: 'straight' | 'diamond';
  pitch: number;
}

export type Treatment = ThreadTreatment | KnurlTreatment;

export interface Body {
  x0: number;
  x1: number;
  outer: Generator;
  /** Radius of the bore; 0 where solid. Covers [x0, x1]. */
  inner: Generator;
  cuts: readonly Cut[];
  treatments: readonly Treatment[];
}
