import type { ThreadFeature } from '../../part/part';
import { formatThread, parseThread } from '../../standards/threads';
import { threadLimits } from '../../standards/threads/limits';

export interface ThreadBlank {
  diameter: number;
  upper: number;
  lower: number;
  thread: string;
}

/**
 * Diameter to turn before a thread is cut (mm): in the middle of the class's limits of the major diameter, so a die
 * that raises the crest a little stays inside them. Without a table of limits a tenth of the pitch under.
 */
export function threadBlank(thread: ThreadFeature): ThreadBlank {
  const known = KNOWN.get(thread);
  if (known) return known;
  const blank = blankOf(thread);
  KNOWN.set(thread, blank);
  return blank;
}

/** Asked for in every candidate: a thread's limits are looked up once. */
const KNOWN = new WeakMap<ThreadFeature, ThreadBlank>();

function blankOf(thread: ThreadFeature): ThreadBlank {
  const parsed = parseThread(thread.designation);
  const limits = parsed.ok ? threadLimits(parsed.value) : null;
  const name = parsed.ok ? formatThread(parsed.value) : thread.designation;
  const upper = limits ? limits.major.max : thread.major - 0.03 * thread.pitch;
  const lower = limits ? limits.major.min : thread.major - 0.17 * thread.pitch;
  const middle = Math.round(((upper + lower) / 2) * 100) / 100;
  return { diameter: Math.min(upper, Math.max(lower, middle)), upper, lower, thread: name };
}
