import { boxAround } from '../geometry/box';
import type { Box } from '../geometry/box';
import { footprintOf } from '../footprint';
import type { Candidate } from '../layout';
import type { Mark } from '../sheet';
import { textBoxesOf } from '../strokes';

/** Puts a candidate together from its strokes and its writing. */
export function candidateOf(
  form: Candidate['form'],
  strokes: readonly Mark[],
  writing: readonly Mark[],
  cost: number,
  rotate?: -90,
): Candidate {
  const marks = [...strokes, ...writing];
  const textBox: Box = boxAround(textBoxesOf(writing)) ?? [0, 0, 0, 0];
  return { form, marks, print: footprintOf(marks), cost, clashes: 0, textBox, rotate };
}
