import { boxAround } from '../geometry/box';
import type { Box } from '../geometry/box';
import { footprintOf } from '../footprint';
import type { Candidate } from '../layout';
import type { Mark } from '../sheet';
import { textBoxesOf } from '../strokes';

/** A way of drawing a size that is not worked out yet: most are never needed. */
export interface Draft {
  form: Candidate['form'];
  cost: number;
  rotate?: -90;
  build: () => { strokes: readonly Mark[]; writing: readonly Mark[] };
}

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

/** The draft worked out. */
export function realise(draft: Draft): Candidate {
  const { strokes, writing } = draft.build();
  return candidateOf(draft.form, strokes, writing, draft.cost, draft.rotate);
}
