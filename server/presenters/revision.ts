import type { RevisionAnswer } from '../../shared/api/drawings';
import type { Decision } from '../models/decision';
import type { Revision } from '../models/revision';
import { revisionAbilities } from '../policies/abilities';
import { frozenBalloons } from '../services/frozen-balloons';
import { namesOf } from '../services/people-names';
import type { RevisionAt } from '../services/revision-at';
import { revisionHistory } from '../services/revision-history';
import type { ShopWork } from '../services/shop-work';
import { sheetSvg } from '../services/sheet-svg';
import { openRevision } from './drawing';
import { presentSummary } from './revision-summary';

type Presented = RevisionAnswer['revision'];

/** A revision as it is answered: what is stored, what was decided, and what the asker may do now. */
export async function presentRevision(work: ShopWork, at: RevisionAt): Promise<RevisionAnswer> {
  const { revision, drawing, matter } = at;
  const decisions = await work.services.database.models.decisions.findAll({
    where: { shopId: work.shop.id, revisionId: revision.id },
    order: [['id', 'ASC']],
    transaction: work.t,
  });
  const name = await namesOf(work, [
    revision.savedBy,
    revision.drawnBy,
    revision.checkedBy,
    ...decisions.map((decision) => decision.personId),
  ]);
  const { title, note, template, templateHash, engine, entryUnit, settings, typed, contentHash } = revision;
  const presented: Presented = {
    ...presentSummary(revision),
    drawing: { id: drawing.id, number: drawing.number, title },
    ...{ title, note, template, templateHash, engine, entryUnit, settings, contentHash },
    values: typed,
    problems: revision.problems.map(({ path, message }) => ({ path, message })),
    drawn: signature(revision.drawnBy, revision.drawnAt, name),
    checked: signature(revision.checkedBy, revision.checkedAt, name),
    noSecondCheck: revision.noSecondCheck,
    saved: { name: name(revision.savedBy), at: revision.savedAt.toISOString() },
    decisions: decisions.map((decision) => presentDecision(decision, name)),
    history: await revisionHistory(work, revision),
    frozenBalloons: (await frozenBalloons(work, revision)) ?? null,
    result: await presentResult(work, revision),
  };
  return {
    revision: presented,
    abilities: revisionAbilities(work.asker, matter, await openRevision(work, revision)),
  };
}

async function presentResult(work: ShopWork, revision: Revision): Promise<Presented['result']> {
  const { part, scheme, route, capacity, faults, sheet, findings } = revision;
  if (!part || !scheme || !sheet || !findings || !faults || !capacity) return null;
  const svg = await sheetSvg(work, revision, sheet);
  return {
    schemaVersion: 1,
    part,
    scheme,
    sheet,
    findings: [...findings],
    route,
    capacity,
    faults: [...faults],
    svg,
  };
}

function signature(id: string | null, at: Date | null, name: (id: string) => string): Presented['drawn'] {
  return id && at ? { name: name(id), at: at.toISOString() } : null;
}

function presentDecision(decision: Decision, name: (id: string) => string): Presented['decisions'][number] {
  const { act, reason, contentHash } = decision;
  return { act, by: name(decision.personId), at: decision.at.toISOString(), reason, contentHash };
}
