import { boxAround } from '../geometry/box';
import type { Box } from '../geometry/box';
import { footprintWith } from '../footprint';
import { placeLabel, writtenBoxes } from '../label';
import type { Written } from '../label';
import type { Candidate } from '../layout';
import type { Mark } from '../sheet';
import { textBoxesOf } from '../strokes';

/** A way of drawing a size that is not worked out yet: most are never needed. */
export interface Draft {
  form: Candidate['form'];
  cost: number;
  rotate?: -90;
  build: () => { strokes: readonly Mark[]; writing: Written };
}

/** Drafts, and dearer ones that are only made where the cheap ones do not do. */
export interface Drafts {
  first: readonly Draft[];
  later?: { from: number; make: () => readonly Draft[] };
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
  const texts = textBoxesOf(writing);
  const textBox: Box = boxAround(texts) ?? [0, 0, 0, 0];
  return {
    form,
    marks: () => marks,
    print: footprintWith(strokes, texts),
    cost,
    clashes: 0,
    textBox,
    rotate,
  };
}

/** The draft worked out, all but the marks of its writing, which are made if it is chosen. */
export function realise(draft: Draft): Candidate {
  const { strokes, writing } = draft.build();
  const texts = writtenBoxes(writing);
  return {
    form: draft.form,
    marks: () => [...strokes, ...placeLabel(writing.label, writing.x, writing.y, writing.rotate)],
    print: footprintWith(strokes, texts),
    cost: draft.cost,
    clashes: 0,
    textBox: boxAround(texts) ?? [0, 0, 0, 0],
    rotate: draft.rotate,
  };
}
