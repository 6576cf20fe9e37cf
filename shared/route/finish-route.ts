import type { Body } from '../part/body';
import { applyRemoval, removedVolume } from '../part/apply';
import { volume, volumeBetween } from '../part/volume';
import type { Part } from '../part/part';
import type { Scheme, Size } from '../scheme/scheme';
import { cautionsFor } from './cautions';
import { costOf } from './cost';
import type { Build, DraftOperation } from './draft';
import { ratesFor } from './figures';
import type { Rates } from './figures';
import { instrumentFor, sizesOf } from './inspection';
import { inOrder } from './order';
import type { Bar } from './register';
import type { Need, Operation, Route, Stage, Target, Volumes } from './route';
import type { DraftNeed } from './draft';

/** A plan put in order, with its figures and needs, but its metal not yet measured: what plans are compared by. */
export interface WeighedPlan {
  build: Build;
  ordered: DraftOperation[];
  rates: Map<string, Rates>;
  needs: { key: string; need: DraftNeed }[];
  targets: Map<string, Size[]>;
  setupMinutes: number;
  runMinutes: number;
}

export function weigh(build: Build, scheme: Scheme, whole: readonly DraftNeed[]): WeighedPlan {
  const ordered = inOrder(build.operations);
  const maximum = new Map(build.register.chucks.map((c) => [c.id, c.maximumSpeed]));
  const rates = new Map<string, Rates>();
  for (const operation of ordered) {
    const hold = build.setups.find((s) => s.id === operation.setup)?.holdingItem;
    rates.set(operation.key, ratesFor(build, operation, hold ? (maximum.get(hold) ?? Infinity) : Infinity));
  }
  const targets = sizesOf(ordered, scheme, build.views.right.length);
  for (const operation of ordered)
    if (operation.method === 'inspect')
      targets.set(operation.key, sizesToInspect(ordered, operation, targets, scheme));
  const needs = [
    ...[...whole, ...build.planNeeds].map((need) => ({ key: '', need })),
    ...ordered.flatMap((o) => o.needs.map((need) => ({ key: o.key, need }))),
  ];
  for (const operation of ordered) {
    if (operation.method === 'inspect' && operation.key !== 'final') continue;
    for (const size of targets.get(operation.key) ?? []) {
      const measuring = instrumentFor(build, size);
      if (measuring) needs.push({ key: operation.key, need: measuring.need });
    }
  }
  const setupMinutes = build.setups.reduce((sum, s) => sum + s.minutes, 0);
  const runMinutes = ordered.reduce((sum, o) => sum + (rates.get(o.key)?.minutes ?? 0), 0);
  return { build, ordered, rates, needs, targets, setupMinutes, runMinutes };
}

/** The last check measures every size; one in between what its own set-up brought about. */
function sizesToInspect(
  ordered: readonly DraftOperation[],
  operation: DraftOperation,
  targets: ReadonlyMap<string, Size[]>,
  scheme: Scheme,
): Size[] {
  if (operation.key === 'final') return scheme.sizes.filter((s) => !s.reference);
  return ordered
    .filter((o) => o.setup === operation.setup && o.method !== 'inspect')
    .flatMap((o) => targets.get(o.key) ?? []);
}

/** Needs that say the same thing are one, at the first operation that has it; shorts and makeshifts are never dropped. */
export function needList(plan: WeighedPlan): Need[] {
  const numbers = new Map(plan.ordered.map((o, i) => [o.key, i + 1]));
  const seen = new Set<string>();
  const list: Need[] = [];
  for (const { key, need } of plan.needs) {
    const id = `${need.kind}|${need.need}|${need.state}`;
    if (seen.has(id)) continue;
    seen.add(id);
    list.push({ operation: numbers.get(key) ?? 0, ...need });
  }
  return list;
}

export interface RouteExtras {
  part: Part;
  scheme: Scheme;
  bar: Bar | undefined;
  quantity: number;
  others: Route['others'];
}

/** The whole route of a weighed plan: metal replayed stage by stage, volumes, targets, cautions, kitting, cost. */
export function finishRoute(plan: WeighedPlan, extras: RouteExtras): Route {
  const { build, ordered } = plan;
  const numbers = new Map(ordered.map((o, i) => [o.key, i + 1]));
  const stages: Stage[] = [{ after: 0, body: build.blank }];
  const volumes: Volumes = { blank: volume(build.blank), removed: 0, kerf: 0, remnant: 0, part: 0 };
  let stage: Body = build.blank;
  const operations: Operation[] = [];
  const firstOf = new Set(build.setups.map((s) => ordered.find((o) => o.setup === s.id)?.key));
  for (const [index, draft] of ordered.entries()) {
    const number = index + 1;
    const removes = draft.cut ? removedVolume(stage, draft.cut) : 0;
    volumes.removed += removes;
    if (draft.cut?.kind === 'sever') {
      const { kerfFrom, kerfTo, from, to } = draft.cut;
      volumes.kerf += volumeBetween(stage, kerfFrom, kerfTo);
      volumes.remnant +=
        volumeBetween(stage, stage.x0, Math.min(kerfFrom, from)) +
        volumeBetween(stage, Math.max(kerfTo, to), stage.x1);
    }
    if (draft.cut) stage = applyRemoval(stage, draft.cut);
    stages.push({ after: number, body: stage });
    operations.push(operationOf(plan, draft, number, numbers, removes, firstOf.has(draft.key)));
  }
  volumes.part = volume(stage);
  const kerf = build.saw?.kerf ?? 2;
  const blankLength = build.blank.x1 - build.blank.x0;
  const stub = stubLength(build, ordered);
  return {
    stock: build.stock,
    blankLength,
    blank: build.blank,
    setups: build.setups.map(({ rocks: _rocks, ...setup }) => setup),
    operations,
    stages,
    volumes,
    minutes: { setup: plan.setupMinutes, run: plan.runMinutes },
    cost: costOf({
      register: build.register,
      operations,
      setupMinutes: plan.setupMinutes,
      runMinutes: plan.runMinutes,
      bar: extras.bar,
      used: blankLength + kerf,
      // A stub is worth keeping when it is long enough to hold again.
      goesBack: stub >= 100 ? stub : 0,
      quantity: extras.quantity,
      words: build.words,
    }),
    kitting: kittingOf(plan, operations, extras),
    others: extras.others,
  };
}

/** Length of bar that is left in the jaws after parting; 0 where nothing is parted. */
function stubLength(build: Build, ordered: readonly DraftOperation[]): number {
  for (const { cut } of ordered) {
    if (cut?.kind !== 'sever') continue;
    return cut.kerfTo <= cut.from + 1e-9 ? cut.kerfFrom - build.blank.x0 : build.blank.x1 - cut.kerfTo;
  }
  return 0;
}

function operationOf(
  plan: WeighedPlan,
  draft: DraftOperation,
  number: number,
  numbers: Map<string, number>,
  removes: number,
  first: boolean,
): Operation {
  const rates = plan.rates.get(draft.key);
  if (!rates) throw new Error(`operation ${draft.key} was not weighed`);
  const setup = plan.build.setups.find((s) => s.id === draft.setup);
  const sizes = plan.targets.get(draft.key) ?? [];
  const measuring = sizes.map((size) => instrumentFor(plan.build, size)?.text).filter((t) => t !== undefined);
  const checks = measuring.length > 0 ? [...new Set(measuring)] : draft.check ? [draft.check] : [];
  const behind = setup ? behindSpindle(plan.build, setup.gripFrom, setup.gripTo, setup.freeEnd) : 0;
  return {
    number,
    title: draft.title,
    method: draft.method,
    setup: draft.setup,
    end: draft.end,
    features: draft.features,
    machine: draft.machine,
    tool: draft.tool || checks[0] || 'by the table of sizes',
    ...(draft.toolItem ? { toolItem: draft.toolItem } : {}),
    speed: rates.speed,
    surfaceSpeed: rates.surfaceSpeed,
    feed: rates.feed,
    feedPer: rates.feedPer,
    depthOfCut: draft.figures?.depth ?? 0,
    passes: draft.figures?.passes ?? 0,
    minutes: rates.minutes,
    removes,
    ...(draft.cut ? { cut: draft.cut } : {}),
    after: draft.after.flatMap(({ key, rule }) => {
      const operation = numbers.get(key);
      return operation === undefined ? [] : [{ operation, rule }];
    }),
    stops: draft.stops.map((s) => ({ ...s, length: Math.abs(s.toX - s.fromX) })),
    target: targetsOf(draft, sizes, plan),
    ...(draft.depth !== undefined ? { depth: draft.depth } : {}),
    ...(draft.faces !== undefined ? { faces: draft.faces } : {}),
    ...(draft.halfAngle !== undefined ? { halfAngle: draft.halfAngle } : {}),
    ...(draft.slantLength !== undefined ? { slantLength: draft.slantLength } : {}),
    ...(draft.settings !== undefined ? { settings: draft.settings } : {}),
    ...(draft.runOut !== undefined ? { runOut: draft.runOut } : {}),
    ...(draft.blank !== undefined ? { blankDiameter: draft.blank.diameter } : {}),
    reasons: draft.reasons,
    ...(draft.notes.length > 0 ? { notes: draft.notes } : {}),
    cautions: cautionsFor(draft, plan.build.register, first, behind),
    check: checks.join('; '),
  };
}

function behindSpindle(build: Build, gripFrom: number, gripTo: number, freeEnd: string): number {
  const behind = freeEnd === 'left' ? build.blank.x1 - gripTo : gripFrom - build.blank.x0;
  return Math.max(0, behind - 450);
}

function targetsOf(draft: DraftOperation, sizes: readonly Size[], plan: WeighedPlan): Target[] {
  const targets = sizes.map((s) => ({
    size: s.id,
    nominal: s.nominal,
    upperLimit: s.upperLimit,
    lowerLimit: s.lowerLimit,
  }));
  if (!draft.blank) return targets;
  const { diameter, upper, lower } = draft.blank;
  // The blank's own target carries the thread's size: the thread itself is the die's.
  const thread = [...plan.targets.values()]
    .flat()
    .find((s) => s.kind === 'thread' && s.features.some((id) => draft.features.includes(id)));
  return [
    { size: thread?.id ?? draft.features[0] ?? '', nominal: diameter, upperLimit: upper, lowerLimit: lower },
    ...targets,
  ];
}

function kittingOf(
  plan: WeighedPlan,
  operations: readonly Operation[],
  extras: RouteExtras,
): Route['kitting'] {
  const { build } = plan;
  const { register, words } = build;
  const list: { item: string; text: string; place: string }[] = [];
  const length = build.blank.x1 - build.blank.x0;
  const size = build.stock.size;
  list.push({
    item: extras.bar?.id ?? '',
    text: `${extras.quantity} × ${words.about(length)} of ${words.length(size)} ${build.stock.shape === 'hex' ? 'hexagon' : build.stock.shape}`,
    place: extras.bar?.place ?? 'to be bought',
  });
  const seen = new Set<string>();
  const items = [
    ...register.chucks,
    ...register.colletSets,
    ...register.colletBlocks,
    ...register.dividingHeads,
    ...register.tools,
    ...register.instruments,
  ];
  const pull = (id: string | undefined): void => {
    if (!id || seen.has(id)) return;
    const found = items.find((i) => i.id === id);
    if (!found) return;
    seen.add(id);
    list.push({ item: id, text: found.name, place: found.place });
  };
  for (const setup of build.setups) pull(setup.holdingItem);
  for (const operation of operations) pull(operation.toolItem);
  for (const { need } of plan.needs)
    if (need.kind === 'tool' || need.kind === 'instrument' || need.kind === 'holder') pull(need.by);
  return list;
}
