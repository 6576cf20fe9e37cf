import type { Body } from '../part/body';
import { largestRadius } from '../part/generator';
import type { Build } from './draft';
import { RuledOut, stageIn } from './draft';
import type { View } from './features';
import type { Method } from './route';
import { LIMITS } from './rules';
import { depthAllowed } from './support';

/** One holding of the work, its free end to the right: what the methods need to know of it. */
export interface Session {
  build: Build;
  view: View;
  /** Set-up id that keys start with. */
  id: string;
  /** Edge of the jaws towards the free end, in the view's x. */
  gripTo: number;
  /** A centre stands in the free end now. */
  tail: boolean;
  /** A fixed steady runs beside the free end. */
  steady: boolean;
  /** Length beyond the part that the centre hole stands in, cut away later. */
  trim: number;
  /** Rows from here to the free end are worked. */
  from: number;
  /** How far a cut at the held end runs on: the parting width, or nothing. */
  runOn: number;
  /** Keys of operations by what they did, for the reasons of later ones. */
  done: Map<string, string>;
}

export function stageOf(session: Session): Body {
  return stageIn(session.build, session.view);
}

/** Radial depth a cut may have here; throws the rule that stands against it. */
export function depthFor(
  session: Session,
  method: Method,
  farEnd: number,
  wish: number,
  what: string,
): number {
  const answer = depthAllowed({
    method,
    stage: stageOf(session),
    gripEdge: session.gripTo,
    farEnd,
    tail: session.tail || session.steady,
    wish,
  });
  if (answer.depth === null) {
    const ratio = Math.round(answer.ratio * 10) / 10;
    throw new RuledOut(
      answer.rule,
      answer.rule === 'support-overhang'
        ? `${what}: the work stands out ${ratio} of its smallest diameters with no centre in its end.`
        : `${what}: the work is too slender and bends more than it may, even in light cuts (free length ${ratio} of its smallest diameter).`,
    );
  }
  return answer.depth;
}

/** Neighbours that only touch an end of a span are none of its metal (mm). */
const TOUCH = 1e-7;

/** Radial metal between the stage and a radius over a span (mm); 0 where there is none. */
export function metalOver(session: Session, from: number, to: number, radius: number): number {
  return Math.max(0, largestRadius(stageOf(session).outer, from + TOUCH, to - TOUCH) - radius);
}

/**
 * Passes and the even depth of each. A depth that was allowed as a roughing cut stays one: evened out to a light cut
 * it would be held to the finishing limit of bend.
 */
export function passesFor(metal: number, depth: number): { passes: number; depth: number } {
  const passes = Math.max(1, Math.ceil(metal / depth - 1e-9));
  const even = metal / passes;
  const light = LIMITS.lightDepth.value;
  return { passes, depth: depth > light && even <= light && passes > 1 ? depth : even };
}

export function keyOf(session: Session, name: string): string {
  return `${session.id}.${name}`;
}
