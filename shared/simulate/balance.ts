import type { Part } from '../part/part';
import { volume, volumeBetween } from '../part/volume';
import type { Fault, Route } from '../route/route';
import { LIMITS } from '../route/rules';
import { fault, mm } from './fault';
import type { Replay, Step } from './replay';

/** blank = chips + kerf + remnant + part, each by the simulator's own integrals, and as the route says it. */
export function judgeBalance(route: Route, part: Part, replayed: Replay): Fault[] {
  const faults: Fault[] = [];
  const blank = volume(route.blank);
  const slack = LIMITS.volumeTolerance.value * blank;
  const own = { blank, removed: 0, kerf: 0, remnant: 0, part: volume(part.body) };
  for (const step of replayed.steps) {
    own.removed += step.chips;
    const severed = severedVolumes(step);
    own.kerf += severed.kerf;
    own.remnant += severed.remnant;
    if (severed.message) faults.push(fault('volumes-balance', step.operation.number, severed.message));
  }
  for (const name of ['blank', 'removed', 'kerf', 'remnant', 'part'] as const) {
    if (!(Math.abs(own[name] - route.volumes[name]) <= slack))
      faults.push(
        fault(
          'volumes-balance',
          0,
          `The route gives ${name} as ${route.volumes[name]} mm³; the metal gives ${own[name]} mm³.`,
        ),
      );
  }
  const said = route.operations.reduce((sum, operation) => sum + operation.removes, 0);
  if (!(Math.abs(said - route.volumes.removed) <= slack))
    faults.push(
      fault(
        'volumes-balance',
        0,
        `The operations remove ${said} mm³ together, the route says ${route.volumes.removed} mm³.`,
      ),
    );
  if (!(Math.abs(own.blank - own.removed - own.kerf - own.remnant - own.part) <= slack))
    faults.push(fault('volumes-balance', 0, 'Chips, kerf, remnant and part together are not the blank.'));
  return faults;
}

/** Kerf and remnant of a parting or sawing cut, measured on the stage at that moment. */
function severedVolumes(step: Step): { kerf: number; remnant: number; message?: string } {
  const { cut, before } = step;
  if (cut?.kind !== 'sever') return { kerf: 0, remnant: 0 };
  const whole = volume(before);
  const kept = volumeBetween(before, cut.from, cut.to);
  const kerf = volumeBetween(before, cut.kerfFrom, cut.kerfTo);
  const beside = Math.abs(cut.kerfTo - cut.from) < 1e-9 || Math.abs(cut.kerfFrom - cut.to) < 1e-9;
  const message =
    beside && cut.kerfTo > cut.kerfFrom
      ? undefined
      : `The blade's width, ${mm(cut.kerfTo - cut.kerfFrom)}, does not lie beside what is kept.`;
  return { kerf, remnant: whole - kept - kerf, message };
}
