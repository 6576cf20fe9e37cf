import { formatThread } from '../standards/threads';
import type { ThreadTreatment } from './body';
import type { Feature } from './part';
import type { ThreadInput } from './part-input';
import type { PlacedChamfer, PlacedLength } from './outline';
import type { PlacedCentreHole } from './centre-hole';
import type { PlacedCrown } from './crown';
import type { PlacedFlats } from './place-flats';
import type { InputProblem } from './input-problem';
import { millimetres } from './input-problem';

export interface PlacedThread {
  input: ThreadInput;
  treatment: ThreadTreatment;
}

/** A thread over its length, or over its full-thread length from the named end. */
export function placeThread(
  input: ThreadInput,
  placed: readonly PlacedLength[],
): { thread: PlacedThread } | { problem: InputProblem } {
  const fault = (message: string): { problem: InputProblem } => ({ problem: { input: input.id, message } });
  const on = placed.find((length) => length.input.id === input.on);
  if (!on) return fault('The thread is on a length that is not there.');
  const { spec } = input;
  if (on.input.form !== 'cylinder') return fault('A thread needs a cylinder to be cut on.');
  if (Math.abs(on.input.diameter - spec.major) > 1e-6)
    return fault(
      `A ${spec.designation} thread needs a cylinder of ${millimetres(spec.major)}, not ${millimetres(on.input.diameter)}.`,
    );
  const length = on.to - on.from;
  const full = input.fullThread ?? length;
  if (!(full > 0) || full > length + 1e-9)
    return fault(
      `The full thread must be more than 0 mm and at most the ${millimetres(length)} it is cut on.`,
    );
  const from = input.end === 'right' ? on.to - full : on.from;
  return {
    thread: {
      input,
      treatment: {
        kind: 'thread',
        id: input.id,
        from,
        to: input.end === 'right' ? on.to : Math.min(on.to, on.from + full),
        internal: false,
        designation: formatThread(spec),
        major: spec.major,
        pitchDiameter: spec.pitchDiameter,
        root: spec.root,
        pitch: spec.pitch,
        lead: spec.lead,
        starts: spec.starts,
        hand: spec.hand,
      },
    },
  };
}

function lengthFeature(placed: PlacedLength): Feature {
  const { input, from, to } = placed;
  if (input.form === 'cylinder') {
    const feature: Feature = { kind: 'cylinder', id: input.id, from, to, diameter: input.diameter };
    return input.asDrawn ? { ...feature, asDrawn: true } : feature;
  }
  return {
    kind: 'cone',
    id: input.id,
    from,
    to,
    startDiameter: input.startDiameter,
    endDiameter: input.endDiameter,
    halfAngle: Math.atan(Math.abs(input.endDiameter - input.startDiameter) / 2 / input.length),
  };
}

function threadFeature(thread: PlacedThread): Feature {
  const { input, treatment } = thread;
  const threadClass = input.spec.class;
  return { ...treatment, on: input.on, ...(threadClass ? { threadClass } : {}) };
}

function flatsFeature(flats: PlacedFlats): Feature {
  const { cut, input } = flats;
  return {
    kind: 'flats',
    id: input.id,
    from: flats.declaredFrom,
    to: flats.declaredTo,
    count: cut.count,
    acrossFlats: input.acrossFlats,
    distance: cut.distance,
    phase: cut.phase,
    runOutFrom: cut.from,
    runOutTo: cut.to,
    roundedCorners: flats.roundedCorners,
  };
}

export interface PlacedInputs {
  length: number;
  lengths: readonly PlacedLength[];
  chamfers: readonly PlacedChamfer[];
  crowns: readonly PlacedCrown[];
  threads: readonly PlacedThread[];
  flats: readonly PlacedFlats[];
  centreHoles: readonly PlacedCentreHole[];
}

/** Every feature with its span resolved: faces first, then lengths in order, then what is cut on them. */
export function featuresOf(placed: PlacedInputs): Feature[] {
  return [
    { kind: 'face', id: 'left-face', x: 0 },
    { kind: 'face', id: 'right-face', x: placed.length },
    ...placed.lengths.map(lengthFeature),
    ...placed.chamfers.map(({ input, from, to, angle }): Feature => ({
      kind: 'chamfer',
      id: input.id,
      from,
      to,
      end: input.end,
      leg: input.leg,
      angle,
      on: input.on,
    })),
    ...placed.crowns.map(({ input, from, to }): Feature => ({
      kind: 'crown',
      id: input.id,
      from,
      to,
      end: input.end,
      radius: input.radius,
    })),
    ...placed.threads.map(threadFeature),
    ...placed.flats.map(flatsFeature),
    ...placed.centreHoles.map(({ input, from, to }): Feature => ({
      kind: 'centre-hole',
      id: input.id,
      from,
      to,
      end: input.end,
      designation: input.designation,
    })),
  ];
}
