import type { AuditEvent } from '../models/audit-event';
import { namesOf } from '../services/people-names';
import type { ShopWork } from '../services/shop-work';

export interface AuditAnswer {
  events: {
    id: string;
    act: string;
    by: string | null;
    at: string;
    drawing: string | null;
    revision: string | null;
    detail: Record<string, unknown>;
  }[];
}

export async function presentAudit(work: ShopWork, events: readonly AuditEvent[]): Promise<AuditAnswer> {
  const name = await namesOf(
    work,
    events.map((event) => event.personId),
  );
  return {
    events: events.map(({ id, act, personId, at, drawingId, revisionId, detail }) => ({
      ...{ id, act, detail },
      by: personId === null ? null : name(personId),
      at: at.toISOString(),
      drawing: drawingId,
      revision: revisionId,
    })),
  };
}
