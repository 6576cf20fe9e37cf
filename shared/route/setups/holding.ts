import type { Build } from '../draft';
import { addOperation, stageIn } from '../draft';
import type { View } from '../features';
import type { Grip } from '../grips';
import { LIMITS } from '../rules';
import type { RuleId } from '../rules';
import type { SetUp } from '../route';
import type { Session } from '../session';
import { holdsFor, short } from '../shop';
import type { Hold, Indexing } from '../shop';
import { inSentence } from '../words';

export interface SetUpWish {
  view: View;
  machine: string;
  holding: string;
  holdingItem?: string;
  grip: Grip;
  support?: SetUp['support'];
  how: string;
  datum: string;
  minutes: number;
  turned: boolean;
  /** What is done with the work between this set-up and the one before. */
  title: string;
  reasons: RuleId[];
}

/** Opens a set-up, grips the work in it, and gives the session its methods work in. */
export function openSetUp(
  build: Build,
  wish: SetUpWish,
  before: { trim: number; from: number; runOn: number },
): Session {
  const { view, grip } = wish;
  const number = build.setups.length + 1;
  const id = `S${number}`;
  const last = build.operations[build.operations.length - 1];
  const flipped = view.flipped;
  const free = stageIn(build, view).x1 - grip.to;
  build.setups.push({
    id,
    machine: wish.machine,
    holding: wish.holding,
    gripFrom: flipped ? view.length - grip.to : grip.from,
    gripTo: flipped ? view.length - grip.from : grip.to,
    freeEnd: flipped ? 'left' : 'right',
    ...(wish.support ? { support: wish.support } : {}),
    ...(wish.holdingItem ? { holdingItem: wish.holdingItem } : {}),
    ...(wish.grip.onFlats ? { heldOn: 'flats' as const } : {}),
    heldText: wish.how,
    datumText: wish.datum,
    minutes: wish.minutes,
    rocks: free > LIMITS.gripLeverage.value * (grip.to - grip.from),
  });
  const session: Session = {
    build,
    view,
    id,
    gripTo: grip.to,
    tail: false,
    steady: false,
    trim: before.trim,
    from: before.from,
    runOn: before.runOn,
    done: new Map(),
  };
  const key = `${id}.grip`;
  addOperation(build, view, {
    key,
    method: wish.turned ? 'turn-round' : 'grip',
    title: wish.title,
    features: [],
    tool: wish.holding,
    toolItem: wish.holdingItem,
    figures: null,
    after: last
      ? [{ key: last.key, rule: wish.turned ? 'turn-round' : number === 1 ? 'saw-first' : 'set-up-whole' }]
      : [],
    reasons: wish.reasons,
    check: wish.turned ? 'runs true' : 'tight, key out',
    handling: 0,
  });
  session.done.set('grip', key);
  return session;
}

/** Sets turned-round work true by an indicator before it is cut. */
export function indicate(session: Session, within: number): void {
  const dial = session.build.register.instruments.find((i) => i.kind === 'dial');
  const key = `${session.id}.indicate`;
  const grip = session.done.get('grip');
  addOperation(session.build, session.view, {
    key,
    method: 'indicate',
    title: `indicate true within ${session.build.words.length(within)}`,
    features: [],
    tool: dial?.name ?? 'dial indicator',
    toolItem: dial?.id,
    figures: null,
    after: grip ? [{ key: grip, rule: 'grip-first' }] : [],
    reasons: ['indicate-before-cut'],
    check: `dial, ${session.build.words.length(within)}`,
    needs: [
      dial
        ? {
            kind: 'instrument',
            need: 'dial indicator',
            state: 'held',
            by: dial.id,
            why: `${dial.name}, ${dial.place}.`,
            alternatives: [],
          }
        : short('instrument', 'dial indicator', 'None in the register.'),
    ],
    handling: 2,
  });
  session.done.set('grip', key);
}

export interface LatheHold {
  hold: Hold | null;
  name: string;
  item?: string;
  minutes: number;
  reach: number;
}

/** The lathe's hold on a diameter; without one, a short is written down and the plan goes on with a plain chuck. */
export function latheHold(build: Build, diameter: number, finished: boolean, onFlats = false): LatheHold {
  // A round collet does not sit on flats: three jaws do.
  const hold =
    holdsFor(build.register, build.lathe, diameter, finished).find(
      (h) => !onFlats || (h.kind === 'chuck' && 'kind' in h.item && h.item.kind === 'three-jaw'),
    ) ?? null;
  const spec = `hold ${onFlats ? 'the flats of ' : ''}Ø${build.words.length(diameter)} on ${inSentence(build.lathe.name)}`;
  if (!hold) {
    build.planNeeds.push(
      short('hold', spec, 'No chuck or collet of this lathe closes on it.', [
        'buy the collet, or bore soft jaws',
      ]),
    );
    return { hold, name: 'Three-jaw chuck', minutes: 3, reach: LIMITS.mouthOfJaw.value };
  }
  if (!build.planNeeds.some((n) => n.need === spec))
    build.planNeeds.push({
      kind: 'hold',
      need: spec,
      state: 'held',
      by: hold.item.id,
      why: `${hold.name}, ${hold.item.place}.`,
      alternatives: [],
    });
  return { hold, name: hold.name, item: hold.item.id, minutes: hold.minutes, reach: hold.reach };
}

/** What stands out of the jaws, in words. */
export function standsOut(build: Build, view: View, grip: Grip): string {
  const stage = stageIn(build, view);
  return `${build.words.about(stage.x1 - grip.to)} out of the jaws`;
}

export function millSetUp(
  build: Build,
  view: View,
  grip: Grip,
  indexing: Indexing,
  outboard: boolean,
): SetUpWish {
  const machine = build.mill;
  return {
    view,
    machine: machine?.id ?? 'mill',
    holding: indexing.name,
    ...(indexing.item ? { holdingItem: indexing.item } : {}),
    grip,
    ...(outboard ? { support: 'outboard' as const } : {}),
    how: `Held on Ø${build.words.length(grip.diameter)}, ${standsOut(build, view, grip)}${outboard ? ', the outer end on a centre' : ''}. ${indexing.text}`,
    datum: 'Lengths are from the faced end.',
    minutes: indexing.minutes + (outboard ? 3 : 0),
    turned: false,
    title: `grip in ${inSentence(indexing.name)}`,
    reasons: ['stick-for-milling', indexing.rule],
  };
}
