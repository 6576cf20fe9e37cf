import { validate } from 'uuid';
import { Refusal } from '../errors';
import type { Drawing } from '../models/drawing';
import type { Revision } from '../models/revision';
import type { Matter } from '../policies/permit';
import type { ShopWork } from './shop-work';

/** A revision of this shop, its drawing, and how the asker stands to it. */
export interface RevisionAt {
  drawing: Drawing;
  revision: Revision;
  matter: Matter;
}

export interface RevisionPlace {
  drawing: string;
  revision: string;
}

/**
 * Loads a revision. With `lock` its row is held until the transaction ends, so that what was judged is what is changed.
 * @throws Refusal `not-found`: ids of another shop look exactly like ids that never were.
 */
export async function revisionAt(
  work: ShopWork,
  place: RevisionPlace,
  options: { lock?: boolean } = {},
): Promise<RevisionAt> {
  const { models } = work.services.database;
  const drawing = await drawingAt(work, place.drawing);
  if (!validate(place.revision)) throw new Refusal('not-found');
  const revision = await models.revisions.findOne({
    where: { shopId: work.shop.id, drawingId: drawing.id, id: place.revision },
    transaction: work.t,
    lock: options.lock ? work.t.LOCK.UPDATE : undefined,
  });
  if (!revision) throw new Refusal('not-found');
  return { drawing, revision, matter: await matterOf(work, revision) };
}

/** @throws Refusal `not-found` */
export async function drawingAt(work: ShopWork, id: string): Promise<Drawing> {
  if (!validate(id)) throw new Refusal('not-found');
  const drawing = await work.services.database.models.drawings.findOne({
    where: { shopId: work.shop.id, id },
    transaction: work.t,
  });
  if (!drawing) throw new Refusal('not-found');
  return drawing;
}

export async function matterOf(work: ShopWork, revision: Revision): Promise<Matter> {
  const own = await work.services.database.models.revisionEditors.count({
    where: { shopId: work.shop.id, revisionId: revision.id, personId: work.person.id },
    transaction: work.t,
  });
  return { state: revision.state, trial: revision.trial, own: own > 0 };
}
