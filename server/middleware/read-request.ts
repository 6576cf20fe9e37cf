import type { Request } from 'express';
import type { z } from 'zod';
import { Refusal } from '../errors';
import { plainIssue } from './plain-issue';

/** The body as the schema makes it. @throws Refusal `bad-input` with every issue and its path at once. */
export function readBody<Schema extends z.ZodType>(request: Request, schema: Schema): z.output<Schema> {
  return read(request.body ?? {}, schema);
}

/** The query as the schema makes it; a name given twice or left empty counts as not understood, or not given. */
export function readQuery<Schema extends z.ZodType>(request: Request, schema: Schema): z.output<Schema> {
  const given = Object.entries(request.query).filter(([, value]) => value !== '');
  return read(Object.fromEntries(given), schema);
}

function read<Schema extends z.ZodType>(value: unknown, schema: Schema): z.output<Schema> {
  const result = schema.safeParse(value);
  if (result.success) return result.data;
  const fields = result.error.issues.map((issue) => ({
    path: issue.path.join('.'),
    message: plainIssue(issue),
  }));
  throw new Refusal('bad-input', fields);
}
