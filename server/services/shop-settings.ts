import { Refusal } from '../errors';
import { permit } from '../policies/permit';
import { recordAudit } from './record';
import type { ShopWork } from './shop-work';

export interface SettingsAnswer {
  settings: {
    version: number;
    selfRelease: boolean;
    /** People who may check, the lead among them. */ checkers: number;
  };
}

export async function presentSettings(work: ShopWork): Promise<SettingsAnswer> {
  const { version, selfRelease } = work.shop;
  return { settings: { version, selfRelease, checkers: await checkersOf(work) } };
}

/**
 * Switches self-release. @throws Refusal `wrong-state` to switch it on where a second person may check; the database
 * holds the same, and switches it off when one joins.
 */
export async function changeSettings(
  work: ShopWork,
  request: { version: number; selfRelease: boolean },
): Promise<SettingsAnswer> {
  permit('settings', work.asker);
  const { shop, t } = work;
  await shop.reload({ transaction: t, lock: t.LOCK.UPDATE });
  if (request.version !== shop.version)
    throw new Refusal('stale', undefined, { current: await presentSettings(work) });
  if (request.selfRelease === shop.selfRelease) return presentSettings(work);
  if (request.selfRelease && (await checkersOf(work)) > 1) {
    throw new Refusal(
      'wrong-state',
      undefined,
      undefined,
      'A second person may check in this shop, so nobody releases their own.',
    );
  }
  await shop.update({ selfRelease: request.selfRelease, version: shop.version + 1 }, { transaction: t });
  await recordAudit(work, request.selfRelease ? 'self-release switched on' : 'self-release switched off', {});
  return presentSettings(work);
}

async function checkersOf(work: ShopWork): Promise<number> {
  const memberships = await work.services.database.models.memberships.findAll({
    where: { shopId: work.shop.id },
    transaction: work.t,
  });
  return memberships.filter(({ roles }) => roles.includes('checker') || roles.includes('lead')).length;
}
