import type { SaveRevisionRequest } from '../../shared/api/drawings';
import { canonicalJson } from './content-hash';
import { allow } from './allow';
import { currentRegister } from './current-register';
import { keepFacts } from './keep-facts';
import { requirePrintable } from './printable';
import { recordAudit } from './record';
import type { RevisionAt, RevisionPlace } from './revision-at';
import { revisionAt } from './revision-at';
import type { ShopWork } from './shop-work';
import { signedSheet, standingOf } from './signed-sheet';
import { snapshotOf, workOut } from './work-out';

/**
 * Saves a draft. Wrong values are kept with what is wrong about them, and the last good drawing stays. Saving what is
 * there already changes nothing.
 */
export async function saveRevision(
  work: ShopWork,
  place: RevisionPlace,
  request: SaveRevisionRequest,
): Promise<RevisionAt> {
  const at = await revisionAt(work, place, { lock: true });
  const { revision, drawing } = at;
  await allow(work, at, 'edit', request.version);
  // The sheet's revision table prints it; every other text has its own field, where the draft keeps what is wrong.
  requirePrintable('change', request.change ?? '');
  const filled = {
    template: revision.template,
    title: request.title,
    note: request.note,
    entryUnit: request.entryUnit,
    settings: request.settings,
    typed: request.values,
    change: request.change ?? revision.change,
  };
  const { title, note, entryUnit, settings, typed, change } = revision;
  const kept = { template: revision.template, title, note, entryUnit, settings, typed, change };
  if (canonicalJson(filled) === canonicalJson(kept)) return at;

  const register = await currentRegister(work);
  const saved = { savedBy: work.person.id, savedAt: work.at };
  const signed = await signedSheet(work, at, { ...standingOf(revision), ...saved });
  const result = await workOut(work, filled, register.content, signed);
  revision.set({
    ...filled,
    ...snapshotOf(result),
    ...saved,
    registerId: register.id,
    version: revision.version + 1,
    changedAt: work.at,
  });
  await revision.save({ transaction: work.t });
  await work.services.database.sequelize.query(
    `INSERT INTO revision_editors (shop_id, revision_id, person_id) VALUES ($1, $2, $3) ON CONFLICT DO NOTHING`,
    { bind: [work.shop.id, revision.id, work.person.id], transaction: work.t },
  );
  await recordAudit(work, 'saved', {
    drawingId: drawing.id,
    revisionId: revision.id,
    detail: { version: revision.version },
  });
  await keepFacts(work, drawing, revision);
  return { ...at, matter: { ...at.matter, own: true } };
}
