import type { FlatsFeature } from '../../part/part';
import type { Build } from '../draft';
import { RuledOut, stageIn } from '../draft';
import type { View } from '../features';
import { LIMITS } from '../rules';
import type { Session } from '../session';
import type { Candidate, Tails } from './candidate';
import { openEnd, workEnd } from './end-work';
import { latheHold, openSetUp, standsOut } from './holding';
import type { Layout } from './layout';
import { openWithSteady } from './steady';

/** Everything that the first end gets, held on the raw bar. Returns the session that holds the work at the end. */
export function firstEnd(
  build: Build,
  view: View,
  candidate: Candidate,
  tails: Tails,
  trims: { first: number; second: number },
  layout: Layout,
  flats: readonly FlatsFeature[],
): Session {
  const { lathe, words } = build;
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
      `Ø${words.length(diameter)} does not pass the spindle, bore ${words.length(lathe.spindleBore)}.`,
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
        how: `${work} of Ø${words.length(diameter)}, ${standsOut(build, view, layout.grip)}${support ? ', centre in the tail' : ''}.`,
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
