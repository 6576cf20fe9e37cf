import type { Generator, LinePiece } from './body';
import { mirrorGenerator, radiusAt, spanOf } from './generator';
import type { InputProblem } from './input-problem';
import { millimetres } from './input-problem';
import type { CentreHoleInput } from './part-input';
import { parseCentreHole } from '../standards/centre-holes';
import type { CentreHole } from '../standards/centre-holes';

export interface PlacedCentreHole {
  input: CentreHoleInput;
  from: number;
  to: number;
  /** b(x) that the hole raises the bore to. */
  envelope: Generator;
}

/**
 * A centre hole at its nominal form: guard cone where the form has one, 60° cone, pilot with a flat bottom
 * (the drill's point is left out, as the standard's figure gives it no size).
 */
export function placeCentreHole(
  input: CentreHoleInput,
  outline: Generator,
): { hole: PlacedCentreHole } | { problem: InputProblem } {
  const fault = (message: string): { problem: InputProblem } => ({ problem: { input: input.id, message } });
  const parsed = parseCentreHole(input.designation);
  if (!parsed.ok) return fault(parsed.message);
  const hole = parsed.value;
  if (!hole) return fault('No size of centre hole is given; leave it out for none.');
  if (hole.form === 'R') return fault('Centre holes of form R are not cut yet. Choose form A or B.');
  const { from, to } = spanOf(outline);
  const face = input.end === 'right' ? radiusAt(outline, to, 'left') : radiusAt(outline, from, 'right');
  const mouth = hole.guard?.diameter ?? hole.mouthDiameter;
  if (mouth / 2 >= face)
    return fault(
      `Centre hole ${hole.designation} opens to ${millimetres(mouth)}, but the end face is only ${millimetres(2 * face)}.`,
    );
  if (hole.depth >= to - from)
    return fault(
      `Centre hole ${hole.designation} is ${millimetres(hole.depth)} deep; the part must be longer than that.`,
    );
  const leftward = holePieces(hole, from);
  const envelope = input.end === 'left' ? leftward : mirrorGenerator(leftward, from + to);
  return { hole: { input, ...spanOf(envelope), envelope } };
}

function holePieces(hole: CentreHole, face: number): Generator {
  const pieces: LinePiece[] = [];
  let x = face;
  const cone = (large: number, small: number, included: number): void => {
    const to = x + (large - small) / 2 / Math.tan(included / 2);
    pieces.push({ kind: 'line', from: x, to, start: large / 2, end: small / 2 });
    x = to;
  };
  if (hole.guard) cone(hole.guard.diameter, hole.mouthDiameter, hole.guard.angle);
  cone(hole.mouthDiameter, hole.pilotDiameter, hole.coneAngle);
  pieces.push({
    kind: 'line',
    from: x,
    to: face + hole.depth,
    start: hole.pilotDiameter / 2,
    end: hole.pilotDiameter / 2,
  });
  return pieces;
}
