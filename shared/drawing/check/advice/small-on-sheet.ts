import { finding } from '../reading';
import type { CheckRule } from '../reading';
import { drawingBox, largerScaleFits, roomsOf } from '../room';

const SHARE = 0.45;

/** Views and sizes fill the sheet at least one way, where a larger scale fits. */
export const smallOnSheet: CheckRule = {
  id: 'small-on-sheet',
  check: (reading) => {
    const room = roomsOf(reading)[0];
    const drawing = drawingBox(reading);
    if (!room || !drawing) return [];
    const wide = (drawing[2] - drawing[0]) / (room[2] - room[0]);
    const high = (drawing[3] - drawing[1]) / (room[3] - room[1]);
    if (wide >= SHARE || high >= SHARE || !largerScaleFits(reading)) return [];
    const share = Math.round(100 * Math.max(wide, high));
    return [
      finding('small-on-sheet', `Views and sizes fill ${share} % of the sheet; a larger scale fits.`, [
        'axis',
      ]),
    ];
  },
};
