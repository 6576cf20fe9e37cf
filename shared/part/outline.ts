import type { Generator, LinePiece } from './body';
import type { ChamferInput, LengthInput } from './part-input';
import { minOuter } from './envelope';
import type { InputProblem } from './input-problem';
import { millimetres } from './input-problem';

/** A length with its place on the axis. */
export interface PlacedLength {
  input: LengthInput;
  from: number;
  to: number;
  startRadius: number;
  endRadius: number;
}

export interface PlacedChamfer {
  input: ChamferInput;
  from: number;
  to: number;
  /** To the axis (rad). */
  angle: number;
  envelope: Generator;
}

/** Lengths put end to end from x = 0, and what is wrong with any of them. */
export function placeLengths(lengths: readonly LengthInput[]): {
  placed: PlacedLength[];
  problems: InputProblem[];
} {
  const problems: InputProblem[] = [];
  const placed: PlacedLength[] = [];
  let x = 0;
  for (const input of lengths) {
    const start = input.form === 'cone' ? input.startDiameter : input.diameter;
    const end = input.form === 'cone' ? input.endDiameter : input.diameter;
    const figures = [input.length, start, end];
    if (!(input.length > 0) || figures.some((figure) => !Number.isFinite(figure))) {
      problems.push({ input: input.id, message: 'The length must be more than 0 mm.' });
      continue;
    }
    if (start < 0 || end < 0 || start + end <= 0) {
      problems.push({ input: input.id, message: 'The diameter must be more than 0 mm.' });
      continue;
    }
    placed.push({ input, from: x, to: x + input.length, startRadius: start / 2, endRadius: end / 2 });
    x += input.length;
  }
  return { placed, problems };
}

/** r(x) of the lengths alone, before chamfers and crowns. */
export function lengthsOutline(placed: readonly PlacedLength[]): LinePiece[] {
  return placed.map(({ from, to, startRadius, endRadius }) => ({
    kind: 'line',
    from,
    to,
    start: startRadius,
    end: endRadius,
  }));
}

/**
 * One chamfer as an envelope. The leg is measured along the axis from the length's end; the slope starts on the
 * surface there and falls at the angle to the axis, so on a cylinder at 45° both legs are equal.
 */
export function placeChamfer(
  input: ChamferInput,
  placed: readonly PlacedLength[],
): { chamfer: PlacedChamfer } | { problem: InputProblem } {
  const index = placed.findIndex((length) => length.input.id === input.on);
  const on = placed[index];
  const fault = (message: string): { problem: InputProblem } => ({ problem: { input: input.id, message } });
  if (!on) return fault('The chamfer is on a length that is not there.');
  const angle = input.angle ?? Math.PI / 4;
  const length = on.to - on.from;
  if (!(input.leg > 0)) return fault('A chamfer must be more than 0 mm; leave it out for none.');
  if (input.leg > length)
    return fault(
      `A chamfer of ${millimetres(input.leg)} is longer than the ${millimetres(length)} it is cut on; at most ${millimetres(length)} is allowed.`,
    );
  const neighbour = input.end === 'left' ? placed[index - 1] : placed[index + 1];
  const facing = input.end === 'left' ? neighbour?.endRadius : neighbour?.startRadius;
  const corner = input.end === 'left' ? on.startRadius : on.endRadius;
  if (facing !== undefined && facing >= corner)
    return fault('The chamfer has no edge to cut: the length beside it is as large or larger.');
  const slope = (on.endRadius - on.startRadius) / length;
  const edge = input.end === 'left' ? corner + slope * input.leg : corner - slope * input.leg;
  const drop = input.leg * Math.tan(angle);
  const least = facing ?? 0;
  if (edge - drop < least - 1e-9) {
    const allowed = Math.max(0, (edge - least) / Math.tan(angle));
    return fault(
      `A chamfer of ${millimetres(input.leg)} is deeper than the edge it cuts; at most ${millimetres(allowed)} is allowed.`,
    );
  }
  // Where the cone narrows towards the end faster than the chamfer, no corner is left to cut.
  if (edge - drop > corner)
    return fault('The chamfer does not touch the edge: the cone already falls more steeply.');
  const envelope: Generator =
    input.end === 'left'
      ? [{ kind: 'line', from: on.from, to: on.from + input.leg, start: edge - drop, end: edge }]
      : [{ kind: 'line', from: on.to - input.leg, to: on.to, start: edge, end: edge - drop }];
  const from = input.end === 'left' ? on.from : on.to - input.leg;
  return { chamfer: { input, from, to: from + input.leg, angle, envelope } };
}

/** Chamfers that overlap on one length, each pair said once at the second. */
export function overlappingChamfers(chamfers: readonly PlacedChamfer[]): InputProblem[] {
  const problems: InputProblem[] = [];
  for (const [index, chamfer] of chamfers.entries()) {
    const clash = chamfers
      .slice(0, index)
      .find((other) => other.from < chamfer.to - 1e-9 && chamfer.from < other.to - 1e-9);
    if (!clash) continue;
    const allowed =
      chamfer.to - chamfer.from - (Math.min(clash.to, chamfer.to) - Math.max(clash.from, chamfer.from));
    problems.push({
      input: chamfer.input.id,
      message: `The chamfers at the two ends of this length overlap; at most ${millimetres(Math.max(0, allowed))} is left for this one.`,
    });
  }
  return problems;
}

export function cutChamfers(outline: Generator, chamfers: readonly PlacedChamfer[]): Generator {
  return chamfers.reduce((outer, chamfer) => minOuter(outer, chamfer.envelope), outline);
}
