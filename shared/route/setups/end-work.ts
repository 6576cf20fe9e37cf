import type { FlatsFeature } from '../../part/part';
import { RuledOut } from '../draft';
import type { Build } from '../draft';
import { cutChamfers, drillCentre, faceEnd, turnCrown } from '../methods/ends';
import { markOut, milledSpan, millFlats } from '../methods/mill';
import { chamferHeldEnd } from '../methods/part-off';
import { cutThreads } from '../methods/thread';
import { finishRows, finishValleys, rowsWorked, roughRows, turnTapers } from '../methods/turn';
import type { Grip } from '../grips';
import type { Session } from '../session';
import { indexingFor } from '../shop';
import { millSetUp, openSetUp } from './holding';
import { isSupport, markOf } from './steady';

/** Faces the end; with a tail, drills the centre too and brings the tail up. */
export function openEnd(session: Session, tail: boolean): void {
  const { view, trim } = session;
  faceEnd(session, view.length + trim, trim === 0);
  if (tail || view.centreRight) {
    drillCentre(session);
    session.tail = tail;
  }
}

export interface EndWork {
  tail: boolean;
  flats: readonly FlatsFeature[];
  grip: Grip;
  /** Opens the lathe again on the same grip after the mill. */
  regrip: () => Session;
  /** Opens the lathe again on the same grip with a steady beside the end, or throws what it was asked for. */
  regripSteady: (otherwise: RuledOut) => Session;
  /** The piece is parted off after this, so the lathe is gone back to in any case. */
  comesBack: boolean;
  /** Width of the groove that the held end is parted by, where its chamfer is cut from there; 0 for none. */
  partingWidth: number;
}

/**
 * Everything that one free end gets, from roughing to its last thread. With flats that run into a taper here the
 * mill comes between; otherwise the lathe is left only once. Returns the session that holds the work at the end.
 */
export function workEnd(session: Session, work: EndWork): Session {
  roughRows(session);
  finishRows(session);
  finishValleys(session);
  if (work.flats.length === 0) return endForms(session, work);
  const rows = rowsWorked(session);
  const trims = rows.some(
    (row) =>
      row.kind === 'cone' &&
      work.flats.some((f) => f.runOutTo > row.from + 1e-9 && f.runOutFrom < row.to - 1e-9),
  );
  const later = trims || session.tail;
  if (!later) endForms(session, work);
  const build = session.build;
  const first = work.flats[0];
  if (!first) return session;
  const indexing = indexingFor(build, first.count, work.grip.diameter);
  dropIfEmpty(session);
  const grip = { ...work.grip, from: Math.max(work.grip.from, work.grip.to - indexing.reach) };
  inspectSetUp(session);
  const milling = openSetUp(build, millSetUp(build, session.view, grip, indexing, session.tail), session);
  milling.tail = session.tail;
  if (session.tail) {
    const centre = session.done.get('centre');
    if (centre) milling.done.set('centre', centre);
  }
  carry(session, milling, ['turn', 'face', 'rough']);
  for (const flats of work.flats) {
    if (milledSpan(milling, flats).from < milling.gripTo - 1e-9)
      throw new RuledOut('grip-uncut', 'The flats run under the jaws in this holding.');
    markOut(milling, flats);
    millFlats(milling, flats, indexing);
  }
  inspectSetUp(milling);
  if (!later && !work.comesBack) return milling;
  const back = work.regrip();
  back.tail = session.tail;
  carry(session, back, ['centre', 'turn', 'rough', 'face']);
  for (const [name, key] of session.done) if (name.startsWith('row.')) back.done.set(name, key);
  for (const [name, key] of milling.done) if (name.startsWith('mill.')) back.done.set(name, key);
  return later ? endForms(back, work) : back;
}

/** A set-up in which nothing was cut after the work was pulled out is not worth the grip. */
function dropIfEmpty(session: Session): void {
  const { build } = session;
  const mine = build.operations.filter((o) => o.setup === session.id);
  if (build.setups.length < 2 || mine.length !== 1 || mine[0]?.method !== 'grip') return;
  build.operations.pop();
  build.setups.pop();
}

/** Tapers with the tail in, then the end to length, its crown, chamfers and threads. */
function endForms(session: Session, work: EndWork): Session {
  turnTapers(session);
  const back = markOf(session.build);
  const done = new Map(session.done);
  try {
    formEnd(session, work);
    return session;
  } catch (error) {
    if (!isSupport(error) || !done.has('centre')) throw error;
    back();
    inspectSetUp({ ...session, done });
    const steadied = work.regripSteady(error);
    carry({ ...session, done }, steadied, ['face', 'turn', 'rough', 'taper', 'centre', 'leans']);
    for (const [name, key] of done) if (name.startsWith('row.')) steadied.done.set(name, key);
    formEnd(steadied, work);
    return steadied;
  }
}

function formEnd(session: Session, work: EndWork): void {
  if (session.trim > 0) faceEnd(session, session.view.length, true);
  session.tail = false;
  turnCrown(session);
  cutChamfers(session);
  // A thread that runs to the held end needs its chamfer there before the die comes to it.
  if (work.partingWidth > 0) chamferHeldEnd(session, work.partingWidth);
  cutThreads(session);
}

/** Measures what a set-up finished before it is broken down. */
export function inspectSetUp(session: Session): void {
  const build: Build = session.build;
  const mine = build.operations.filter((o) => o.setup === session.id);
  if (mine.some((o) => o.method === 'inspect')) return;
  const finishing = mine.filter((o) => o.cut && o.method !== 'rough-turn' && o.features.length > 0);
  if (finishing.length === 0) return;
  const features = [...new Set(finishing.flatMap((o) => o.features))];
  const last = mine[mine.length - 1];
  build.operations.push({
    key: `${session.id}.inspect`,
    method: 'inspect',
    title: 'measure before it is moved',
    setup: session.id,
    end: session.view.flipped ? 'left' : 'right',
    features,
    machine: last?.machine ?? build.lathe.id,
    tool: '',
    toolMaterial: 'hss',
    toolFigures: {},
    figures: null,
    after: last ? [{ key: last.key, rule: 'inspect-last' }] : [],
    stops: [],
    reasons: ['inspect-last'],
    notes: [],
    check: '',
    handling: 1,
    needs: [],
  });
}

function carry(from: Session, to: Session, names: readonly string[]): void {
  for (const name of names) {
    const key = from.done.get(name);
    if (key) to.done.set(name, key);
  }
}
