import type { FlatsFeature } from '../../part/part';
import type { Build } from '../draft';
import { RuledOut, stageIn } from '../draft';
import type { View } from '../features';
import { gripsOf, longEnough } from '../grips';
import type { Grip } from '../grips';
import { LIMITS } from '../rules';
import type { Session } from '../session';
import type { Candidate, Tails } from './candidate';
import { openEnd, workEnd } from './end-work';
import { indicate, latheHold, openSetUp, standsOut } from './holding';
import { isSupport, markOf, openWithSteady } from './steady';

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
export function secondEnd(
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
    throw new RuledOut('grip-length', `Ø${build.words.length(grip.diameter)} is held on too short a length.`);
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
        how: `Turned round, on ${grip.onFlats ? 'the flats, padded with copper' : `Ø${build.words.length(grip.diameter)}`}, ${standsOut(build, view, grip)}${tails.second ? ', centre in the tail' : ''}.`,
        datum: 'Stops are from the end faced here.',
        minutes: hold.minutes + 1 + (tails.second ? 2 : 0),
        turned: first,
        title: first
          ? `turn round, grip on ${grip.onFlats ? 'the flats' : `Ø${build.words.length(grip.diameter)}`}`
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
