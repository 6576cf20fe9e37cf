import type { ErrorAnswer } from '../../../shared/api/error';

/** An answer that is not a success, or no answer at all (`status` 0: no connection). */
export class ApiFault extends Error {
  constructor(
    readonly status: number,
    readonly code: string,
    message: string,
    readonly fields: readonly { path: string; message: string }[] = [],
    /** The whole answer, for those that carry more than the error (409: what stands now). */
    readonly body: unknown = null,
  ) {
    super(message);
    this.name = 'ApiFault';
  }

  get noConnection(): boolean {
    return this.status === 0;
  }
}

function isErrorAnswer(body: unknown): body is ErrorAnswer {
  if (typeof body !== 'object' || body === null || !('error' in body)) return false;
  const { error } = body;
  return typeof error === 'object' && error !== null && 'code' in error && 'message' in error;
}

/** The fault that a bad answer stands for; an answer in no known shape gets a sentence of its own. */
export function faultFrom(status: number, body: unknown): ApiFault {
  if (isErrorAnswer(body)) {
    const { code, message, fields } = body.error;
    return new ApiFault(status, code, message, fields ?? [], body);
  }
  return new ApiFault(
    status,
    'unreadable',
    `The server gave an answer that cannot be read (${status}). Nothing you typed is lost.`,
  );
}

export const noConnection = () =>
  new ApiFault(0, 'no_connection', 'The server cannot be reached. Nothing you typed is lost.');
