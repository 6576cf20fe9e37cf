import { largestRadius, radiusAt, smallestRadius } from '../part/generator';
import { unequalSpans } from '../part/same-metal';
import type { ChamferFeature, Feature, Part } from '../part/part';
import type { Fault, Method, Operation } from '../route/route';
import { LIMITS } from '../route/rules';
import type { RuleId } from '../route/rules';
import { facesMade } from './datum';
import { fault, mm } from './fault';
import type { Step } from './replay';

/** Cuts that leave a finished surface. */
const FINISHING: readonly Method[] = ['turn', 'taper-turn', 'form-turn', 'chamfer', 'groove', 'thread-die', 'thread-single-point', 'knurl']; // prettier-ignore
/** Cuts that need the free end faced before them. */
const FROM_A_FACE: readonly Method[] = ['centre-drill', 'drill', 'chamfer', 'form-turn', 'thread-die', 'thread-single-point', 'mill-flat']; // prettier-ignore

/** Order judged by the state of the metal, not by the list: what must be there before a cut is there. */
export function judgeTechnology(steps: readonly Step[]): Fault[] {
  const faults: Fault[] = [];
  const made: number[] = [];
  for (const [index, step] of steps.entries()) {
    if (step.changes.length > 0) {
      const say = (rule: RuleId, message: string): void =>
        void faults.push(fault(rule, step.operation.number, message));
      judgeFace(step, made, say);
      judgeRoughing(step, steps.slice(0, index), say);
      judgeFinishedThreads(step, say);
      judgeEndForms(step, say);
      judgeFlats(step, steps.slice(index + 1), say);
    }
    made.push(...facesMade(step));
  }
  return faults;
}

type Say = (rule: RuleId, message: string) => void;

function judgeFace(step: Step, made: readonly number[], say: Say): void {
  const { operation, before } = step;
  if (!FROM_A_FACE.includes(operation.method) || step.setup.freeEnd === 'both') return;
  if (made.some((x) => Math.abs(step.place(x) - before.x1) < 1e-6)) return;
  say(
    operation.method === 'centre-drill' ? 'face-before-centre' : 'datum-first',
    'The free end has not been faced yet.',
  );
}

function judgeRoughing(step: Step, before: readonly Step[], say: Say): void {
  if (step.operation.method !== 'rough-turn') return;
  const here = before.filter((each) => each.setup.id === step.setup.id && each.changes.length > 0);
  const finished = here.find((each) => FINISHING.includes(each.operation.method));
  if (finished)
    say(
      'rough-before-finish',
      `Operation ${finished.operation.number} has finished a surface in this set-up already.`,
    );
  const smaller = here.find((each) => each.operation.method === 'rough-turn' && isWeakerBeside(each, step));
  if (smaller)
    say('rough-large-first', `Operation ${smaller.operation.number} has roughed a smaller diameter already.`);
}

/** True where `earlier` has gone to a smaller diameter, unless a collar parts it from this cut on the free side. */
function isWeakerBeside(earlier: Step, step: Step): boolean {
  const done = roughed(earlier);
  const now = roughed(step);
  if (!done || !now || done.radius >= now.radius - 1e-6) return false;
  return (
    done.from < now.to - 1e-6 || largestRadius(step.before.outer, now.to, done.from) <= now.radius + 1e-6
  );
}

function roughed(step: Step): { from: number; to: number; radius: number } | null {
  const spans = step.changes.filter((change) => change.kind === 'outer');
  if (spans.length === 0) return null;
  return {
    from: Math.min(...spans.map((span) => span.from)),
    to: Math.max(...spans.map((span) => span.to)),
    radius: Math.min(...spans.map((span) => smallestRadius(step.after.outer, span.from, span.to))),
  };
}

function judgeFinishedThreads(step: Step, say: Say): void {
  const { before, part, operation } = step;
  for (const change of step.changes) {
    if (change.kind === 'outer' || change.kind === 'flats')
      for (const treatment of before.treatments)
        if (treatment.from < change.to - 1e-6 && treatment.to > change.from + 1e-6)
          say(
            'nothing-after-finish',
            `The finished ${treatment.kind} from ${mm(treatment.from)} to ${mm(treatment.to)} is cut into.`,
          );
    if (change.kind === 'thread' && change.treatment?.kind === 'thread' && !change.treatment.internal)
      judgeThreadBlank(step, change.treatment, part, operation, say);
  }
}

/** The stage is the part over the thread and beside it, and the tool has somewhere to come out. */
function judgeThreadBlank(
  step: Step,
  thread: { from: number; to: number; major: number; pitch: number },
  part: Part,
  operation: Operation,
  say: Say,
): void {
  const { before } = step;
  const from = Math.max(thread.from, 0);
  const to = Math.min(thread.to, part.length);
  for (const span of unequalSpans(before.outer, part.body.outer, from, to)) {
    const chamfer = part.features.find(
      (f) => f.kind === 'chamfer' && f.from < span.to - 1e-6 && f.to > span.from + 1e-6,
    );
    const onlyThere =
      chamfer &&
      chamfer.kind === 'chamfer' &&
      span.from >= chamfer.from - 1e-6 &&
      span.to <= chamfer.to + 1e-6;
    say(
      onlyThere ? 'chamfer-before-thread' : 'blank-before-thread',
      `The blank is not the part's from ${mm(span.from)} to ${mm(span.to)}.`,
    );
  }
  if (thread.to >= part.length - 1e-6 && before.x1 > part.length + 1e-6)
    say('trim-before-end-form', 'The end is not to length before its thread is cut.');
  for (const side of ['left', 'right'] as const) {
    const x = side === 'left' ? thread.from : thread.to;
    const beside = side === 'left' ? x - 1e-5 : x + 1e-5;
    if (beside <= 0 || beside >= part.length) continue;
    const wanted = radiusAt(part.body.outer, beside);
    if (wanted < thread.major / 2 - 1e-6 && radiusAt(before.outer, beside) > wanted + 1e-6)
      say('relief-before-thread', `The smaller diameter beside the thread at ${mm(x)} is not there yet.`);
    // A run-out said on the card is room to draw the tool out, and no more than the thread itself.
    const said = operation.runOut ?? 0;
    const stated = said >= LIMITS.threadExit.value * thread.pitch - 1e-9 && said < thread.to - thread.from;
    if (
      side === 'left' &&
      operation.method === 'thread-single-point' &&
      wanted > thread.major / 2 + 1e-6 &&
      !stated
    )
      say(
        'thread-run-out',
        `The thread ends against a shoulder at ${mm(x)} with neither relief nor run-out.`,
      );
  }
}

function judgeEndForms(step: Step, say: Say): void {
  const { operation, part, before } = step;
  for (const id of operation.features) {
    const feature = part.features.find((each) => each.id === id);
    if (feature?.kind === 'chamfer' && operation.method === 'chamfer') judgeChamfer(step, feature, say);
    if (feature?.kind === 'crown' && operation.method === 'form-turn') {
      if (before.x1 > part.length + 1e-6)
        say('trim-before-end-form', 'The end is not to length before its crown is cut.');
      const beside = feature.from - 1e-4;
      if (beside > 0 && Math.abs(radiusAt(before.outer, beside) - radiusAt(part.body.outer, beside)) > 1e-6)
        say('taper-before-crown', 'The surface that the crown meets is not at its size yet.');
    }
  }
}

function judgeChamfer(step: Step, chamfer: ChamferFeature, say: Say): void {
  const { part, before } = step;
  const atEnd = chamfer.end === 'right' && Math.abs(chamfer.to - part.length) < 1e-6;
  if (atEnd && before.x1 > part.length + 1e-6)
    say('trim-before-end-form', 'The end is not to length before its chamfer is cut.');
  // The tool comes at the edge from the air beside it: the face, the smaller neighbour or a groove is there.
  const beside = chamfer.end === 'right' ? chamfer.to + 1e-5 : chamfer.from - 1e-5;
  const small = radiusAt(
    part.body.outer,
    chamfer.end === 'right' ? chamfer.to : chamfer.from,
    chamfer.end === 'right' ? 'left' : 'right',
  );
  if (beside > before.x0 && beside < before.x1 && radiusAt(before.outer, beside) > small + 1e-6)
    say('way-in', 'The chamfer has no edge yet: metal still stands beside it.');
  const on = part.features.find((each) => each.id === chamfer.on);
  if (!on || on.kind === 'face') return;
  const ends = endForms(part);
  const raw = unequalSpans(before.outer, part.body.outer, Math.max(0, on.from), Math.min(part.length, on.to));
  const unturned = raw.filter((span) => !isCovered(span, ends));
  if (unturned.length > 0)
    say('row-before-chamfer', `${chamfer.on} is not at its size before its chamfer is cut.`);
}

/** Flats are set from the turned round, and come before a taper or crown that trims them. */
function judgeFlats(step: Step, later: readonly Step[], say: Say): void {
  const { operation, part, before } = step;
  const flats = operation.features
    .map((id) => part.features.find((each) => each.id === id))
    .filter((each): each is Extract<Feature, { kind: 'flats' }> => each?.kind === 'flats');
  if (operation.method === 'mill-flat') {
    for (const feature of flats) {
      const trimmed = trimmedSpans(part, feature);
      const round = unequalSpans(
        before.outer,
        part.body.outer,
        Math.max(0, feature.from),
        Math.min(part.length, feature.to),
      );
      const unturned = round.filter((span) => !isCovered(span, [...trimmed, ...endForms(part)]));
      if (unturned.length > 0)
        say('turn-before-mill', 'The round that the flats are set from is not turned yet.');
      for (const span of trimmed)
        if (unequalSpans(before.outer, part.body.outer, span.from, span.to).length === 0)
          say(
            'flats-before-taper',
            'The surface that should trim the ends of the flats is finished already.',
          );
    }
  }
  const trims = operation.method === 'taper-turn';
  if (!trims) return;
  for (const feature of part.features) {
    if (feature.kind !== 'flats') continue;
    const meets = trimmedSpans(part, feature).some((span) =>
      step.changes.some((c) => c.kind === 'outer' && c.from < span.to - 1e-6 && c.to > span.from + 1e-6),
    );
    const comes = later.some(
      (each) => each.operation.method === 'mill-flat' && each.operation.features.includes(feature.id),
    );
    if (meets && comes)
      say('flats-before-taper', `${feature.id} should be milled before the taper that trims its ends.`);
  }
}

interface Span {
  from: number;
  to: number;
}

function endForms(part: Part): Span[] {
  return part.features.filter((each) => each.kind === 'chamfer' || each.kind === 'crown');
}

/** True where the spans together leave nothing of this one. */
function isCovered(span: Span, spans: readonly Span[]): boolean {
  let reached = span.from;
  for (const each of [...spans].sort((a, b) => a.from - b.from))
    if (each.from <= reached + 1e-6) reached = Math.max(reached, each.to);
  return reached >= span.to - 1e-6;
}

/** Where flats that are set from a cylinder go on into cones and crowns, which trim them. */
function trimmedSpans(part: Part, flats: Extract<Feature, { kind: 'flats' }>): Span[] {
  const over = (kind: Feature['kind']): Span[] =>
    part.features
      .filter((each): each is Exclude<Feature, { kind: 'face' }> => each.kind === kind)
      .map((each) => ({ from: Math.max(each.from, flats.runOutFrom), to: Math.min(each.to, flats.runOutTo) }))
      .filter((span) => span.to - span.from > 1e-6);
  return over('cylinder').length > 0 ? [...over('cone'), ...over('crown')] : [];
}
