import type { z } from 'zod';

/** A schema's issue in words a person can act on: what is allowed there. Sentences the schema gives itself stay. */
export function plainIssue(issue: z.core.$ZodIssue): string {
  switch (issue.code) {
    case 'invalid_type':
      return `This must be ${WORDS[issue.expected] ?? issue.expected}.`;
    case 'too_small':
      if (issue.origin === 'string' && issue.minimum === 1) return 'This cannot be empty.';
      return `This must ${bound(issue.origin, 'at least', issue.minimum)}.`;
    case 'too_big':
      return `This must ${bound(issue.origin, 'at most', issue.maximum)}.`;
    case 'invalid_format':
      return issue.format === 'uuid' ? 'This is no id.' : 'This is not written as it must be.';
    case 'invalid_value':
      return `This must be one of ${issue.values.map(String).join(', ')}.`;
    case 'invalid_union':
      return 'This is none of the forms that are allowed here.';
    case 'custom':
      return issue.message;
    default:
      return 'This is not allowed here.';
  }
}

const WORDS: Readonly<Record<string, string>> = {
  string: 'text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'yes or no (true or false)',
  object: 'a set of named values',
  record: 'a set of named values',
  array: 'a list',
};

function bound(origin: string, word: string, figure: number | bigint): string {
  if (origin === 'string') return `have ${word} ${figure} characters`;
  if (origin === 'array') return `have ${word} ${figure} rows`;
  return `be ${word} ${figure}`;
}
