import type { LineType } from './sheet';

/**
 * Width (mm) and dash pattern of each kind of line.
 * Source: ISO 128-2, line group 0.5: wide 0.5, narrow 0.25; long-dashed dotted centre lines; sheet frame 0.7 (ISO 5457).
 */
export const lineLook: Readonly<Record<LineType, { width: number; dash?: string }>> = {
  visible: { width: 0.5 },
  hidden: { width: 0.25, dash: '3 1' },
  centre: { width: 0.25, dash: '7 1.2 0.6 1.2' },
  thin: { width: 0.25 },
  hatch: { width: 0.25 },
  break: { width: 0.25 },
  cutting: { width: 0.5, dash: '7 1.2 0.6 1.2' },
  dimension: { width: 0.25 },
  extension: { width: 0.25 },
  leader: { width: 0.25 },
  arrow: { width: 0.1 },
  frame: { width: 0.7 },
  table: { width: 0.25 },
  symbol: { width: 0.35 },
};
