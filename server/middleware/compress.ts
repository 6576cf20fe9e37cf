import compression from 'compression';
import type { RequestHandler } from 'express';

/**
 * Sends text (JSON, SVG, pages) packed to whoever can unpack it; a PDF is packed already. The answer with the token
 * that pages are given is left as it is: its length must not depend on a secret beside something a stranger chose.
 */
export function compressAnswers(): RequestHandler {
  return compression({
    filter: (request, response) =>
      !request.originalUrl.startsWith('/api/session') && compression.filter(request, response),
  });
}
