import { STATION_TOLERANCE } from '../part/body';
import type { Part } from '../part/part';
import { LEAST_TO_A_STOP } from './datum-rules';
import type { Scheme, Size } from './scheme';

/** A length of the bench: from the datum face to one station, with the limits it was given. */
export interface DatumLength {
  station: string;
  x: number;
  /** From the datum, always positive (mm). */
  nominal: number;
  upperLimit: number;
  lowerLimit: number;
  /** The original size it is, where that one ran from the datum already; its limits then are the designer's own or tighter. */
  original?: string;
}

export interface Redimensioned {
  datum: string;
  lengths: readonly DatumLength[];
  /** Stations whose share of the limits falls below what turning to a stop can hold, each with a sentence. */
  refused: readonly { station: string; message: string }[];
}

/** An original length as a constraint between two stations: the deviation of the right one less that of the left one. */
interface Chain {
  size: Size;
  left: number;
  right: number;
  middle: number;
  width: number;
}

interface Node {
  id: string;
  x: number;
  /** Middle of its allowed deviation along x, and its full width. */
  middle: number;
  width: number;
  settled: boolean;
}

/**
 * ISO 286-1 standard tolerance unit, mm: i = 0.45 ∛D + 0.001 D in micrometres, D in mm. What makes two shares equal
 * in terms of IT grade.
 */
export function toleranceUnit(nominal: number): number {
  return (0.45 * Math.cbrt(nominal) + 0.001 * nominal) / 1000;
}

/**
 * The same part's lengths from one datum face. The original limits are constraints, general tolerances too; the new
 * tolerances are the largest equal share in IT-grade terms such that every original limit holds in the worst case,
 * and what a share leaves over goes to those that can still grow. Asymmetric limits keep their middle.
 * @param datum id of a station that the lengths fix
 * @throws RangeError when it is no such station, or the lengths are not complete: ours
 */
export function redimension(part: Part, scheme: Scheme, datum: string): Redimensioned {
  const { nodes, chains } = chainsOf(part, scheme);
  const start = nodes.findIndex(({ id }) => id === datum);
  if (start < 0) throw new RangeError(`“${datum}” is not a station that the lengths fix`);
  const from = nodes[start] as Node;
  settleMiddles(nodes, chains, start);
  from.settled = true;
  const unit = nodes.map(({ x }) => toleranceUnit(Math.abs(x - from.x)));
  shareWidths(nodes, chains, unit);

  const lengths: DatumLength[] = [];
  const refused: { station: string; message: string }[] = [];
  nodes.forEach((node, index) => {
    if (index === start) return;
    const nominal = Math.abs(node.x - from.x);
    const sign = node.x > from.x ? 1 : -1;
    const own = chains.find(
      ({ left, right }) => (left === start && right === index) || (right === start && left === index),
    );
    lengths.push({
      station: node.id,
      x: node.x,
      nominal,
      upperLimit: nominal + sign * node.middle + node.width / 2,
      lowerLimit: nominal + sign * node.middle - node.width / 2,
      ...(own ? { original: own.size.id } : {}),
    });
    const kept = own !== undefined && node.width >= own.width - STATION_TOLERANCE;
    if (!kept && node.width < 2 * LEAST_TO_A_STOP.value - STATION_TOLERANCE) {
      refused.push({ station: node.id, message: refusal(node, chains, index) });
    }
  });
  return { datum, lengths, refused };
}

function refusal(node: Node, chains: readonly Chain[], index: number): string {
  const tightest = chains
    .filter(({ left, right }) => left === index || right === index)
    .reduce((least, chain) => (chain.width < least.width ? chain : least));
  return `Measured from this face, ${node.id} would have to be held closer than ±${LEAST_TO_A_STOP.value} mm for ${tightest.size.id} to come right. Keep ${tightest.size.id} as it is, or widen its limits.`;
}

function chainsOf(part: Part, scheme: Scheme): { nodes: Node[]; chains: Chain[] } {
  const nodes: Node[] = [];
  const nodeAt = (x: number, id: string | undefined): number => {
    const known = nodes.findIndex((node) => Math.abs(node.x - x) <= STATION_TOLERANCE);
    if (known >= 0) return known;
    const station = id ?? part.stations.find((s) => Math.abs(s.x - x) <= STATION_TOLERANCE)?.id ?? `x${x}`;
    return nodes.push({ id: station, x, middle: 0, width: 0, settled: false }) - 1;
  };
  const chains: Chain[] = [];
  for (const size of scheme.sizes) {
    if (size.reference || size.kind !== 'length' || size.anchor.kind !== 'span') continue;
    const { upperLimit, lowerLimit, nominal, anchor } = size;
    chains.push({
      size,
      left: nodeAt(anchor.from, size.from),
      right: nodeAt(anchor.to, size.to),
      middle: (upperLimit + lowerLimit) / 2 - nominal,
      width: upperLimit - lowerLimit,
    });
  }
  return { nodes, chains };
}

/** Middles follow exactly from the tree of the original lengths. */
function settleMiddles(nodes: readonly Node[], chains: readonly Chain[], start: number): void {
  const reached = new Set([start]);
  for (let grew = true; grew;) {
    grew = false;
    for (const { left, right, middle } of chains) {
      const [a, b] = [nodes[left], nodes[right]];
      if (!a || !b || reached.has(left) === reached.has(right)) continue;
      if (reached.has(left)) b.middle = a.middle + middle;
      else a.middle = b.middle - middle;
      reached.add(left).add(right);
      grew = true;
    }
  }
  if (reached.size !== nodes.length) throw new RangeError('The lengths do not fix every station');
}

/**
 * Grows every width in proportion to its tolerance unit until an original limit is used up, settles the two stations
 * that use it, and goes on with the rest.
 */
function shareWidths(nodes: readonly Node[], chains: readonly Chain[], unit: readonly number[]): void {
  const part = (index: number): { held: number; grows: number } => {
    const node = nodes[index];
    return node?.settled ? { held: node.width, grows: 0 } : { held: 0, grows: unit[index] ?? 0 };
  };
  while (nodes.some(({ settled }) => !settled)) {
    let share = Number.POSITIVE_INFINITY;
    let bound: Chain | undefined;
    for (const chain of chains) {
      const [a, b] = [part(chain.left), part(chain.right)];
      const grows = a.grows + b.grows;
      const reach = grows > 0 ? Math.max(0, chain.width - a.held - b.held) / grows : Number.POSITIVE_INFINITY;
      if (reach < share) [share, bound] = [reach, chain];
    }
    if (!bound) throw new RangeError('The lengths do not fix every station');
    for (const index of [bound.left, bound.right]) {
      const node = nodes[index];
      if (!node || node.settled) continue;
      node.width = share * (unit[index] ?? 0);
      node.settled = true;
    }
  }
}
