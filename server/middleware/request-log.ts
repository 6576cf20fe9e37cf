import { pino, stdSerializers } from 'pino';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';
import { v7 as uuid } from 'uuid';

export function openLog(level: string): Logger {
  // Errors that are no request's: those of requests go through the same below.
  return pino({ level, serializers: { err: (error: Error) => plainError(stdSerializers.err(error)) } });
}

/** One line a request, with an id that the answer carries too; neither headers nor bodies are written, so no secrets. */
export function requestLog(logger: Logger) {
  return pinoHttp({
    logger,
    genReqId: (_request, response) => {
      const id = uuid();
      response.setHeader('x-request-id', id);
      return id;
    },
    serializers: {
      req: (request: { id: unknown; method: string; url: string }) => ({
        id: request.id,
        method: request.method,
        // What people search for is theirs: the path is enough.
        path: request.url.split('?')[0],
      }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
      err: plainError,
    },
    customLogLevel: (_request, response, error) => (error || response.statusCode >= 500 ? 'error' : 'info'),
  });
}

/** What an error is and where it arose. Whatever else hangs on it (a statement's values, a token's hash) is not for the log. */
function plainError(error: { type?: unknown; message?: unknown; stack?: unknown; code?: unknown }) {
  const { type, message, stack, code } = error;
  return { type, message, stack, code };
}
