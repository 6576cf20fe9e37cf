import { materialById, defaultMaterial } from '../standards/materials';
import type { Material } from '../standards/materials';
import { cuttingSpeed, spindleSpeed, surfaceSpeed } from '../standards/speeds';
import type { CuttingOperation } from '../standards/speeds';
import { drillFeed, feedPerTooth, partingFeed, tableFeed, turningFeed } from '../standards/feeds';
import type { Build, DraftOperation } from './draft';
import type { Method } from './route';
import { LIMITS } from './rules';
import { nearestFeed, nearestSpeed } from './shop';

export interface Rates {
  speed: number;
  surfaceSpeed: number;
  feed: number;
  feedPer: 'rev' | 'min';
  minutes: number;
  /** Where the figures come from, in words. */
  how: string;
}

const CUTTING: Partial<Record<Method, CuttingOperation>> = {
  face: 'facing',
  'centre-drill': 'centre-drilling',
  'rough-turn': 'turning',
  turn: 'finishing',
  'taper-turn': 'finishing',
  'form-turn': 'form-turning',
  groove: 'grooving',
  chamfer: 'chamfering',
  'thread-die': 'die-threading',
  'thread-single-point': 'thread-cutting',
  knurl: 'knurling',
  'mill-flat': 'milling',
  'part-off': 'parting',
};

export function materialOf(id: string): Material {
  return materialById(id) ?? defaultMaterial();
}

/**
 * Speed, feed and minutes of an operation: the tabled surface speed at the diameter, the machine's nearest rpm not
 * above it (nor above what the hold may turn), the machine's nearest feed; minutes = travel / (feed · rpm) × passes + handling.
 */
export function ratesFor(build: Build, operation: DraftOperation, maximumSpeed: number): Rates {
  const { figures, method } = operation;
  const kind = CUTTING[method];
  if (!figures || !kind)
    return {
      speed: 0,
      surfaceSpeed: 0,
      feed: 0,
      feedPer: 'rev',
      minutes: operation.handling,
      how: `${operation.handling} min by hand.`,
    };
  const material = materialOf(build.stock.material);
  const plunges = operation.toolFigures['reach'] !== undefined && method !== 'part-off';
  const wantedSpeed = cuttingSpeed(material, operation.toolMaterial, plunges ? 'grooving' : kind);
  const wanted = spindleSpeed(wantedSpeed, Math.max(figures.diameter, 1));
  const milling = method === 'mill-flat';
  const speeds = milling ? (build.mill?.speeds ?? []) : build.lathe.speeds;
  const strong = milling
    ? Infinity
    : spindleSpeed(speedForPower(build, material, figures, method), Math.max(figures.diameter, 1));
  const speed = nearestSpeed(
    speeds.length > 0 ? speeds : [Math.floor(wanted)],
    Math.min(wanted, maximumSpeed, strong, method === 'thread-die' ? DIE_SPEED : Infinity),
  );
  const { feed, feedPer } = feedFor(build, operation, material, speed, milling);
  const perMinute = feedPer === 'min' ? feed : feed * Math.max(speed, 1);
  const sides = milling ? (operation.faces ?? 1) : 1;
  // Every pass travels back as well, at the hand's or the machine's quick pace.
  const coarse =
    method === 'taper-turn' || (method === 'face' && figures.depth > LIMITS.lightDepth.value)
      ? Math.max(1, turningFeed('roughing', material.group) / Math.max(feed, 0.01))
      : 1;
  // On a taper, and on a face that is not cut lightly, all passes but the last are roughing.
  const cutting = (figures.travel / Math.max(perMinute, 1)) * ((figures.passes - 1) / coarse + 1) * sides;
  const back = 0.1 * figures.passes * sides;
  const minutes = cutting + back + operation.handling;
  return {
    speed,
    surfaceSpeed: surfaceSpeed(speed, figures.diameter),
    feed,
    feedPer,
    minutes,
    how: `${round(wantedSpeed)} m/min for ${material.name} (common practice) at Ø${round(figures.diameter)} wants ${Math.round(wanted)} rpm; nearest not above: ${speed}. ${round(figures.travel)} mm × ${figures.passes * sides} at ${round(perMinute)} mm/min, ${round(operation.handling)} min by hand.`,
  };
}

/** Fastest that a lathe turns under a die (rpm): it has to be stopped at the shoulder by hand. Common practice. */
const DIE_SPEED = 60;

/** Share of the motor's power that reaches the cut. Common practice. */
const EFFICIENCY = 0.75;

/** Surface speed (m/min) at which a turning cut takes all the motor gives: P = kc · depth · feed · v / 60 000 (kW). */
function speedForPower(build: Build, material: Material, figures: { depth: number }, method: Method): number {
  if (method !== 'rough-turn' && method !== 'turn' && method !== 'taper-turn') return Infinity;
  const feed = turningFeed(method === 'rough-turn' ? 'roughing' : 'finishing', material.group);
  return (60_000 * build.lathe.powerKw * EFFICIENCY) / (material.kc * Math.max(figures.depth, 0.05) * feed);
}

function feedFor(
  build: Build,
  operation: DraftOperation,
  material: Material,
  speed: number,
  milling: boolean,
): { feed: number; feedPer: 'rev' | 'min' } {
  const { method } = operation;
  // A blade goes straight in, whatever it is called: it takes a blade's feed.
  if (operation.toolFigures['reach'] !== undefined)
    return { feed: partingFeed(material.group), feedPer: 'rev' };
  if (milling) {
    const perTooth = feedPerTooth(operation.figures?.diameter ?? 10, material.group, operation.toolMaterial);
    const wanted = tableFeed(speed, operation.toolFigures['teeth'] ?? 4, perTooth);
    return { feed: nearestFeed(build.mill?.feedsPerMin ?? [wanted], wanted), feedPer: 'min' };
  }
  const lathe = (wanted: number) => ({
    feed: nearestFeed(build.lathe.feeds, wanted),
    feedPer: 'rev' as const,
  });
  switch (method) {
    case 'rough-turn':
      return lathe(turningFeed('roughing', material.group));
    case 'turn':
    case 'taper-turn':
    case 'face':
      return lathe(turningFeed('finishing', material.group));
    case 'thread-die':
    case 'thread-single-point':
      return { feed: operation.pitch ?? 1, feedPer: 'rev' };
    case 'centre-drill':
      return { feed: drillFeed(operation.toolFigures['diameter'] ?? 2, material.group), feedPer: 'rev' };
    default:
      return { feed: partingFeed(material.group), feedPer: 'rev' };
  }
}

function round(value: number): number {
  return Math.round(value * 100) / 100;
}
