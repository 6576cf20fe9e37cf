import { z } from 'zod';

/** GET /api/shops/:shop/audit: newest first; `before` is the id of the last event that was seen. */
export const auditQuery = z.object({
  drawing: z.uuid().optional(),
  before: z.uuid().optional(),
  limit: z.coerce.number().int().min(1).max(200).default(100),
});
