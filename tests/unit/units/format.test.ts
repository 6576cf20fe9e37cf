import { describe, expect, it } from 'vitest';
import { toRadians } from '../../../shared/units/angle';
import {
  formatAngle,
  formatInchFraction,
  formatLength,
  formatNumber,
  formatSigned,
  roundHalfEven,
  roundTo,
} from '../../../shared/units/format';

describe('figures as the sheet prints them', () => {
  it.each([
    [12, '12'],
    [12.5, '12.5'],
    [0.5, '0.5'],
    [12.70004, '12.7'],
    [1.0005, '1.001'],
    [-0.0004, '0'],
    [1234.5678, '1234.568'],
  ])('%f mm in the ISO style is %s', (mm, text) => {
    expect(formatLength(mm, { unit: 'mm', style: 'iso' })).toBe(text);
  });

  it('the ASME style has fixed decimals and no leading zero in inches, ISO figures in millimetres', () => {
    expect(formatLength(12.7, { unit: 'in', style: 'asme' })).toBe('.500');
    expect(formatLength(31.75, { unit: 'in', style: 'asme' })).toBe('1.250');
    expect(formatLength(31.75, { unit: 'in', style: 'asme', decimals: 2 })).toBe('1.25');
    expect(formatLength(1.5875, { unit: 'in', style: 'asme' })).toBe('.063');
    expect(formatLength(0.5, { unit: 'mm', style: 'asme' })).toBe('0.5');
    expect(formatLength(1.5875, { unit: 'in', style: 'iso' })).toBe('0.0625');
  });

  it('a comma is the decimal sign where the shop wants it', () => {
    expect(formatLength(12.5, { unit: 'mm', style: 'iso', decimalSign: ',' })).toBe('12,5');
    expect(formatAngle(toRadians(1.5), { style: 'decimal', decimalSign: ',' })).toBe('1,5°');
  });

  it('limits carry their sign, zero none', () => {
    const format = { unit: 'mm', style: 'iso' } as const;
    expect([0.021, 0, -0, -0.05, 0.0001].map((mm) => formatSigned(mm, format))).toEqual([
      '+0.021',
      '0',
      '0',
      '-0.05',
      '0',
    ]);
    expect(formatSigned(-0.0508, { unit: 'in', style: 'asme' })).toBe('-.002');
  });

  it('angles are decimal degrees, or degrees, minutes and seconds', () => {
    expect(formatAngle(toRadians(1.4307))).toBe('1.431°');
    expect(formatAngle(toRadians(1.5), { style: 'minutes' })).toBe("1° 30'");
    expect(formatAngle(toRadians(30), { style: 'minutes' })).toBe('30°');
    expect(formatAngle(toRadians(8 + 17 / 60 + 50 / 3600), { style: 'minutes' })).toBe('8° 17\' 50"');
    expect(formatAngle(toRadians(59.99999), { style: 'minutes' })).toBe('60°');
  });

  it('plain figures and inch fractions', () => {
    expect(formatNumber(0.12345, 2)).toBe('0.12');
    expect(formatNumber(3, 2, { fixed: true })).toBe('3.00');
    expect([31.75, 9.525, 25.4, 0.396875].map(formatInchFraction)).toEqual(['1-1/4', '3/8', '1', '1/64']);
    expect(formatInchFraction(10)).toBeNull();
  });

  it('rounds halves away from zero, or to even where inch tables do', () => {
    expect([roundTo(1.005, 2), roundTo(-1.005, 2), roundTo(2.5, 0)]).toEqual([1.01, -1.01, 3]);
    expect([roundHalfEven(2.4385, 3), roundHalfEven(2.4375, 3), roundHalfEven(2.43851, 3)]).toEqual([
      2.438, 2.438, 2.439,
    ]);
  });

  it('a size that is not a number is a fault of ours', () => {
    expect(() => formatLength(Number.NaN, { unit: 'mm', style: 'iso' })).toThrow(RangeError);
    expect(() => formatNumber(Number.POSITIVE_INFINITY, 1)).toThrow(RangeError);
  });
});
