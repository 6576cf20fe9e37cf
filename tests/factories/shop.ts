import { v7 as uuid } from 'uuid';
import type { Role } from '../../shared/api/session';
import { exampleRegister } from '../../shared/route/example-register';
import type { Register } from '../../shared/route/register';
import { inSight } from '../../server/database';
import { hashPassword } from '../../server/services/sign-in';
import type { TestServer } from './server';

export interface TestShop {
  id: string;
  slug: string;
  name: string;
  /** Who saved its register; belongs to no role that tests use. */
  keeper: TestPerson;
}

export interface TestPerson {
  id: string;
  name: string;
  mail: string;
  password: string;
}

const PASSWORD = 'paddle-gear-and-pawl';
let made = 0;

/** A shop with the example register, and a reader who keeps it; every name is its own. */
export async function makeShop(
  server: TestServer,
  given: { slug?: string; register?: Register } = {},
): Promise<TestShop> {
  const { owner } = server;
  made += 1;
  const shop = { id: uuid(), slug: given.slug ?? `depot-${made}`, name: `Depot ${made}` };
  await inSight(owner, { shopId: shop.id }, async (transaction) => {
    await owner.models.shops.create({ ...shop, entryUnit: 'mm', style: 'iso' }, { transaction });
  });
  const keeper = await makePerson(server, shop, ['reader']);
  await inSight(owner, { shopId: shop.id }, async (transaction) => {
    await owner.models.registers.create(
      {
        id: uuid(),
        shopId: shop.id,
        version: 1,
        content: given.register ?? exampleRegister,
        savedBy: keeper.id,
        savedAt: new Date(),
      },
      { transaction },
    );
  });
  return { ...shop, keeper };
}

/** A person with these roles in that shop. */
export async function makePerson(
  server: TestServer,
  shop: { id: string },
  roles: readonly Role[],
  given: Partial<TestPerson> = {},
): Promise<TestPerson> {
  const { owner, config } = server;
  made += 1;
  const person = {
    id: uuid(),
    name: `${roles.join(' and ')} ${made}`,
    mail: `person${made}@depot.example`,
    password: PASSWORD,
    ...given,
  };
  const passwordHash = await hashPassword(person.password, config.bcryptRounds);
  await inSight(owner, { shopId: shop.id, personId: person.id }, async (transaction) => {
    await owner.models.people.create(
      { id: person.id, name: person.name, mail: person.mail, passwordHash },
      { transaction },
    );
    await owner.models.memberships.create(
      { shopId: shop.id, personId: person.id, roles: [...roles] },
      { transaction },
    );
  });
  return person;
}

/** Adds a person who exists to another shop, or gives them other roles there. */
export async function giveRoles(
  server: TestServer,
  shop: { id: string },
  person: { id: string },
  roles: readonly Role[],
): Promise<void> {
  await inSight(server.owner, { shopId: shop.id }, async (transaction) => {
    await server.owner.models.memberships.upsert(
      { shopId: shop.id, personId: person.id, roles: [...roles] },
      { transaction },
    );
  });
}
