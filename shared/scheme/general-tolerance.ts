import {
  generalBrokenEdge,
  generalLinear,
  INCH_DECIMAL_BLOCK,
  inchDecimalTolerance,
  type GeneralToleranceClass,
} from '../standards/general-tolerances';
import { formatLength } from '../units/format';
import type { SizeKind } from './scheme';

/** What governs every size that carries no tolerance of its own. */
export interface GeneralTolerance {
  id: string;
  /** As the title block prints it. */
  text: string;
  /** As `Size.toleranceSource` names it. */
  source: string;
  /** ± mm for a length, diameter or broken edge of this nominal. */
  deviation: (kind: SizeKind, nominal: number) => number;
}

/** Decimals every inch size is given to where nothing else is said; the block's figure for them governs. */
const INCH_DECIMALS = 3;
/** Below this the standard gives no figure; its smallest row is used, never more than half the size. Common practice. */
const SMALLEST_TABLED = 0.5;

const ISO = /^ISO 2768-([fmcv])$/;

/** A broken edge never comes to less than half itself, so that it is never sized away. */
function withinHalf(nominal: number, deviation: number): number {
  return Math.min(deviation, nominal / 2);
}

/**
 * The general tolerance by its id: `ISO 2768-f`, `-m`, `-c`, `-v`, or `shop-inch`.
 * @throws RangeError for an id that is not known: ours, never a person's
 */
export function generalToleranceById(id: string): GeneralTolerance {
  const iso = ISO.exec(id);
  if (iso) {
    const grade = iso[1] as GeneralToleranceClass;
    return {
      id,
      text: id,
      source: id,
      deviation: (kind, nominal) => {
        const tabled = Math.max(nominal, SMALLEST_TABLED);
        const isEdge = kind === 'chamfer' || kind === 'radius';
        const found = isEdge ? generalBrokenEdge(tabled, grade) : generalLinear(tabled, grade);
        const usual = found ?? generalLinear(tabled, 'm') ?? 0;
        return isEdge || nominal < SMALLEST_TABLED ? withinHalf(nominal, usual) : usual;
      },
    };
  }
  if (id === 'shop-inch') {
    return {
      id,
      text: inchBlockText(),
      source: 'shop block',
      deviation: (_, nominal) => withinHalf(nominal, inchDecimalTolerance(INCH_DECIMALS) ?? 0),
    };
  }
  throw new RangeError(`No general tolerance is called “${id}”`);
}

/** `.X ±.030  .XX ±.010  .XXX ±.005` and the angle. */
function inchBlockText(): string {
  const lines = Object.entries(INCH_DECIMAL_BLOCK.byDecimals).map(([decimals, mm]) => {
    const places = Number(decimals);
    return `.${'X'.repeat(places)} ±${formatLength(mm, { unit: 'in', style: 'asme', decimals: Math.max(3, places) })}`;
  });
  return `${lines.join('  ')}  ANGLES ±${INCH_DECIMAL_BLOCK.angleDegrees}°`;
}
