import { v7 as uuid } from 'uuid';
import type { Drawing } from '../models/drawing';
import { currentRegister } from './current-register';
import { keepFacts } from './keep-facts';
import { recordDecision } from './record';
import { revisionLetter } from './revision-letter';
import type { RevisionAt } from './revision-at';
import type { ShopWork } from './shop-work';
import type { Standing } from './signed-sheet';
import { signedSheet } from './signed-sheet';
import type { Filled } from './work-out';
import { snapshotOf, workOut } from './work-out';

/** Adds a draft to a drawing; whoever starts it is its first editor. */
export async function addDraft(
  work: ShopWork,
  drawing: Drawing,
  filled: Filled & { note: string },
  place: { sequence: number; change: string },
): Promise<RevisionAt> {
  const { models } = work.services.database;
  const register = await currentRegister(work);
  const letter = revisionLetter(place.sequence);
  const standing: Standing = {
    state: 'draft',
    trial: false,
    returned: false,
    savedBy: work.person.id,
    savedAt: work.at,
    drawnBy: null,
    drawnAt: null,
    checkedBy: null,
    checkedAt: null,
    noSecondCheck: false,
  };
  const seed = models.revisions.build({
    id: uuid(),
    shopId: work.shop.id,
    drawingId: drawing.id,
    ...place,
    letter,
    ...standing,
    title: filled.title,
    note: filled.note,
    template: filled.template,
    templateHash: '',
    engine: '',
    entryUnit: filled.entryUnit,
    settings: filled.settings,
    typed: filled.typed,
    evaluated: { values: {}, tables: {} },
    problems: [],
    registerId: register.id,
    changedAt: work.at,
  });
  const signed = await signedSheet(work, { drawing, revision: seed }, standing);
  seed.set(snapshotOf(await workOut(work, filled, register.content, signed)));
  const revision = await seed.save({ transaction: work.t });
  await models.revisionEditors.create(
    { shopId: work.shop.id, revisionId: revision.id, personId: work.person.id },
    { transaction: work.t },
  );
  await recordDecision(work, revision, 'started');
  await keepFacts(work, drawing, revision);
  return { drawing, revision, matter: { state: 'draft', trial: false, own: true } };
}
