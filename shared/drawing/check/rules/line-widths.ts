import { lineLook } from '../../line-look';
import { rulesFor } from '../../rules';
import type { LineType } from '../../sheet';
import { finding, ofRole } from '../reading';
import type { CheckRule } from '../reading';

const WIDE: readonly LineType[] = ['visible', 'cutting', 'frame'];

/** Outlines are wide, what measures them is half as wide. */
export const lineWidths: CheckRule = {
  id: 'line-widths',
  check: (reading) => {
    const { lineRatio } = rulesFor(reading.sheet.style);
    const ratio = lineLook.visible.width / lineLook.dimension.width;
    const found = reading.groups
      .filter((g) => g.group.role === 'dimension' || g.group.role === 'balloon')
      .filter((g) => g.strokes.some((s) => WIDE.includes(s.line)))
      .map((g) => finding('line-widths', `${g.name} is drawn with a line as wide as an outline.`, [g.name]));
    for (const view of ofRole(reading, 'view'))
      if (!view.strokes.some((s) => s.line === 'visible'))
        found.push(finding('line-widths', `The view ${view.name} has no outline.`, [view.name]));
    if (Math.abs(ratio - lineRatio) > 1e-9)
      found.push(
        finding(
          'line-widths',
          `Outlines are ${ratio} times as wide as dimension lines; ${lineRatio} is the rule.`,
          ['sheet'],
        ),
      );
    return found;
  },
};
