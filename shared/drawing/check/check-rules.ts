import { balloons } from './rules/balloons';
import { brokenView } from './rules/break-lines';
import { centreLine } from './rules/centre-line';
import { dimensionCrossing } from './rules/dimension-crossing';
import { dimensionOverlap } from './rules/dimension-overlap';
import { extensionEdge } from './rules/extension-edge';
import { extensionTwice } from './rules/extension-twice';
import { figure } from './rules/figure';
import { foreignOutline } from './rules/foreign-outline';
import { geometry } from './rules/geometry';
import { insideFrame } from './rules/inside-frame';
import { leaderAngle } from './rules/leader-angle';
import { leadersCross } from './rules/leaders-cross';
import { lineWidths } from './rules/line-widths';
import { numbers } from './rules/numbers';
import { scaleSeries } from './rules/scale-series';
import { sizeMissing } from './rules/size-missing';
import { sizeTwice } from './rules/size-twice';
import { spacing } from './rules/spacing';
import { stackedLimits } from './rules/stacked-limits';
import { textDirection } from './rules/text-direction';
import { textSize } from './rules/text-size';
import { textStroke } from './rules/text-stroke';
import { textText } from './rules/text-text';
import { viewsOverlap } from './rules/views-overlap';
import type { CheckRule } from './reading';

/** Every rule of the sheet check, in the order in which findings are told. */
export const checkRules: readonly CheckRule[] = [
  textSize,
  textText,
  textStroke,
  textDirection,
  dimensionCrossing,
  dimensionOverlap,
  foreignOutline,
  spacing,
  extensionEdge,
  extensionTwice,
  leaderAngle,
  leadersCross,
  insideFrame,
  viewsOverlap,
  scaleSeries,
  lineWidths,
  centreLine,
  brokenView,
  sizeMissing,
  sizeTwice,
  geometry,
  figure,
  stackedLimits,
  balloons,
  numbers,
];
