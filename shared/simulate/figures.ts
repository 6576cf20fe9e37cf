import type { Fault, Method } from '../route/route';
import { LIMITS } from '../route/rules';
import type { Change } from './changes';
import { fault, mm } from './fault';
import { EVENTS } from './replay';
import type { Step } from './replay';
import { pieceAt } from '../part/generator';

/** Methods whose passes go down on the metal one after another. */
const BY_PASSES: readonly Method[] = ['rough-turn', 'turn', 'taper-turn', 'groove', 'face', 'mill-flat'];
/** Turned by hand, or not turned at all. */
const WITHOUT_SPEED: readonly Method[] = ['saw', 'thread-die', 'tap'];

/** What an operation says of itself in figures, against the metal. */
export function judgeFigures(steps: readonly Step[]): Fault[] {
  return steps.flatMap((step) => [
    ...removesFaults(step),
    ...rateFaults(step),
    ...passFaults(step),
    ...coneFaults(step),
    ...flatsFaults(step),
    ...threadFaults(step),
  ]);
}

function removesFaults(step: Step): Fault[] {
  const { operation, chips, cut } = step;
  const faults: Fault[] = [];
  const slack = LIMITS.volumeTolerance.value * Math.max(1, chips);
  if (!(Math.abs(operation.removes - chips) <= slack))
    faults.push(
      fault(
        'removes-metal',
        operation.number,
        `It says it removes ${operation.removes} mm³; the cut takes ${chips} mm³.`,
      ),
    );
  const event = EVENTS.has(operation.method);
  if (event && cut)
    faults.push(
      fault('removes-metal', operation.number, `No metal is cut when the method is ${operation.method}.`),
    );
  if (!event && operation.method !== 'saw' && !cut)
    faults.push(fault('removes-metal', operation.number, 'The operation has no cut to replay.'));
  if (cut && step.changes.length === 0)
    faults.push(fault('removes-metal', operation.number, 'The cut changes nothing: no metal is there.'));
  return faults;
}

function rateFaults({ operation }: Step): Fault[] {
  const { number } = operation;
  const faults: Fault[] = [];
  if (!EVENTS.has(operation.method) && !WITHOUT_SPEED.includes(operation.method)) {
    if (!(operation.speed > 0 && Number.isFinite(operation.speed)))
      faults.push(fault('figures-fit', number, 'The cut has no speed: it must be more than 0 rpm.'));
    if (!(operation.passes >= 1 && Number.isInteger(operation.passes)))
      faults.push(fault('figures-fit', number, 'The number of passes must be a whole number, at least 1.'));
  }
  if (!(operation.minutes >= 0 && Number.isFinite(operation.minutes)))
    faults.push(fault('figures-fit', number, 'The minutes must be a number, 0 or more.'));
  return faults;
}

/** Metal to go through: along the axis for an end, radially for a turned surface, square to the face for a flat. */
function passFaults({ operation, changes }: Step): Fault[] {
  if (!BY_PASSES.includes(operation.method)) return [];
  const kinds: readonly Change['kind'][] =
    operation.method === 'face'
      ? ['left-end', 'right-end']
      : operation.method === 'mill-flat'
        ? ['flats']
        : ['outer'];
  const gone = Math.max(
    0,
    ...changes.filter((change) => kinds.includes(change.kind)).map((change) => change.deepest),
  );
  const taken = operation.passes * operation.depthOfCut;
  if (taken >= gone - LIMITS.figureTolerance.value) return [];
  return [
    fault(
      'figures-fit',
      operation.number,
      `${operation.passes} passes of ${mm(operation.depthOfCut)} do not go through ${mm(gone)} of metal.`,
    ),
  ];
}

function coneFaults(step: Step): Fault[] {
  const { operation, after, changes } = step;
  if (operation.method !== 'taper-turn') return [];
  const angles = changes
    .filter((change) => change.kind === 'outer')
    .map((change) => pieceAt(after.outer, (change.from + change.to) / 2))
    .map((piece) =>
      piece?.kind === 'line' ? Math.atan(Math.abs(piece.end - piece.start) / (piece.to - piece.from)) : 0,
    );
  const degrees = (Math.max(0, ...angles) * 180) / Math.PI;
  const said = operation.halfAngle ?? NaN;
  const faults: Fault[] = [];
  if (!(Math.abs(said - degrees) <= LIMITS.angleTolerance.value))
    faults.push(
      fault(
        'figures-fit',
        operation.number,
        `The half angle is said to be ${said}°; the cone has ${degrees.toFixed(4)}°.`,
      ),
    );
  if (operation.settings !== undefined && !(Number.isInteger(operation.settings) && operation.settings >= 1))
    faults.push(
      fault('figures-fit', operation.number, 'A taper takes a whole number of settings, at least 1.'),
    );
  return faults;
}

function flatsFaults({ operation, changes }: Step): Fault[] {
  if (operation.method !== 'mill-flat') return [];
  const milled = changes.filter((change) => change.kind === 'flats');
  const count = milled[0]?.cut?.count ?? 0;
  const deepest = Math.max(0, ...milled.map((change) => change.deepest));
  const faults: Fault[] = [];
  if (operation.faces !== count)
    faults.push(
      fault(
        'figures-fit',
        operation.number,
        `It says ${operation.faces ?? 'no'} faces; the cut has ${count}.`,
      ),
    );
  if (!(Math.abs((operation.depth ?? NaN) - deepest) <= LIMITS.figureTolerance.value))
    faults.push(
      fault(
        'figures-fit',
        operation.number,
        `It says ${mm(operation.depth ?? NaN)} a face; from the round that is there it is ${mm(deepest)}.`,
      ),
    );
  return faults;
}

function threadFaults({ operation, changes }: Step): Fault[] {
  if (operation.method !== 'thread-die' && operation.method !== 'thread-single-point') return [];
  const thread = changes.find((change) => change.kind === 'thread')?.treatment;
  if (thread?.kind !== 'thread' || operation.blankDiameter === undefined) return [];
  const fits =
    operation.blankDiameter <= thread.major + LIMITS.figureTolerance.value &&
    operation.blankDiameter > thread.pitchDiameter;
  return fits
    ? []
    : [
        fault(
          'figures-fit',
          operation.number,
          `A blank of ${mm(operation.blankDiameter)} does not suit a thread of ${mm(thread.major)}.`,
        ),
      ];
}
