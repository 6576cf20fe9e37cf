import type { Parameter } from '../shared/template/template';
import {
  COMMON_PARAMETERS,
  LEAST_DIAMETER,
  LEAST_LENGTH,
  MOST_DIAMETER,
  MOST_LENGTH,
} from './common-parameters';

const KNURL_NOT_YET = 'Knurled grips cannot be drawn yet. Choose round or hex.';
const TAPER_NOT_YET =
  'A taper is given by its end diameter for now. Choose end-diameter and give the end diameter and length.';

const length = { kind: 'length', minimum: LEAST_LENGTH, maximum: MOST_LENGTH } as const;
const diameter = { kind: 'diameter', minimum: LEAST_DIAMETER, maximum: MOST_DIAMETER } as const;

export const TAPERED_HANDLE_PARAMETERS: readonly Parameter[] = [
  {
    id: 'thread',
    label: 'Thread',
    kind: 'thread',
    default: 'M10',
    hint: 'Such as M10, M12x1.25-6g or 3/8-16 UNC-2A.',
  },
  { id: 'threadLength', label: 'Thread length', default: '16', ...length },
  {
    id: 'threadChamfer',
    label: 'Thread chamfer',
    kind: 'length',
    optional: true,
    default: '',
    minimum: '0.1',
    maximum: '50',
    hint: 'Leg of 45°; 0 for none. Empty: one pitch.',
  },
  {
    id: 'threadRelief',
    label: 'Thread relief',
    kind: 'length',
    optional: true,
    default: '',
    notYet: 'A relief behind the thread cannot be drawn yet. Leave this empty or 0: the thread runs out.',
  },
  {
    id: 'spigotDiameter',
    label: 'Spigot diameter',
    default: '14',
    when: 'spigotLength > 0',
    hint: 'May carry its tolerance, 14 h9.',
    ...diameter,
  },
  {
    id: 'spigotLength',
    label: 'Spigot length',
    default: '10',
    optional: true,
    hint: '0 for no spigot.',
    ...length,
  },
  {
    id: 'grip',
    label: 'Grip',
    kind: 'choice',
    default: 'round',
    choices: [
      { id: 'round', label: 'Round' },
      { id: 'hex', label: 'Hexagon' },
      { id: 'knurled', label: 'Knurled', notYet: KNURL_NOT_YET },
    ],
  },
  { id: 'knurl', label: 'Knurl', kind: 'text', optional: true, default: '', notYet: KNURL_NOT_YET },
  { id: 'pitch', label: 'Knurl pitch', kind: 'length', optional: true, default: '', notYet: KNURL_NOT_YET },
  { id: 'barDiameter', label: 'Bar diameter', default: '25', ...diameter },
  {
    id: 'acrossFlats',
    label: 'Across flats',
    kind: 'length',
    default: '22',
    minimum: LEAST_DIAMETER,
    maximum: MOST_DIAMETER,
    when: 'grip == "hex"',
    hint: 'Sharp corners need a bar of 1.155 times the size across flats; a smaller bar leaves them rounded.',
  },
  { id: 'gripLength', label: 'Grip length', default: '60', ...length },
  {
    id: 'flatsLength',
    label: 'Flats length',
    optional: true,
    default: '',
    when: 'grip == "hex"',
    hint: 'From the left end of the grip; empty for the length of the grip. May run on into the taper.',
    ...length,
  },
  {
    id: 'taperBy',
    label: 'Taper given by',
    kind: 'choice',
    default: 'end-diameter',
    choices: [
      { id: 'end-diameter', label: 'End diameter' },
      { id: 'half-angle', label: 'Half angle', notYet: TAPER_NOT_YET },
      { id: 'included-angle', label: 'Included angle', notYet: TAPER_NOT_YET },
      { id: 'ratio', label: 'Ratio', notYet: TAPER_NOT_YET },
    ],
  },
  {
    id: 'taperEndDiameter',
    label: 'Taper end diameter',
    default: '16',
    hint: 'Where the taper and the right face would meet before any crown or chamfer.',
    ...diameter,
  },
  {
    id: 'taperAngle',
    label: 'Taper angle',
    kind: 'angle',
    optional: true,
    default: '',
    notYet: TAPER_NOT_YET,
  },
  {
    id: 'taperRatio',
    label: 'Taper ratio',
    kind: 'ratio',
    optional: true,
    default: '',
    notYet: TAPER_NOT_YET,
  },
  {
    id: 'taperLength',
    label: 'Taper length',
    default: '95',
    hint: 'To the right face, crown or chamfer included.',
    ...length,
  },
  {
    id: 'endForm',
    label: 'End form',
    kind: 'choice',
    default: 'crown',
    choices: [
      { id: 'crown', label: 'Crown' },
      { id: 'chamfer', label: 'Chamfer' },
    ],
  },
  {
    id: 'endSize',
    label: 'End size',
    kind: 'length',
    optional: true,
    default: '0',
    minimum: '0.1',
    maximum: '500',
    hint: 'Radius of the crown or leg of the chamfer; 0 for a plain end.',
  },
  ...COMMON_PARAMETERS,
];
