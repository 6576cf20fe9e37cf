import { allow } from './allow';
import { keepFacts } from './keep-facts';
import { drawStanding, keepMove, redrawn } from './move-revision';
import { recordDecision } from './record';
import type { RevisionAt, RevisionPlace } from './revision-at';
import { revisionAt } from './revision-at';
import type { ShopWork } from './shop-work';

/** Marks a draft as trial piece, or takes the mark off. */
export async function markTrial(
  work: ShopWork,
  place: RevisionPlace,
  version: number,
  trial: boolean,
): Promise<RevisionAt> {
  const at = await revisionAt(work, place, { lock: true });
  await allow(work, at, 'trial', version);
  const { revision, drawing } = at;
  if (revision.trial === trial) return at;
  const result = await drawStanding(work, at, { trial });
  await keepMove(work, revision, { trial, ...redrawn(revision, result) });
  await recordDecision(work, revision, trial ? 'trial on' : 'trial off');
  await keepFacts(work, drawing, revision);
  return { ...at, matter: { ...at.matter, trial } };
}
