import fc from 'fast-check';
import type { TypedRow, TypedValues } from '../../../shared/template/template';
import { sometimes, tenths, typedInches, typedMm } from './pinned';
import { THREADS, type GeneratedThread } from './threads';

interface Step {
  thread?: GeneratedThread;
  diameter: number;
  length: number;
  tolerance: string;
  /** Where the tolerance is typed: beside the diameter or in its own field. */
  beside: boolean;
  lengthTolerance: string;
  sameAsBefore: boolean;
}

/** One step: a quarter threaded, a third of the others fitted, one in twenty the diameter of its neighbour. */
const step: fc.Arbitrary<Step> = fc
  .record({
    thread: fc.option(fc.constantFrom(...THREADS), { nil: undefined, freq: 3 }).map((thread) => thread),
    diameter: tenths(4, 80),
    length: tenths(3, 90),
    tolerance: fc.constantFrom('', '', '', '', 'h6', 'h7', 'g6', 'f7', 'k6', '±0.05', '+0/-0.1'),
    beside: fc.boolean(),
    lengthTolerance: fc.constantFrom('', '', '', '', '±0.1', '+0.2/0'),
    sameAsBefore: sometimes(5),
  })
  .map((drawn) => ({ ...drawn, thread: drawn.thread && drawn.diameter > 30 ? undefined : drawn.thread }));

/** Lengths leave room for a chamfer of one pitch at either end. */
function roomFor({ thread, length }: Step): number {
  return thread ? Math.max(length, 3 * thread.pitch + 1) : length;
}

function typedRow(given: Step, index: number, before: Step | undefined, inches: boolean): TypedRow {
  const show = inches ? typedInches : typedMm;
  const key = `k${index + 1}`;
  const length = `${show(roomFor(given))}`;
  if (given.thread) return { key, diameter: '', length, fit: '', thread: given.thread.text };
  const same = given.sameAsBefore && before && !before.thread ? before : undefined;
  const diameter = show((same ?? given).diameter);
  if (same) return { key, diameter, length, fit: '', thread: '' };
  const { tolerance, beside } = given;
  return {
    key,
    diameter: beside && tolerance !== '' ? `${diameter} ${tolerance}` : diameter,
    length: given.lengthTolerance === '' || inches ? length : `${length} ${given.lengthTolerance}`,
    fit: beside ? '' : tolerance,
    thread: '',
  };
}

/** A chamfer that leaves metal: empty, none, or up to a third of what the step allows. */
function chamfer(on: Step, choice: number): string {
  const most = Math.min(roomFor(on) / 3, (on.thread?.major ?? on.diameter) / 4, 5);
  if (choice < 35) return '';
  if (choice < 45) return '0';
  const leg = Math.max(0.2, (most * (choice - 40)) / 60);
  return leg <= most ? typedMm(leg) : '0';
}

/** Valid values of a stepped shaft: 1 to 6 steps, mixed threads, fits and chamfers, a seventh typed in inches. */
export const steppedShaftValues: fc.Arbitrary<TypedValues> = fc
  .record({
    steps: fc.array(step, { minLength: 1, maxLength: 6 }),
    left: fc.integer({ min: 0, max: 99 }),
    right: fc.integer({ min: 0, max: 99 }),
    inches: sometimes(14),
    quantity: fc.integer({ min: 1, max: 40 }),
  })
  .map(({ steps, left, right, inches, quantity }) => {
    const settled: Step[] = [];
    for (const [index, drawn] of steps.entries()) {
      const before = settled[index - 1];
      // A run of equal diameters keeps the diameter of its first step.
      settled.push(
        drawn.sameAsBefore && before && !before.thread
          ? { ...drawn, thread: undefined, diameter: before.diameter }
          : drawn,
      );
    }
    const first = settled[0] as Step;
    const last = settled[settled.length - 1] as Step;
    const rows = settled.map((each, index) => typedRow(each, index, settled[index - 1], inches));
    // Neighbours of one diameter are one face when neither carries a tolerance; then no length of theirs may carry one.
    rows.forEach((row, index) => {
      const next = rows[index + 1];
      const joins = (other: TypedRow | undefined): boolean =>
        other !== undefined && bare(other['diameter']) === bare(row['diameter']);
      if (joins(next) || joins(rows[index - 1])) row['length'] = bare(row['length']);
    });
    return {
      steps: rows,
      leftChamfer: chamfer(first, left),
      rightChamfer: chamfer(last, right),
      title: 'Pinned shaft',
      quantity: String(quantity),
    };
  });

/** A size without the tolerance typed beside it. */
function bare(text: string | undefined): string {
  return /^[\d.]+(?: in)?/.exec(text ?? '')?.[0] ?? '';
}
