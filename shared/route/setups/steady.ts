import type { Body } from '../../part/body';
import { flatsSpan } from '../../part/flats';
import type { Build } from '../draft';
import { RuledOut, stageIn } from '../draft';
import type { View } from '../features';
import type { Grip } from '../grips';
import { LIMITS } from '../rules';
import type { Tool } from '../register';
import type { Session } from '../session';
import { short } from '../shop';
import { smallestDiameter } from '../stiffness';
import { openSetUp } from './holding';
import type { SetUpWish } from './holding';

/** Least length of a plain cylinder that a steady's jaws run on (mm). Common practice. */
const STEADY_WIDTH = 12;

interface SteadyPlace {
  from: number;
  to: number;
  diameter: number;
}

/** Plain cylinder nearest the free end on which a steady can run, near enough to the end to hold it. */
function steadyPlace(stage: Body, gripTo: number, steady: Tool | undefined): SteadyPlace | null {
  const least = steady?.figures['minimum'] ?? 0;
  const most = steady?.figures['maximum'] ?? Infinity;
  for (const piece of [...stage.outer].reverse()) {
    if (piece.kind !== 'line' || Math.abs(piece.start - piece.end) > 1e-9) continue;
    const diameter = 2 * piece.start;
    const end = Math.min(piece.to, stage.x1 - STEADY_WIDTH);
    const place = { from: Math.max(piece.from, end - STEADY_WIDTH), to: end, diameter };
    const wide = place.to - place.from >= STEADY_WIDTH - 1e-9 && place.from > gripTo + STEADY_WIDTH;
    const marked =
      stage.treatments.some((t) => t.from < place.to && t.to > place.from) ||
      stage.cuts.some((cut) => {
        const span = cut.kind === 'flats' ? flatsSpan(stage, cut) : null;
        return span !== null && span.from < place.to && span.to > place.from;
      });
    if (!wide || marked || diameter < least || diameter > most) continue;
    const beyond = (stage.x1 - place.to) / smallestDiameter(stage, place.to, stage.x1);
    if (beyond <= LIMITS.overhang.value) return place;
  }
  return null;
}

/**
 * The same grip with a fixed steady beside the free end. Throws the rule it was asked for when the work has no plain
 * cylinder for it; a register without a steady leaves a short.
 */
export function openWithSteady(
  build: Build,
  view: View,
  grip: Grip,
  wish: Omit<SetUpWish, 'view' | 'grip' | 'support' | 'how' | 'title' | 'reasons'>,
  run: { trim: number; from: number; runOn: number },
  otherwise: RuledOut,
): Session {
  const steady = build.register.tools.find((t) => t.kind === 'steady');
  const { words } = build;
  const stage = stageIn(build, view);
  const place = steadyPlace(stage, grip.to, steady);
  if (!place) throw otherwise;
  const at = `Ø${words.length(place.diameter)}, ${words.about(stage.x1 - place.to)} from the end`;
  const spec = `fixed steady on Ø${words.length(place.diameter)}`;
  build.planNeeds.push(
    steady
      ? {
          kind: 'tool',
          need: spec,
          state: 'held',
          by: steady.id,
          why: `${steady.name}, ${steady.place}.`,
          alternatives: [],
        }
      : short('tool', spec, 'No steady in the register.', [
          'borrow or make a steady',
          'leave the centre hole in the drawing',
        ]),
  );
  const session = openSetUp(
    build,
    {
      ...wish,
      view,
      grip,
      support: 'steady',
      how: `${grip.onFlats ? 'On the flats' : `On Ø${words.length(grip.diameter)}`}, fixed steady on ${at}, oiled.`,
      title: `grip, fixed steady on ${at}`,
      reasons: ['steady-end'],
    },
    run,
  );
  session.steady = true;
  return session;
}

export function isSupport(error: unknown): error is RuledOut {
  return error instanceof RuledOut && (error.rule === 'support-overhang' || error.rule === 'support-bend');
}

/** Where a build stands, to go back to when a way of doing a thing does not hold. */
export function markOf(build: Build): () => void {
  const { stage } = build;
  const lengths = [build.operations.length, build.setups.length, build.planNeeds.length] as const;
  return () => {
    build.stage = stage;
    build.operations.length = lengths[0];
    build.setups.length = lengths[1];
    build.planNeeds.length = lengths[2];
  };
}
