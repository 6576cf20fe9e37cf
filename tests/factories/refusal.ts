import { expect } from 'vitest';
import { errorAnswer } from '../../shared/api/error';
import type { ErrorAnswer } from '../../shared/api/error';
import type { Answer } from './browser-like';

/** Expects that status and code in the one error shape, and nothing of the program's inside in it; gives the error. */
export function expectRefusal(answer: Answer, status: number, code: string): ErrorAnswer['error'] {
  const text = answer.bytes.toString('utf8');
  expect({ status: answer.status, body: text.slice(0, 400) }).toMatchObject({ status });
  const { error } = errorAnswer.parse(answer.body);
  expect(error.code).toBe(code);
  expect(text).not.toMatch(/node_modules|\bat [\w.<>]+ \(|\.ts:\d|sequelize|SELECT |INSERT /i);
  return error;
}
