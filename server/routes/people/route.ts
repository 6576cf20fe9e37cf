import { Router } from 'express';
import { inShop } from '../../middleware/in-shop';
import { permit } from '../../policies/permit';
import { presentPeople } from '../../presenters/people';
import type { Services } from '../../services/services';

/** Who belongs to the shop, in which roles. */
export function peopleRoutes(services: Services): Router {
  const router = Router({ mergeParams: true });
  router.get(
    '/',
    inShop(services, async (work) => {
      permit('people', work.asker);
      return presentPeople(work);
    }),
  );
  return router;
}
