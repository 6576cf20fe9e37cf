import { describe, expect, it } from 'vitest';
import { sizeLabel } from '../../../shared/drawing/size-text';
import { partAndScheme } from '../../corpus/sheet-of';

const fitted = (fit: string) => {
  const { scheme } = partAndScheme(
    'stepped-shaft',
    {
      title: 'Pin',
      quantity: '1',
      leftChamfer: '0',
      rightChamfer: '0',
      steps: [{ key: 'r1', diameter: '25', length: '40', fit, thread: '' }],
    },
    { style: 'iso', unit: 'mm' },
  );
  const size = scheme.sizes.find((s) => s.kind === 'diameter');
  if (!size) throw new Error('The pin has no diameter.');
  return size;
};

describe('limits one over the other', () => {
  it.each([
    ['g6', '.', '-0.007', '-0.020'],
    ['k6', '.', '+0.015', '+0.002'],
    ['h7', '.', '0', '-0.021'],
    ['f7', ',', '-0,020', '-0,041'],
  ] as const)('of 25 %s show the same number of decimals', (fit, decimalSign, upper, lower) => {
    const label = sizeLabel(fitted(fit), { style: 'iso', unit: 'mm', decimalSign });
    expect(label.runs.find((r) => r.kind === 'stack')).toEqual({ kind: 'stack', upper, lower });
  });
});
