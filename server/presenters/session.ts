import type { SessionAnswer } from '../../shared/api/session';
import { inSight } from '../database';
import { Refusal } from '../errors';
import type { Services } from '../services/services';
import type { SignedIn } from '../services/sessions';
import { csrfToken } from '../services/sessions';

/** Who is signed in, their shops with their roles there, and the token unsafe requests must carry. */
export async function presentSession(services: Services, who: SignedIn): Promise<SessionAnswer> {
  const { database, config } = services;
  const { models } = database;
  return inSight(database, { personId: who.personId }, async (t) => {
    const person = await models.people.findOne({ where: { id: who.personId }, transaction: t });
    if (!person) throw new Refusal('session-ended');
    const memberships = await models.memberships.findAll({
      where: { personId: who.personId },
      transaction: t,
    });
    const rolesIn = new Map(memberships.map((membership) => [membership.shopId, membership.roles]));
    const shops = await models.shops.findAll({
      where: { id: [...rolesIn.keys()] },
      order: [['name', 'ASC']],
      transaction: t,
    });
    return {
      person: { id: person.id, name: person.name, mail: person.mail },
      shops: shops.map(({ id, slug, name, entryUnit, style, timeZone }) => ({
        ...{ id, slug, name, entryUnit, style, timeZone },
        roles: rolesIn.get(id) ?? [],
      })),
      csrf: csrfToken(config, who.familyId),
    };
  });
}
