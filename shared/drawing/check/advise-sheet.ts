import type { Part } from '../../part/part';
import type { Scheme } from '../../scheme/scheme';
import type { AdviceFinding, Sheet } from '../sheet';
import { breakInStubby } from './advice/break-in-stubby';
import { extensionHugs } from './advice/extension-hugs';
import { leaderLength } from './advice/leader-length';
import { leaderOverOutline } from './advice/leader-over-outline';
import { leadersLean } from './advice/leaders-lean';
import { outlinesMerge } from './advice/outlines-merge';
import { smallDetail } from './advice/small-detail';
import { smallOnSheet } from './advice/small-on-sheet';
import type { CheckRule } from './reading';
import { readSheet } from './reading';

/** Every rule of advice: what a draughtsman would do better, but no checker refuses. */
export const adviceRules: readonly CheckRule[] = [
  smallDetail,
  smallOnSheet,
  outlinesMerge,
  leaderOverOutline,
  extensionHugs,
  breakInStubby,
  leaderLength,
  leadersLean,
];

/** What could be lovelier on a finished sheet; reads the sheet alone, as the check does. */
export function adviseSheet(sheet: Sheet, scheme: Scheme, part: Part): AdviceFinding[] {
  const reading = readSheet(sheet, scheme, part);
  return adviceRules.flatMap((rule) => rule.check(reading));
}
