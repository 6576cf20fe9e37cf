import { UniqueConstraintError } from 'sequelize';
import { v7 as uuid } from 'uuid';
import type { z } from 'zod';
import type { startDrawingRequest } from '../../shared/api/drawings';
import { Refusal } from '../errors';
import { permit } from '../policies/permit';
import { addDraft } from './add-draft';
import { nextDrawingNumber } from './drawing-number';
import type { RevisionAt } from './revision-at';
import type { ShopWork } from './shop-work';

/** Starts a drawing with its revision A as a draft. Wrong values are kept too, with what is wrong about them. */
export async function startDrawing(
  work: ShopWork,
  request: z.output<typeof startDrawingRequest>,
): Promise<RevisionAt> {
  permit('start-drawing', work.asker);
  const { models } = work.services.database;
  const number = await nextDrawingNumber(work);
  try {
    const drawing = await models.drawings.create(
      {
        id: request.id ?? uuid(),
        shopId: work.shop.id,
        number,
        template: request.template,
        createdBy: work.person.id,
      },
      { transaction: work.t },
    );
    return await addDraft(
      work,
      drawing,
      { ...request, typed: request.values },
      { sequence: 1, change: 'first issue' },
    );
  } catch (error) {
    if (error instanceof UniqueConstraintError)
      throw new Refusal('exists', [{ path: 'id', message: 'This id is in use already.' }]);
    throw error;
  }
}
