// Cutting speeds and spindle speeds. Formulas exact; the factors of operations are common practice, each with its reason.
import type { Certainty } from './certainty';
import type { BaseSpeeds, CuttingToolMaterial, Material } from './materials';

/** Spindle speed in rev/min for a surface speed in m/min at a diameter in mm: n = 1000 v / (π d). Infinity at the axis. */
export function spindleSpeed(surfaceSpeedMPerMin: number, diameterMm: number): number {
  return (1000 * surfaceSpeedMPerMin) / (Math.PI * diameterMm);
}

/** Surface speed in m/min at a diameter in mm turning at n rev/min. */
export function surfaceSpeed(revPerMin: number, diameterMm: number): number {
  return (Math.PI * diameterMm * revPerMin) / 1000;
}

export type CuttingOperation =
  | 'turning'
  | 'finishing'
  | 'facing'
  | 'chamfering'
  | 'boring'
  | 'parting'
  | 'grooving'
  | 'form-turning'
  | 'thread-cutting'
  | 'die-threading'
  | 'tapping'
  | 'knurling'
  | 'drilling'
  | 'centre-drilling'
  | 'reaming'
  | 'counterboring'
  | 'milling';

export interface OperationFactor {
  /** The tabled speed it is taken from. */
  of: keyof BaseSpeeds;
  factor: number;
  reason: string;
  certainty: Certainty;
}

const practice = (of: keyof BaseSpeeds, factor: number, reason: string): OperationFactor => ({
  of,
  factor,
  reason,
  certainty: 'common practice',
});

export const OPERATION_FACTORS: Readonly<Record<CuttingOperation, OperationFactor>> = {
  turning: practice('turning', 1, 'Tabled for roughing.'),
  finishing: practice('finishing', 1, 'Tabled for a light cut.'),
  facing: practice('turning', 1, 'Taken at the outside diameter; the speed falls towards the centre.'),
  chamfering: practice('turning', 0.8, 'A wide edge cuts along its whole length.'),
  boring: practice('turning', 0.8, 'The bar springs and chips leave badly.'),
  parting: practice('turning', 0.5, 'A deep narrow blade is weak and its chips are trapped.'),
  grooving: practice('turning', 0.5, 'A narrow blade is weak and its chips are trapped.'),
  'form-turning': practice('turning', 0.5, 'A long edge in contact chatters.'),
  'thread-cutting': practice('turning', 0.35, 'The carriage must be stopped in time and the point is fine.'),
  'die-threading': practice(
    'turning',
    0.15,
    'Every tooth cuts at once and the die must be stopped at the shoulder.',
  ),
  tapping: practice('drilling', 0.3, 'Every tooth cuts at once and the tap must be reversed.'),
  knurling: practice('turning', 0.5, 'The rolls press metal; heat and flakes grow with speed.'),
  drilling: practice('drilling', 1, 'Tabled for holes to three diameters deep.'),
  'centre-drilling': practice('drilling', 0.8, 'The pilot is thin; the speed is taken at the mouth.'),
  reaming: practice('drilling', 0.5, 'Size and finish come before time.'),
  counterboring: practice('drilling', 0.5, 'The whole end cuts and the tool has little clearance.'),
  milling: practice('milling', 1, 'Tabled for a sharp cutter.'),
};

/** Surface speed in m/min for an operation, from the material's table and the operation's factor. */
export function cuttingSpeed(
  material: Material,
  tool: CuttingToolMaterial,
  operation: CuttingOperation,
): number {
  const { of, factor } = OPERATION_FACTORS[operation];
  return material.cuttingSpeeds[tool][of] * factor;
}

/**
 * What is left of drilling speed and feed in a deep hole: [from this many diameters deep, share of speed, share of feed].
 * Source: workshop drilling charts (figures differ between copies). Certainty: common practice.
 */
const DEEP_HOLE: readonly (readonly [number, number, number])[] = [
  [8, 0.6, 0.8],
  [6, 0.65, 0.8],
  [5, 0.7, 0.8],
  [4, 0.8, 0.9],
  [3, 0.9, 0.9],
];

export function deepHoleFactors(depth: number, diameter: number): { speed: number; feed: number } {
  const row = DEEP_HOLE.find(([from]) => depth / diameter >= from);
  return row ? { speed: row[1], feed: row[2] } : { speed: 1, feed: 1 };
}
