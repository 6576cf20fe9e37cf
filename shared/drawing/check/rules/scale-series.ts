import { INCH_SCALES, ISO_SCALES } from '../../../standards/scales';
import { finding, ofRole } from '../reading';
import type { CheckRule } from '../reading';

/** Every view at a scale of the series, and the sheet's own scale in the title block. */
export const scaleSeries: CheckRule = {
  id: 'scale-series',
  check: (reading) => {
    const { sheet } = reading;
    const series = [...ISO_SCALES, ...(sheet.style === 'asme' ? INCH_SCALES : [])];
    const known = (factor: number): boolean => series.some((s) => Math.abs(s.factor - factor) < 1e-9);
    const views = ofRole(reading, 'view').filter((v) => v.group.scale === undefined || !known(v.group.scale));
    const found = views.map((v) =>
      finding(
        'scale-series',
        `The view ${v.name} is drawn at ${v.group.scale ?? 'no scale'}, which is not in the series.`,
        [v.name],
      ),
    );
    if (!known(sheet.scale))
      found.push(
        finding('scale-series', `The sheet's scale ${sheet.scaleText} is not in the series.`, [
          'title-block',
        ]),
      );
    return found;
  },
};
