import type { RevisionAnswer, SaveRevisionRequest, StartDrawingRequest } from '../../shared/api/drawings';
import { revisionAnswer } from '../../shared/api/drawings';
import { exampleValues } from '../../shared/template/default-values';
import { templateById } from '../../templates';
import type { Answer, BrowserLike } from './browser-like';
import type { TestShop } from './shop';

/** A request for a good drawing: the first worked example of the stepped shaft. */
export function drawingRequest(changes: Partial<StartDrawingRequest> = {}): StartDrawingRequest {
  const template = templateById(changes.template ?? 'stepped-shaft');
  if (!template) throw new Error(`No template ${changes.template}`);
  return {
    template: template.id,
    title: 'Paddle-gear shaft',
    note: '',
    entryUnit: 'mm',
    settings: { unit: 'mm', style: 'iso', sheet: 'auto', scale: 'auto', balloons: true },
    values: exampleValues(template),
    ...changes,
  };
}

/** A revision in the answer's own schema; the test fails with what came instead. */
export function revisionOf(answer: Answer): RevisionAnswer {
  if (answer.status >= 300)
    throw new Error(`${answer.status}: ${answer.bytes.toString('utf8').slice(0, 600)}`);
  return revisionAnswer.parse(answer.body);
}

export function revisionPath(shop: Pick<TestShop, 'slug'>, answer: RevisionAnswer, act = ''): string {
  const { revision } = answer;
  return `/api/shops/${shop.slug}/drawings/${revision.drawing.id}/revisions/${revision.id}${act === '' ? '' : `/${act}`}`;
}

export async function startDrawing(
  browser: BrowserLike,
  shop: Pick<TestShop, 'slug'>,
  changes: Partial<StartDrawingRequest> = {},
): Promise<RevisionAnswer> {
  return revisionOf(await browser.post(`/api/shops/${shop.slug}/drawings`, drawingRequest(changes)));
}

/** The save that changes nothing but what is named. */
export function saveRequest(
  answer: RevisionAnswer,
  changes: Partial<SaveRevisionRequest> = {},
): SaveRevisionRequest {
  const { version, title, note, entryUnit, settings, values } = answer.revision;
  return { version, title, note, entryUnit, settings, values, ...changes };
}

export async function submit(
  browser: BrowserLike,
  shop: Pick<TestShop, 'slug'>,
  answer: RevisionAnswer,
): Promise<RevisionAnswer> {
  return revisionOf(
    await browser.post(revisionPath(shop, answer, 'submit'), { version: answer.revision.version }),
  );
}

export async function approve(
  browser: BrowserLike,
  shop: Pick<TestShop, 'slug'>,
  answer: RevisionAnswer,
): Promise<RevisionAnswer> {
  const { version, contentHash } = answer.revision;
  return revisionOf(await browser.post(revisionPath(shop, answer, 'approve'), { version, contentHash }));
}

/** A drawing that one person drew and another released. */
export async function releasedDrawing(
  designer: BrowserLike,
  checker: BrowserLike,
  shop: Pick<TestShop, 'slug'>,
  changes: Partial<StartDrawingRequest> = {},
): Promise<RevisionAnswer> {
  return approve(checker, shop, await submit(designer, shop, await startDrawing(designer, shop, changes)));
}
