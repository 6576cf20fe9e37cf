import type { RequestHandler } from 'express';
import type { FieldError } from '../errors';
import { Refusal } from '../errors';

/** Deeper than any request of ours; a body that nests further is not walked to its end. */
const DEEPEST = 32;

/** Refuses what no database keeps: a NUL, half a character, nesting without end. All at once, with their places. */
export const readableText: RequestHandler = (request, _response, next) => {
  const fields: FieldError[] = [];
  walk(request.body, '', 0, fields);
  walk({ ...request.query }, '', 0, fields);
  next(fields.length > 0 ? new Refusal('bad-input', fields.slice(0, 20)) : undefined);
};

function walk(value: unknown, path: string, depth: number, fields: FieldError[]): void {
  if (typeof value === 'string') {
    const fault = unreadable(value);
    if (fault) fields.push({ path, message: fault });
  } else if (typeof value === 'object' && value !== null) {
    if (depth > DEEPEST) {
      fields.push({ path, message: `This is nested more than ${DEEPEST} deep.` });
      return;
    }
    for (const [key, inner] of Object.entries(value)) {
      if (unreadable(key)) fields.push({ path, message: 'A name here holds a character that is no text.' });
      walk(inner, path === '' ? key : `${path}.${key}`, depth + 1, fields);
    }
  }
}

function unreadable(text: string): string | null {
  if (text.includes('\u0000')) return 'This holds a NUL character, which is no text. Type it again.';
  return /\p{Surrogate}/u.test(text) ? 'This holds half a character. Type it again.' : null;
}
