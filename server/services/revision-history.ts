import { Op } from 'sequelize';
import type { Revision } from '../models/revision';
import { namesOf } from './people-names';
import { printedDate } from './printed-date';
import type { ShopWork } from './shop-work';

export interface HistoryLine {
  letter: string;
  change: string;
  by: string;
  date: string;
}

/** Earlier revisions of the drawing that were released, oldest first, as the sheet's revision table prints them. */
export async function revisionHistory(
  work: ShopWork,
  revision: { drawingId: string; sequence: number },
): Promise<HistoryLine[]> {
  const earlier = await work.services.database.models.revisions.findAll({
    where: {
      shopId: work.shop.id,
      drawingId: revision.drawingId,
      sequence: { [Op.lt]: revision.sequence },
      state: ['released', 'superseded', 'withdrawn'],
    },
    attributes: ['letter', 'change', 'checkedBy', 'checkedAt', 'drawnBy'],
    order: [['sequence', 'ASC']],
    transaction: work.t,
  });
  const name = await namesOf(
    work,
    earlier.map((one) => one.checkedBy),
  );
  return earlier.map((one) => lineOf(one, name, work.shop.timeZone));
}

function lineOf(revision: Revision, name: (id: string) => string, timeZone: string): HistoryLine {
  if (!revision.checkedBy || !revision.checkedAt)
    throw new Error('A released revision has no second signature.');
  return {
    letter: revision.letter,
    change: revision.change,
    by: name(revision.checkedBy),
    date: printedDate(revision.checkedAt, timeZone),
  };
}
