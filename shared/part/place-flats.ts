import type { FlatsCut, Generator, Piece } from './body';
import { STATION_TOLERANCE } from './body';
import { largestRadius, mirrorGenerator, radiusAt, spanOf } from './generator';
import { levelRoots, pieceRadius } from './piece';
import type { FlatsInput } from './part-input';
import type { InputProblem } from './input-problem';
import { millimetres } from './input-problem';

export interface PlacedFlats {
  input: FlatsInput;
  declaredFrom: number;
  declaredTo: number;
  roundedCorners: boolean;
  cut: FlatsCut;
}

/**
 * Flats with their run-out. Where the declared span ends at a station from which the outline falls, the flats
 * go on to where r(x) meets them; where it ends within a length, against a cylinder or below a step, they stop.
 */
export function placeFlats(
  input: FlatsInput,
  outline: Generator,
): { flats: PlacedFlats } | { problem: InputProblem } {
  const { from: left, to: right } = spanOf(outline);
  const fault = (message: string): { problem: InputProblem } => ({ problem: { input: input.id, message } });
  const declaredFrom = input.from;
  const declaredTo = input.from + input.length;
  if (!(input.length > 0)) return fault('The length of the flats must be more than 0 mm.');
  if (!(input.acrossFlats > 0)) return fault('The size across flats must be more than 0 mm.');
  if (declaredFrom < left - STATION_TOLERANCE || declaredTo > right + STATION_TOLERANCE)
    return fault(`The flats must lie within the part, from ${millimetres(left)} to ${millimetres(right)}.`);
  const largest = largestRadius(outline, declaredFrom, declaredTo);
  const distance = input.count === 1 ? input.acrossFlats - largest : input.acrossFlats / 2;
  if (distance >= largest - STATION_TOLERANCE)
    return fault(
      `Flats ${millimetres(input.acrossFlats)} across do not touch a round of ${millimetres(2 * largest)}; they must be less than that.`,
    );
  if (distance <= 0)
    return fault(`A flat this deep passes the axis; it must leave more than ${millimetres(largest)} across.`);
  const to = runOut(outline, Math.min(declaredTo, right), distance);
  const from =
    left +
    right -
    runOut(mirrorGenerator(outline, left + right), left + right - Math.max(declaredFrom, left), distance);
  const corner = input.count >= 3 ? distance / Math.cos(Math.PI / input.count) : Infinity;
  return {
    flats: {
      input,
      declaredFrom,
      declaredTo,
      roundedCorners: largest < corner - STATION_TOLERANCE,
      cut: { kind: 'flats', id: input.id, from, to, count: input.count, distance, phase: input.phase ?? 0 },
    },
  };
}

/** Where flats that are declared to end at `end` really stop, to the right. */
function runOut(outline: Generator, end: number, distance: number): number {
  const index = outline.findIndex((piece) => Math.abs(piece.from - end) <= STATION_TOLERANCE);
  if (index < 0) return end;
  let reached = end;
  let before = radiusAt(outline, end, 'left');
  for (const piece of outline.slice(index)) {
    const start = pieceRadius(piece, piece.from);
    if (start > before + STATION_TOLERANCE || start <= distance || !falls(piece)) return reached;
    const met = levelRoots(piece, distance)[0];
    if (met !== undefined) return met;
    reached = piece.to;
    before = pieceRadius(piece, piece.to);
    if (before <= distance + STATION_TOLERANCE) return reached;
  }
  return reached;
}

function falls(piece: Piece): boolean {
  return pieceRadius(piece, piece.to) < pieceRadius(piece, piece.from) - STATION_TOLERANCE;
}
