import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { beforeAll, describe, expect, it } from 'vitest';
import { DRILL_SIZES } from '../../shared/standards/drills';
import { parseAngle } from '../../shared/units/angle';
import { parseLength } from '../../shared/units/length';

/** GNU units, Debian package `units`: an independent table of units and gauges. */
const PROGRAM = '/usr/bin/units';

beforeAll(() => {
  if (!existsSync(PROGRAM)) {
    throw new Error(
      'GNU units is not installed, and these checks compare with it. Install it with: apt-get install units',
    );
  }
});

function convert(expression: string, unit: string): number {
  const ran = spawnSync(PROGRAM, ['--terse', '--digits', '16', expression, unit], {
    encoding: 'utf8',
    timeout: 20_000,
  });
  const value = Number(ran.stdout.trim());
  if (ran.status !== 0 || ran.stdout.trim() === '' || !Number.isFinite(value)) {
    throw new Error(`GNU units did not convert ${expression} to ${unit}: ${ran.stdout}${ran.stderr}`);
  }
  return value;
}

describe('conversions against GNU units', () => {
  it.each([
    ['1/2 in', '(1|2) in'],
    ['1-1/4"', '(1 + 1|4) in'],
    ['2 63/64 in', '(2 + 63|64) in'],
    ['.437 in', '0.437 in'],
    ['0.0001 in', '0.0001 in'],
    ['25 thou', '25 mil'],
    ['1.2 cm', '1.2 cm'],
    ['0.5 m', '0.5 m'],
    ['3 ft', '3 ft'],
    ['12,5', '12.5 mm'],
    ['40 um', '40 micrometer'],
    ['7.25', '7.25 mm'],
  ])('length %s', (typed, expression) => {
    const read = parseLength(typed, 'mm');
    const reference = convert(expression, 'mm');
    expect(read.ok && Math.abs(read.value - reference) <= 1e-12 * Math.max(1, reference)).toBe(true);
  });

  it.each([
    ['1.5', '1.5 degree'],
    ["1° 30'", '1 degree + 30 arcmin'],
    ['8°17\'50"', '8 degree + 17 arcmin + 50 arcsec'],
    ['60 deg', '60 degree'],
  ])('angle %s', (typed, expression) => {
    const read = parseAngle(typed);
    expect(read.ok && Math.abs(read.value - convert(expression, 'radian')) <= 1e-14).toBe(true);
  });

  it('number and letter drills are the gauge tables', () => {
    const drills = [...DRILL_SIZES.number, ...DRILL_SIZES.letter];
    expect(drills).toHaveLength(106);
    const wrong = drills.filter(({ name, system, diameter }) => {
      const gauge = system === 'number' ? `drillgauge(${name.slice(1)})` : `drill${name}`;
      return Math.abs(convert(gauge, 'mm') - diameter) > 1e-9;
    });
    expect(wrong).toEqual([]);
  });
});
