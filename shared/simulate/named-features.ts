import { radiusAt, smallestRadius } from '../part/generator';
import { unequalSpans } from '../part/same-metal';
import type { Feature, FeatureKind, Part } from '../part/part';
import type { Fault, Method, Route } from '../route/route';
import { fault } from './fault';
import { EVENTS } from './replay';
import type { Step } from './replay';

/** Kinds of feature a method may be about. Absent: any. */
const ABOUT: Partial<Record<Method, readonly FeatureKind[]>> = {
  face: ['face'],
  turn: ['cylinder', 'groove', 'thread'],
  groove: ['cylinder', 'groove'],
  'taper-turn': ['cone'],
  'form-turn': ['crown'],
  chamfer: ['chamfer'],
  'thread-die': ['thread'],
  'thread-single-point': ['thread'],
  'mill-flat': ['flats'],
};

/** Every operation names what it changes, and each feature is finished by exactly one. */
export function judgeFeatures(route: Route, part: Part, steps: readonly Step[]): Fault[] {
  return [...steps.flatMap(namedFaults), ...finishedFaults(route, part, steps)];
}

function namedFaults(step: Step): Fault[] {
  const { operation, part, changes } = step;
  const number = operation.number;
  const faults: Fault[] = [];
  const named: Feature[] = [];
  for (const id of operation.features) {
    const feature = part.features.find((each) => asNamed(each, step.flipped) === id);
    if (feature) named.push(feature);
    else faults.push(fault('named-features', number, `The part has no feature called ${id}.`));
  }
  if (EVENTS.has(operation.method) || changes.length === 0) return faults;
  const about = ABOUT[operation.method];
  // A groove beside the part, in metal that is parted off, is the work of no feature.
  const waste = changes.every((change) => change.to <= 1e-6 || change.from >= part.length - 1e-6);
  if (
    about &&
    !(waste && operation.method === 'groove') &&
    !named.some((feature) => about.includes(feature.kind))
  )
    faults.push(
      fault('named-features', number, `Nothing that is named can be the work of ${operation.method}.`),
    );
  for (const feature of named) {
    if (about && !about.includes(feature.kind) && feature.kind !== 'face')
      faults.push(fault('named-features', number, `${feature.id} is not the work of ${operation.method}.`));
    else if (!touches(step, feature))
      faults.push(fault('named-features', number, `No metal of ${feature.id} is cut here.`));
  }
  return faults;
}

function asNamed(feature: Feature, flipped: boolean): string {
  if (feature.kind !== 'face' || !flipped) return feature.id;
  return feature.id === 'left-face' ? 'right-face' : 'left-face';
}

function touches(step: Step, feature: Feature): boolean {
  if (feature.kind === 'face') {
    const side = feature.id === 'right-face' ? 'right-end' : 'left-end';
    return step.changes.some((change) => change.kind === side);
  }
  if (feature.kind === 'centre-hole') return step.changes.some((change) => change.kind === 'inner');
  // A roughing cut for an end feature may stop short of it along the axis: the whole end counts.
  const from = feature.kind === 'flats' ? Math.min(feature.runOutFrom, feature.from) : feature.from;
  const to = feature.kind === 'flats' ? Math.max(feature.runOutTo, feature.to) : feature.to;
  return step.changes.some((change) => change.from < to - 1e-6 && change.to > from + 1e-6);
}

function finishedFaults(route: Route, part: Part, steps: readonly Step[]): Fault[] {
  const faults: Fault[] = [];
  for (const feature of part.features) {
    const by = finishers(feature, steps);
    const once = feature.kind === 'face' || feature.kind === 'cylinder' ? by.length >= 1 : by.length === 1;
    if (once || by.length === 0 ? once || !needsWork(feature, route, part) : false) {
      faults.push(...unfinished(feature, by[by.length - 1]));
      continue;
    }
    const message =
      by.length === 0 ? `${feature.id} is never finished.` : `${feature.id} is finished ${by.length} times.`;
    faults.push(fault('finished-once', by[1]?.operation.number ?? 0, message));
  }
  return faults;
}

function finishers(feature: Feature, steps: readonly Step[]): Step[] {
  return steps.filter(({ operation, flipped, changes }) => {
    if (changes.length === 0 || operation.method === 'rough-turn') return false;
    const id = flipped && feature.kind === 'face' ? feature.id : feature.id;
    const about = ABOUT[operation.method] ?? [];
    const parts = feature.kind === 'face' && operation.method === 'part-off';
    return (
      (about.includes(feature.kind) || parts || isHole(feature, operation.method)) &&
      operation.features.includes(id)
    );
  });
}

function isHole(feature: Feature, method: Method): boolean {
  return feature.kind === 'centre-hole' && method === 'centre-drill';
}

/** Surfaces the bar already has need no cut: a face never, a cylinder where the blank has its radius. */
function needsWork(feature: Feature, route: Route, part: Part): boolean {
  if (feature.kind !== 'cylinder') return true;
  const from = Math.max(feature.from, 0);
  const to = Math.min(feature.to, part.length);
  return smallestRadius(route.blank.outer, from, to) > feature.diameter / 2 + 1e-6;
}

/** After its own operation a turned surface is the part's, but for what is cut on it later. */
function unfinished(feature: Feature, last: Step | undefined): Fault[] {
  if (!last || (feature.kind !== 'cylinder' && feature.kind !== 'cone')) return [];
  const seen = last.part.features.find((each) => each.id === feature.id);
  if (!seen || seen.kind === 'face') return [];
  const later = last.part.features.filter((each) => each.kind === 'chamfer' || each.kind === 'crown');
  const clear = later.reduce<{ from: number; to: number }>(
    (span, end) => {
      if (end.from <= span.from + 1e-6) return { ...span, from: Math.max(span.from, end.to) };
      return end.to >= span.to - 1e-6 ? { ...span, to: Math.min(span.to, end.from) } : span;
    },
    { from: seen.from, to: seen.to },
  );
  if (clear.to <= clear.from) return [];
  const middle = (clear.from + clear.to) / 2;
  if (unequalSpans(last.after.outer, last.part.body.outer, clear.from, clear.to).length === 0) return [];
  return [
    fault(
      'named-features',
      last.operation.number,
      `${feature.id} is not at its size after this: ${2 * radiusAt(last.after.outer, middle)} mm across its middle.`,
    ),
  ];
}
