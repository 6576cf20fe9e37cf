import { Router } from 'express';
import { inShop } from '../../middleware/in-shop';
import { readBody } from '../../middleware/read-request';
import { permit } from '../../policies/permit';
import type { Services } from '../../services/services';
import { changeSettings, presentSettings } from '../../services/shop-settings';
import { settingsRequest } from './schema';

/** Settings of the shop: whether its only checker may release their own. */
export function settingsRoutes(services: Services): Router {
  const router = Router({ mergeParams: true });
  router.get(
    '/',
    inShop(services, async (work) => {
      permit('settings', work.asker);
      return presentSettings(work);
    }),
  );
  router.put(
    '/',
    inShop(services, (work, request) => changeSettings(work, readBody(request, settingsRequest))),
  );
  return router;
}
