import { Op } from 'sequelize';
import type { Revision } from '../models/revision';
import type { ShopWork } from './shop-work';

/** Balloons of the newest earlier release, by size: unchanged sizes keep theirs. */
export async function frozenBalloons(
  work: ShopWork,
  revision: Pick<Revision, 'drawingId' | 'sequence'>,
): Promise<Record<string, number> | undefined> {
  const earlier = await work.services.database.models.revisions.findOne({
    where: {
      shopId: work.shop.id,
      drawingId: revision.drawingId,
      sequence: { [Op.lt]: revision.sequence },
      state: ['released', 'superseded', 'withdrawn'],
    },
    attributes: ['scheme'],
    order: [['sequence', 'DESC']],
    transaction: work.t,
  });
  if (!earlier?.scheme) return undefined;
  const numbered = earlier.scheme.sizes.filter((size) => size.balloon > 0);
  return Object.fromEntries(numbered.map((size) => [size.id, size.balloon]));
}
