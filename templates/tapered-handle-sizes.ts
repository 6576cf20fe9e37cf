import type { SizeTemplate } from '../shared/template/template';

/** The shown sizes: the parameters themselves, each once. */
export const TAPERED_HANDLE_SIZES: readonly SizeTemplate[] = [
  {
    id: 'thread',
    kind: 'thread',
    parameter: 'thread',
    features: ['thread', 'threadedEnd'],
    figures: { nominal: 'major', from: '0', to: 'threadLength', diameter: 'major' },
  },
  { id: 'threadLength', kind: 'length', parameter: 'threadLength', features: ['threadedEnd'], figures: { nominal: 'threadLength', from: '0', to: 'threadLength' } },
  { id: 'threadChamfer', kind: 'chamfer', parameter: 'threadChamfer', when: 'threadLeg > 0', features: ['threadChamfer'], figures: { nominal: 'threadLeg' } },
  {
    id: 'spigotDiameter',
    kind: 'diameter',
    parameter: 'spigotDiameter',
    when: 'spigot > 0',
    features: ['spigot'],
    figures: { nominal: 'spigotDiameter', from: 'threadLength', to: 'gripFrom', diameter: 'spigotDiameter' },
  },
  {
    id: 'spigotLength',
    kind: 'length',
    parameter: 'spigotLength',
    when: 'spigot > 0',
    features: ['spigot'],
    figures: { nominal: 'spigot', from: 'threadLength', to: 'gripFrom' },
  },
  // Short flats leave some round to read; sharp corners that run on leave only where the taper begins.
  {
    id: 'barDiameter',
    kind: 'diameter',
    parameter: 'barDiameter',
    when: 'not (isHex and cornersSharp and flatsStop >= gripLength)',
    features: ['grip', 'taper'],
    figures: {
      nominal: 'barDiameter',
      from: 'isHex ? (flatsStop < gripLength ? gripFrom + flatsStop : gripFrom) : gripFrom',
      to: 'gripTo',
      diameter: 'barDiameter',
    },
  },
  {
    id: 'barDiameter',
    kind: 'diameter',
    parameter: 'barDiameter',
    when: 'isHex and cornersSharp and flatsStop >= gripLength',
    features: ['grip', 'taper'],
    figures: { nominal: 'barDiameter', from: 'gripTo', to: 'overall', at: 'gripTo', diameter: 'barDiameter' },
  },
  { id: 'acrossFlats', kind: 'across-flats', parameter: 'acrossFlats', when: 'isHex', features: ['flats'], figures: { nominal: 'acrossFlats' } },
  { id: 'gripLength', kind: 'length', parameter: 'gripLength', features: ['grip'], figures: { nominal: 'gripLength', from: 'gripFrom', to: 'gripTo' } },
  {
    id: 'flatsLength',
    kind: 'length',
    parameter: 'flatsLength',
    when: 'flatsEndIsGiven',
    features: ['flats'],
    figures: { nominal: 'flatsSpan', from: 'gripFrom', to: 'gripFrom + flatsSpan' },
  },
  {
    id: 'taperEndDiameter',
    kind: 'diameter',
    parameter: 'taperEndDiameter',
    features: ['taper'],
    figures: { nominal: 'taperEndDiameter', from: 'gripTo', to: 'overall', at: 'overall', diameter: 'taperEndDiameter' },
  },
  { id: 'taperLength', kind: 'length', parameter: 'taperLength', features: ['taper'], figures: { nominal: 'taperLength', from: 'gripTo', to: 'overall' } },
  { id: 'endCrown', kind: 'radius', parameter: 'endSize', when: 'crowned', features: ['endCrown'], figures: { nominal: 'end' } },
  { id: 'endChamfer', kind: 'chamfer', parameter: 'endSize', when: 'chamfered', features: ['endChamfer'], figures: { nominal: 'end' } },
  {
    id: 'overall',
    kind: 'length',
    features: ['left-face', 'right-face'],
    figures: { nominal: 'overall', from: '0', to: 'overall' },
    reference: true,
  },
];
