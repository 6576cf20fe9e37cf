import { UniqueConstraintError } from 'sequelize';
import { Refusal } from '../errors';
import type { Revision } from '../models/revision';
import { permit } from '../policies/permit';
import { addDraft } from './add-draft';
import { requirePrintable } from './printable';
import type { RevisionAt } from './revision-at';
import { drawingAt, matterOf } from './revision-at';
import type { ShopWork } from './shop-work';

/**
 * Starts the next revision from what the released one holds, worked out by today's engine and register.
 * @throws Refusal `wrong-state` when nothing is released, or another revision is being worked on.
 */
export async function startRevision(work: ShopWork, drawingId: string, change: string): Promise<RevisionAt> {
  requirePrintable('change', change);
  const { models } = work.services.database;
  const drawing = await drawingAt(work, drawingId);
  const scope = { shopId: work.shop.id, drawingId: drawing.id };
  const released = await models.revisions.findOne({
    where: { ...scope, state: 'released' },
    transaction: work.t,
    lock: work.t.LOCK.UPDATE,
  });
  if (!released) {
    permit('start-drawing', work.asker);
    throw new Refusal(
      'wrong-state',
      undefined,
      undefined,
      'Nothing of this drawing is released that a new revision could start from.',
    );
  }
  permit('start-revision', work.asker, await matterOf(work, released));
  const openOne = await models.revisions.findOne({
    where: { ...scope, state: ['draft', 'in review'] },
    attributes: ['letter'],
    transaction: work.t,
  });
  if (openOne) throw alreadyOpen(openOne.letter);
  const last = await models.revisions.max<number, typeof released>('sequence', {
    where: scope,
    transaction: work.t,
  });
  try {
    return await addDraft(work, drawing, filledFrom(released), { sequence: last + 1, change });
  } catch (error) {
    if (error instanceof UniqueConstraintError) throw alreadyOpen('');
    throw error;
  }
}

function alreadyOpen(letter: string): Refusal {
  return new Refusal(
    'wrong-state',
    undefined,
    undefined,
    `Revision ${letter} of this drawing is being worked on already.`.replace('  ', ' '),
  );
}

function filledFrom({ template, title, note, entryUnit, settings, typed }: Revision) {
  return { template, title, note, entryUnit, settings, typed };
}
