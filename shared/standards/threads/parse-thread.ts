import { quoteGiven, refuse } from '../../units/parsed';
import { MAX_TYPED_LENGTH, readHand, type HandedText } from './designation';
import { parseMetricThread } from './metric';
import type { ParsedThread, ThreadSpec } from './thread-spec';
import { looksAcme, looksTrapezoidal, parseAcmeThread, parseTrapezoidalThread } from './trapezoidal';
import { looksUnified, parseUnifiedThread } from './unified';
import {
  looksBritishAssociation,
  looksPipe,
  looksWhitworth,
  parseBritishAssociationThread,
  parsePipeThread,
  parseWhitworthThread,
} from './whitworth';

/** Each series with how it is told from the others, asked in this order; unified last, since its size alone names no series. */
const SERIES: readonly { looks: (text: string) => boolean; parse: (handed: HandedText) => ParsedThread }[] = [
  { looks: (text) => /^M ?[\d.,]/i.test(text), parse: parseMetricThread },
  { looks: looksTrapezoidal, parse: parseTrapezoidalThread },
  { looks: looksAcme, parse: parseAcmeThread },
  { looks: looksWhitworth, parse: parseWhitworthThread },
  { looks: looksBritishAssociation, parse: parseBritishAssociationThread },
  { looks: looksPipe, parse: parsePipeThread },
  { looks: looksUnified, parse: parseUnifiedThread },
];

/**
 * Reads a thread as designated: `M10`, `M10x1.25-6g`, `M20x1.5 LH`, `3/8-16 UNC-2A`, `1/4-20`, `#10-24`, `1/2 BSW`, `2 BA`,
 * `G1/4`, `Tr20x8 (P4)`, `3/4-6 ACME`.
 * @returns basic sizes in mm, or a sentence naming what is allowed
 */
export function parseThread(text: string): ParsedThread {
  if (typeof text !== 'string') return refuse('A thread is typed as text, such as M10 or 3/8-16 UNC.');
  if (text.length > MAX_TYPED_LENGTH) {
    return refuse(
      `${quoteGiven(text)} is ${text.length} characters long. A thread takes at most ${MAX_TYPED_LENGTH}, such as M10x1.25-6g.`,
    );
  }
  const handed = readHand(text);
  if (handed.text === '')
    return refuse('No thread was given. Type a designation such as M10, M10x1.25 or 3/8-16 UNC.');
  const series = SERIES.find(({ looks }) => looks(handed.text));
  if (series) return series.parse(handed);
  return refuse(
    `${quoteGiven(text)} is not a thread that is read. Type a designation such as M10, M10x1.25-6g, 3/8-16 UNC-2A, #10-24, 1/2 BSW, 2 BA, G1/4 or Tr20x4.`,
  );
}

/** The whole designation with class and hand: `M10x1.25-6g`, `1/2-13 UNC-2A-LH`. Reads back to the same thread. */
export function formatThread(spec: ThreadSpec): string {
  const withClass = spec.class === undefined ? spec.designation : `${spec.designation}-${spec.class}`;
  return spec.hand === 'left' ? `${withClass}-LH` : withClass;
}
