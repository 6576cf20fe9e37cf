import { z } from 'zod';

/** PUT /api/shops/:shop/settings */
export const settingsRequest = z.object({
  version: z.number().int().nonnegative(),
  selfRelease: z.boolean(),
});
