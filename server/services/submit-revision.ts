import type { EngineGood } from '../../shared/engine';
import type { FieldError } from '../errors';
import { Refusal } from '../errors';
import { allow } from './allow';
import { currentRegister } from './current-register';
import { keepFacts } from './keep-facts';
import { drawStanding, goodOf, keepMove, redrawn } from './move-revision';
import { recordDecision } from './record';
import type { RevisionAt, RevisionPlace } from './revision-at';
import { revisionAt } from './revision-at';
import type { ShopWork } from './shop-work';
import { signedSheet, standingOf } from './signed-sheet';
import { snapshotOf, workOut } from './work-out';

/**
 * Sends a draft for checking: worked out once more against today's register, which is then the one it is judged by.
 * Its last saver is the one who drew it. A trial mark goes off. @throws Refusal `not-ready` with what is in the way.
 */
export async function submitRevision(
  work: ShopWork,
  place: RevisionPlace,
  version: number,
): Promise<RevisionAt> {
  const at = await revisionAt(work, place, { lock: true });
  const { revision, drawing } = at;
  await allow(work, at, 'submit', version);
  const register = await currentRegister(work);
  const standing = {
    state: 'in review' as const,
    trial: false,
    returned: false,
    drawnBy: revision.savedBy,
    drawnAt: revision.savedAt,
  };
  const signed = await signedSheet(work, at, { ...standingOf(revision), ...standing });
  const result = await workOut(work, revision, register.content, signed);
  const inTheWay = faultsOf(goodOf(result));
  if (inTheWay.length > 0) throw new Refusal('not-ready', inTheWay);

  if (revision.trial) await recordDecision(work, revision, 'trial off');
  await keepMove(work, revision, { ...snapshotOf(result), ...standing, registerId: register.id });
  await recordDecision(work, revision, 'submitted', { contentHash: revision.contentHash });
  await keepFacts(work, drawing, revision);
  return { ...at, matter: { ...at.matter, state: revision.state, trial: false } };
}

/** Takes a revision back from checking; it is a draft again. */
export async function takeBackRevision(
  work: ShopWork,
  place: RevisionPlace,
  version: number,
): Promise<RevisionAt> {
  return reopen(work, place, version, 'take-back');
}

/** Sends a revision back to its drawer with reasons; it is a draft again and says that it came back. */
export async function returnRevision(
  work: ShopWork,
  place: RevisionPlace,
  version: number,
  reason: string,
): Promise<RevisionAt> {
  return reopen(work, place, version, 'return', reason);
}

async function reopen(
  work: ShopWork,
  place: RevisionPlace,
  version: number,
  act: 'take-back' | 'return',
  reason?: string,
): Promise<RevisionAt> {
  const at = await revisionAt(work, place, { lock: true });
  await allow(work, at, act, version);
  const { revision, drawing } = at;
  const { contentHash } = revision;
  const standing = { state: 'draft' as const, returned: act === 'return', drawnBy: null, drawnAt: null };
  const result = await drawStanding(work, at, standing);
  await keepMove(work, revision, { ...standing, ...redrawn(revision, result) });
  await recordDecision(work, revision, act === 'return' ? 'returned' : 'taken back', { reason, contentHash });
  await keepFacts(work, drawing, revision);
  return { ...at, matter: { ...at.matter, state: 'draft' } };
}

function faultsOf(good: EngineGood): FieldError[] {
  return [
    ...good.findings.map(({ rule, message }) => ({ path: `sheet.${rule}`, message })),
    ...good.faults.map(({ operation, message }) => ({ path: `route.${operation}`, message })),
  ];
}
