import { v7 as uuid } from 'uuid';
import type { DecisionAct } from '../models/decision';
import type { Revision } from '../models/revision';
import type { ShopWork } from './shop-work';

/** Adds a row to the audit trail; it is never changed or removed again. */
export async function recordAudit(
  work: ShopWork,
  act: string,
  about: { drawingId?: string; revisionId?: string; detail?: Record<string, unknown> },
): Promise<void> {
  await work.services.database.models.auditEvents.create(
    {
      id: uuid(),
      shopId: work.shop.id,
      drawingId: about.drawingId ?? null,
      revisionId: about.revisionId ?? null,
      personId: work.person.id,
      act,
      detail: about.detail ?? {},
      requestId: work.requestId,
      at: work.at,
    },
    { transaction: work.t },
  );
}

/** Records a decision on a revision, and the same in the audit trail. */
export async function recordDecision(
  work: ShopWork,
  revision: Revision,
  act: DecisionAct,
  detail: { reason?: string; contentHash?: string | null; noSecondCheck?: boolean } = {},
): Promise<void> {
  await work.services.database.models.decisions.create(
    {
      id: uuid(),
      shopId: work.shop.id,
      revisionId: revision.id,
      act,
      personId: work.person.id,
      at: work.at,
      reason: detail.reason ?? null,
      contentHash: detail.contentHash ?? null,
    },
    { transaction: work.t },
  );
  await recordAudit(work, act, {
    drawingId: revision.drawingId,
    revisionId: revision.id,
    detail: { letter: revision.letter, version: revision.version, ...detail },
  });
}
