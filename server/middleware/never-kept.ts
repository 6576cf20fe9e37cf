import type { RequestHandler } from 'express';

/** Nothing the api answers, refusals among them, may lie in any cache: it is what holds now, for whoever asks. */
export const neverKept: RequestHandler = (_request, response, next) => {
  response.setHeader('cache-control', 'no-store');
  next();
};
