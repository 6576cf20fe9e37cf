import type { Part } from '../../part/part';
import type { Scheme } from '../../scheme/scheme';
import type { CheckFinding, Sheet } from '../sheet';
import { checkRules } from './check-rules';
import { readSheet } from './reading';

export { checkRules } from './check-rules';

/**
 * The sheet as a checker in the drawing office would judge it: every finding of every rule, none when it is clean.
 * Reads the finished sheet alone; scheme and part are asked only for what must be on it and whether it is true.
 */
export function checkSheet(sheet: Sheet, scheme: Scheme, part: Part): CheckFinding[] {
  const reading = readSheet(sheet, scheme, part);
  return checkRules.flatMap((rule) => rule.check(reading));
}
