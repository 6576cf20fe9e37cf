import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseCentreHole } from '../../shared/standards/centre-holes';
import { fitLimits } from '../../shared/standards/iso286';
import { formatThread, parseThread } from '../../shared/standards/threads';
import { METRIC_SERIES } from '../../shared/standards/threads/metric-series';
import { UNIFIED_SIZES } from '../../shared/standards/threads/unified-series';
import { parseAngle, toRadians } from '../../shared/units/angle';
import {
  formatAngle,
  formatInchFraction,
  formatLength,
  formatSigned,
  roundTo,
} from '../../shared/units/format';
import { parseLength } from '../../shared/units/length';
import { parseFitOrTolerance, splitSizeAndTolerance } from '../../shared/units/tolerance';

const SEED = { seed: 20_260_701, numRuns: 500 };
const decimalSign = fc.constantFrom('.' as const, ',' as const);

/** A comma before exactly three digits is asked about, so such texts are not sent round. */
const isAmbiguous = (text: string): boolean => /^[1-9]\d{0,2},\d{3}$/.test(text);

describe('what is printed reads back as it was', () => {
  it('millimetres', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 9_999_999 }), decimalSign, (micrometres, sign) => {
        const mm = micrometres / 1000;
        const text = formatLength(mm, { unit: 'mm', style: 'iso', decimalSign: sign });
        fc.pre(!isAmbiguous(text));
        expect(parseLength(text, 'mm')).toEqual({ ok: true, value: mm, unit: 'mm', kind: 'decimal' });
      }),
      SEED,
    );
  });

  it('inches of both styles', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 999_999 }),
        fc.constantFrom('iso' as const, 'asme' as const),
        (tenths, style) => {
          const mm = (tenths * 254) / 100_000;
          const read = parseLength(formatLength(mm, { unit: 'in', style, decimals: 4 }), 'in');
          expect(read.ok && Math.abs(read.value - mm) < 1e-9).toBe(true);
        },
      ),
      SEED,
    );
  });

  it('binary fractions of an inch', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 64 * 40 }), (sixtyFourths) => {
        const mm = (sixtyFourths * 25.4) / 64;
        const text = formatInchFraction(mm) ?? '';
        const read = parseLength(`${text} in`, 'mm');
        expect(read.ok && Math.abs(read.value - mm) < 1e-9).toBe(true);
      }),
      SEED,
    );
  });

  it('angles, decimal and in minutes and seconds', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 90 * 3600 }), (seconds) => {
        const minutes = parseAngle(formatAngle(toRadians(seconds / 3600), { style: 'minutes' }));
        expect(minutes.ok && Math.abs(minutes.degrees * 3600 - seconds) < 1e-6).toBe(true);
        const degrees = roundTo(seconds / 3600, 3);
        const decimal = parseAngle(formatAngle(toRadians(degrees)));
        expect(decimal.ok && Math.abs(decimal.degrees - degrees) < 1e-9).toBe(true);
      }),
      SEED,
    );
  });

  it('limits beside a size', () => {
    const format = { unit: 'mm', style: 'iso' } as const;
    fc.assert(
      fc.property(
        fc.integer({ min: -2000, max: 2000 }),
        fc.integer({ min: 1, max: 2000 }),
        (lower, width) => {
          const upper = (lower + width) / 1000;
          const text = `25 ${formatSigned(upper, format)}/${formatSigned(lower / 1000, format)}`;
          const parts = splitSizeAndTolerance(text);
          expect(parts.size).toBe('25');
          expect(parseFitOrTolerance(parts.tolerance, 'mm')).toEqual({
            ok: true,
            value: { kind: 'limits', upper, lower: lower / 1000 },
          });
        },
      ),
      SEED,
    );
  });

  it('every thread of the metric and unified series, in both hands', () => {
    const metric = METRIC_SERIES.flatMap(([d, coarse, fine]) => [
      ...(coarse === null ? [] : [`M${d}`]),
      ...fine.map((p) => `M${d}x${p}`),
    ]);
    const unified = UNIFIED_SIZES.flatMap(({ name, unc, unf, unef }) => [
      ...(unc === undefined ? [] : [`${name}-${unc} UNC`]),
      ...(unf === undefined ? [] : [`${name}-${unf} UNF`]),
      ...(unef === undefined ? [] : [`${name}-${unef} UNEF`]),
    ]);
    for (const designation of [...metric, ...unified]) {
      for (const ending of ['', designation.startsWith('M') ? '-6g' : '-2A', '-LH']) {
        const read = parseThread(designation + ending);
        if (!read.ok) throw new Error(`${designation + ending}: ${read.message}`);
        expect(formatThread(read.value)).toBe(designation + ending);
        expect(read.value.major).toBeGreaterThan(read.value.pitchDiameter);
        expect(read.value.pitchDiameter).toBeGreaterThan(read.value.minor);
        expect(read.value.minor).toBeGreaterThan(read.value.root);
        expect(read.value.root).toBeGreaterThan(0);
      }
    }
    expect(metric.length + unified.length).toBeGreaterThan(350);
  });
});

describe('readers refuse in words and never throw', () => {
  const piece = fc.constantFrom(
    ...[
      '1',
      '12',
      '0',
      '.',
      ',',
      '/',
      '-',
      '−',
      '+',
      '±',
      ' ',
      'in',
      'mm',
      '"',
      "'",
      '°',
      'e',
      'E9',
      'x',
      'M',
      '#',
      'UNC',
      'Tr',
      'P',
      '(',
    ],
    ...[
      'h6',
      'H7',
      'LH',
      'A2.5',
      '½',
      '\u0000',
      '\u202e',
      '💥',
      'NaN',
      'Infinity',
      '__proto__',
      '${1}',
      'G',
      'BA',
      'ACME',
      'thou',
    ],
  );
  const typed = fc.oneof(
    fc.string({ maxLength: 70 }),
    fc.array(piece, { maxLength: 14 }).map((parts) => parts.join('')),
  );
  const readers: Readonly<
    Record<string, (text: string) => { ok: boolean; message?: string; value?: unknown }>
  > = {
    length: (text) => parseLength(text, 'mm'),
    'length in inches': (text) => parseLength(text, 'in'),
    angle: parseAngle,
    tolerance: (text) => parseFitOrTolerance(text, 'mm'),
    thread: parseThread,
    'centre hole': parseCentreHole,
    fit: (text) => fitLimits(text, 25),
  };

  it.each(Object.entries(readers))('%s', (_name, read) => {
    fc.assert(
      fc.property(typed, (text) => {
        const answer = read(text);
        if (answer.ok) {
          if (typeof answer.value === 'number')
            expect(answer.value >= 0 && answer.value <= 100_000).toBe(true);
        } else {
          // A sentence: begins with what was given or a capital, ends with a full stop, no control characters, not long.
          expect(answer.message).toMatch(/^[“A-Z0-9#.][^\u0000-\u001f]*\.$/u);
          expect((answer.message ?? '').length).toBeLessThan(420);
        }
      }),
      { ...SEED, numRuns: 3000 },
    );
  });

  it('a megabyte is refused by all of them, unread', () => {
    for (const read of Object.values(readers)) {
      for (const filling of ['1', ' ', '1/', '9.', 'M1', '±']) {
        const answer = read(filling.repeat(1_000_000 / filling.length));
        expect(answer.ok).toBe(false);
        expect((answer.message ?? '').length).toBeLessThan(300);
      }
    }
    expect(splitSizeAndTolerance('1'.repeat(1_000_000)).size.length).toBeLessThan(200);
  });

  it('the parts of a size and its tolerance are parts of what was typed', () => {
    fc.assert(
      fc.property(typed, (text) => {
        const { size, tolerance } = splitSizeAndTolerance(text);
        expect(text.includes(size) && text.includes(tolerance)).toBe(true);
      }),
      SEED,
    );
  });
});
