import { radiusAt } from '../../part/generator';
import type { ThreadFeature } from '../../part/part';
import { addOperation, RuledOut } from '../draft';
import type { DraftNeed } from '../draft';
import type { Row, View } from '../features';
import { LIMITS } from '../rules';
import type { RuleId } from '../rules';
import { alternative, dieFor, dieHolderFor, gearboxCuts, held, short, threadingTool } from '../shop';
import { depthFor, keyOf, passesFor, stageOf } from '../session';
import type { Session } from '../session';
import { rowsWorked } from './turn';
import { figure, leadText, inSentence } from '../words';

/** Threads on rows worked here, nearest the free end first: by die where the shop cuts the size so, else single point. */
export function cutThreads(session: Session): void {
  for (const row of [...rowsWorked(session)].reverse()) {
    if (row.thread) cutThread(session, row, row.thread);
  }
}

/** True where a die can do it and the shop has it, or none of it needs the tail: the tail must be out for a die. */
export function byDie(session: Session, row: Row, thread: ThreadFeature): boolean {
  const { register } = session.build;
  const die = dieFor(register, thread);
  return (
    die !== undefined &&
    dieHolderFor(register, die) !== undefined &&
    thread.starts === 1 &&
    thread.major <= register.settings.dieLimit + 1e-6 &&
    openToFreeEnd(session.view, row, thread)
  );
}

/** True where nothing between the thread and the free end is larger than its root. */
export function openToFreeEnd(view: View, row: Row, thread: ThreadFeature): boolean {
  const beyond = view.rows.filter((other) => other.from >= row.to - 1e-9);
  return beyond.every((other) => Math.max(other.startR, other.endR) <= thread.root / 2 + 1e-6);
}

export function shutIn(thread: ThreadFeature): RuledOut {
  return new RuledOut(
    'way-in',
    `${thread.designation} stands behind a larger diameter from this end: no die passes over it and no tool can run in.`,
  );
}

/** Plain length between the thread and what it runs into: infinite where a smaller neighbour lets the tool out. */
function runOutOf(session: Session, row: Row, thread: ThreadFeature): number {
  const stage = stageOf(session);
  const spare = thread.from - row.from;
  if (row.from <= stage.x0 + 1e-9) return Infinity;
  return radiusAt(stage.outer, row.from, 'left') <= thread.root / 2 + 1e-6 ? Infinity : spare;
}

function cutThread(session: Session, row: Row, thread: ThreadFeature): void {
  const { build, view } = session;
  const { register, words } = build;
  if (!openToFreeEnd(session.view, row, thread)) throw shutIn(thread);
  const exit = runOutOf(session, row, thread);
  const die = dieFor(register, thread);
  const holder = die && dieHolderFor(register, die);
  const useDie = byDie(session, row, thread);
  const after: { key: string; rule: RuleId }[] = [];
  const chamfer = session.done.get(`chamfer.${row.id}`);
  if (chamfer) after.push({ key: chamfer, rule: 'chamfer-before-thread' });
  else {
    const turned = session.done.get(`row.${row.id}`);
    if (turned) after.push({ key: turned, rule: 'blank-before-thread' });
  }
  const key = keyOf(session, `thread.${thread.id}`);
  const treatment = view.part.body.treatments.find((t) => t.id === thread.id);
  if (!treatment) throw new Error(`the part has no thread called ${thread.id}`);
  const common = {
    key,
    features: [thread.id],
    pitch: thread.lead,
    cut: { kind: 'treatment' as const, treatment },
    after,
    stops: [{ toX: thread.from }],
  };
  const depth = (thread.major - thread.root) / 2;
  if (useDie && die && holder) {
    const turnRound = exit < LIMITS.dieLead.value * thread.pitch;
    addOperation(build, view, {
      ...common,
      method: 'thread-die',
      title: `thread ${thread.designation} by die`,
      tool: `${die.name}, ${inSentence(holder.name)}`,
      toolItem: die.id,
      toolFigures: die.figures,
      figures: { diameter: thread.major, travel: thread.to - thread.from, depth, passes: 1 },
      reasons: turnRound ? ['die-when-held', 'die-turned-round'] : ['die-when-held'],
      notes: turnRound
        ? [
            `No run-out at the shoulder: turn the die round for the last threads; about one pitch (${words.length(thread.pitch)}) stays incomplete.`,
          ]
        : ['Start square, oil, and stop at the length with the spindle turned by hand.'],
      check: 'the mate',
      needs: [
        held('tool', `die ${thread.designation}`, die.id, `${die.name}, ${die.place}.`),
        held(
          'holder',
          `die holder ${figure(die.figures['outside'] ?? 0)}`,
          holder.id,
          `${holder.name}, ${holder.place}.`,
        ),
      ],
      handling: turnRound ? 4 : 3,
    });
    session.done.set('thread', key);
    return;
  }
  singlePoint(session, thread, exit, common, depth);
  session.done.set('thread', key);
}

function singlePoint(
  session: Session,
  thread: ThreadFeature,
  exit: number,
  common: Pick<Parameters<typeof addOperation>[2], 'key' | 'features' | 'pitch' | 'cut' | 'after' | 'stops'>,
  depth: number,
): void {
  const { build, view } = session;
  const { register, lathe, words } = build;
  const tool = threadingTool(register, thread);
  const needs: DraftNeed[] = [tool.need];
  const spec = `lead of ${leadText(thread.lead)} in the gearbox`;
  const dieHeld = dieFor(register, thread) !== undefined;
  const why = dieHeld
    ? `Over the ${words.length(register.settings.dieLimit)} the shop cuts by die.`
    : `No ${thread.designation} die in the register.`;
  if (!gearboxCuts(lathe, thread.lead)) {
    needs.push(
      short(
        'machine',
        spec,
        `${lathe.name} does not cut this lead, and ${why.charAt(0).toLowerCase()}${why.slice(1)}`,
        ['buy the die', 'change wheels'],
      ),
    );
  } else if (!dieHeld && thread.major <= register.settings.dieLimit + 1e-6) {
    needs.push(
      alternative(
        'tool',
        `die ${thread.designation}`,
        lathe.id,
        `${why} Single point: ${lathe.name} cuts ${leadText(thread.lead)}.`,
        [`single point on ${lathe.name}, about 15 min more`, 'buy the die'],
      ),
    );
  } else needs.push(held('machine', spec, lathe.id, `${why} ${lathe.name} cuts ${leadText(thread.lead)}.`));
  const shallow = exit < LIMITS.threadExit.value * thread.pitch;
  if (shallow)
    needs.push(
      alternative(
        'geometry',
        `run-out or relief where ${thread.designation} meets its shoulder`,
        undefined,
        `A single-point tool is drawn out in the last turn: about ${words.length(2 * thread.pitch)} at the shoulder stays shallow.`,
        [
          'say the run-out on the drawing',
          'draw a relief',
          ...(dieHeld ? [] : ['buy the die and turn it round for the last threads']),
        ],
      ),
    );
  const allowed = depthFor(
    session,
    'thread-single-point',
    thread.to,
    Math.min(0.2, depth),
    `Thread ${thread.designation}`,
  );
  const cut = passesFor(depth, allowed);
  addOperation(build, view, {
    ...common,
    method: 'thread-single-point',
    title: `thread ${thread.designation}, single point`,
    tool: tool.name,
    toolItem: tool.item?.id,
    toolFigures: tool.item?.figures,
    figures: {
      diameter: thread.major,
      travel: thread.to - thread.from + 3 * thread.pitch,
      depth: cut.depth,
      passes: cut.passes + 2,
    },
    reasons: shallow ? ['single-point', 'thread-run-out'] : ['single-point'],
    ...(shallow ? { runOut: 2 * thread.pitch } : {}),
    notes: [
      `Gearbox to ${leadText(thread.lead)}; infeed ${words.length(depth)} in all, two spring passes.`,
      ...(shallow
        ? [
            `Draw the tool out in the last turn before the shoulder, the spindle turned by hand; ${words.length(2 * thread.pitch)} stays shallow.`,
          ]
        : []),
      ...(thread.hand === 'left'
        ? [
            shallow
              ? 'Left hand, and no relief to start in: spindle reversed, the tool turned over, so that it still cuts towards the chuck.'
              : 'Left hand: the tool starts in the relief and travels away from the chuck.',
          ]
        : []),
      ...(thread.starts > 1
        ? [`${thread.starts} starts, each a pitch of ${words.length(thread.pitch)} on.`]
        : []),
    ],
    check: 'the mate',
    needs,
    handling: 8,
  });
}
