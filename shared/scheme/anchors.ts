import { STATION_TOLERANCE } from '../part/body';
import { radiusAt } from '../part/generator';
import type { Feature, Part } from '../part/part';
import type { SizeInstance } from '../template/size-instances';
import type { SizeAnchor } from './scheme';

export function stationAt(part: Part, x: number): string | undefined {
  return part.stations.find((station) => Math.abs(station.x - x) <= STATION_TOLERANCE)?.id;
}

export function featureById(part: Part, id: string): Feature | undefined {
  return part.features.find((feature) => feature.id === id);
}

/** Where on the part a size is read. @throws when the template names a figure or feature the part does not have */
export function anchorOf(size: SizeInstance, part: Part): SizeAnchor {
  switch (size.template.kind) {
    case 'length':
      return { kind: 'span', from: figure(size, 'from'), to: figure(size, 'to') };
    case 'diameter':
    case 'thread': {
      const visible = visibleSpan(size, part);
      const at = size.figures['at'];
      return {
        kind: 'across',
        ...visible,
        diameter: figure(size, 'diameter'),
        internal: false,
        ...(typeof at === 'number' ? { at } : {}),
      };
    }
    case 'chamfer': {
      const chamfer = the(size, part, 'chamfer');
      const x = (chamfer.from + chamfer.to) / 2;
      return { kind: 'corner', x, r: radiusAt(part.body.outer, x), end: chamfer.end };
    }
    case 'radius': {
      const { from, to, radius, end } = the(size, part, 'crown');
      return { kind: 'arc', from, to, radius, end };
    }
    case 'across-flats': {
      const { id, runOutFrom, runOutTo, acrossFlats, phase } = the(size, part, 'flats');
      return { kind: 'flats', feature: id, from: runOutFrom, to: runOutTo, acrossFlats, phase };
    }
    default:
      throw new TypeError(`No anchor is known for a size of kind ${size.template.kind}`);
  }
}

function figure(size: SizeInstance, name: string): number {
  const value = size.figures[name];
  if (typeof value !== 'number') throw new TypeError(`Size “${size.id}” has no figure “${name}”`);
  return value;
}

function the<K extends Feature['kind']>(
  size: SizeInstance,
  part: Part,
  kind: K,
): Extract<Feature, { kind: K }> {
  const isKind = (feature: Feature | undefined): feature is Extract<Feature, { kind: K }> =>
    feature?.kind === kind;
  const found = size.features.map((id) => featureById(part, id)).find(isKind);
  if (!found) throw new TypeError(`Size “${size.id}” needs a ${kind} that the part does not have`);
  return found;
}

/** The span of a size without the chamfers and crowns cut on its features. */
function visibleSpan(size: SizeInstance, part: Part): { from: number; to: number } {
  let [from, to] = [figure(size, 'from'), figure(size, 'to')];
  for (const feature of part.features) {
    const cutsHere =
      feature.kind === 'crown' || (feature.kind === 'chamfer' && size.features.includes(feature.on));
    if (!cutsHere || (feature.kind !== 'crown' && feature.kind !== 'chamfer')) continue;
    if (feature.end === 'left' && feature.to > from && feature.to < to) from = feature.to;
    if (feature.end === 'right' && feature.from < to && feature.from > from) to = feature.from;
  }
  return { from, to };
}
