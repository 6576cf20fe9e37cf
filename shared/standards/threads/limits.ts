import { metricExternalLimits, metricInternalLimits } from './metric-limits';
import type { Limits, ThreadSeries, ThreadSpec } from './thread-spec';
import { unifiedExternalLimits, unifiedInternalLimits } from './unified-limits';

export interface ExternalThreadLimits {
  /** The class they hold for: the thread's own, or the usual one when none was typed. */
  class: string;
  major: Limits;
  pitch: Limits;
}

export interface InternalThreadLimits {
  class: string;
  minor: Limits;
  pitch: Limits;
}

type Family = 'metric' | 'unified' | 'other';

function familyOf(series: ThreadSeries): Family {
  if (series.startsWith('metric')) return 'metric';
  return series.startsWith('un') ? 'unified' : 'other';
}

const USUAL_CLASS = {
  metric: { external: '6g', internal: '6H' },
  unified: { external: '2A', internal: '2B' },
} as const;

/** Whether a typed class is of a screw or of a hole; null when none was typed or the series has no such classes. */
export function classSide(spec: ThreadSpec): 'external' | 'internal' | null {
  if (spec.class === undefined) return null;
  const family = familyOf(spec.series);
  if (family === 'metric') return /[a-z]/.test(spec.class) ? 'external' : 'internal';
  if (family === 'unified') return spec.class.endsWith('A') ? 'external' : 'internal';
  return null;
}

/**
 * Limits of the external thread in mm, by its own class or the usual one (6g, 2A).
 * Null when the series has no limits tabled here yet, or the class is not tabled.
 */
export function threadLimits(spec: ThreadSpec): ExternalThreadLimits | null {
  const family = familyOf(spec.series);
  if (family === 'other') return null;
  const threadClass =
    classSide(spec) === 'external' && spec.class !== undefined ? spec.class : USUAL_CLASS[family].external;
  const limits =
    family === 'metric'
      ? metricExternalLimits(spec.major, spec.pitch, threadClass)
      : unifiedExternalLimits(spec.series, spec.major, spec.tpi ?? 0, threadClass);
  return limits === null ? null : { class: threadClass, ...limits };
}

/** Limits of the internal thread in mm, by its own class or the usual one (6H, 2B). Null as above. */
export function internalThreadLimits(spec: ThreadSpec): InternalThreadLimits | null {
  const family = familyOf(spec.series);
  if (family === 'other') return null;
  const threadClass =
    classSide(spec) === 'internal' && spec.class !== undefined ? spec.class : USUAL_CLASS[family].internal;
  const limits =
    family === 'metric'
      ? metricInternalLimits(spec.major, spec.pitch, threadClass)
      : unifiedInternalLimits(spec.series, spec.major, spec.tpi ?? 0, threadClass);
  return limits === null ? null : { class: threadClass, ...limits };
}
