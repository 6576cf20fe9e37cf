import { fitLimits } from '../standards/iso286';
import { formatThread, parseThread, type ThreadSpec } from '../standards/threads';
import { threadLimits } from '../standards/threads/limits';
import type { SizeInstance } from '../template/size-instances';
import type { GeneralTolerance } from './general-tolerance';
import type { SizeTolerance } from './scheme';

export interface SizeLimits {
  tolerance: SizeTolerance;
  /** `as typed`, `ISO 286 h6`, `ISO 965 6g`, the general tolerance's own name, `reference`. */
  source: string;
  designation?: string;
}

/**
 * The limits of a size about its nominal (mm): typed, by ISO 286 code, by thread class, or by the general tolerance.
 * @throws when a tolerance that passed evaluation cannot be read: ours
 */
export function limitsOf(size: SizeInstance, general: GeneralTolerance, thread?: string): SizeLimits {
  const { nominal, tolerance } = size;
  const { kind, reference } = size.template;
  if (reference) return { tolerance: { kind: 'none', upper: 0, lower: 0 }, source: 'reference' };
  if (kind === 'thread') return threadSizeLimits(thread ?? '', nominal);
  switch (tolerance.kind) {
    case 'symmetric':
    case 'limits':
      return {
        tolerance: { kind: tolerance.kind, upper: tolerance.upper, lower: tolerance.lower },
        source: 'as typed',
      };
    case 'fit': {
      const limits = fitLimits(tolerance.code, nominal);
      if (!limits.ok) throw new TypeError(limits.message);
      return {
        tolerance: { kind: 'fit', ...limits.value, code: tolerance.code },
        source: `ISO 286 ${tolerance.code}`,
      };
    }
    case 'none': {
      const deviation = general.deviation(kind, nominal);
      return { tolerance: { kind: 'general', upper: deviation, lower: -deviation }, source: general.source };
    }
  }
}

/** Limits of a thread are those of its major diameter, which is what the turned blank and the finished crest are measured by. */
function threadSizeLimits(designation: string, nominal: number): SizeLimits {
  const thread = parseThread(designation);
  if (!thread.ok) throw new TypeError(thread.message);
  const limits = threadLimits(thread.value);
  const named = formatThread(thread.value);
  if (!limits) {
    return {
      tolerance: { kind: 'thread-class', upper: 0, lower: 0 },
      source: 'thread designation',
      designation: named,
    };
  }
  return {
    tolerance: {
      kind: 'thread-class',
      upper: limits.major.max - nominal,
      lower: limits.major.min - nominal,
      code: limits.class,
    },
    source: `${standardOf(thread.value)} ${limits.class}`,
    designation: named,
  };
}

function standardOf({ series }: ThreadSpec): string {
  return series.startsWith('metric') ? 'ISO 965' : 'ASME B1.1';
}
