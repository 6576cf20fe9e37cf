import { Router } from 'express';
import { searchQuery, startDrawingRequest, startRevisionRequest } from '../../../shared/api/drawings';
import type { RevisionAnswer } from '../../../shared/api/drawings';
import { inShop, parameter } from '../../middleware/in-shop';
import { readBody, readQuery } from '../../middleware/read-request';
import { presentDrawing } from '../../presenters/drawing';
import { presentRevision } from '../../presenters/revision';
import { presentSearch } from '../../presenters/search';
import { drawingAt } from '../../services/revision-at';
import { searchDrawings } from '../../services/search-drawings';
import type { Services } from '../../services/services';
import { startDrawing } from '../../services/start-drawing';
import { startRevision } from '../../services/start-revision';
import type { Response } from 'express';

const created = (response: Response, answer: RevisionAnswer) => void response.status(201).json(answer);

/** Find drawings, start one, read one, start its next revision. */
export function drawingRoutes(services: Services): Router {
  const router = Router({ mergeParams: true });
  router.get(
    '/',
    inShop(services, async (work, request) =>
      presentSearch(work, await searchDrawings(work, readQuery(request, searchQuery))),
    ),
  );
  router.post(
    '/',
    inShop(
      services,
      async (work, request) =>
        presentRevision(work, await startDrawing(work, readBody(request, startDrawingRequest))),
      created,
    ),
  );
  router.get(
    '/:drawing',
    inShop(services, async (work, request) =>
      presentDrawing(work, await drawingAt(work, parameter(request, 'drawing'))),
    ),
  );
  router.post(
    '/:drawing/revisions',
    inShop(
      services,
      async (work, request) => {
        const { change } = readBody(request, startRevisionRequest);
        return presentRevision(work, await startRevision(work, parameter(request, 'drawing'), change));
      },
      created,
    ),
  );
  return router;
}
