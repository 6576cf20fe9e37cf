import type { Lathe } from '../register';
import type { StockOption } from '../stock';
import type { Words } from '../words';
import { inSentence } from '../words';

export type CandidateKind = 'bar' | 'stick' | 'blank';

/** One way to go about it: which end first, how the stock is cut, where the two ends' work meets. */
export interface Candidate {
  first: 'right' | 'left';
  kind: CandidateKind;
  /** Station, in the first end's view, from which the first end's work begins. */
  meets: number;
  /** Whether the work is turned round at all. */
  secondEnd: boolean;
  lathe: Lathe;
  stock: StockOption;
  /** Which end's holding the flats are milled in, where the bar is already their round. */
  flatsWith: 'first' | 'second';
}

/** Which end's work leans on a centre. */
export interface Tails {
  first: boolean;
  second: boolean;
}

const KIND_TEXT: Record<CandidateKind, string> = {
  bar: 'from the bar through the spindle',
  stick: 'from a sawn stick, parted last',
  blank: 'from a sawn blank',
};

export function candidateText(candidate: Candidate, words: Words): string {
  const turned = candidate.secondEnd
    ? candidate.meets > 1e-9
      ? `, turned round at ${words.length(candidate.meets)} from the far end`
      : ', turned round for its far face'
    : ', in one holding';
  return `${candidate.stock.text} ${KIND_TEXT[candidate.kind]}, ${candidate.first} end first${turned}, ${inSentence(candidate.lathe.name)}`;
}
