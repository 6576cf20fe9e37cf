import type { Transaction } from 'sequelize';
import type { Role } from '../../shared/api/session';
import { inSight, look } from '../database';
import { Refusal } from '../errors';
import type { Shop } from '../models/shop';
import type { Asker } from '../policies/permit';
import type { EngineBeside } from './engine-beside';
import { engineBeside } from './engine-beside';
import type { Services } from './services';

/** One piece of work in one shop: a transaction that sees this shop alone, and who asks. */
export interface ShopWork {
  services: Services;
  t: Transaction;
  engine: EngineBeside;
  shop: Shop;
  person: { id: string };
  asker: Asker;
  requestId: string | null;
  /** The moment of this work; one for everything it records. */
  at: Date;
}

export interface ShopAsker {
  slug: string;
  personId: string;
  requestId?: string | null;
}

/**
 * Runs `work` in one transaction inside the shop of that slug. Roles are read in the same transaction, so that a role
 * taken away counts at once. Work that asks the engine may be begun again (see `engineBeside`): it does nothing but
 * through its transaction. @throws Refusal `not-found` when there is no such shop or the person is not in it.
 */
export function workInShop<T>(
  services: Services,
  asks: ShopAsker,
  work: (work: ShopWork) => Promise<T>,
): Promise<T> {
  const at = services.now();
  return engineBeside(services, (engine) => inOneTransaction(services, asks, { engine, at }, work));
}

function inOneTransaction<T>(
  services: Services,
  asks: ShopAsker,
  given: { engine: EngineBeside; at: Date },
  work: (work: ShopWork) => Promise<T>,
): Promise<T> {
  const { database } = services;
  return inSight(database, { personId: asks.personId }, async (t) => {
    const shop = await database.models.shops.findOne({ where: { slug: asks.slug }, transaction: t });
    if (!shop) throw new Refusal('not-found');
    await look(database, { shopId: shop.id }, t);
    const membership = await database.models.memberships.findOne({
      where: { shopId: shop.id, personId: asks.personId },
      transaction: t,
    });
    if (!membership) throw new Refusal('not-found');
    const roles: readonly Role[] = membership.roles;
    return work({
      services,
      t,
      shop,
      ...given,
      person: { id: asks.personId },
      asker: { roles, selfRelease: shop.selfRelease },
      requestId: asks.requestId ?? null,
    });
  });
}
