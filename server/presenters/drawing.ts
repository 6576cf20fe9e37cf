import type { Abilities, DrawingAnswer, RevisionSummary } from '../../shared/api/drawings';
import type { Drawing } from '../models/drawing';
import type { Revision } from '../models/revision';
import { shopAbilities } from '../policies/abilities';
import { judge, mayRead } from '../policies/permit';
import { matterOf } from '../services/revision-at';
import type { ShopWork } from '../services/shop-work';
import { Refusal } from '../errors';
import { presentSummary } from './revision-summary';

/**
 * A drawing with those of its revisions that the asker may read, newest first.
 * @throws Refusal `forbidden` when there is none they may read.
 */
export async function presentDrawing(work: ShopWork, drawing: Drawing): Promise<DrawingAnswer> {
  const all = await revisionsOf(work, drawing.id);
  const readable: Revision[] = [];
  for (const revision of all) {
    if (mayRead(work.asker, await matterOf(work, revision))) readable.push(revision);
  }
  const [newest] = readable;
  if (!newest) throw new Refusal('forbidden');
  return {
    drawing: { id: drawing.id, number: drawing.number, title: newest.title, template: drawing.template },
    revisions: readable.map((revision): RevisionSummary => presentSummary(revision)),
    abilities: drawingAbilities(work, all),
  };
}

function drawingAbilities(work: ShopWork, revisions: readonly Revision[]): Abilities {
  const released = revisions.find((revision) => revision.state === 'released');
  const open = revisions.some(isOpen);
  const may =
    released &&
    judge('start-revision', work.asker, { state: 'released', trial: false, own: false }) === 'allowed';
  return { ...shopAbilities(work.asker), 'start-revision': Boolean(may) && !open };
}

/** Whether another revision of the drawing is being worked on. */
export async function openRevision(work: ShopWork, revision: Revision): Promise<{ open: boolean }> {
  const all = await revisionsOf(work, revision.drawingId);
  return { open: all.some(isOpen) };
}

function isOpen(revision: Revision): boolean {
  return revision.state === 'draft' || revision.state === 'in review';
}

function revisionsOf(work: ShopWork, drawingId: string): Promise<Revision[]> {
  return work.services.database.models.revisions.findAll({
    where: { shopId: work.shop.id, drawingId },
    attributes: [
      'id',
      'letter',
      'state',
      'trial',
      'returned',
      'version',
      'changedAt',
      'change',
      'title',
      'sequence',
    ],
    order: [['sequence', 'DESC']],
    transaction: work.t,
  });
}
