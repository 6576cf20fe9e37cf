import type { ShopWork } from './shop-work';

/** Names of people of this shop by id; one who is no longer seen here is `somebody who left`. */
export async function namesOf(
  work: ShopWork,
  ids: readonly (string | null)[],
): Promise<(id: string) => string> {
  const wanted = [...new Set(ids.filter((id): id is string => id !== null))];
  const people = await work.services.database.models.people.findAll({
    where: { id: wanted },
    attributes: ['id', 'name'],
    transaction: work.t,
  });
  const names = new Map(people.map((person) => [person.id, person.name]));
  return (id) => names.get(id) ?? 'somebody who left';
}
