import { buildPart } from '../../../shared/part/build';
import type { Part } from '../../../shared/part/part';
import type { PartInput } from '../../../shared/part/part-input';
import { parseThread } from '../../../shared/standards/threads';
import type { ThreadSpec } from '../../../shared/standards/threads';

export function thread(designation: string): ThreadSpec {
  const parsed = parseThread(designation);
  if (!parsed.ok) throw new Error(`not a thread: ${designation}`);
  return parsed.value;
}

export function input(given: Partial<PartInput>): PartInput {
  return {
    lengths: [],
    chamfers: [],
    crowns: [],
    threads: [],
    flats: [],
    centreHoles: [],
    material: 'free-cutting',
    datum: 0,
    ...given,
  };
}

export function built(given: Partial<PartInput>): Part {
  const result = buildPart(input(given));
  if ('problems' in result) throw new Error(JSON.stringify(result.problems));
  return result.part;
}

/** A hand lever: thread, spigot, hexagon milled on round bar, taper that trims the flats, crown. */
export const hexHandle = (): Part =>
  built({
    lengths: [
      { form: 'cylinder', id: 'thread-length', length: 18, diameter: 10 },
      { form: 'cylinder', id: 'spigot', length: 8, diameter: 13 },
      { form: 'cylinder', id: 'grip', length: 40, diameter: 20, asDrawn: true },
      { form: 'cone', id: 'taper', length: 60, startDiameter: 20, endDiameter: 14 },
    ],
    chamfers: [{ id: 'lead', on: 'thread-length', end: 'left', leg: 1.25 }],
    crowns: [{ id: 'crown', end: 'right', radius: 12 }],
    threads: [{ id: 'thread', on: 'thread-length', spec: thread('M10x1.25-6g') }],
    flats: [{ id: 'hexagon', from: 26, length: 40, count: 6, acrossFlats: 17.5 }],
  });

export const threadedShaft = (): Part =>
  built({
    lengths: [
      { form: 'cylinder', id: 'head', length: 20, diameter: 24 },
      { form: 'cylinder', id: 'seat', length: 30, diameter: 18 },
      { form: 'cylinder', id: 'end', length: 22, diameter: 12 },
    ],
    chamfers: [
      { id: 'head-chamfer', on: 'head', end: 'left', leg: 1 },
      { id: 'end-chamfer', on: 'end', end: 'right', leg: 1.75 },
    ],
    threads: [{ id: 'end-thread', on: 'end', spec: thread('M12-6g'), fullThread: 18, end: 'right' }],
  });
