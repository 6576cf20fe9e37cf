import type { EngineResult } from '../../shared/engine';
import type { Revision } from '../models/revision';
import { Refusal } from '../errors';
import type { RevisionAt } from './revision-at';
import type { ShopWork } from './shop-work';
import type { Standing } from './signed-sheet';
import { signedSheet, standingOf } from './signed-sheet';
import { workOut } from './work-out';

/**
 * Draws a revision as its sheet looks once it stands so, from its stored values and the register it was judged by.
 * Part, scheme and route do not depend on how it stands.
 */
export async function drawStanding(
  work: ShopWork,
  at: RevisionAt,
  change: Partial<Standing>,
): Promise<EngineResult> {
  const register = await work.services.database.models.registers.findOne({
    where: { shopId: work.shop.id, id: at.revision.registerId },
    transaction: work.t,
  });
  if (!register) throw new Error(`Revision ${at.revision.id} names a register that is not there.`);
  const signed = await signedSheet(work, at, { ...standingOf(at.revision), ...change });
  return workOut(work, at.revision, register.content, signed);
}

/** Only the sheet and what is said of it are drawn anew when a revision moves on; everything else stays as it was. */
export function redrawn(revision: Revision, result: EngineResult): Pick<Revision, 'sheet' | 'findings'> {
  if (!result.good) return { sheet: revision.sheet, findings: revision.findings };
  return { sheet: result.good.sheet, findings: result.good.findings };
}

/** Saves what changed, as the revision's next version. */
export async function keepMove(work: ShopWork, revision: Revision, change: Partial<Revision>): Promise<void> {
  revision.set({ ...change, version: revision.version + 1, changedAt: work.at });
  await revision.save({ transaction: work.t });
}

/** @throws Refusal `not-ready` unless there is something that could be checked. */
export function goodOf(result: EngineResult): NonNullable<EngineResult['good']> {
  if (!result.good) throw new Refusal('not-ready', result.problems);
  return result.good;
}
