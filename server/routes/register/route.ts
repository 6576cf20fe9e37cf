import { Router } from 'express';
import { inShop } from '../../middleware/in-shop';
import { permit } from '../../policies/permit';
import { shopAbilities } from '../../policies/abilities';
import { currentRegister } from '../../services/current-register';
import type { Services } from '../../services/services';

/** What the shop owns, as plans are judged by it now. */
export function registerRoutes(services: Services): Router {
  const router = Router({ mergeParams: true });
  router.get(
    '/',
    inShop(services, async (work) => {
      permit('read-register', work.asker);
      const { id, version, content, savedAt } = await currentRegister(work);
      return {
        register: content,
        id,
        version,
        savedAt: savedAt.toISOString(),
        abilities: shopAbilities(work.asker),
      };
    }),
  );
  return router;
}
