import { Refusal } from '../errors';
import type { RegisterVersion } from '../models/register';
import type { ShopWork } from './shop-work';

/** The newest register of the shop. @throws Refusal `not-found` when the shop has none yet. */
export async function currentRegister(work: ShopWork): Promise<RegisterVersion> {
  const register = await work.services.database.models.registers.findOne({
    where: { shopId: work.shop.id },
    order: [['version', 'DESC']],
    transaction: work.t,
  });
  if (!register) throw new Refusal('not-found', undefined, undefined, 'This shop has no register yet.');
  return register;
}
