/** Threads the generators draw from, with the major diameter and pitch (mm) they need room for. ISO 261, ASME B1.1. */
export interface GeneratedThread {
  text: string;
  major: number;
  pitch: number;
}

export const METRIC_THREADS: readonly GeneratedThread[] = [
  { text: 'M6', major: 6, pitch: 1 },
  { text: 'M8-6g', major: 8, pitch: 1.25 },
  { text: 'M10', major: 10, pitch: 1.5 },
  { text: 'M10x1.25', major: 10, pitch: 1.25 },
  { text: 'M12', major: 12, pitch: 1.75 },
  { text: 'M12x1.25-6g', major: 12, pitch: 1.25 },
  { text: 'M16', major: 16, pitch: 2 },
  { text: 'M16x1.5 LH', major: 16, pitch: 1.5 },
  { text: 'M20', major: 20, pitch: 2.5 },
  { text: 'M24x2', major: 24, pitch: 2 },
];

export const INCH_THREADS: readonly GeneratedThread[] = [
  { text: '1/4-20 UNC', major: 6.35, pitch: 1.27 },
  { text: '3/8-16 UNC', major: 9.525, pitch: 1.5875 },
  { text: '3/8-24 UNF-2A', major: 9.525, pitch: 25.4 / 24 },
  { text: '1/2-13 UNC-2A', major: 12.7, pitch: 25.4 / 13 },
  { text: '5/8-11 UNC', major: 15.875, pitch: 25.4 / 11 },
  { text: '3/4-16 UNF', major: 19.05, pitch: 1.5875 },
];

export const THREADS: readonly GeneratedThread[] = [...METRIC_THREADS, ...INCH_THREADS];
