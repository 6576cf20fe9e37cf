import type { Group } from '../sheet';
import { ADVANCE } from '../text-metrics';

const SHARE = 0.94;
const LARGEST = 16;
const LIFT = 6;

/** The state of an unreleased sheet, faint and large beside the notes over the title block; drawn under everything. */
export function stampGroup(text: string, left: number, right: number, bottom: number): Group {
  const size = Math.min(LARGEST, ((right - left) * SHARE) / (ADVANCE * Math.max(1, text.length)));
  const x = (left + right) / 2;
  return {
    role: 'stamp',
    marks: [{ type: 'text', x, y: bottom - LIFT, size, anchor: 'middle', weight: 700, text, faint: true }],
  };
}
