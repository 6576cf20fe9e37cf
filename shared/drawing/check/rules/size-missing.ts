import { finding, ofRole } from '../reading';
import type { CheckRule } from '../reading';

/** Every size of the scheme on the sheet, and the scheme itself complete. */
export const sizeMissing: CheckRule = {
  id: 'size-missing',
  check: (reading) => {
    const drawn = new Set(ofRole(reading, 'dimension').map((g) => g.group.sizeId));
    const absent = reading.scheme.sizes
      .filter((s) => !drawn.has(s.id))
      .map((s) => finding('size-missing', `${s.id} is not on the sheet.`, [s.id]));
    const open = reading.scheme.completeness.missing.map((words) =>
      finding('size-missing', `Nothing fixes ${words}.`, [words]),
    );
    return [...absent, ...open];
  },
};
