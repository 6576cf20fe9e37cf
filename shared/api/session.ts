import { z } from 'zod';
import { limits } from './limits';

export const roleNames = ['reader', 'machinist', 'designer', 'checker', 'lead'] as const;
export const role = z.enum(roleNames);
export type Role = z.infer<typeof role>;

/** POST /api/session */
export const signInRequest = z.object({
  mail: z.string().trim().min(3).max(limits.mailLength),
  password: z.string().min(1).max(200),
});
export type SignInRequest = z.infer<typeof signInRequest>;

/** Answer of POST and GET /api/session. `csrf` goes back as header `x-csrf-token` on every unsafe request. */
export const sessionAnswer = z.object({
  person: z.object({ id: z.uuid(), name: z.string(), mail: z.string() }),
  shops: z.array(
    z.object({
      id: z.uuid(),
      slug: z.string(),
      name: z.string(),
      roles: z.array(role),
      entryUnit: z.enum(['mm', 'in']),
      style: z.enum(['iso', 'asme']),
      timeZone: z.string(),
    }),
  ),
  csrf: z.string(),
});
export type SessionAnswer = z.infer<typeof sessionAnswer>;
