import { allow } from './allow';
import { keepFacts } from './keep-facts';
import { keepMove } from './move-revision';
import { recordDecision } from './record';
import type { RevisionAt, RevisionPlace } from './revision-at';
import { revisionAt } from './revision-at';
import type { ShopWork } from './shop-work';

/** Withdraws a release, with the reason: nobody may work from it any more. */
export async function withdrawRevision(
  work: ShopWork,
  place: RevisionPlace,
  version: number,
  reason: string,
): Promise<RevisionAt> {
  const at = await revisionAt(work, place, { lock: true });
  await allow(work, at, 'withdraw', version);
  await keepMove(work, at.revision, { state: 'withdrawn' });
  await recordDecision(work, at.revision, 'withdrawn', { reason });
  await keepFacts(work, at.drawing, at.revision);
  return { ...at, matter: { ...at.matter, state: 'withdrawn' } };
}
