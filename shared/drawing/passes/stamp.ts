import type { Box } from '../geometry/box';
import type { Group } from '../sheet';
import { ADVANCE } from '../text-metrics';

const SHARE = 0.72;
const LARGEST = 16;

/** The state of an unreleased sheet, faint and large across the drawing space; drawn under everything. */
export function stampGroup(text: string, frame: Box, footTop: number): Group {
  const size = Math.min(LARGEST, ((frame[2] - frame[0]) * SHARE) / (ADVANCE * Math.max(1, text.length)));
  const x = (frame[0] + frame[2]) / 2;
  const y = frame[1] + (footTop - frame[1]) * 0.86;
  return { role: 'stamp', marks: [{ type: 'text', x, y, size, anchor: 'middle', weight: 700, text, faint: true }] };
}
