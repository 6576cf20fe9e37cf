import { describe, expect, it } from 'vitest';
import { fitLimits, itGrade } from '../../shared/standards/iso286';
import { FIT_LIMITS, IT_VALUES } from './published/fit-limits';

describe('ISO 286', () => {
  it('standard tolerances agree with the table of ISO 286-1', () => {
    const wrong = IT_VALUES.filter(([size, grade, micrometres]) => {
      const found = itGrade(size, grade);
      return found === null || Math.abs(found * 1000 - micrometres) > 1e-6;
    });
    expect(wrong).toEqual([]);
  });

  const codes = [...new Set(FIT_LIMITS.map(([, code]) => code))];
  it.each(codes)('limits of %s agree with ISO 286-2', (code) => {
    const wrong = FIT_LIMITS.filter((row) => row[1] === code).filter(([size, , upper, lower]) => {
      const found = fitLimits(code, size);
      // js and JS of odd grades are printed to a whole micrometre in some tables.
      const slack = code.toLowerCase().startsWith('js') ? 0.51 : 1e-6;
      return !(
        found.ok &&
        Math.abs(found.value.upper * 1000 - upper) <= slack &&
        Math.abs(found.value.lower * 1000 - lower) <= slack
      );
    });
    expect(wrong).toEqual([]);
  });

  it('every range is over its lower bound and up to its upper one', () => {
    expect(fitLimits('h7', 18)).toMatchObject({ ok: true, value: { lower: -0.018 } });
    expect(fitLimits('h7', 18.001)).toMatchObject({ ok: true, value: { lower: -0.021 } });
  });
});
