import type { Body } from '../part/body';
import { flatsSpan } from '../part/flats';
import { largestRadius } from '../part/generator';
import { LIMITS } from './rules';

/** A plain cylinder of a stage that jaws may close on, free end to the right. */
export interface Grip {
  from: number;
  to: number;
  diameter: number;
  /** The jaws close on the faces of a polygon. */
  onFlats?: boolean;
}

/**
 * Plain cylinders of a stage that can be held with the work to their right, the nearest to the free end first: no
 * thread, knurl or flat on them, long enough, and nothing larger behind. `before` is where the work begins.
 */
export function gripsOf(stage: Body, before: number, reach: number, spindleBore: number): Grip[] {
  const grips: Grip[] = [];
  for (const piece of stage.outer) {
    if (piece.kind !== 'line' || Math.abs(piece.start - piece.end) > 1e-9) continue;
    for (const span of withoutMarks(stage, piece.from, piece.to)) {
      const to = Math.min(span.to, before);
      const from = Math.max(span.from, to - reach);
      const grip = { from, to, diameter: 2 * piece.start };
      if (
        longEnough(grip) &&
        nothingLargerBehind(stage, grip) &&
        passesSpindle(stage, grip, spindleBore, reach)
      )
        grips.push(grip);
    }
  }
  // A round is held before flats are.
  return grips.length > 0
    ? grips.sort((a, b) => b.to - a.to)
    : polygonGrips(stage, before, reach, spindleBore);
}

/** Lengths on which a polygon of three, six, nine … faces runs whole, for padded jaws when no round is left. */
function polygonGrips(stage: Body, before: number, reach: number, spindleBore: number): Grip[] {
  const grips: Grip[] = [];
  for (const cut of stage.cuts) {
    if (cut.kind !== 'flats' || cut.count % 3 !== 0) continue;
    const span = flatsSpan(stage, cut);
    if (!span) continue;
    for (const piece of stage.outer) {
      if (piece.kind !== 'line' || Math.abs(piece.start - piece.end) > 1e-9) continue;
      const to = Math.min(piece.to, span.to, before);
      const from = Math.max(piece.from, span.from, to - reach);
      const marked = stage.treatments.some((t) => t.from < to && t.to > from);
      const grip: Grip = { from, to, diameter: 2 * piece.start, onFlats: true };
      if (
        !marked &&
        longEnough(grip) &&
        nothingLargerBehind(stage, grip) &&
        passesSpindle(stage, grip, spindleBore, reach)
      )
        grips.push(grip);
    }
  }
  return grips.sort((a, b) => b.to - a.to);
}

export function longEnough(grip: Grip): boolean {
  const least = Math.max(LIMITS.gripMinimum.value, LIMITS.gripRatio.value * grip.diameter);
  return grip.to - grip.from >= least - 1e-9;
}

function nothingLargerBehind(stage: Body, grip: Grip): boolean {
  if (grip.from <= stage.x0 + 1e-9) return true;
  return 2 * largestRadius(stage.outer, stage.x0, grip.from) <= grip.diameter + 1e-6;
}

/** What is behind the jaws goes through the spindle, or stands wholly within the chuck's own depth. */
function passesSpindle(stage: Body, grip: Grip, spindleBore: number, reach: number): boolean {
  const behind = grip.from - stage.x0;
  if (behind <= 1e-9) return true;
  return (
    2 * largestRadius(stage.outer, stage.x0, grip.from) <= spindleBore ||
    behind + (grip.to - grip.from) <= reach
  );
}

/** [from, to] less the spans of threads, knurls and flats that really leave a face. */
function withoutMarks(stage: Body, from: number, to: number): { from: number; to: number }[] {
  const marks: { from: number; to: number }[] = stage.treatments.map((t) => ({ from: t.from, to: t.to }));
  for (const cut of stage.cuts) {
    if (cut.kind !== 'flats') {
      marks.push({ from: -Infinity, to: Infinity });
      continue;
    }
    const span = flatsSpan(stage, cut);
    if (span) marks.push(span);
  }
  let left = [{ from, to }];
  for (const mark of marks) {
    left = left
      .flatMap((s) => [
        { from: s.from, to: Math.min(s.to, mark.from) },
        { from: Math.max(s.from, mark.to), to: s.to },
      ])
      .filter((s) => s.to - s.from > 1e-9);
  }
  return left;
}
