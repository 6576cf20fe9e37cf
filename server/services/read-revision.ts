import { Refusal } from '../errors';
import { mayRead } from '../policies/permit';
import type { RevisionAt, RevisionPlace } from './revision-at';
import { revisionAt } from './revision-at';
import type { ShopWork } from './shop-work';

/** A revision that the asker may read. @throws Refusal `not-found`, `forbidden` */
export async function readRevision(work: ShopWork, place: RevisionPlace): Promise<RevisionAt> {
  const at = await revisionAt(work, place);
  if (!mayRead(work.asker, at.matter)) throw new Refusal('forbidden');
  return at;
}
