import { describe, expect, it } from 'vitest';
import { inchesToMm, parseLength } from '../../../shared/units/length';

describe('a length as people type it', () => {
  it.each([
    ['12', 12, 'mm', 'decimal'],
    ['12 mm', 12, 'mm', 'decimal'],
    ['12mm', 12, 'mm', 'decimal'],
    ['  12\u00a0MM ', 12, 'mm', 'decimal'],
    ['1.2 cm', 12, 'mm', 'decimal'],
    ['0.5 m', 500, 'mm', 'decimal'],
    ['1/2 in', 12.7, 'in', 'fraction'],
    ['½"', 12.7, 'in', 'fraction'],
    ['1-1/4"', 31.75, 'in', 'fraction'],
    ['1 1/4 in', 31.75, 'in', 'fraction'],
    ['1 - 1/4 inch', 31.75, 'in', 'fraction'],
    ['.437 in', 11.0998, 'in', 'decimal'],
    ['3/8”', 9.525, 'in', 'fraction'],
    ['25 thou', 0.635, 'in', 'decimal'],
    ['12,5', 12.5, 'mm', 'decimal'],
    ['0,125 in', 3.175, 'in', 'decimal'],
    ['1e2', 100, 'mm', 'decimal'],
    ['3/8 mm', 0.375, 'mm', 'fraction'],
    ['0', 0, 'mm', 'decimal'],
  ])('%s', (typed, value, unit, kind) => {
    expect(parseLength(typed, 'mm')).toEqual({ ok: true, value, unit, kind });
  });

  it('a bare figure or fraction means inches in an inch drawing', () => {
    expect(parseLength('12', 'in')).toMatchObject({ ok: true, value: 304.8, unit: 'in' });
    expect(parseLength('1-1/4', 'in')).toMatchObject({ ok: true, value: 31.75, kind: 'fraction' });
    expect(parseLength('12 mm', 'in')).toMatchObject({ ok: true, value: 12, unit: 'mm' });
  });

  it.each([
    ['3/8', /no unit.*3\/8 in.*0\.375 mm/],
    ['1 1/4', /1 1\/4 in.*1\.25 mm/],
    ['1,000', /two ways.*1\.000.*1000/],
    ['12,500', /12\.500.*12500/],
  ])('%s can be read two ways and is asked about', (typed, sentence) => {
    const read = parseLength(typed, 'mm');
    expect(read.ok ? '' : read.message).toMatch(sentence);
  });

  it.each([
    ['', /No length was given/],
    ['   ', /No length was given/],
    ['-5', /negative/],
    ['−5', /negative/],
    ['NaN', /not a length/],
    ['Infinity', /not a length/],
    ['1e400', /out of all measure/],
    ['1e9', /longer than 100 m/],
    ['1000000', /longer than 100 m/],
    ['12 furlongs', /“furlongs”/],
    ["12'", /ft/],
    ['3/0 in', /divides by nought/],
    ['1-5/4 in', /one or more/],
    ['1.5/2 in', /whole numbers/],
    ['1.2.3', /more than one point/],
    ['12 5', /not a length/],
    ['1.2345678901234', /more than 12 digits/],
    ['12; drop', /unit that is not known/],
  ])('%j is refused in words', (typed, sentence) => {
    const read = parseLength(typed, 'mm');
    expect(read.ok ? '' : read.message).toMatch(sentence);
  });

  it('converts a fraction of an inch without a hair of error', () => {
    expect([inchesToMm(0.375), inchesToMm(1 / 64), inchesToMm(0.19)]).toEqual([9.525, 0.396875, 4.826]);
  });
});
