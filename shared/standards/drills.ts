// Tapping drills. Metric: ISO 2306 (from memory), which is d - P brought to a drill that exists. Unified: the usual chart of about 75 % thread.
import type { Certainty } from './certainty';
import {
  INCH_SYSTEMS,
  METRIC_SYSTEMS,
  drillByName,
  nearestDrill,
  nextDrillUp,
  type DrillSize,
} from './drill-sizes';
import type { ThreadSpec } from './threads';

export * from './drill-sizes';

export interface TapDrill {
  drill: DrillSize;
  /** Share of the basic thread depth the hole leaves, 0 to 1 (and over 1 when too small). */
  engagement: number;
  source: string;
  certainty: Certainty;
}

/** What is taken off the diameter where d - P falls between two drills, mm, by pitch. */
const METRIC_ALLOWANCE: Readonly<Record<number, number>> = { 0.75: 0.8, 1.25: 1.2, 1.75: 1.8 };

/** Unified coarse and fine, by designation. Certainty: common charts. */
const UNIFIED_CHART: Readonly<Record<string, string>> = {
  '#0-80 UNF': '3/64',
  '#1-64 UNC': '#53',
  '#1-72 UNF': '#53',
  '#2-56 UNC': '#50',
  '#2-64 UNF': '#50',
  '#3-48 UNC': '#47',
  '#3-56 UNF': '#45',
  '#4-40 UNC': '#43',
  '#4-48 UNF': '#42',
  '#5-40 UNC': '#38',
  '#5-44 UNF': '#37',
  '#6-32 UNC': '#36',
  '#6-40 UNF': '#33',
  '#8-32 UNC': '#29',
  '#8-36 UNF': '#29',
  '#10-24 UNC': '#25',
  '#10-32 UNF': '#21',
  '#12-24 UNC': '#16',
  '#12-28 UNF': '#14',
  '1/4-20 UNC': '#7',
  '1/4-28 UNF': '#3',
  '5/16-18 UNC': 'F',
  '5/16-24 UNF': 'I',
  '3/8-16 UNC': '5/16',
  '3/8-24 UNF': 'Q',
  '7/16-14 UNC': 'U',
  '7/16-20 UNF': '25/64',
  '1/2-13 UNC': '27/64',
  '1/2-20 UNF': '29/64',
  '9/16-12 UNC': '31/64',
  '9/16-18 UNF': '33/64',
  '5/8-11 UNC': '17/32',
  '5/8-18 UNF': '37/64',
  '3/4-10 UNC': '21/32',
  '3/4-16 UNF': '11/16',
  '7/8-9 UNC': '49/64',
  '7/8-14 UNF': '13/16',
  '1-8 UNC': '7/8',
  '1-12 UNF': '59/64',
  '1-1/8-7 UNC': '63/64',
  '1-1/8-12 UNF': '1-3/64',
  '1-1/4-7 UNC': '1-7/64',
  '1-1/4-12 UNF': '1-11/64',
  '1-3/8-6 UNC': '1-7/32',
  '1-3/8-12 UNF': '1-19/64',
  '1-1/2-6 UNC': '1-11/32',
  '1-1/2-12 UNF': '1-27/64',
  '1-3/4-5 UNC': '1-9/16',
};

/** Depth of thread a hole of this diameter leaves, as a share of the full basic depth of the external thread's 60° form: (D - d) / (1.299 P). */
export function threadEngagement(spec: ThreadSpec, holeDiameterMm: number): number {
  const full =
    spec.series.startsWith('metric') || spec.series.startsWith('un')
      ? 1.299038 * spec.pitch
      : spec.major - spec.root;
  return (spec.major - holeDiameterMm) / full;
}

/** Hole diameter in mm for a share of thread (0.75 for 75 %). */
export function holeForEngagement(spec: ThreadSpec, share: number): number {
  return spec.major - share * 1.299038 * spec.pitch;
}

/** The drill for a tapped hole; null for a thread no tap of this series drills for (trapezoidal, Acme). */
export function tapDrill(spec: ThreadSpec): TapDrill | null {
  if (spec.series === 'tr' || spec.series === 'acme') return null;
  if (spec.series.startsWith('metric')) {
    const drill = nearestDrill(spec.major - (METRIC_ALLOWANCE[spec.pitch] ?? spec.pitch), METRIC_SYSTEMS);
    return drill && result(spec, drill, 'ISO 2306: d - P', 'from memory');
  }
  if (spec.series.startsWith('un')) {
    const charted = UNIFIED_CHART[spec.designation];
    const drill =
      charted === undefined
        ? nearestDrill(holeForEngagement(spec, 0.75), INCH_SYSTEMS)
        : drillByName(charted);
    return drill && result(spec, drill, 'tapping drills for about 75 % of thread', 'common practice');
  }
  // Whitworth form, BA and pipe: a tenth of the depth left open, so the tap does not cut at its root.
  const open = spec.minor + 0.1 * (spec.major - spec.minor);
  const drill = nextDrillUp(
    open,
    spec.series === 'ba' || spec.series === 'g' ? METRIC_SYSTEMS : [...INCH_SYSTEMS],
  );
  return (
    drill && result(spec, drill, 'minor diameter and a tenth of the depth, next drill up', 'common practice')
  );
}

function result(spec: ThreadSpec, drill: DrillSize, source: string, certainty: Certainty): TapDrill {
  return { drill, engagement: threadEngagement(spec, drill.diameter), source, certainty };
}
