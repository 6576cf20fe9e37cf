import type { Body } from '../part/body';
import { LIGHT_METHODS, LIMITS, SIDE_METHODS } from './rules';
import { bendPerDepth, smallestDiameter } from './stiffness';
import type { Method } from './route';

export interface SupportAsked {
  method: Method;
  /** Stage before the cut, free end to the right. */
  stage: Body;
  gripEdge: number;
  /** Far end of the cut, towards the free end. */
  farEnd: number;
  /** A centre stands in the free end. */
  tail: boolean;
  /** Depth that is wished for, radial (mm). */
  wish: number;
}

export type SupportAnswer =
  | { depth: number; ratio: number }
  | { depth: null; ratio: number; rule: 'support-overhang' | 'support-bend' };

const LEAST_DEPTH = 0.05;

/** Where a chamfer at the tip begins: the lead of a thread carries nothing, so its small end does not count. */
function leadFrom(stage: Body, farEnd: number): number {
  const tip = stage.outer[stage.outer.length - 1];
  return tip?.kind === 'line' && tip.end < tip.start && tip.to <= farEnd + 1e-9 ? tip.from : farEnd;
}

function withinLimit(depth: number, perDepth: number): boolean {
  return (
    perDepth * depth <= (depth > LIMITS.lightDepth.value ? LIMITS.bendRough.value : LIMITS.bendFinish.value)
  );
}

/** Bend for each millimetre of depth of an even bar of this diameter, a third weaker for a hole in it: never too little. */
function roughBend(free: number, diameter: number): number {
  const inertia = (Math.PI * (diameter / 2) ** 4) / 4 / 1.5;
  return ((LIMITS.forcePerDepth.value / LIMITS.elasticModulus.value) * free ** 3) / (3 * inertia);
}

/**
 * The radial depth a cut may have on this stage: what is wished for, less where the work would bend more than its
 * limit, or null with the rule that stands against it (no centre where one is needed, or too slender with one).
 */
export function depthAllowed(asked: SupportAsked): SupportAnswer {
  const { method, stage, gripEdge, farEnd, tail, wish } = asked;
  const side = (SIDE_METHODS as readonly string[]).includes(method);
  const light = (LIGHT_METHODS as readonly string[]).includes(method);
  if (!side && !light) return { depth: wish, ratio: 0 };
  const free = Math.max(0, farEnd - gripEdge);
  const smallest = free <= 0 ? Infinity : smallestDiameter(stage, gripEdge, farEnd);
  const counted =
    method === 'thread-single-point' && free > 0
      ? smallestDiameter(stage, gripEdge, leadFrom(stage, farEnd))
      : smallest;
  const ratio = free / counted;
  if (side && !tail && ratio > LIMITS.overhang.value) return { depth: null, ratio, rule: 'support-overhang' };
  const ceiling =
    light && method !== 'face' && ratio > LIMITS.overhang.value ? LIMITS.lightDepth.value : wish;
  let depth = Math.min(wish, ceiling);
  const left = tail ? LIMITS.tailFactor.value : 1;
  // As stiff as its thinnest place all along, and hollowed by a centre: when even that is enough, nothing is integrated.
  if (withinLimit(depth, roughBend(free, smallest) * left)) return { depth, ratio };
  const perDepth = bendPerDepth(stage, gripEdge, farEnd) * left;
  // A face is finished where it is cut, however deep the cut: it is held to the finishing limit.
  if (method === 'face')
    depth = Math.min(depth, Math.floor((LIMITS.bendFinish.value / perDepth) * 100) / 100);
  if (depth > LIMITS.lightDepth.value && perDepth * depth > LIMITS.bendRough.value) {
    depth = Math.floor((LIMITS.bendRough.value / perDepth) * 20) / 20;
    if (depth <= LIMITS.lightDepth.value) depth = LIMITS.lightDepth.value;
  }
  if (depth <= LIMITS.lightDepth.value && perDepth * depth > LIMITS.bendFinish.value) {
    depth = Math.floor((LIMITS.bendFinish.value / perDepth) * 100) / 100;
  }
  return depth >= LEAST_DEPTH || depth >= wish
    ? { depth, ratio }
    : { depth: null, ratio, rule: 'support-bend' };
}
