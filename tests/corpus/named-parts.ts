import type { TypedValues } from '../../shared/template/template';
import { STEPPED_SHAFT_EXAMPLES } from '../../templates/stepped-shaft-examples';
import { TAPERED_HANDLE_EXAMPLES } from '../../templates/tapered-handle-examples';
import type { Asked } from './sheet-of';

/** A part with a name: a unit case, a golden sheet and a picture in the gallery at once. */
export interface NamedPart extends Asked {
  name: string;
  template: string;
  typed: TypedValues;
}

const handle = (id: string): TypedValues => TAPERED_HANDLE_EXAMPLES.find((e) => e.id === id)?.values ?? {};
const shaft = (id: string): TypedValues => STEPPED_SHAFT_EXAMPLES.find((e) => e.id === id)?.values ?? {};

const mm = { style: 'iso', unit: 'mm' } as const;
const inch = { style: 'asme', unit: 'in' } as const;

const rows = (...steps: [diameter: string, length: string][]): TypedValues => ({
  title: 'Named shaft',
  quantity: '1',
  leftChamfer: '0',
  rightChamfer: '0',
  steps: steps.map(([diameter, length], i) => ({ key: `r${i + 1}`, diameter, length, fit: '', thread: '' })),
});

export const namedParts: readonly NamedPart[] = [
  { name: 'windlass-handle', template: 'tapered-handle', typed: handle('windlass-handle'), ...mm },
  { name: 'windlass-handle-inch', template: 'tapered-handle', typed: handle('windlass-handle'), ...inch },
  { name: 'sluice-valve-handle', template: 'tapered-handle', typed: handle('sluice-valve-handle'), ...mm },
  {
    name: 'paddle-rack-handle',
    template: 'tapered-handle',
    typed: handle('paddle-rack-handle'),
    entryUnit: 'in',
    ...inch,
  },
  { name: 'paddle-gear-shaft', template: 'stepped-shaft', typed: shaft('paddle-gear-shaft'), ...mm },
  {
    name: 'paddle-gear-shaft-third-angle',
    template: 'stepped-shaft',
    typed: shaft('paddle-gear-shaft'),
    style: 'asme',
    unit: 'mm',
  },
  { name: 'pawl-pin', template: 'stepped-shaft', typed: shaft('pawl-pin'), ...mm },
  {
    name: 'sluice-roller-spindle',
    template: 'stepped-shaft',
    typed: shaft('sluice-roller-spindle'),
    entryUnit: 'in',
    ...inch,
  },
  {
    name: 'narrow-collars',
    template: 'stepped-shaft',
    typed: rows(['20', '40'], ['30', '1.5'], ['20', '1.5'], ['30', '1.5'], ['18', '40']),
    ...mm,
  },
  {
    name: 'long-slender-rod',
    template: 'stepped-shaft',
    typed: rows(['16', '30'], ['20', '900'], ['16', '30']),
    ...mm,
  },
  { name: 'thin-disc', template: 'stepped-shaft', typed: rows(['200', '9']), ...mm },
];
