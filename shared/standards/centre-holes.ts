// Centre holes. ISO 6411 forms A, B and R, and the plain inch series of combined drills and countersinks (ASME B94.11M).
// Certainty: from memory; the form A figures agree with their geometry (60° cone and pilot).
import { toRadians } from '../units/angle';
import { inchesToMm } from '../units/length';
import { MAX_TYPED_LENGTH, plainCharacters, quoteGiven, refuse, type Parsed } from '../units/parsed';
import type { Source } from './certainty';

export type CentreHoleForm = 'A' | 'B' | 'R' | 'plain';

/** A centre hole at its nominal form, mm; angles are included angles in radians. */
export interface CentreHole {
  form: CentreHoleForm;
  /** `A2.5`, `#3`. */
  designation: string;
  pilotDiameter: number;
  /** Depth of the pilot beyond the cone. */
  pilotDepth: number;
  /** Diameter of the 60° cone, or of the curve of form R, at its mouth. */
  mouthDiameter: number;
  /** From the face to the bottom of the pilot's cylinder. */
  depth: number;
  coneAngle: number;
  /** Form B: the 120° cone that guards the seat. */
  guard?: { diameter: number; angle: number };
  /** Form R: radius of the curve. */
  arcRadius?: number;
  basis: Source;
}

/** [d, D of the cone, pilot depth, D of the guard (form B), smallest radius (form R)]; null where the form has no such size. */
type Row = readonly [number, number, number, number | null, number | null];

const ISO_6411: readonly Row[] = [
  [0.5, 1.06, 0.5, null, null],
  [0.63, 1.32, 0.6, null, null],
  [0.8, 1.7, 0.7, null, null],
  [1, 2.12, 0.9, 3.15, 2.5],
  [1.25, 2.65, 1.1, 4, 3.15],
  [1.6, 3.35, 1.4, 5, 4],
  [2, 4.25, 1.8, 6.3, 5],
  [2.5, 5.3, 2.2, 8, 6.3],
  [3.15, 6.7, 2.8, 10, 8],
  [4, 8.5, 3.5, 12.5, 10],
  [5, 10.6, 4.4, 16, 12.5],
  [6.3, 13.2, 5.5, 18, 16],
  [8, 17, 7, 22.4, 20],
  [10, 21.2, 8.7, 28, 25],
];

/** [number, body diameter, drill diameter, drill length] in inches. */
const PLAIN_INCH: readonly (readonly [string, number, number, number])[] = [
  ['00', 0.125, 0.025, 0.03],
  ['0', 0.125, 0.0312, 0.038],
  ['1', 0.125, 0.0469, 0.0469],
  ['2', 0.1875, 0.0781, 0.0781],
  ['3', 0.25, 0.1094, 0.1094],
  ['4', 0.3125, 0.125, 0.125],
  ['5', 0.4375, 0.1875, 0.1875],
  ['6', 0.5, 0.2188, 0.2188],
  ['7', 0.625, 0.25, 0.25],
  ['8', 0.75, 0.3125, 0.3125],
];

/** Mouth of a plain inch centre as a share of the drill's body, so that the body never rubs. Common practice. */
const INCH_MOUTH_SHARE = 0.8;

const CONE = toRadians(60);
const GUARD_CONE = toRadians(120);

function coneDepth(large: number, small: number, included: number): number {
  return (large - small) / 2 / Math.tan(included / 2);
}

function isoCentre(form: 'A' | 'B' | 'R', row: Row): CentreHole | null {
  const [pilotDiameter, mouthDiameter, pilotDepth, guardDiameter, arcRadius] = row;
  const seat = coneDepth(mouthDiameter, pilotDiameter, CONE);
  const common = {
    form,
    designation: `${form}${pilotDiameter}`,
    pilotDiameter,
    pilotDepth,
    mouthDiameter,
    coneAngle: CONE,
    basis: { source: 'ISO 6411', certainty: 'from memory' },
  } as const;
  if (form === 'A') return { ...common, depth: seat + pilotDepth };
  if (form === 'R') return arcRadius === null ? null : { ...common, depth: seat + pilotDepth, arcRadius };
  if (guardDiameter === null) return null;
  return {
    ...common,
    depth: coneDepth(guardDiameter, mouthDiameter, GUARD_CONE) + seat + pilotDepth,
    guard: { diameter: guardDiameter, angle: GUARD_CONE },
  };
}

function inchCentre([number, body, drill, drillLength]: (typeof PLAIN_INCH)[number]): CentreHole {
  const pilotDiameter = inchesToMm(drill);
  const mouthDiameter = inchesToMm(body) * INCH_MOUTH_SHARE;
  const pilotDepth = inchesToMm(drillLength);
  return {
    form: 'plain',
    designation: `#${number}`,
    pilotDiameter,
    pilotDepth,
    mouthDiameter,
    depth: coneDepth(mouthDiameter, pilotDiameter, CONE) + pilotDepth,
    coneAngle: CONE,
    basis: { source: 'ASME B94.11M; mouth by common practice', certainty: 'from memory' },
  };
}

/**
 * Reads a centre hole: empty, `none` or `0` (no hole), form and pilot (`A2.5`, `B 4`, `A2.5/5.3`, `ISO 6411-R3.15`), or `#3` for the plain inch series.
 * @returns the hole, null for none, or a sentence naming the sizes there are
 */
export function parseCentreHole(text: string): Parsed<CentreHole | null> {
  if (typeof text !== 'string') return refuse('A centre hole is typed as text, such as A2.5 or #3.');
  if (text.length > MAX_TYPED_LENGTH)
    return refuse(
      `${quoteGiven(text)} is too long for a centre hole. Type form and size, such as A2.5, or #3.`,
    );
  const plain = plainCharacters(text).replace(/^ISO ?6411 ?-? ?/i, '');
  if (plain === '' || plain === '0' || plain.toLowerCase() === 'none') return { ok: true, value: null };
  const inch = /^(?:#|no\.? ?)(\d{1,2})$/i.exec(plain);
  if (inch) {
    const row = PLAIN_INCH.find(([number]) => number === inch[1]);
    if (row) return { ok: true, value: inchCentre(row) };
    return refuse(
      `${quoteGiven(text)} is not in the plain inch series. The numbers are ${PLAIN_INCH.map(([number]) => `#${number}`).join(', ')}.`,
    );
  }
  const iso = /^([ABR]) ?(\d{1,2}(?:[.,]\d{1,2})?)(?: ?\/ ?\d{1,2}(?:[.,]\d{1,2})?)?$/i.exec(plain);
  if (!iso)
    return refuse(
      `${quoteGiven(text)} is not a centre hole. Type form A, B or R and the pilot size, such as A2.5, or #3 for the plain inch series, or none.`,
    );
  const form = (iso[1] ?? 'A').toUpperCase() as 'A' | 'B' | 'R';
  const size = Number((iso[2] ?? '').replace(',', '.'));
  const row = ISO_6411.find(([pilot]) => pilot === size);
  const hole = row ? isoCentre(form, row) : null;
  if (hole) return { ok: true, value: hole };
  const sizes = ISO_6411.filter((each) => isoCentre(form, each) !== null).map(([pilot]) => `${form}${pilot}`);
  return refuse(`${quoteGiven(text)} is not a size of ISO 6411. Form ${form} has ${sizes.join(', ')}.`);
}

/** Pilot size of the centre for a work diameter, mm: [up to this diameter, pilot]. Common practice. */
const CENTRE_FOR_WORK: readonly (readonly [number, number])[] = [
  [5, 0.8],
  [8, 1],
  [12, 1.6],
  [18, 2],
  [30, 2.5],
  [50, 3.15],
  [80, 4],
  [120, 5],
  [Number.POSITIVE_INFINITY, 6.3],
];

/** The form A centre usually put in work of this diameter (mm). Source: common practice; its mouth stays well inside the face. */
export function centreHoleForWork(diameterMm: number): CentreHole {
  const pilot = CENTRE_FOR_WORK.find(([upTo]) => diameterMm <= upTo)?.[1] ?? 6.3;
  const row = ISO_6411.find(([size]) => size === pilot);
  const hole = row ? isoCentre('A', row) : null;
  if (!hole) throw new Error(`No centre hole of pilot ${pilot} in the table.`);
  return hole;
}
