import type { ParameterBase } from '../shared/template/template';

/** Smallest and largest sizes every family takes, mm. Common practice: what a small shop turns. */
export const LEAST_DIAMETER = '1';
export const MOST_DIAMETER = '500';
export const LEAST_LENGTH = '0.5';
export const MOST_LENGTH = '3000';

const CENTRES_NOT_YET =
  'Centre holes cannot be asked for yet. Leave this empty; the route still centres long work where it must.';

/** What every family asks besides its shape. */
export const COMMON_PARAMETERS: readonly ParameterBase[] = [
  {
    id: 'leftCentre',
    label: 'Left centre hole',
    kind: 'text',
    optional: true,
    default: '',
    notYet: CENTRES_NOT_YET,
  },
  {
    id: 'rightCentre',
    label: 'Right centre hole',
    kind: 'text',
    optional: true,
    default: '',
    notYet: CENTRES_NOT_YET,
  },
  {
    id: 'material',
    label: 'Material',
    kind: 'material',
    default: 'steel-free-cutting',
    hint: 'From the table of materials; a free-cutting low-carbon steel where nothing is said.',
  },
  {
    id: 'title',
    label: 'Title',
    kind: 'text',
    optional: true,
    default: '',
    hint: 'Up to 80 characters, printed as typed.',
  },
  { id: 'quantity', label: 'Quantity', kind: 'count', default: '1', minimum: '1', maximum: '10000' },
];
