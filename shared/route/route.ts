import type { Removal } from '../part/removal';
import type { Body } from '../part/body';

/** `method` ids of the headless JSON: added to, never renamed. */
export type Method =
  | 'saw'
  | 'grip'
  | 'turn-round'
  | 'mark-out'
  | 'indicate'
  | 'face'
  | 'centre-drill'
  | 'rough-turn'
  | 'turn'
  | 'taper-turn'
  | 'form-turn'
  | 'groove'
  | 'chamfer'
  | 'drill'
  | 'bore'
  | 'counterbore'
  | 'ream'
  | 'tap'
  | 'thread-die'
  | 'thread-single-point'
  | 'knurl'
  | 'mill-flat'
  | 'mill-key'
  | 'cross-drill'
  | 'part-off'
  | 'file'
  | 'polish'
  | 'deburr'
  | 'fit-check'
  | 'inspect';

export type End = 'left' | 'right' | 'both' | 'side';

export interface SetUp {
  id: string;
  machine: string;
  holding: string;
  /** In the part's x; may lie below 0 or beyond L. */
  gripFrom: number;
  gripTo: number;
  freeEnd: 'left' | 'right' | 'both' | 'side';
  support?: 'centre' | 'steady' | 'outboard';
  /** Where three jaws close on the faces of a polygon instead of a round. */
  heldOn?: 'flats';
  /** Register ids of what holds: chuck, collet, block, head. */
  holdingItem?: string;
  /** In words, for the card: how it is held, what the datum is, index or slide settings. */
  heldText: string;
  datumText: string;
  minutes: number;
}

export interface Stop {
  /** Station id of the part, or `<setup>.face`. */
  from: string;
  /** Part x of the datum at that moment. */
  fromX: number;
  /** Part x that is reached. */
  toX: number;
  length: number;
}

export interface Target {
  size: string;
  nominal: number;
  upperLimit: number;
  lowerLimit: number;
}

export interface Operation {
  number: number;
  title: string;
  method: Method;
  setup: string;
  end: End;
  features: readonly string[];
  machine: string;
  tool: string;
  toolItem?: string;
  speed: number;
  surfaceSpeed: number;
  feed: number;
  feedPer: 'rev' | 'min';
  depthOfCut: number;
  passes: number;
  minutes: number;
  /** mm³ turned to chips here, integrated on its own; 0 for parting and sawing. */
  removes: number;
  /** Absent for events without metal (grip, indicate, mark-out, inspect). */
  cut?: Removal;
  after: readonly { operation: number; rule: string }[];
  stops: readonly Stop[];
  target: readonly Target[];
  depth?: number;
  faces?: number;
  /** Degrees. */
  halfAngle?: number;
  slantLength?: number;
  settings?: number;
  blankDiameter?: number;
  overWires?: number;
  /** Length of thread left incomplete at a shoulder that has no relief (mm), said on the card. */
  runOut?: number;
  reasons: readonly string[];
  /** How it is done, step by step: instructions, none of them a warning. */
  notes?: readonly string[];
  /** Only what can hurt somebody or spoil the work. */
  cautions: readonly string[];
  check: string;
}

export interface Stage {
  /** Operation number after which the work looks like this; 0 = the blank. */
  after: number;
  body: Body;
}

export type NeedKind = 'machine' | 'bar' | 'hold' | 'tool' | 'holder' | 'instrument' | 'setting' | 'geometry';

export interface Need {
  operation: number;
  kind: NeedKind;
  need: string;
  state: 'held' | 'short' | 'alternative';
  /** Register id that meets it. */
  by?: string;
  why: string;
  alternatives: readonly string[];
}

export interface Capacity {
  verdict: 'can' | 'cannot' | 'with-changes';
  needs: readonly Need[];
}

export interface StockChoice {
  shape: 'round' | 'hex' | 'square';
  /** Diameter or across flats, mm. */
  size: number;
  material: string;
  bar?: string;
  certified: boolean;
}

export interface Volumes {
  blank: number;
  removed: number;
  kerf: number;
  remnant: number;
  part: number;
}

export interface Route {
  stock: StockChoice;
  /** Saw or stick length as cut from the bar, with grip and parting. */
  blankLength: number;
  blank: Body;
  setups: readonly SetUp[];
  operations: readonly Operation[];
  stages: readonly Stage[];
  volumes: Volumes;
  minutes: { setup: number; run: number };
  cost?: {
    one: number;
    each: number;
    quantity: number;
    total: number;
    currency: string;
    sums: readonly { label: string; amount: number; how: string }[];
  };
  /** What to pull before starting. */
  kitting: readonly { item: string; text: string; place: string }[];
  /** Plans that lost, and why. */
  others: readonly { text: string; why: string }[];
}

/** Judgement of a route by the simulator: accepted when there are no faults. */
export interface Fault {
  rule: string;
  operation: number;
  message: string;
}
