import type { Parameter, ParameterBase } from '../shared/template/template';
import {
  COMMON_PARAMETERS,
  LEAST_DIAMETER,
  LEAST_LENGTH,
  MOST_DIAMETER,
  MOST_LENGTH,
} from './common-parameters';

const KEY_NOT_YET = 'Key seats cannot be drawn yet. Leave this empty.';
const UNDERCUT_NOT_YET = 'Undercuts cannot be drawn yet. Leave this empty.';

const notYet = (id: string, label: string, sentence: string): ParameterBase => ({
  id,
  label,
  kind: 'length',
  optional: true,
  default: '',
  notYet: sentence,
});

export const STEPPED_SHAFT_PARAMETERS: readonly Parameter[] = [
  {
    id: 'steps',
    label: 'Steps',
    kind: 'table',
    minimumRows: 1,
    maximumRows: 12,
    hint: 'From the left. A step with a thread takes its diameter from the thread and is threaded over its whole length.',
    columns: [
      {
        id: 'diameter',
        label: 'Diameter',
        kind: 'diameter',
        optional: true,
        default: '',
        minimum: LEAST_DIAMETER,
        maximum: MOST_DIAMETER,
        hint: 'May carry its tolerance, 25 h6. Leave it empty where a thread is given.',
      },
      { id: 'length', label: 'Length', kind: 'length', minimum: LEAST_LENGTH, maximum: MOST_LENGTH },
      {
        id: 'fit',
        label: 'Fit',
        kind: 'fit',
        optional: true,
        default: '',
        hint: 'h6, ±0.05 or +0/-0.1; empty for the general tolerance.',
      },
      { id: 'thread', label: 'Thread', kind: 'thread', optional: true, default: '' },
      notYet(
        'fullThread',
        'Full thread',
        'A thread runs over its whole step for now. Leave this empty and give the threaded length as a step of its own.',
      ),
      notYet('keyWidth', 'Key width', KEY_NOT_YET),
      notYet('keyDepth', 'Key depth', KEY_NOT_YET),
      notYet('keyLength', 'Key length', KEY_NOT_YET),
      notYet('keyOffset', 'Key offset', KEY_NOT_YET),
      {
        ...notYet(
          'texture',
          'Surface texture',
          'Surface texture cannot be given for each step yet. Leave this empty.',
        ),
        kind: 'text',
      },
    ],
    defaultRows: [
      { key: 'r1', diameter: '20', length: '30' },
      { key: 'r2', diameter: '30', length: '50' },
      { key: 'r3', diameter: '20', length: '25' },
    ],
  },
  {
    id: 'leftChamfer',
    label: 'Left chamfer',
    kind: 'length',
    optional: true,
    default: '',
    minimum: '0.1',
    maximum: '50',
    hint: 'Leg of 45°; 0 for none. Empty: none on a plain end, one pitch on a threaded one.',
  },
  {
    id: 'rightChamfer',
    label: 'Right chamfer',
    kind: 'length',
    optional: true,
    default: '',
    minimum: '0.1',
    maximum: '50',
    hint: 'Leg of 45°; 0 for none. Empty: none on a plain end, one pitch on a threaded one.',
  },
  notYet(
    'shoulderRadius',
    'Shoulder radius',
    'Inside corners are drawn sharp for now. Leave the shoulder radius empty.',
  ),
  { ...notYet('undercut', 'Undercut', UNDERCUT_NOT_YET), kind: 'text' },
  notYet('undercutWidth', 'Undercut width', UNDERCUT_NOT_YET),
  notYet('undercutDepth', 'Undercut depth', UNDERCUT_NOT_YET),
  ...COMMON_PARAMETERS,
];
