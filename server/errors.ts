import type { ErrorAnswer } from '../shared/api/error';

/** The one catalogue: status, stable code and the sentence a person reads. */
export const errorCatalogue = {
  'broken-json': { status: 400, message: 'The request is not readable JSON.' },
  'bad-input': { status: 422, message: 'Some of what was sent is not allowed. See the fields.' },
  unsigned: { status: 401, message: 'You are not signed in. Sign in and try again.' },
  'wrong-sign-in': { status: 401, message: 'This mail and password do not belong together.' },
  'session-ended': { status: 401, message: 'This sign-in has ended. Sign in again.' },
  forged: { status: 403, message: 'The request did not come from this application. Load the page again.' },
  forbidden: { status: 403, message: 'Your roles in this shop do not allow this.' },
  'own-work': { status: 403, message: 'You wrote or changed this revision. Somebody else must check it.' },
  'not-found': { status: 404, message: 'There is no such thing here.' },
  'wrong-state': { status: 409, message: 'The revision is not in a state that allows this.' },
  stale: { status: 409, message: 'Somebody else changed this meanwhile. Look at what differs.' },
  'engine-changed': {
    status: 409,
    message:
      'The program was renewed since this was submitted and works it out differently. Take it back, look at it and submit it again.',
  },
  exists: { status: 409, message: 'This id is in use already.' },
  'too-large': { status: 413, message: 'The request is larger than 256 kB.' },
  'unknown-encoding': {
    status: 415,
    message: 'The request is written in an encoding that is not understood.',
  },
  'not-drawn': {
    status: 409,
    message: 'There is no sheet yet: the sizes have never been right. Mend the fields first.',
  },
  'not-ready': { status: 422, message: 'This cannot be sent for checking yet. See the fields.' },
  'too-many': { status: 429, message: 'Too many tries. Wait a few minutes and try again.' },
  internal: { status: 500, message: 'Something failed on our side. Nothing was changed. Try again.' },
} as const;

export type ErrorCode = keyof typeof errorCatalogue;
export type FieldError = { path: string; message: string };

/** An answer that is not a success. Thrown anywhere below a route; the one exit writes it. */
export class Refusal extends Error {
  readonly status: number;

  /** `extra` stands beside `error` in the answer: a stale version carries what is there now. */
  constructor(
    readonly code: ErrorCode,
    readonly fields?: readonly FieldError[],
    readonly extra?: Readonly<Record<string, unknown>>,
    sentence?: string,
  ) {
    super(sentence ?? errorCatalogue[code].message);
    this.name = 'Refusal';
    this.status = errorCatalogue[code].status;
  }

  answer(): ErrorAnswer & Record<string, unknown> {
    const fields = this.fields ? { fields: [...this.fields] } : {};
    return { error: { code: this.code, message: this.message, ...fields }, ...this.extra };
  }
}
