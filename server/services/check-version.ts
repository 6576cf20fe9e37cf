import { Refusal } from '../errors';
import { presentRevision } from '../presenters/revision';
import type { RevisionAt } from './revision-at';
import type { ShopWork } from './shop-work';

/** @throws Refusal `stale`, carrying the revision as it stands now, when the request was made from another version. */
export async function checkVersion(work: ShopWork, at: RevisionAt, version: number): Promise<void> {
  if (version !== at.revision.version) throw await stale(work, at);
}

/** The refusal itself: the request was made from something that is no longer there. */
export async function stale(work: ShopWork, at: RevisionAt): Promise<Refusal> {
  return new Refusal('stale', undefined, { current: await presentRevision(work, at) });
}
