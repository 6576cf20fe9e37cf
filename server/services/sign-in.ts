import bcrypt from 'bcryptjs';
import { inSight } from '../database';
import { Refusal } from '../errors';
import type { Person } from '../models/person';
import { startSession } from './sessions';
import type { Issued } from './sessions';
import type { Services } from './services';

/** A hash that no password answers, per cost: an unknown mail takes as long as a wrong password. */
const decoys = new Map<number, Promise<string>>();

/** @throws Refusal `wrong-sign-in`, the same for an unknown mail and a wrong password. */
export async function signIn(
  services: Services,
  mail: string,
  password: string,
): Promise<{ person: Person; issued: Issued }> {
  const { database, config } = services;
  const asked = mail.trim().toLowerCase();
  const person = await inSight(database, { mail: asked }, (t) =>
    database.models.people.findOne({ where: { mail: asked }, transaction: t }),
  );
  const right = await bcrypt.compare(
    password,
    person?.passwordHash ?? (await decoyHash(config.bcryptRounds)),
  );
  if (!person || !right) throw new Refusal('wrong-sign-in');
  return { person, issued: await startSession(services, person.id) };
}

export function hashPassword(password: string, rounds: number): Promise<string> {
  return bcrypt.hash(password, rounds);
}

/** Made once, before the first sign-in is answered, so that the first unknown mail takes no longer either. */
export function decoyHash(rounds: number): Promise<string> {
  const made = decoys.get(rounds) ?? bcrypt.hash(crypto.randomUUID(), rounds);
  decoys.set(rounds, made);
  return made;
}
