import { describe, expect, it } from 'vitest';
import { parseFitOrTolerance, splitSizeAndTolerance } from '../../../shared/units/tolerance';

describe('a fit or tolerance as people type it', () => {
  it.each([
    ['', { kind: 'none' }],
    ['none', { kind: 'none' }],
    ['0', { kind: 'none' }],
    ['h6', { kind: 'fit', code: 'h6' }],
    ['H 7', { kind: 'fit', code: 'H7' }],
    ['js9', { kind: 'fit', code: 'js9' }],
    ['±0.05', { kind: 'symmetric', upper: 0.05, lower: -0.05 }],
    ['+-0.05', { kind: 'symmetric', upper: 0.05, lower: -0.05 }],
    ['+/- 0,05 mm', { kind: 'symmetric', upper: 0.05, lower: -0.05 }],
    ['±2 thou', { kind: 'symmetric', upper: 0.0508, lower: -0.0508 }],
    ['+0/-0.1', { kind: 'limits', upper: 0, lower: -0.1 }],
    ['0/-0.1', { kind: 'limits', upper: 0, lower: -0.1 }],
    ['+0.1/0', { kind: 'limits', upper: 0.1, lower: 0 }],
    ['−0.02/−0.05', { kind: 'limits', upper: -0.02, lower: -0.05 }],
    ['+0.1 -0.05', { kind: 'limits', upper: 0.1, lower: -0.05 }],
    ['-0.1/+0', { kind: 'limits', upper: 0, lower: -0.1 }],
    ['+.001/-.002 in', { kind: 'limits', upper: 0.0254, lower: -0.0508 }],
  ])('%j', (typed, value) => {
    expect(parseFitOrTolerance(typed, 'mm')).toEqual({ ok: true, value });
  });

  it.each([
    ['0.05', /not a tolerance.*±0\.05/],
    ['H7/g6', /pair of fits/],
    ['w6', /not a tolerance/],
    ['h19', /not a tolerance/],
    ['Hh7', /not a tolerance/],
    ['±0', /no tolerance at all/],
    ['+0.1/+0.1', /no tolerance at all/],
    ['±1/64', /cannot be read.*1\/64 in/],
  ])('%j is refused in words', (typed, sentence) => {
    const read = parseFitOrTolerance(typed, 'mm');
    expect(read.ok ? '' : read.message).toMatch(sentence);
  });

  it.each([
    ['25 h6', '25', 'h6'],
    ['25h6', '25', 'h6'],
    ['25e8', '25', 'e8'],
    ['12 mm H7', '12 mm', 'H7'],
    ['1-1/4" h7', '1-1/4"', 'h7'],
    ['22 ±0.1', '22', '±0.1'],
    ['22±0.1', '22', '±0.1'],
    ['1/2 in +0/-.002', '1/2 in', '+0/-.002'],
    ['25 0/-0.1', '25', '0/-0.1'],
    ['25 -0.1/-0.2', '25', '-0.1/-0.2'],
    ['1 -1/4"', '1 -1/4"', ''],
    ['12.5 mm', '12.5 mm', ''],
    ['1e+21', '1e+21', ''],
    ['', '', ''],
  ])('%j is the size %j with the tolerance %j', (typed, size, tolerance) => {
    expect(splitSizeAndTolerance(typed)).toEqual({ size, tolerance });
  });
});
