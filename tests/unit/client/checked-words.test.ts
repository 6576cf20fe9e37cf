import { expect, it } from 'vitest';
import { checkRules } from '../../../shared/drawing/check/check-sheet';
import { CHECKED_WORDS } from '../../../src/features/fill-in/checked-words';

it('says in words what every rule of the sheet check looks at, and of no other', () => {
  expect(Object.keys(CHECKED_WORDS).sort()).toEqual(checkRules.map(({ id }) => id).sort());
  for (const words of Object.values(CHECKED_WORDS)) expect(words).toMatch(/^[a-z][^.]+[a-z]$/);
});
