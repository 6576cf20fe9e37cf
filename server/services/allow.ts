import type { ActId } from '../policies/act-table';
import type { Asker } from '../policies/permit';
import { judge, permit } from '../policies/permit';
import { Refusal } from '../errors';
import { presentRevision } from '../presenters/revision';
import type { RevisionAt } from './revision-at';
import type { ShopWork } from './shop-work';

/**
 * Lets an act on a locked revision pass. Whoever may never do it is told so; whoever may, but asks from an older
 * version, is shown what is there now; only then does the state count.
 * @throws Refusal `forbidden`, `own-work`, `stale` or `wrong-state`
 */
export async function allow(
  work: ShopWork,
  at: RevisionAt,
  act: ActId,
  version: number,
  asker: Asker = work.asker,
): Promise<void> {
  const verdict = judge(act, asker, at.matter);
  if ((verdict === 'allowed' || verdict === 'state') && version !== at.revision.version)
    throw await stale(work, at);
  permit(act, asker, at.matter);
}

/** The refusal of a request that was made from something that is no longer there. */
export async function stale(work: ShopWork, at: RevisionAt): Promise<Refusal> {
  return new Refusal('stale', undefined, { current: await presentRevision(work, at) });
}
