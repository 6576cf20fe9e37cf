import { STATION_TOLERANCE } from '../part/body';
import type { Feature, Part } from '../part/part';
import type { Completeness, Size, SizeAnchor } from './scheme';

/** A figure of the part that sizes must fix, besides its stations. */
interface Unknown {
  words: string;
  value: number;
}

type Measure = (figures: readonly number[]) => number;

/** Step of the numerical derivative (mm) and what counts as nothing in it. */
const STEP = 1e-4;
const NOTHING = 1e-6;

/**
 * Whether the sizes across the part fix every diameter, leg, radius, designation and distance once: each shown size is a
 * function of the part's free figures, and their Jacobian must have full rank with no row to spare.
 * Stations count as known here; `lengthsCompleteness` judges them.
 */
export function rankCompleteness(part: Part, sizes: readonly Size[]): Completeness {
  const { unknowns, indexOf } = freeFigures(part);
  const at = unknowns.map(({ value }) => value);
  const basis: number[][] = [];
  const redundant: string[] = [];
  for (const size of sizes) {
    if (size.reference || size.kind === 'length') continue;
    let adds = false;
    for (const measure of measuresOf(part, size, indexOf)) {
      const rest = residual(gradient(measure, at), basis);
      if (!rest) continue;
      basis.push(rest);
      adds = true;
    }
    if (!adds) redundant.push(size.id);
  }
  const missing = unknowns
    .filter((_, index) => residual(unit(index, unknowns.length), basis) !== undefined)
    .map(({ words }) => `No size gives ${words}.`);
  return { missing, redundant };
}

function unit(index: number, length: number): number[] {
  return Array.from({ length }, (_, i) => (i === index ? 1 : 0));
}

function gradient(measure: Measure, at: readonly number[]): number[] {
  return at.map((_, index) => {
    const moved = (by: number): number => measure(at.map((value, i) => (i === index ? value + by : value)));
    return (moved(STEP) - moved(-STEP)) / (2 * STEP);
  });
}

/** What is left of a row after the basis is taken out, of length one; nothing where it is dependent. */
function residual(row: readonly number[], basis: readonly (readonly number[])[]): number[] | undefined {
  const size = Math.hypot(...row);
  if (size < NOTHING) return undefined;
  let rest = row.map((value) => value / size);
  // Twice, because once leaves rounding behind where rows are nearly parallel.
  for (let pass = 0; pass < 2; pass += 1) {
    for (const direction of basis) {
      const along = rest.reduce((sum, value, i) => sum + value * (direction[i] ?? 0), 0);
      rest = rest.map((value, i) => value - along * (direction[i] ?? 0));
    }
  }
  const left = Math.hypot(...rest);
  return left < NOTHING ? undefined : rest.map((value) => value / left);
}

interface FreeFigures {
  unknowns: Unknown[];
  /** By feature id and figure, `grip.diameter`; several may share one unknown. */
  indexOf: ReadonlyMap<string, number>;
}

/** Diameters of a cone and its neighbour that meet at a corner without a step are one figure. */
function freeFigures(part: Part): FreeFigures {
  const unknowns: Unknown[] = [];
  const indexOf = new Map<string, number>();
  let before: { x: number; diameter: number; index: number } | undefined;
  const add = (name: string, words: string, value: number, shared?: number): number => {
    const index = shared ?? unknowns.push({ words, value }) - 1;
    indexOf.set(name, index);
    return index;
  };
  const meeting = (x: number, diameter: number): number | undefined =>
    before &&
    Math.abs(before.x - x) <= STATION_TOLERANCE &&
    Math.abs(before.diameter - diameter) <= STATION_TOLERANCE
      ? before.index
      : undefined;
  for (const feature of part.features) {
    const { id } = feature;
    switch (feature.kind) {
      case 'cylinder': {
        const { from, to, diameter } = feature;
        const corner = isCone(part, before?.x) ? meeting(from, diameter) : undefined;
        const index = add(`${id}.diameter`, `the diameter of ${id}`, diameter, corner);
        before = { x: to, diameter, index };
        break;
      }
      case 'cone': {
        const { from, to, startDiameter, endDiameter } = feature;
        add(
          `${id}.start`,
          `the larger or left diameter of ${id}`,
          startDiameter,
          meeting(from, startDiameter),
        );
        const index = add(`${id}.end`, `the end diameter of ${id}`, endDiameter);
        before = { x: to, diameter: endDiameter, index };
        break;
      }
      case 'chamfer':
        add(`${id}.leg`, `the leg of ${id}`, feature.leg);
        break;
      case 'crown':
        add(`${id}.radius`, `the radius of ${id}`, feature.radius);
        break;
      case 'flats':
        add(`${id}.acrossFlats`, `the size across ${id}`, feature.acrossFlats);
        break;
      case 'thread':
      case 'knurl':
      case 'centre-hole':
        add(`${id}.designation`, `the designation of ${id}`, 0);
        break;
      case 'groove':
      case 'bore':
        add(`${id}.diameter`, `the diameter of ${id}`, feature.diameter);
        break;
      case 'face':
        break;
    }
  }
  return { unknowns, indexOf };
}

function isCone(part: Part, endsAt: number | undefined): boolean {
  return (
    endsAt !== undefined &&
    part.features.some(
      (feature) => feature.kind === 'cone' && Math.abs(feature.to - endsAt) <= STATION_TOLERANCE,
    )
  );
}

/** What a size says of the free figures, one function each. */
function measuresOf(part: Part, size: Size, indexOf: ReadonlyMap<string, number>): Measure[] {
  const features = size.features.flatMap((id) => part.features.filter((feature) => feature.id === id));
  const reading = (name: string | undefined): Measure[] => {
    const index = name === undefined ? undefined : indexOf.get(name);
    return index === undefined ? [] : [(figures) => figures[index] ?? 0];
  };
  const { anchor } = size;
  switch (anchor.kind) {
    case 'across': {
      const designated = size.kind === 'thread' ? features.find(({ kind }) => kind === 'thread') : undefined;
      return [
        ...reading(acrossName(features, anchor)),
        ...reading(designated && `${designated.id}.designation`),
      ];
    }
    case 'corner':
      return reading(nameOf(features, 'chamfer', 'leg'));
    case 'arc':
      return reading(nameOf(features, 'crown', 'radius'));
    case 'flats':
      return reading(nameOf(features, 'flats', 'acrossFlats'));
    case 'slope': {
      const cone = features.find(({ kind }) => kind === 'cone');
      const [start, end] = [indexOf.get(`${cone?.id}.start`), indexOf.get(`${cone?.id}.end`)];
      if (start === undefined || end === undefined) return [];
      const length = anchor.to - anchor.from;
      return [(figures) => Math.atan(((figures[start] ?? 0) - (figures[end] ?? 0)) / 2 / length)];
    }
    case 'span':
      return [];
  }
}

function nameOf(features: readonly Feature[], kind: Feature['kind'], figure: string): string | undefined {
  const found = features.find((feature) => feature.kind === kind);
  return found && `${found.id}.${figure}`;
}

/** The diameter a size across the part reads: a cylinder's, or a cone's at the end the size is read at. */
function acrossName(
  features: readonly Feature[],
  anchor: Extract<SizeAnchor, { kind: 'across' }>,
): string | undefined {
  const { at, diameter } = anchor;
  const near = (a: number, b: number | undefined): boolean =>
    b !== undefined && Math.abs(a - b) <= STATION_TOLERANCE;
  for (const feature of features) {
    if (feature.kind === 'cylinder' && near(feature.diameter, diameter)) return `${feature.id}.diameter`;
    if (feature.kind !== 'cone') continue;
    if (near(feature.from, at) && near(feature.startDiameter, diameter)) return `${feature.id}.start`;
    if (near(feature.to, at) && near(feature.endDiameter, diameter)) return `${feature.id}.end`;
  }
  return undefined;
}
