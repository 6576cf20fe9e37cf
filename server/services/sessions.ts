import { createHash, createHmac, randomBytes } from 'node:crypto';
import jwt from 'jsonwebtoken';
import type { Transaction } from 'sequelize';
import { v7 as uuid } from 'uuid';
import { z } from 'zod';
import type { ServerConfig } from '../config';
import { inSight, look } from '../database';
import { Refusal } from '../errors';
import type { Services } from './services';

/** What one answer hands out: a short access token, and the refresh token unless a second tab was let through. */
export interface Issued {
  personId: string;
  familyId: string;
  access: string;
  refresh?: string;
}

export interface SignedIn {
  personId: string;
  familyId: string;
}

const accessClaims = z.object({ sub: z.uuid(), family: z.uuid() });
const ALGORITHM = 'HS256';

/** A new family of refresh tokens for somebody who just proved who they are. */
export function startSession(services: Services, personId: string): Promise<Issued> {
  return inSight(services.database, { personId }, (t) => issue(services, t, { personId, familyId: uuid() }));
}

/**
 * Gives a new pair for a refresh token, which is then used up. Asked again within the grace window (two tabs, one
 * cookie) it gives an access token alone; later it was stolen or copied, and the whole family ends.
 * @throws Refusal `session-ended`
 */
export async function refreshSession(services: Services, token: string): Promise<Issued> {
  const { database, config } = services;
  const { models } = database;
  const tokenHash = hashToken(token);
  const issued = await inSight(database, { tokenHash }, async (t) => {
    const seen = await models.sessions.findOne({ where: { tokenHash }, transaction: t });
    if (!seen) return null;
    await look(database, { personId: seen.personId }, t);
    const session = await models.sessions.findOne({
      where: { id: seen.id },
      transaction: t,
      lock: t.LOCK.UPDATE,
    });
    const now = services.now();
    if (!session || session.endedAt || session.expiresAt <= now) return null;
    const { personId, familyId } = session;
    if (session.replacedAt) {
      if (now.getTime() - session.replacedAt.getTime() <= config.refreshGrace) {
        return { personId, familyId, access: signAccess(config, { personId, familyId }, now) };
      }
      await models.sessions.update({ endedAt: now }, { where: { familyId }, transaction: t });
      return null;
    }
    await session.update({ replacedAt: now }, { transaction: t });
    return issue(services, t, { personId, familyId });
  });
  // Thrown outside, so that the end of a family is kept.
  if (!issued) throw new Refusal('session-ended');
  return issued;
}

/** Ends one sign-in, or with `everywhere` every one of the person. */
export async function endSession(services: Services, who: SignedIn, everywhere: boolean): Promise<void> {
  const where = everywhere ? { personId: who.personId } : { familyId: who.familyId, personId: who.personId };
  await inSight(services.database, { personId: who.personId }, (t) =>
    services.database.models.sessions.update(
      { endedAt: services.now() },
      { where: { ...where, endedAt: null }, transaction: t },
    ),
  );
}

/** Who an access token names, when it is ours, young, and its sign-in has not been ended since; else null. */
export async function readAccess(services: Services, token: string): Promise<SignedIn | null> {
  const claims = verifyAccess(services, token);
  if (!claims) return null;
  const { sub: personId, family: familyId } = claims;
  const alive = await inSight(services.database, { personId }, (t) =>
    services.database.models.sessions.count({ where: { familyId, personId, endedAt: null }, transaction: t }),
  );
  return alive > 0 ? { personId, familyId } : null;
}

/** What unsafe requests of that sign-in must carry; no other site can know it. */
export function csrfToken(config: ServerConfig, familyId: string): string {
  return createHmac('sha256', config.cookieSecret).update(`csrf ${familyId}`).digest('base64url');
}

function verifyAccess(services: Services, token: string): z.infer<typeof accessClaims> | null {
  try {
    const clockTimestamp = Math.floor(services.now().getTime() / 1000);
    const claims = accessClaims.safeParse(
      jwt.verify(token, services.config.jwtSecret, { algorithms: [ALGORITHM], clockTimestamp }),
    );
    return claims.success ? claims.data : null;
  } catch (error) {
    if (error instanceof jwt.JsonWebTokenError) return null;
    throw error;
  }
}

async function issue(services: Services, t: Transaction, who: SignedIn): Promise<Issued> {
  const now = services.now();
  const refresh = randomBytes(32).toString('base64url');
  await services.database.models.sessions.create(
    {
      id: uuid(),
      ...who,
      tokenHash: hashToken(refresh),
      expiresAt: new Date(now.getTime() + services.config.refreshLife),
    },
    { transaction: t },
  );
  return { ...who, access: signAccess(services.config, who, now), refresh };
}

function signAccess(config: ServerConfig, who: SignedIn, now: Date): string {
  const iat = Math.floor(now.getTime() / 1000);
  const claims = {
    sub: who.personId,
    family: who.familyId,
    iat,
    exp: iat + Math.floor(config.accessLife / 1000),
  };
  return jwt.sign(claims, config.jwtSecret, { algorithm: ALGORITHM });
}

function hashToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
