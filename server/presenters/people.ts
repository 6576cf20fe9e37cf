import type { Role } from '../../shared/api/session';
import { namesOf } from '../services/people-names';
import type { ShopWork } from '../services/shop-work';

/** People of the shop with their roles, by name. */
export async function presentPeople(
  work: ShopWork,
): Promise<{ people: { id: string; name: string; roles: Role[] }[] }> {
  const memberships = await work.services.database.models.memberships.findAll({
    where: { shopId: work.shop.id },
    transaction: work.t,
  });
  const name = await namesOf(
    work,
    memberships.map(({ personId }) => personId),
  );
  const people = memberships.map(({ personId, roles }) => ({ id: personId, name: name(personId), roles }));
  return { people: people.sort((a, b) => a.name.localeCompare(b.name, 'en')) };
}
