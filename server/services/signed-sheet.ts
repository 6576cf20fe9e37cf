import { namesOf } from './people-names';
import { printedDate } from './printed-date';
import { frozenBalloons } from './frozen-balloons';
import { revisionHistory } from './revision-history';
import { stampAcross, stateWord } from '../../shared/state-words';
import type { RevisionAt } from './revision-at';
import type { ShopWork } from './shop-work';
import type { Signed } from './work-out';
import type { Revision } from '../models/revision';

/** The parts of a revision that decide what its sheet says about itself. */
export type Standing = Pick<
  Revision,
  | 'state'
  | 'trial'
  | 'returned'
  | 'savedBy'
  | 'savedAt'
  | 'drawnBy'
  | 'drawnAt'
  | 'checkedBy'
  | 'checkedAt'
  | 'noSecondCheck'
>;

/** What the sheet of a revision prints when it stands so; before it is sent for checking its last saver drew it. */
export async function signedSheet(
  work: ShopWork,
  at: Pick<RevisionAt, 'drawing' | 'revision'>,
  standing: Standing,
): Promise<Signed> {
  const drawnBy = standing.drawnBy ?? standing.savedBy;
  const drawnAt = standing.drawnAt ?? standing.savedAt;
  const name = await namesOf(work, [drawnBy, standing.checkedBy]);
  const day = (moment: Date) => printedDate(moment, work.shop.timeZone);
  return {
    number: at.drawing.number,
    letter: at.revision.letter,
    state: stateWord(standing),
    stamp: stampAcross(standing),
    drawn: { by: name(drawnBy), date: day(drawnAt) },
    checked: standing.noSecondCheck
      ? 'NO SECOND CHECK'
      : standing.checkedBy && standing.checkedAt
        ? { by: name(standing.checkedBy), date: day(standing.checkedAt) }
        : null,
    history: await revisionHistory(work, at.revision),
    frozenBalloons: await frozenBalloons(work, at.revision),
  };
}

/** How a revision stands now. */
export function standingOf(revision: Revision): Standing {
  const { state, trial, returned, savedBy, savedAt, drawnBy, drawnAt, checkedBy, checkedAt, noSecondCheck } =
    revision;
  return { state, trial, returned, savedBy, savedAt, drawnBy, drawnAt, checkedBy, checkedAt, noSecondCheck };
}
