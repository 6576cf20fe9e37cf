import { applyRemoval, removedVolume } from '../../shared/part/apply';
import type { Piece } from '../../shared/part/body';
import { smallestRadius } from '../../shared/part/generator';
import type { Part } from '../../shared/part/part';
import type { Removal } from '../../shared/part/removal';
import { differences } from '../../shared/part/same-metal';
import { volume, volumeBetween } from '../../shared/part/volume';
import type { Operation, Route, SetUp } from '../../shared/route/route';
import { SIDE_METHODS } from '../../shared/route/rules';
import type { RuleId } from '../../shared/route/rules';

/** A route spoiled in one way: what was done, and by which rules it must be refused (any, where none is named). */
export interface Spoiled {
  text: string;
  route: Route;
}
export interface Sabotage {
  id: string;
  expected: readonly RuleId[];
  mutations: (route: Route, part: Part) => Spoiled[];
}

/**
 * The route with its bookkeeping done again, honestly: numbers, waits, what each cut removes, stages, volumes.
 * So a mutation has to be found by what it does at the bench, not by a sum that no longer agrees.
 */
export function restate(route: Route, part: Part): Route {
  const numbers = new Map(route.operations.map((operation, index) => [operation.number, index + 1]));
  let stage = route.blank;
  const stages: Route['stages'][number][] = [{ after: 0, body: stage }];
  const volumes = { blank: volume(stage), removed: 0, kerf: 0, remnant: 0, part: volume(part.body) };
  const operations = route.operations.map((operation, index): Operation => {
    const { cut } = operation;
    let removes = 0;
    try {
      if (cut?.kind === 'sever') {
        const kerf = volumeBetween(stage, cut.kerfFrom, cut.kerfTo);
        volumes.kerf += kerf;
        volumes.remnant += volume(stage) - volumeBetween(stage, cut.from, cut.to) - kerf;
      } else if (cut) removes = removedVolume(stage, cut);
      if (cut) stage = applyRemoval(stage, cut);
    } catch {
      removes = 0; // nothing is there to cut: the simulator has to say so
    }
    volumes.removed += removes;
    stages.push({ after: index + 1, body: stage });
    const after = operation.after
      .map((edge) => ({ ...edge, operation: numbers.get(edge.operation) ?? 0 }))
      .filter((edge) => edge.operation > 0);
    return { ...operation, number: index + 1, after, removes };
  });
  return { ...route, operations, stages, volumes };
}

type Change = (operation: Operation) => Operation | null;

/** One spoiled route for each operation that the change has something to do to. */
function each(route: Route, part: Part, change: Change, honest = true): Spoiled[] {
  return route.operations.flatMap((operation, index) => {
    const changed = change(operation);
    if (!changed) return [];
    const operations = route.operations.map((old, i) => (i === index ? changed : old));
    const spoiled = { ...route, operations };
    return [
      {
        text: `operation ${operation.number}, ${operation.title}`,
        route: honest ? restate(spoiled, part) : spoiled,
      },
    ];
  });
}

function eachSetUp(route: Route, change: (setup: SetUp) => SetUp | null): Spoiled[] {
  return route.setups.flatMap((setup, index) => {
    const changed = change(setup);
    if (!changed || !isHeld(route, setup)) return [];
    return [
      {
        text: `set-up ${setup.id}`,
        route: { ...route, setups: route.setups.map((old, i) => (i === index ? changed : old)) },
      },
    ];
  });
}

function isHeld(route: Route, setup: SetUp): boolean {
  return route.operations.some(
    (operation) => operation.setup === setup.id && operation.cut && operation.method !== 'saw',
  );
}

function shifted(cut: Removal | undefined, by: number): Removal | null {
  if (cut?.kind === 'outer') {
    const lower = (piece: Piece): Piece =>
      piece.kind === 'line'
        ? { ...piece, start: Math.max(0, piece.start - by), end: Math.max(0, piece.end - by) }
        : { ...piece, centreR: piece.centreR - by };
    return { ...cut, envelope: cut.envelope.map(lower) };
  }
  if (cut?.kind === 'cut' && cut.cut.kind === 'flats')
    return { ...cut, cut: { ...cut.cut, distance: cut.cut.distance - by } };
  return null;
}

const isFinishing = (operation: Operation): boolean =>
  operation.method !== 'rough-turn' && operation.cut !== undefined;

function withCut(by: number): Change {
  return (operation) => {
    // A groove in what is parted off names no feature, and its depth is nobody's size.
    if (!isFinishing(operation) || operation.features.length === 0) return null;
    const cut = shifted(operation.cut, by);
    return cut && { ...operation, cut };
  };
}

function dropped(route: Route, part: Part, which: (operation: Operation) => boolean): Spoiled[] {
  return route.operations.filter(which).map((gone) => ({
    text: `operation ${gone.number}, ${gone.title}`,
    route: restate(
      { ...route, operations: route.operations.filter((operation) => operation !== gone) },
      part,
    ),
  }));
}

/** Neighbours of which the later waits for the earlier, swapped; the wait itself is struck out. */
function swapped(route: Route, part: Part): Spoiled[] {
  return route.operations.flatMap((later, index) => {
    const earlier = route.operations[index - 1];
    if (!earlier || !later.after.some((edge) => edge.operation === earlier.number)) return [];
    const free = { ...later, after: later.after.filter((edge) => edge.operation !== earlier.number) };
    const operations = [
      ...route.operations.slice(0, index - 1),
      free,
      earlier,
      ...route.operations.slice(index + 1),
    ];
    const rules = later.after.filter((edge) => edge.operation === earlier.number).map((edge) => edge.rule);
    return [
      {
        text: `${later.title} before ${earlier.title} (${rules.join(', ')})`,
        route: restate({ ...route, operations }, part),
      },
    ];
  });
}

function partedEarly(route: Route, part: Part): Spoiled[] {
  return route.operations.flatMap((operation, index) => {
    const before = route.operations[index - 1];
    if (operation.method !== 'part-off' || !before?.cut || before.setup !== operation.setup) return [];
    if (!route.operations.slice(index + 1).every((later) => later.setup !== operation.setup || !later.cut))
      return [];
    const operations = [...route.operations];
    operations.splice(index - 1, 2, { ...operation, after: [] }, before);
    return [
      { text: `${operation.title} before ${before.title}`, route: restate({ ...route, operations }, part) },
    ];
  });
}

function stopMoved(move: (stop: Operation['stops'][number]) => Operation['stops'][number]): Change {
  return (operation) => {
    const [first, ...rest] = operation.stops;
    return first && operation.cut ? { ...operation, stops: [move(first), ...rest] } : null;
  };
}

function otherFeature(part: Part): Change {
  return (operation) => {
    const own = part.features.find((feature) => feature.id === operation.features[0]);
    if (!operation.cut || !own || operation.method === 'rough-turn') return null;
    const other =
      part.features.find((feature) => feature.kind === own.kind && feature.id !== own.id) ??
      part.features.find((feature) => feature.kind !== own.kind);
    return other ? { ...operation, features: [other.id, ...operation.features.slice(1)] } : null;
  };
}

/** True where a sideways cut of the set-up reaches out more than three of the smallest diameters on the way, by a plain look at the stages. */
function standsOut(route: Route, setup: SetUp): boolean {
  return route.operations.some((operation, index) => {
    const before = route.stages[index]?.body;
    const after = route.stages[index + 1]?.body;
    const sideways = (SIDE_METHODS as readonly string[]).includes(operation.method);
    if (operation.setup !== setup.id || !before || !after || !sideways) return false;
    const cut = differences(before, after);
    const right = setup.freeEnd === 'right';
    const edge = right ? Math.max(setup.gripFrom, setup.gripTo) : Math.min(setup.gripFrom, setup.gripTo);
    const far = right
      ? Math.max(edge, ...cut.map((span) => span.to))
      : Math.min(edge, ...cut.map((span) => span.from));
    const [from, to] = right ? [edge, far] : [far, edge];
    return to > from && to - from > 3.05 * 2 * smallestRadius(before.outer, from, to);
  });
}

export const SABOTAGES: readonly Sabotage[] = [
  {
    id: 'drop-cut',
    expected: [],
    mutations: (route, part) => dropped(route, part, (o) => o.cut !== undefined),
  },
  {
    id: 'drop-event',
    expected: ['grip-first', 'edges-last', 'inspect-last', 'fit-before-inspect'],
    mutations: (route, part) => {
      const needed = (o: Operation): boolean =>
        (['deburr', 'grip', 'turn-round', 'fit-check'].includes(o.method) ||
          o === route.operations[route.operations.length - 1]) &&
        route.operations.filter((other) => other.method === o.method && other.setup === o.setup).length ===
          1 &&
        (isHeld(route, route.setups.find((setup) => setup.id === o.setup) ?? ({} as SetUp)) ||
          o.method !== 'grip');
      return dropped(route, part, needed);
    },
  },
  { id: 'swap-with-reason', expected: [], mutations: swapped },
  {
    id: 'too-deep',
    expected: ['not-below-part', 'named-features'],
    mutations: (route, part) => each(route, part, withCut(0.1)),
  },
  {
    id: 'too-shallow',
    expected: ['stage-is-part', 'named-features'],
    mutations: (route, part) => each(route, part, withCut(-0.1)),
  },
  {
    id: 'wrong-end',
    expected: ['free-end-only'],
    mutations: (route, part) =>
      each(route, part, (o) =>
        o.cut && (o.end === 'left' || o.end === 'right')
          ? { ...o, end: o.end === 'left' ? 'right' : 'left' }
          : null,
      ),
  },
  {
    id: 'set-up-turned',
    expected: ['free-end-only', 'grip-behind'],
    mutations: (route) =>
      eachSetUp(route, (s) =>
        s.freeEnd === 'left' || s.freeEnd === 'right'
          ? { ...s, freeEnd: s.freeEnd === 'left' ? 'right' : 'left' }
          : null,
      ),
  },
  {
    id: 'grip-on-thread',
    expected: ['grip-plain', 'grip-uncut', 'free-end-only'],
    mutations: (route, part) => {
      const thread = part.features.find((feature) => feature.kind === 'thread');
      if (thread?.kind !== 'thread') return [];
      const cut = route.operations.findIndex((operation) => operation.method.startsWith('thread-'));
      const lasts = (s: SetUp): boolean =>
        route.operations.some(
          (operation, index) => operation.setup === s.id && operation.cut && index >= cut,
        );
      return eachSetUp(route, (s) =>
        cut >= 0 && lasts(s) ? { ...s, gripFrom: thread.from, gripTo: thread.to } : null,
      );
    },
  },
  {
    id: 'grip-two',
    expected: ['grip-length'],
    mutations: (route) =>
      eachSetUp(route, (s) =>
        s.freeEnd === 'left' ? { ...s, gripTo: s.gripFrom + 2 } : { ...s, gripFrom: s.gripTo - 2 },
      ),
  },
  {
    id: 'grip-in-air',
    expected: ['grip-metal'],
    mutations: (route) =>
      eachSetUp(route, (s) => ({ ...s, gripFrom: s.gripFrom - 1000, gripTo: s.gripTo - 1000 })),
  },
  { id: 'part-early', expected: ['part-last', 'grip-metal'], mutations: partedEarly },
  {
    id: 'no-support',
    expected: ['support-overhang', 'support-bend'],
    mutations: (route) =>
      eachSetUp(route, (s) => (s.support && standsOut(route, s) ? { ...s, support: undefined } : null)),
  },
  {
    id: 'no-centre-hole',
    expected: ['centre-before-support'],
    mutations: (route, part) =>
      dropped(
        route,
        part,
        (o) =>
          o.method === 'centre-drill' && route.setups.some((s) => s.id === o.setup && s.support === 'centre'),
      ),
  },
  {
    id: 'stop-length',
    expected: ['figures-fit'],
    mutations: (route, part) =>
      each(
        route,
        part,
        stopMoved((stop) => ({ ...stop, length: stop.length + 1 })),
      ),
  },
  {
    id: 'stop-reaches',
    expected: ['figures-fit'],
    mutations: (route, part) =>
      each(
        route,
        part,
        stopMoved((stop) => {
          const further = Math.sign(stop.toX - stop.fromX) || 1;
          return { ...stop, toX: stop.toX + further * 0.37, length: stop.length + 0.37 };
        }),
      ),
  },
  {
    id: 'stop-starts',
    expected: ['stop-from-face'],
    mutations: (route, part) =>
      each(
        route,
        part,
        stopMoved((stop) => {
          const away = Math.sign(stop.fromX - stop.toX) || 1;
          return { ...stop, fromX: stop.fromX + away * 0.37, length: stop.length + 0.37 };
        }),
      ),
  },
  {
    id: 'wrong-feature',
    expected: ['named-features', 'finished-once'],
    mutations: (route, part) => each(route, part, otherFeature(part)),
  },
  {
    id: 'wrong-angle',
    expected: ['figures-fit'],
    mutations: (route, part) =>
      each(route, part, (o) => (o.halfAngle === undefined ? null : { ...o, halfAngle: o.halfAngle * 2 })),
  },
  {
    id: 'wrong-faces',
    expected: ['figures-fit'],
    mutations: (route, part) =>
      each(route, part, (o) => (o.faces === undefined ? null : { ...o, faces: o.faces - 1 })),
  },
  {
    id: 'wrong-depth',
    expected: ['figures-fit'],
    mutations: (route, part) =>
      each(route, part, (o) => (o.depth === undefined ? null : { ...o, depth: o.depth + 0.05 })),
  },
  {
    id: 'too-few-passes',
    expected: ['figures-fit'],
    mutations: (route, part) =>
      each(route, part, (o) =>
        ['rough-turn', 'turn', 'taper-turn', 'face', 'mill-flat'].includes(o.method) && o.cut
          ? { ...o, depthOfCut: 0.01, passes: 1 }
          : null,
      ),
  },
  {
    id: 'no-speed',
    expected: ['figures-fit'],
    mutations: (route, part) =>
      each(route, part, (o) => (o.method === 'turn' || o.method === 'mill-flat' ? { ...o, speed: 0 } : null)),
  },
  {
    id: 'removes-off',
    expected: ['removes-metal'],
    mutations: (route, part) =>
      each(route, part, (o) => (o.removes > 0 ? { ...o, removes: o.removes * 1.0001 } : null), false),
  },
  {
    id: 'removes-nothing-said',
    expected: ['removes-metal'],
    mutations: (route, part) =>
      each(route, part, (o) => (o.removes > 0 ? { ...o, removes: 0 } : null), false),
  },
  {
    id: 'stage-of-another',
    expected: ['stages-recorded'],
    mutations: (route) =>
      route.stages.slice(1).flatMap((stage, index) => {
        const before = route.stages[index];
        const operation = route.operations.find((each) => each.number === stage.after);
        if (!before || !operation?.cut) return [];
        const stages = route.stages.map((old) => (old === stage ? { ...stage, body: before.body } : old));
        return [{ text: `stage ${stage.after}`, route: { ...route, stages } }];
      }),
  },
  {
    id: 'volumes-off',
    expected: ['volumes-balance'],
    mutations: (route) =>
      (['blank', 'removed', 'kerf', 'remnant', 'part'] as const).map((name) => ({
        text: name,
        route: {
          ...route,
          volumes: { ...route.volumes, [name]: route.volumes[name] + 1e-3 * route.volumes.blank },
        },
      })),
  },
];
