import { Router } from 'express';
import { Op } from 'sequelize';
import { inShop } from '../../middleware/in-shop';
import { readQuery } from '../../middleware/read-request';
import { permit } from '../../policies/permit';
import { presentAudit } from '../../presenters/audit';
import { drawingAt } from '../../services/revision-at';
import type { Services } from '../../services/services';
import { auditQuery } from './schema';

/** The audit trail of the shop, or of one drawing. */
export function auditRoutes(services: Services): Router {
  const router = Router({ mergeParams: true });
  router.get(
    '/',
    inShop(services, async (work, request) => {
      permit('audit', work.asker);
      const { drawing, before, limit } = readQuery(request, auditQuery);
      const of = drawing === undefined ? {} : { drawingId: (await drawingAt(work, drawing)).id };
      const older = before === undefined ? {} : { id: { [Op.lt]: before } };
      const events = await services.database.models.auditEvents.findAll({
        where: { shopId: work.shop.id, ...of, ...older },
        order: [['id', 'DESC']],
        limit,
        transaction: work.t,
      });
      return presentAudit(work, events);
    }),
  );
  return router;
}
