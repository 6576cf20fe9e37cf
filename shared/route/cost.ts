import type { Bar, Register } from './register';
import type { Operation, Route } from './route';
import type { Words } from './words';

export interface CostAsked {
  register: Register;
  operations: readonly Operation[];
  setupMinutes: number;
  runMinutes: number;
  bar: Bar | undefined;
  /** Length of bar that one piece uses, kerf counted, and what of it goes back to the rack (mm). */
  used: number;
  goesBack: number;
  quantity: number;
  words: Words;
}

/** Money for one and for N: labour and machines by the hour, set-up once, the bar less what goes back to the rack. */
export function costOf(asked: CostAsked): NonNullable<Route['cost']> {
  const { register, operations, quantity } = asked;
  const { labourPerHour, currency } = register.settings;
  const rates = new Map<string, number>();
  for (const machine of [...register.lathes, ...register.mills, ...register.saws])
    rates.set(machine.id, machine.ratePerHour);
  const machineRun = operations.reduce((sum, o) => sum + (o.minutes * (rates.get(o.machine) ?? 0)) / 60, 0);
  const rate =
    rates.get(operations.find((o) => rates.has(o.machine) && o.method !== 'saw')?.machine ?? '') ?? 0;
  // Rounded before they are added, so that the sums a reader opens come out to the penny.
  const setup = cents((asked.setupMinutes * (labourPerHour + rate)) / 60);
  const run = cents((asked.runMinutes * labourPerHour) / 60 + machineRun);
  const perMetre = asked.bar?.costPerMetre ?? 0;
  const material = cents((Math.max(0, asked.used - asked.goesBack) * perMetre) / 1000);
  const each = run + material;
  return {
    one: cents(setup + each),
    each: cents(each),
    quantity,
    total: cents(setup + each * quantity),
    currency,
    sums: [
      {
        label: 'Setting up, once',
        amount: cents(setup),
        how: `${tenths(asked.setupMinutes)} min at ${labourPerHour} + ${rate} an hour`,
      },
      {
        label: 'Running, each',
        amount: cents(run),
        how: `${tenths(asked.runMinutes)} min at ${labourPerHour} an hour, and the machines’ own rates`,
      },
      {
        label: 'Bar, each',
        amount: cents(material),
        how: asked.bar
          ? `${asked.words.aboutWithUnit(asked.used)} at ${perMetre} a metre${asked.goesBack > 0 ? `, less ${asked.words.aboutWithUnit(asked.goesBack)} that goes back to the rack` : ''}`
          : 'not in the rack: no price',
      },
    ],
  };
}

function cents(value: number): number {
  return Math.round(value * 100) / 100;
}

function tenths(value: number): number {
  return Math.round(value * 10) / 10;
}
