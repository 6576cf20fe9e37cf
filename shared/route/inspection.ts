import type { Scheme, Size } from '../scheme/scheme';
import type { DraftNeed, DraftOperation } from './draft';
import type { Instrument, Register } from './register';
import type { Method } from './route';
import { alternative, held, short } from './shop';
import type { Shop } from './shop';
import { figure, inSentence } from './words';

/** Which kinds of size an operation brings to its figure. */
const BROUGHT: Partial<Record<Method, readonly Size['kind'][]>> = {
  face: ['length'],
  turn: ['diameter', 'length', 'groove'],
  groove: ['diameter', 'length', 'groove'],
  'taper-turn': ['taper', 'angle', 'diameter', 'length'],
  'form-turn': ['radius'],
  chamfer: ['chamfer'],
  'thread-die': ['thread'],
  'thread-single-point': ['thread'],
  'mill-flat': ['across-flats', 'length'],
  'centre-drill': ['centre-hole'],
  'part-off': ['length'],
};

/**
 * Sizes by the operation that brings each to its figure; reference sizes and what the bar already is belong to none.
 */
export function sizesOf(
  operations: readonly DraftOperation[],
  scheme: Scheme,
  length: number,
): Map<string, Size[]> {
  const found = new Map<string, Size[]>();
  for (const size of scheme.sizes) {
    if (size.reference) continue;
    const maker =
      size.kind === 'length' ? lengthMaker(operations, size, length) : figureMaker(operations, size);
    if (!maker) continue;
    found.set(maker.key, [...(found.get(maker.key) ?? []), size]);
  }
  return found;
}

/** A size read across one station of a cone is the cone's; any other diameter is its cylinder's, or the bar's own. */
function figureMaker(operations: readonly DraftOperation[], size: Size): DraftOperation | undefined {
  const atCone = size.anchor.kind === 'across' && size.anchor.at !== undefined;
  return operations.find(
    (o) =>
      BROUGHT[o.method]?.includes(size.kind) &&
      o.features.some((id) => size.features.includes(id)) &&
      (size.kind !== 'diameter' || (o.method === 'taper-turn') === atCone),
  );
}

/** A length is brought about by the last cut at one of its shoulders; only where both are ends of the part by a facing. */
function lengthMaker(
  operations: readonly DraftOperation[],
  size: Size,
  length: number,
): DraftOperation | undefined {
  if (size.anchor.kind !== 'span') return undefined;
  const stations = [size.anchor.from, size.anchor.to];
  const shoulders = stations.filter((x) => x > 1e-6 && x < length - 1e-6);
  const wanted = shoulders.length > 0 ? shoulders : stations;
  const makers = operations.filter(
    (o) =>
      BROUGHT[o.method]?.includes('length') &&
      edgesOf(o).some((e) => wanted.some((x) => Math.abs(e - x) < 0.005)),
  );
  return makers[makers.length - 1];
}

function edgesOf({ cut }: DraftOperation): number[] {
  switch (cut?.kind) {
    case 'outer':
      return [cut.envelope[0]?.from ?? NaN, cut.envelope[cut.envelope.length - 1]?.to ?? NaN];
    case 'trim':
    case 'sever':
      return [cut.from, cut.to];
    case 'cut':
      return cut.cut.kind === 'cross-hole' ? [] : [cut.cut.from, cut.cut.to];
    default:
      return [];
  }
}

export interface Measuring {
  text: string;
  need: DraftNeed;
}

const KINDS: Partial<Record<Size['kind'], readonly Instrument['kind'][]>> = {
  length: ['caliper', 'depth', 'micrometer', 'rule'],
  diameter: ['micrometer', 'caliper'],
  'across-flats': ['micrometer', 'caliper'],
  groove: ['caliper', 'micrometer'],
  radius: ['radius-gauge'],
  angle: ['protractor'],
  taper: ['micrometer', 'protractor'],
  chamfer: ['rule', 'caliper'],
  thread: ['ring-gauge', 'thread-wires'],
  'centre-hole': ['caliper'],
};

/**
 * The instrument for a size: the coarsest whose permissible error is a tenth of the tolerance; else one at the shop's
 * own ratio, with a note; else a short that names what is wanted. Null for sizes nobody measures.
 */
export function instrumentFor({ register, words }: Shop, size: Size): Measuring | null {
  const kinds = KINDS[size.kind];
  if (!kinds) return null;
  const spec = `measure ${size.typed || words.length(size.nominal)}`;
  if (size.kind === 'thread') return threadGauge(register, size, spec);
  const width = size.upperLimit - size.lowerLimit;
  const reach = register.instruments.filter(
    (i) =>
      kinds.includes(i.kind) &&
      (i.kind === 'protractor' || (i.minimum <= size.nominal + 1e-9 && size.nominal <= i.maximum + 1e-9)),
  );
  if (size.kind === 'radius' || size.kind === 'angle' || size.kind === 'taper' || size.kind === 'chamfer') {
    const first = reach[0];
    return first
      ? {
          text: inSentence(first.name),
          need: held('instrument', spec, first.id, `${first.name}, ${first.place}.`),
        }
      : missing(spec, words.length(width));
  }
  const coarse = [...reach].sort((a, b) => b.permissibleError - a.permissibleError);
  const coarsest = coarse.find((i) => i.permissibleError <= width / 10 + 1e-12);
  const tenth = coarsest && handiest(coarse, coarsest);
  if (tenth)
    return {
      text: inSentence(tenth.name),
      need: held(
        'instrument',
        spec,
        tenth.id,
        `${tenth.name}: ${words.length(tenth.permissibleError)} is a tenth of ${words.length(width)} or less.`,
      ),
    };
  const ratio = Math.max(0.1, register.settings.instrumentRatio);
  const allowed = coarse.find((i) => i.permissibleError <= width * ratio + 1e-12);
  if (allowed)
    return {
      text: `${inSentence(allowed.name)}, twice`,
      need: held(
        'instrument',
        spec,
        allowed.id,
        `${allowed.name}: ${words.length(allowed.permissibleError)} is more than a tenth of ${words.length(width)} but within ${figure(ratio)} of it, which the shop allows; measure twice.`,
      ),
    };
  return missing(spec, words.length(width));
}

/** Of the same kind, the shortest that reads as closely: nobody takes the long caliper to a short size. */
function handiest(reach: readonly Instrument[], found: Instrument): Instrument {
  return reach.reduce(
    (best, each) =>
      each.kind === found.kind &&
      each.maximum < best.maximum &&
      each.permissibleError <= found.permissibleError
        ? each
        : best,
    found,
  );
}

function missing(spec: string, width: string): Measuring {
  return {
    text: 'no instrument fine enough',
    need: short(
      'instrument',
      spec,
      `Nothing in the register reads it to a tenth of ${width}, nor to the shop’s own share.`,
      ['borrow or buy a finer instrument', 'gauge it against a master piece'],
    ),
  };
}

function threadGauge(register: Register, size: Size, spec: string): Measuring {
  const name = (size.designation ?? '').replace(/-\d*[a-zA-Z0-9]+$/, '');
  const gauge = register.instruments.find(
    (i) =>
      i.kind === 'ring-gauge' &&
      i.designation !== undefined &&
      name.startsWith(i.designation) &&
      (name.length === i.designation.length || !/[x0-9.]/i.test(name.charAt(i.designation.length))),
  );
  if (gauge)
    return {
      text: inSentence(gauge.name),
      need: held('instrument', spec, gauge.id, `${gauge.name}, ${gauge.place}.`),
    };
  const wires = register.instruments.find((i) => i.kind === 'thread-wires');
  if (wires)
    return {
      text: `${inSentence(wires.name)}, or the mate`,
      need: held(
        'instrument',
        spec,
        wires.id,
        `No ring gauge for it: over ${inSentence(wires.name)} with a micrometer, and in the mate.`,
      ),
    };
  return {
    text: 'the mate',
    need: alternative('instrument', spec, undefined, 'No ring gauge and no wires: it is tried in the mate.', [
      'try it in the mate',
      'buy a ring gauge',
    ]),
  };
}
