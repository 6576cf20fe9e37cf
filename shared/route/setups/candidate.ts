import type { Body } from '../../part/body';
import { constant } from '../../part/generator';
import type { FlatsFeature, Part } from '../../part/part';
import type { Build } from '../draft';
import { RuledOut, stageIn } from '../draft';
import { rowMax } from '../features';
import type { View, Views } from '../features';
import { gripsOf, longEnough } from '../grips';
import type { Grip } from '../grips';
import { trimFor } from '../methods/ends';
import { bladeFor, partOff } from '../methods/part-off';
import { LIMITS } from '../rules';
import type { Lathe, Register } from '../register';
import type { Session } from '../session';
import { firstMill, holdsFor, mm } from '../shop';
import type { StockOption } from '../stock';
import { finishPiece, sawPiece } from './bench';
import { inspectSetUp, openEnd, workEnd } from './end-work';
import { isSupport, markOf, openWithSteady } from './steady';
import { indicate, latheHold, openSetUp, standsOut } from './holding';

export type CandidateKind = 'bar' | 'stick' | 'blank';

/** One way to go about it: which end first, how the stock is cut, where the two ends' work meets. */
export interface Candidate {
  first: 'right' | 'left';
  kind: CandidateKind;
  /** Station, in the first end's view, from which the first end's work begins. */
  meets: number;
  /** Whether the work is turned round at all. */
  secondEnd: boolean;
  lathe: Lathe;
  stock: StockOption;
  /** Which end's holding the flats are milled in, where the bar is already their round. */
  flatsWith: 'first' | 'second';
}

interface Tails {
  first: boolean;
  second: boolean;
}

const KIND_TEXT: Record<CandidateKind, string> = {
  bar: 'from the bar through the spindle',
  stick: 'from a sawn stick, parted last',
  blank: 'from a sawn blank',
};

export function candidateText(candidate: Candidate): string {
  const turned = candidate.secondEnd
    ? `, turned round at ${mm(candidate.meets)} from the far end`
    : ', in one holding';
  return `${candidate.stock.text} ${KIND_TEXT[candidate.kind]}, ${candidate.first} end first${turned}, ${candidate.lathe.name.toLowerCase()}`;
}

/** Builds the plan; where work stands out too far it is planned again with a centre. Throws RuledOut when it cannot be. */
export function buildCandidate(part: Part, views: Views, register: Register, candidate: Candidate): Build {
  let tails: Tails = { first: surelyNeedsCentre(views, candidate), second: false };
  for (let attempt = 0; ; attempt += 1) {
    const where = { end: 'first' as 'first' | 'second' };
    try {
      return attemptPlan(part, views, register, candidate, tails, where);
    } catch (error) {
      if (!(error instanceof RuledOut) || attempt >= 3) throw error;
      const wantsCentre = error.rule === 'support-overhang' || error.rule === 'support-bend';
      if (!wantsCentre || tails[where.end]) throw error;
      tails = { ...tails, [where.end]: true };
    }
  }
}

/** True where even the raw bar stands out too far for the turning that its free end gets: spares a vain attempt. */
function surelyNeedsCentre(views: Views, candidate: Candidate): boolean {
  const view = candidate.first === 'right' ? views.right : views.left;
  const last = view.rows[view.rows.length - 1];
  if (!last || candidate.stock.asDrawn.includes(last.id)) return false;
  return (view.length - candidate.meets) / (2 * candidate.stock.radius) > LIMITS.overhang.value;
}

function attemptPlan(
  part: Part,
  views: Views,
  register: Register,
  candidate: Candidate,
  tails: Tails,
  where: { end: 'first' | 'second' },
): Build {
  const view = candidate.first === 'right' ? views.right : views.left;
  const other = candidate.first === 'right' ? views.left : views.right;
  const trims = {
    first: tails.first ? trimFor(view) : 0,
    second: tails.second ? trimFor(other) : 0,
  };
  const layout = layOut(register, view, candidate, trims);
  const build: Build = {
    register,
    lathe: candidate.lathe,
    mill: firstMill(register),
    saw: register.saws[0] ?? null,
    stock: {
      shape: candidate.stock.shape,
      size: candidate.stock.size,
      material: part.material,
      ...(candidate.stock.bar ? { bar: candidate.stock.bar.id } : {}),
      certified: candidate.stock.bar?.certified ?? false,
    },
    stockRadius: candidate.stock.radius,
    views,
    blank: layout.blank,
    stage: layout.blank,
    setups: [],
    operations: [],
    planNeeds: [],
    notes: [],
  };
  const sides = shareFlats(view, candidate);
  sawPiece(build, view, candidate.kind);
  const end = firstEnd(build, view, candidate, tails, trims, layout, sides.first);
  if (candidate.kind !== 'blank') {
    inspectSetUp(end);
    partOff(end, layout.cutAt, layout.width, !candidate.secondEnd);
  } else inspectSetUp(end);
  let last = end;
  if (candidate.secondEnd) {
    where.end = 'second';
    last = secondEnd(build, other, candidate, tails, trims, sides.second);
    inspectSetUp(last);
  }
  finishPiece(build, last);
  return build;
}

interface Layout {
  blank: Body;
  /** Where the piece is parted; the blade takes [cutAt − width, cutAt]. */
  cutAt: number;
  width: number;
  grip: Grip;
}

/** Blank and first grip, in the first end's view, then the blank in the part's own x. */
function layOut(
  register: Register,
  view: View,
  candidate: Candidate,
  trims: { first: number; second: number },
): Layout {
  const radius = candidate.stock.radius;
  const face = LIMITS.faceAllowance.value;
  const x1 = view.length + face + trims.first;
  const held = candidate.meets > 1e-9 ? radius : Math.max(...view.rows.slice(0, 1).map(rowMax));
  const { width } = bladeFor({ build: { register } as Build }, held);
  const cutAt = candidate.secondEnd ? -(LIMITS.partedAllowance.value + trims.second) : 0;
  const reach = holdsFor(register, candidate.lathe, 2 * radius, false)[0]?.reach ?? 28;
  let grip: Grip;
  let x0: number;
  if (candidate.kind === 'blank') {
    x0 = -(face + trims.second);
    const begins = workBegins(view, candidate) - 2;
    grip = { from: Math.max(x0, begins - reach), to: begins, diameter: 2 * radius };
    if (!longEnough(grip))
      throw new RuledOut('grip-length', `Only ${mm(Math.max(0, begins - x0))} of the blank is left to hold.`);
  } else {
    const to = cutAt - width - LIMITS.partingClear.value;
    const hold = Math.min(Math.max(20, 1.2 * radius), 38);
    x0 = to - hold;
    grip = { from: x0, to, diameter: 2 * radius };
  }
  const blank: Body = {
    x0: view.flipped ? view.length - x1 : x0,
    x1: view.flipped ? view.length - x0 : x1,
    outer: [],
    inner: [],
    cuts: [],
    treatments: [],
  };
  return {
    blank: { ...blank, outer: constant(blank.x0, blank.x1, radius), inner: constant(blank.x0, blank.x1, 0) },
    cutAt,
    width,
    grip,
  };
}

/** First station, from the held end, that the first end's work or its flats reach. */
function workBegins(view: View, candidate: Candidate): number {
  const milled = shareFlats(view, candidate).first.map((f) => f.runOutFrom - LIMITS.overRun.value);
  return Math.min(candidate.meets, ...milled);
}

/** Flats go to the end whose work leaves their round finished; to the first where the bar is already the round. */
function shareFlats(view: View, candidate: Candidate): { first: FlatsFeature[]; second: FlatsFeature[] } {
  const first: FlatsFeature[] = [];
  const second: FlatsFeature[] = [];
  for (const flats of view.flats) {
    const under = view.rows.filter(
      (row) => row.from < flats.runOutTo - 1e-9 && row.to > flats.runOutFrom + 1e-9,
    );
    const round = under.filter((row) => row.kind === 'cylinder');
    const inFirst = (row: { from: number }) => row.from >= candidate.meets - 1e-9;
    const bar = (row: { id: string }) => candidate.stock.asDrawn.includes(row.id);
    const mayFirst = round.every((row) => inFirst(row) || bar(row));
    const maySecond = candidate.secondEnd && round.every((row) => !inFirst(row) || bar(row));
    if (mayFirst && (candidate.flatsWith === 'first' || !maySecond)) first.push(flats);
    else if (maySecond) second.push(flats);
    else
      throw new RuledOut(
        'turn-before-mill',
        'The flats lie over lengths that are turned from different ends.',
      );
  }
  return { first, second };
}

function firstEnd(
  build: Build,
  view: View,
  candidate: Candidate,
  tails: Tails,
  trims: { first: number; second: number },
  layout: Layout,
  flats: readonly FlatsFeature[],
): Session {
  const { lathe } = build;
  const diameter = layout.grip.diameter;
  const keeps = view.rows.some(
    (row) =>
      candidate.stock.asDrawn.includes(row.id) && row.from < layout.grip.to && row.to > layout.grip.from,
  );
  const hold = latheHold(build, diameter, keeps);
  const passes = diameter <= lathe.spindleBore + 1e-9;
  if (candidate.kind === 'bar' && !passes)
    throw new RuledOut(
      'bar-through-spindle',
      `Ø${mm(diameter)} does not pass the spindle, bore ${mm(lathe.spindleBore)}.`,
    );
  const run = {
    trim: trims.first,
    from: candidate.meets,
    runOn: candidate.meets <= 1e-9 && candidate.kind !== 'blank' ? layout.width - layout.cutAt : 0,
  };
  const work =
    candidate.kind === 'bar' ? 'Bar through the spindle' : candidate.kind === 'stick' ? 'Stick' : 'Blank';
  const datum = 'Stops are from the faced end.';
  const open = (support: boolean, first: boolean): Session =>
    openSetUp(
      build,
      {
        view,
        machine: lathe.id,
        holding: hold.name,
        ...(hold.item ? { holdingItem: hold.item } : {}),
        grip: layout.grip,
        ...(support ? { support: 'centre' as const } : {}),
        how: `${work} of Ø${mm(diameter)}, ${standsOut(build, view, layout.grip)}${support ? ', centre in the tail' : ''}.`,
        datum,
        minutes: hold.minutes + (support ? 2 : 0),
        turned: false,
        title: first
          ? `grip, ${standsOut(build, view, layout.grip)}`
          : 'grip again as before, against the same face',
        reasons:
          candidate.kind === 'bar'
            ? ['bar-through-spindle']
            : candidate.kind === 'stick'
              ? ['stick-for-milling']
              : ['saw-blank'],
      },
      run,
    );
  let session: Session;
  if (tails.first && passes && roomToPullOut(view, layout)) {
    session = pullOut(build, view, layout, hold, run, open);
  } else {
    session = open(tails.first, true);
    openEnd(session, tails.first);
  }
  return workEnd(session, {
    tail: tails.first,
    flats,
    grip: layout.grip,
    regrip: () => open(tails.first, false),
    regripSteady: (otherwise) =>
      openWithSteady(
        build,
        view,
        layout.grip,
        {
          machine: lathe.id,
          holding: hold.name,
          ...(hold.item ? { holdingItem: hold.item } : {}),
          datum,
          minutes: hold.minutes + 6,
          turned: false,
        },
        run,
        otherwise,
      ),
    comesBack: candidate.kind !== 'blank',
    partingWidth: candidate.kind !== 'blank' && !candidate.secondEnd ? layout.width : 0,
  });
}

/** Length out of the jaws while an end is faced and centred before it is pulled out. */
const SHORT = 15;

function roomToPullOut(view: View, layout: Layout): boolean {
  return view.length - SHORT - 20 > layout.grip.to;
}

/** Faces and centres with the bar held short, then pulls it out to the tail centre. */
function pullOut(
  build: Build,
  view: View,
  layout: Layout,
  hold: ReturnType<typeof latheHold>,
  run: { trim: number; from: number; runOn: number },
  open: (support: boolean, first: boolean) => Session,
): Session {
  const stage = stageIn(build, view);
  const to = stage.x1 - SHORT - LIMITS.faceAllowance.value;
  const grip = { from: to - Math.min(hold.reach, 30), to, diameter: layout.grip.diameter };
  const close = openSetUp(
    build,
    {
      view,
      machine: build.lathe.id,
      holding: hold.name,
      ...(hold.item ? { holdingItem: hold.item } : {}),
      grip,
      how: `Held short, ${standsOut(build, view, grip)}, the rest in the spindle.`,
      datum: 'The faced end is the datum from here on.',
      minutes: hold.minutes,
      turned: false,
      title: `grip short, ${standsOut(build, view, grip)}`,
      reasons: ['pull-out'],
    },
    run,
  );
  openEnd(close, true);
  const long = open(true, true);
  long.tail = true;
  for (const name of ['face', 'centre']) {
    const key = close.done.get(name);
    if (key) long.done.set(name, key);
  }
  return long;
}

/** Turns the work round and opens its end; with a steady beside it first where it stands out too far even for that. */
function beginSecond(
  build: Build,
  open: (first: boolean) => Session,
  steady: (otherwise: RuledOut) => Session,
  tail: boolean,
): Session {
  const back = markOf(build);
  try {
    const session = open(true);
    indicate(session, 0.05);
    openEnd(session, tail);
    return session;
  } catch (error) {
    if (!isSupport(error) || !tail) throw error;
    back();
    const opening = steady(error);
    indicate(opening, 0.05);
    openEnd(opening, true);
    const session = open(false);
    session.tail = true;
    for (const name of ['face', 'centre']) {
      const key = opening.done.get(name);
      if (key) session.done.set(name, key);
    }
    return session;
  }
}

/** The other end, held on a plain cylinder that the first end's work left. */
function secondEnd(
  build: Build,
  view: View,
  candidate: Candidate,
  tails: Tails,
  trims: { first: number; second: number },
  flats: readonly FlatsFeature[],
): Session {
  const from = view.length - candidate.meets;
  const begins = Math.min(from, ...flats.map((f) => f.runOutFrom - LIMITS.overRun.value)) - 2;
  const stage = stageIn(build, view);
  const grips = gripsOf(stage, begins, 38, build.lathe.spindleBore);
  if (grips.length === 0)
    throw new RuledOut(
      'grip-plain',
      'Nothing plain is left to hold the other end by: threads or tapers all the way.',
    );
  const back = markOf(build);
  let failure: RuledOut | null = null;
  for (const grip of grips.slice(0, 3)) {
    back();
    try {
      return holdSecond(build, view, grip, from, tails, trims, flats);
    } catch (error) {
      if (!(error instanceof RuledOut)) throw error;
      failure ??= error;
    }
  }
  throw failure ?? new RuledOut('grip-plain', 'Nothing holds the other end.');
}

function holdSecond(
  build: Build,
  view: View,
  found: Grip,
  from: number,
  tails: Tails,
  trims: { first: number; second: number },
  flats: readonly FlatsFeature[],
): Session {
  const hold = latheHold(build, found.diameter, true, found.onFlats ?? false);
  const grip = { ...found, from: Math.max(found.from, found.to - hold.reach) };
  if (!longEnough(grip))
    throw new RuledOut('grip-length', `Ø${mm(grip.diameter)} is held on too short a length.`);
  const run = { trim: trims.second, from, runOn: 0 };
  const open = (first: boolean): Session =>
    openSetUp(
      build,
      {
        view,
        machine: build.lathe.id,
        holding: hold.name,
        ...(hold.item ? { holdingItem: hold.item } : {}),
        grip,
        ...(tails.second ? { support: 'centre' as const } : {}),
        how: `Turned round, on ${grip.onFlats ? 'the flats, padded with copper' : `Ø${mm(grip.diameter)}`}, ${standsOut(build, view, grip)}${tails.second ? ', centre in the tail' : ''}.`,
        datum: 'Stops are from the end faced here.',
        minutes: hold.minutes + 1 + (tails.second ? 2 : 0),
        turned: first,
        title: first
          ? `turn round, grip on ${grip.onFlats ? 'the flats' : `Ø${mm(grip.diameter)}`}`
          : 'grip again as before, against the same face',
        reasons: grip.onFlats ? ['turn-round', 'grip-polygon'] : ['turn-round'],
      },
      run,
    );
  const steady = (otherwise: RuledOut): Session =>
    openWithSteady(
      build,
      view,
      grip,
      {
        machine: build.lathe.id,
        holding: hold.name,
        ...(hold.item ? { holdingItem: hold.item } : {}),
        datum: 'Stops are from the end faced here.',
        minutes: hold.minutes + 6,
        turned: false,
      },
      run,
      otherwise,
    );
  const session = beginSecond(build, open, steady, tails.second);
  return workEnd(session, {
    tail: tails.second,
    flats,
    grip,
    regrip: () => open(false),
    regripSteady: steady,
    comesBack: false,
    partingWidth: 0,
  });
}
