import { describe, expect, it } from 'vitest';
import {
  parseThread,
  threadLimits,
  internalThreadLimits,
  type ThreadSpec,
} from '../../shared/standards/threads';
import { METRIC_THREAD_LIMITS } from './published/metric-thread-limits';
import { THREAD_BASIC_SIZES } from './published/thread-basic-sizes';
import { UNIFIED_THREAD_LIMITS } from './published/unified-thread-limits';

const MM_PER_INCH = 25.4;

function threadOf(text: string): ThreadSpec {
  const read = parseThread(text);
  if (!read.ok) throw new Error(`${text}: ${read.message}`);
  return read.value;
}

/** Major, pitch and minor limits of either side, as far as the class has them. */
function limitOf(spec: ThreadSpec, quantity: string): number | undefined {
  const external = /[a-z]|A$/.test(spec.class ?? '');
  const both = external
    ? { minor: undefined, ...threadLimits(spec) }
    : { major: undefined, ...internalThreadLimits(spec) };
  const key = quantity.slice(0, -3) as 'major' | 'pitch' | 'minor';
  const end = quantity.endsWith('Max') ? 'max' : 'min';
  return both[key]?.[end];
}

describe('basic sizes against published tables', () => {
  const sources = [...new Set(THREAD_BASIC_SIZES.map(([, , , , source]) => source))];
  it.each(sources)('%s', (source) => {
    const wrong = THREAD_BASIC_SIZES.filter((row) => row[4] === source).filter(
      ([designation, quantity, value, unit]) => {
        const mm = threadOf(designation)[quantity];
        const found = unit === 'in' ? mm / MM_PER_INCH : mm;
        // Tables are printed to three decimals of a millimetre or four of an inch.
        return !(Math.abs(found - value) <= (unit === 'in' ? 0.00011 : 0.0011));
      },
    );
    expect(wrong).toEqual([]);
  });
});

describe('limits of metric threads against ISO 965', () => {
  const classes = [...new Set(METRIC_THREAD_LIMITS.map(([threadClass]) => threadClass))];
  it.each(classes)('%s', (threadClass) => {
    const wrong = METRIC_THREAD_LIMITS.filter((row) => row[0] === threadClass).filter(
      ([, diameter, pitch, quantity, mm]) => {
        const found = limitOf(threadOf(`M${diameter}x${pitch}-${threadClass}`), quantity);
        return !(found !== undefined && Math.abs(found - mm) <= 0.0011);
      },
    );
    expect(wrong).toEqual([]);
  });
});

describe('limits of unified threads against ASME B1.1', () => {
  const classes = [...new Set(UNIFIED_THREAD_LIMITS.map(([, threadClass]) => threadClass))];
  it.each(classes)('%s', (threadClass) => {
    const wrong = UNIFIED_THREAD_LIMITS.filter((row) => row[1] === threadClass).filter(
      ([designation, , quantity, inches]) => {
        const found = limitOf(threadOf(`${designation} ${threadClass}`), quantity);
        // The printed tables round each step; one unit of the last place is theirs.
        return !(found !== undefined && Math.abs(found / MM_PER_INCH - inches) <= 0.00011);
      },
    );
    expect(wrong).toEqual([]);
  });
});
