import { STATION_TOLERANCE } from '../part/body';
import { radiusAt } from '../part/generator';
import type { FlatsFeature, Part } from '../part/part';
import { stationAt } from './anchors';
import type { Completeness, Size } from './scheme';

interface Node {
  x: number;
  words: string;
}

/**
 * Whether the lengths fix every station once: stations are nodes, shown lengths edges, and the edges must be a spanning
 * tree. Chamfer and crown edges are fixed by their own sizes, run-outs by the shapes that meet.
 */
export function lengthsCompleteness(part: Part, sizes: readonly Size[]): Completeness {
  const nodes = stationsToFix(part);
  const group = nodes.map((_, index) => index);
  const root = (index: number): number => {
    const parent = group[index] ?? index;
    return parent === index ? index : root(parent);
  };
  const nodeAt = (x: number): number => nodes.findIndex((node) => Math.abs(node.x - x) <= STATION_TOLERANCE);
  const redundant: string[] = [];
  for (const { id, anchor, reference, kind } of sizes) {
    if (reference || kind !== 'length' || anchor.kind !== 'span') continue;
    const [from, to] = [nodeAt(anchor.from), nodeAt(anchor.to)];
    if (from < 0 || to < 0 || root(from) === root(to)) redundant.push(id);
    else group[root(to)] = root(from);
  }
  const missing: string[] = [];
  const seen = new Set([root(0)]);
  nodes.forEach((node, index) => {
    if (seen.has(root(index))) return;
    seen.add(root(index));
    missing.push(`No length fixes ${node.words}.`);
  });
  return { missing, redundant };
}

/** Stations that only a length can fix, from the left. */
function stationsToFix(part: Part): Node[] {
  const nodes: Node[] = [{ x: 0, words: 'the left face' }];
  const add = (x: number, words: string): void => {
    if (!nodes.some((node) => Math.abs(node.x - x) <= STATION_TOLERANCE)) nodes.push({ x, words });
  };
  add(part.length, 'the right face');
  for (const feature of part.features) {
    if (feature.kind === 'cylinder' || feature.kind === 'cone') {
      add(feature.to, `the right end of ${feature.id}`);
    } else if (feature.kind === 'thread') {
      add(feature.from, `the left end of ${feature.id}`);
      add(feature.to, `the right end of ${feature.id}`);
    } else if (feature.kind === 'flats') addFlatsEnds(part, feature, add);
  }
  return nodes.sort((a, b) => a.x - b.x);
}

/** An end of flats is a station to fix where it stands as a wall; where it runs out, the shapes fix it. */
function addFlatsEnds(part: Part, flats: FlatsFeature, add: (x: number, words: string) => void): void {
  const { outer } = part.body;
  const stands = (x: number, side: 'left' | 'right'): boolean =>
    radiusAt(outer, x, side) > flats.distance + STATION_TOLERANCE;
  const id = flats.id;
  if (stationAt(part, flats.from) !== undefined && stands(flats.from, 'right'))
    add(flats.from, `the left end of ${id}`);
  const runsOn = flats.runOutTo > flats.to + STATION_TOLERANCE;
  if (!runsOn && stands(flats.to, 'left')) add(flats.to, `the right end of ${id}`);
}
