import type { Request, RequestHandler, Response } from 'express';
import { Router } from 'express';
import type { z } from 'zod';
import {
  approveRequest,
  reasonRequest,
  saveRevisionRequest,
  trialRequest,
  versionRequest,
} from '../../../shared/api/drawings';
import { inShop, parameter } from '../../middleware/in-shop';
import { readBody, readQuery } from '../../middleware/read-request';
import { presentRevision } from '../../presenters/revision';
import { approveRevision } from '../../services/approve-revision';
import { markTrial } from '../../services/mark-trial';
import { printRevision, readSheetSvg } from '../../services/print-revision';
import { readRevision } from '../../services/read-revision';
import type { RevisionAt, RevisionPlace } from '../../services/revision-at';
import { saveRevision } from '../../services/save-revision';
import type { Services } from '../../services/services';
import type { ShopWork } from '../../services/shop-work';
import { returnRevision, submitRevision, takeBackRevision } from '../../services/submit-revision';
import { withdrawRevision } from '../../services/withdraw-revision';
import { pdfQuery } from './schema';

/** Read, save, print a revision, and what is decided about it. */
export function revisionRoutes(services: Services): Router {
  const router = Router({ mergeParams: true });
  const acting = <Schema extends z.ZodType>(
    schema: Schema,
    act: (work: ShopWork, place: RevisionPlace, body: z.output<Schema>) => Promise<RevisionAt>,
  ): RequestHandler =>
    inShop(services, async (work, request) => {
      const body = readBody(request, schema);
      return presentRevision(work, await act(work, placeOf(request), body));
    });

  router.get(
    '/',
    inShop(services, async (work, request) =>
      presentRevision(work, await readRevision(work, placeOf(request))),
    ),
  );
  router.put('/', acting(saveRevisionRequest, saveRevision));
  router.post(
    '/submit',
    acting(versionRequest, (work, place, { version }) => submitRevision(work, place, version)),
  );
  router.post(
    '/take-back',
    acting(versionRequest, (work, place, { version }) => takeBackRevision(work, place, version)),
  );
  router.post(
    '/return',
    acting(reasonRequest, (work, place, { version, reason }) => returnRevision(work, place, version, reason)),
  );
  router.post('/approve', acting(approveRequest, approveRevision));
  router.post(
    '/withdraw',
    acting(reasonRequest, (work, place, { version, reason }) =>
      withdrawRevision(work, place, version, reason),
    ),
  );
  router.post(
    '/trial',
    acting(trialRequest, (work, place, { version, trial }) => markTrial(work, place, version, trial)),
  );
  router.get(
    '/sheet.svg',
    inShop(
      services,
      (work, request) => readSheetSvg(work, placeOf(request)),
      (response, { svg, name }) => {
        named(response, 'image/svg+xml', `${name}.svg`).send(svg);
      },
    ),
  );
  router.get(
    '/sheet.pdf',
    inShop(
      services,
      (work, request) => printRevision(work, placeOf(request), readQuery(request, pdfQuery)),
      (response, { pdf, name }) => {
        named(response, 'application/pdf', `${name}.pdf`).send(Buffer.from(pdf));
      },
    ),
  );
  return router;
}

function placeOf(request: Request): RevisionPlace {
  return { drawing: parameter(request, 'drawing'), revision: parameter(request, 'revision') };
}

function named(response: Response, mediaType: string, name: string): Response {
  return response.type(mediaType).setHeader('content-disposition', `inline; filename="${name}"`);
}
