import { describe, expect, it } from 'vitest';
import { parseAngle } from '../../../shared/units/angle';

describe('an angle as people type it', () => {
  it.each([
    ['1.5', 1.5],
    ['1.5°', 1.5],
    ['1,5°', 1.5],
    ['1.5 deg', 1.5],
    ["1° 30'", 1.5],
    ['1°30′', 1.5],
    ['1°30\'15"', 1 + 30.25 / 60],
    ["30'", 0.5],
    ['0', 0],
    ['360', 360],
  ])('%s', (typed, degrees) => {
    const read = parseAngle(typed);
    expect(read).toMatchObject({ ok: true, degrees });
    expect(read.ok && read.value).toBeCloseTo((degrees * Math.PI) / 180, 15);
  });

  it.each([
    ['', /No angle/],
    ['-2', /negative/],
    ['361', /full turn/],
    ["1° 75'", /60 or more/],
    ['two', /not an angle/],
    ['1 30', /not an angle/],
    ['NaN', /not an angle/],
  ])('%j is refused in words', (typed, sentence) => {
    const read = parseAngle(typed);
    expect(read.ok ? '' : read.message).toMatch(sentence);
  });
});
