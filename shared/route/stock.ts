import type { Part } from '../part/part';
import type { Scheme } from '../scheme/scheme';
import type { Bar } from './register';
import type { Shop } from './shop';
import { materialName } from './words';

/** A bar that could become the part, and the lengths whose surface it already is. */
export interface StockOption {
  shape: 'round' | 'hex';
  size: number;
  /** Radius of the round that the bar is (a hexagon's corners). */
  radius: number;
  bar?: Bar;
  /** Rows that may keep the bar's own surface. */
  asDrawn: readonly string[];
  text: string;
}

/** Metal that is turned off a bar at the least to clean it up, on the diameter (mm). Common practice. */
const CLEAN_UP = 0.5;

/** Tolerance of bright drawn bar, h11 of ISO 286, below its size (mm). From memory. */
function drawnTolerance(diameter: number): number {
  const steps: readonly (readonly [number, number])[] = [
    [3, 0.06],
    [6, 0.075],
    [10, 0.09],
    [18, 0.11],
    [30, 0.13],
    [50, 0.16],
    [80, 0.19],
    [120, 0.22],
    [180, 0.25],
  ];
  return steps.find(([upTo]) => diameter <= upTo)?.[1] ?? 0.3;
}

/** Lengths of the part that are the bar's own size and whose limits the bar keeps. */
export function asDrawnRows(part: Part, scheme: Scheme, size: number): string[] {
  const threaded = new Set(part.features.filter((f) => f.kind === 'thread').map((f) => f.on));
  return part.features
    .filter((f) => f.kind === 'cylinder')
    .filter((f) => Math.abs(f.diameter - size) <= 1e-6 && !threaded.has(f.id))
    .filter((f) => {
      if (f.asDrawn) return true;
      const own = scheme.sizes.find((s) => s.kind === 'diameter' && s.features.includes(f.id));
      // A fit asks for a turned surface even where its limits would let the bar's pass.
      if (!own) return false;
      if (own.tolerance.kind === 'fit') return false;
      return own.lowerLimit <= size - drawnTolerance(size) + 1e-9 && own.upperLimit >= size - 1e-9;
    })
    .map((f) => f.id);
}

export interface StockAnswer {
  options: StockOption[];
  /** Why the rack has nothing, when it has nothing. */
  short?: { need: string; why: string; alternatives: readonly string[] };
}

/** Bars of the material that cover the part, the best two first; a made-up one with its reason when none does. */
export function stockFor(
  part: Part,
  scheme: Scheme,
  { register, words }: Shop,
  material: string,
): StockAnswer {
  const largest = part.maxDiameter;
  const bars = register.bars
    .filter((bar) => bar.material === material && bar.quantity > 0)
    .sort((a, b) => a.size - b.size || (a.id < b.id ? -1 : 1));
  const options: StockOption[] = [];
  for (const bar of bars) {
    if (bar.shape !== 'round') continue;
    const asDrawn = asDrawnRows(part, scheme, bar.size);
    const covers =
      bar.size >= largest + CLEAN_UP - 1e-9 ||
      (Math.abs(bar.size - largest) <= 1e-6 && covered(part, asDrawn, bar.size));
    if (covers)
      options.push({
        shape: 'round',
        size: bar.size,
        radius: bar.size / 2,
        bar,
        asDrawn,
        text: `${words.length(bar.size)} round`,
      });
    if (options.length === 2) break;
  }
  if (options.length > 0) return { options };
  const size = largest + CLEAN_UP;
  const others = register.bars
    .filter((b) => b.shape === 'round' && b.quantity > 0 && b.size >= size)
    .map((b) => materialName(b.material));
  const biggest = bars.filter((b) => b.shape === 'round').at(-1);
  return {
    options: [
      {
        shape: 'round',
        size,
        radius: size / 2,
        asDrawn: [],
        text: `round of ${words.length(size)} or the next size up`,
      },
    ],
    short: {
      need: `round bar of ${materialName(material)}, Ø${words.length(size)} at least`,
      why: biggest
        ? `The largest round bar of it in the rack is Ø${words.length(biggest.size)}.`
        : 'The rack has no round bar of this material.',
      alternatives: [
        `buy Ø${words.length(size)} or the next size up`,
        ...(others.length > 0
          ? [`another material that is in the rack: ${[...new Set(others)].slice(0, 3).join(', ')}`]
          : []),
      ],
    },
  };
}

/** Every length that stands at the bar's own radius keeps its surface. */
function covered(part: Part, asDrawn: readonly string[], size: number): boolean {
  return part.features
    .filter((f) => f.kind === 'cylinder')
    .filter((f) => f.diameter > size - CLEAN_UP + 1e-9)
    .every((f) => asDrawn.includes(f.id));
}
