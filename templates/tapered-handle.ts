import { defineTemplate } from '../shared/template/define';
import {
  TAPERED_HANDLE_CONSTRAINTS,
  TAPERED_HANDLE_DERIVED,
  TAPERED_HANDLE_REMARKS,
} from './tapered-handle-constraints';
import { TAPERED_HANDLE_EXAMPLES } from './tapered-handle-examples';
import { TAPERED_HANDLE_PARAMETERS } from './tapered-handle-parameters';
import { TAPERED_HANDLE_SIZES } from './tapered-handle-sizes';

/** Thread, plain spigot, round or hexagonal grip, and a taper to a plain, crowned or chamfered end. */
export const taperedHandle = defineTemplate({
  id: 'tapered-handle',
  name: 'Tapered handle',
  summary:
    'A threaded end and spigot, a grip of the bar (six flats when hexagonal), then a taper to the right end.',
  parameters: TAPERED_HANDLE_PARAMETERS,
  derived: TAPERED_HANDLE_DERIVED,
  constraints: TAPERED_HANDLE_CONSTRAINTS,
  remarks: TAPERED_HANDLE_REMARKS,
  features: [
    {
      kind: 'cylinder',
      id: 'threadedEnd',
      parameter: 'threadLength',
      figures: { length: 'threadLength', diameter: 'major' },
    },
    {
      kind: 'cylinder',
      id: 'spigot',
      parameter: 'spigotDiameter',
      when: 'spigot > 0',
      figures: { length: 'spigot', diameter: 'spigotDiameter' },
    },
    {
      kind: 'cylinder',
      id: 'grip',
      parameter: 'barDiameter',
      figures: { length: 'gripLength', diameter: 'barDiameter' },
    },
    {
      kind: 'cone',
      id: 'taper',
      parameter: 'taperEndDiameter',
      figures: { length: 'taperLength', startDiameter: 'barDiameter', endDiameter: 'taperEndDiameter' },
    },
    { kind: 'thread', id: 'thread', parameter: 'thread', figures: { on: '"threadedEnd"', thread: 'thread' } },
    {
      kind: 'chamfer',
      id: 'threadChamfer',
      parameter: 'threadChamfer',
      when: 'threadLeg > 0',
      figures: { on: '"threadedEnd"', end: '"left"', leg: 'threadLeg' },
    },
    {
      kind: 'flats',
      id: 'flats',
      parameter: 'acrossFlats',
      when: 'isHex',
      // A corner upwards, so that the axis view shows three faces and the round of the bar at its outline.
      figures: {
        from: 'gripFrom',
        length: 'flatsEndIsGiven ? flatsSpan : (flatsSpan > gripLength + 1e-6 ? flatsRunOut : gripLength)',
        count: '6',
        acrossFlats: 'acrossFlats',
        phase: 'pi / 6',
      },
    },
    {
      kind: 'crown',
      id: 'endCrown',
      parameter: 'endSize',
      when: 'crowned',
      figures: { end: '"right"', radius: 'end' },
    },
    {
      kind: 'chamfer',
      id: 'endChamfer',
      parameter: 'endSize',
      when: 'chamfered',
      figures: { on: '"taper"', end: '"right"', leg: 'end' },
    },
  ],
  sizes: TAPERED_HANDLE_SIZES,
  datum: '0',
  example: TAPERED_HANDLE_EXAMPLES[0].values,
  examples: TAPERED_HANDLE_EXAMPLES,
});
