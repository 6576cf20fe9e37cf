import type { ErrorRequestHandler } from 'express';
import type { ErrorCode } from '../errors';
import { Refusal } from '../errors';

/** The one exit of everything that is not a success. What is no refusal is our fault: written to the log, told without its inside. */
export const answerErrors: ErrorRequestHandler = (error: unknown, request, response, next) => {
  if (response.headersSent) return next(error);
  const refusal = refusalOf(error);
  if (refusal.code === 'internal') request.log?.error({ err: error }, 'a request failed');
  // What is missing now may be there at the next look.
  response.setHeader('cache-control', 'no-store');
  response.status(refusal.status).json(refusal.answer());
};

/** Codes of the body reader and of the router, by their stable `type`. */
const READER_CODES: Readonly<Record<string, ErrorCode>> = {
  'entity.parse.failed': 'broken-json',
  'entity.verify.failed': 'broken-json',
  'request.aborted': 'broken-json',
  'request.size.invalid': 'broken-json',
  'entity.too.large': 'too-large',
  'parameters.too.many': 'too-large',
  'encoding.unsupported': 'unknown-encoding',
  'charset.unsupported': 'unknown-encoding',
};

function refusalOf(error: unknown): Refusal {
  if (error instanceof Refusal) return error;
  const type = typeof error === 'object' && error !== null && 'type' in error ? error.type : undefined;
  if (typeof type === 'string' && READER_CODES[type]) return new Refusal(READER_CODES[type]);
  return new Refusal(isNoAddress(error) ? 'not-found' : 'internal');
}

/** An address that names no file, climbs out of its folder, or cannot be read at all (`/api/shops/%ff`). */
function isNoAddress(error: unknown): boolean {
  const status = typeof error === 'object' && error !== null && 'status' in error ? error.status : undefined;
  return error instanceof URIError || (typeof status === 'number' && status >= 400 && status < 500);
}
