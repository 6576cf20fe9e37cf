import { Refusal } from '../errors';
import { allow, stale } from './allow';
import { keepBlob } from './keep-blob';
import { keepFacts } from './keep-facts';
import { drawStanding, goodOf, keepMove } from './move-revision';
import { recordDecision } from './record';
import type { RevisionAt, RevisionPlace } from './revision-at';
import { revisionAt } from './revision-at';
import type { ShopWork } from './shop-work';
import { snapshotOf } from './work-out';

/**
 * Approves, which releases: under the row's lock the content must be what the checker saw, the asker none of its
 * editors; the released sheet is drawn with both signatures and kept as SVG and PDF, and the release before it is
 * superseded. In a shop with self-release its lead may approve their own; the sheet then says NO SECOND CHECK.
 */
export async function approveRevision(
  work: ShopWork,
  place: RevisionPlace,
  request: { version: number; contentHash: string },
): Promise<RevisionAt> {
  // Whoever switches self-release off waits for this approval, or is seen by it.
  await work.shop.reload({ transaction: work.t, lock: work.t.LOCK.SHARE });
  const asker = { ...work.asker, selfRelease: work.shop.selfRelease };
  const at = await revisionAt(work, place, { lock: true });
  const { revision, drawing } = at;
  await allow(work, at, 'approve', request.version, asker);
  if (request.contentHash !== revision.contentHash) throw await stale(work, at);

  const standing = {
    state: 'released' as const,
    checkedBy: work.person.id,
    checkedAt: work.at,
    noSecondCheck: at.matter.own,
  };
  const result = await drawStanding(work, at, standing);
  const good = goodOf(result);
  if (snapshotOf(result).contentHash !== revision.contentHash) throw new Refusal('engine-changed');

  const svgHash = await keepBlob(work, Buffer.from(good.svg, 'utf8'), 'image/svg+xml');
  const pdf = await work.services.pdf([good.svg], {
    title: `${drawing.number} ${revision.letter} ${revision.title}`,
    date: work.at,
  });
  const pdfHash = await keepBlob(work, pdf, 'application/pdf');
  await supersede(work, at);
  await keepMove(work, revision, {
    ...standing,
    sheet: good.sheet,
    findings: good.findings,
    svgHash,
    pdfHash,
  });
  await recordDecision(work, revision, 'approved', {
    contentHash: revision.contentHash,
    noSecondCheck: at.matter.own,
  });
  await keepFacts(work, drawing, revision);
  return { ...at, matter: { ...at.matter, state: 'released' } };
}

/** The release before this one, when there is one, no longer holds. */
async function supersede(work: ShopWork, { drawing }: RevisionAt): Promise<void> {
  const before = await work.services.database.models.revisions.findOne({
    where: { shopId: work.shop.id, drawingId: drawing.id, state: 'released' },
    transaction: work.t,
    lock: work.t.LOCK.UPDATE,
  });
  if (!before) return;
  await keepMove(work, before, { state: 'superseded' });
  await recordDecision(work, before, 'superseded');
  await keepFacts(work, drawing, before);
}
