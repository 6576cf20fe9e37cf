import { readFileSync } from 'node:fs';
import type { Transaction } from 'sequelize';
import { v7 as uuid } from 'uuid';
import { z } from 'zod';
import { role } from '../../shared/api/session';
import { exampleRegister } from '../../shared/route/example-register';
import type { Database } from '../../server/database';
import { inSight, look, openDatabase } from '../../server/database';
import { hashPassword } from '../../server/services/sign-in';
import { demoDrawings } from '../demo/drawings';
import { addressOf } from '../demo/address';
import type { StepParams } from '../ordered-steps';

const demoPeople = z.object({
  password: z.string(),
  people: z.array(z.object({ role, name: z.string(), email: z.string() })),
});

const BCRYPT_ROUNDS = 12;
const SLUG = 'pellworth';
/** The same in every copy, so that a first start cut short finds its shop again. */
const SHOP_ID = '019ca2c0-0000-7000-8000-00000000b1ea';

/**
 * The depot shop of the invented canal Pellworth Navigation: a person for each role, its register, and some drawings
 * in different states, drawn and decided through the same services as everybody's. BENCHLEAF_DEMO=no leaves it out.
 */
export async function up({ context }: StepParams): Promise<void> {
  if (process.env['BENCHLEAF_DEMO'] === 'no') return;
  const database = openDatabase(addressOf(context.sequelize));
  try {
    const people = await shopWithPeople(database);
    await demoDrawings(database, SLUG, people);
  } finally {
    await database.sequelize.close();
  }
}

/** Makes the shop, its people and its register in one transaction, unless it is there; gives the people's ids by mail. */
async function shopWithPeople(database: Database): Promise<ReadonlyMap<string, string>> {
  const demo = demoPeople.parse(
    JSON.parse(readFileSync(new URL('./demo-people.json', import.meta.url), 'utf8')),
  );
  const passwordHash = await hashPassword(demo.password, BCRYPT_ROUNDS);
  return inSight(database, { shopId: SHOP_ID }, async (transaction) => {
    const { models } = database;
    if (await models.shops.findOne({ where: { id: SHOP_ID }, transaction }))
      return idsByMail(database, transaction);
    await models.shops.create(
      {
        id: SHOP_ID,
        slug: SLUG,
        name: 'Pellworth Navigation',
        timeZone: 'Europe/London',
        entryUnit: 'mm',
        style: 'iso',
      },
      { transaction },
    );
    for (const person of demo.people) {
      const id = uuid();
      await look(database, { personId: id }, transaction);
      await models.people.create(
        { id, name: person.name, mail: person.email, passwordHash },
        { transaction },
      );
      await models.memberships.create(
        { shopId: SHOP_ID, personId: id, roles: [person.role] },
        { transaction },
      );
    }
    const ids = await idsByMail(database, transaction);
    const lead = ids.get('lead@pellworth.example');
    if (lead === undefined) throw new Error('The demo shop has no lead.');
    await models.registers.create(
      {
        id: uuid(),
        shopId: SHOP_ID,
        version: 1,
        content: exampleRegister,
        savedBy: lead,
        savedAt: new Date(),
      },
      { transaction },
    );
    return ids;
  });
}

async function idsByMail(database: Database, transaction: Transaction): Promise<ReadonlyMap<string, string>> {
  const people = await database.models.people.findAll({ attributes: ['id', 'mail'], transaction });
  return new Map(people.map((person) => [person.mail, person.id]));
}
