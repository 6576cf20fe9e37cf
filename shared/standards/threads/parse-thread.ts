import { quoteGiven, refuse } from '../../units/parsed';
import { MAX_TYPED_LENGTH, readHand } from './designation';
import { parseMetricThread } from './metric';
import { parseUnifiedThread, looksUnified } from './unified';
import type { ParsedThread, ThreadSpec } from './thread-spec';

/**
 * Reads a thread as designated: `M10`, `M10x1.25-6g`, `M20x1.5 LH`, `3/8-16 UNC-2A`, `1/4-20`, `#10-24`.
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
  if (/^M ?[\d.,]/i.test(handed.text)) return parseMetricThread(handed);
  if (looksUnified(handed.text)) return parseUnifiedThread(handed);
  return refuse(
    `${quoteGiven(text)} is not a thread that is read. Type a designation such as M10, M10x1.25-6g, 3/8-16 UNC-2A or #10-24.`,
  );
}

/** The whole designation with class and hand: `M10x1.25-6g`, `1/2-13 UNC-2A-LH`. Reads back to the same thread. */
export function formatThread(spec: ThreadSpec): string {
  const withClass = spec.class === undefined ? spec.designation : `${spec.designation}-${spec.class}`;
  return spec.hand === 'left' ? `${withClass}-LH` : withClass;
}
