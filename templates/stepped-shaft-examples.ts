import type { WorkedExample } from '../shared/template/template';

/** Parts of the Pellworth Navigation depot; every size is invented. */
export const STEPPED_SHAFT_EXAMPLES: readonly [WorkedExample, ...WorkedExample[]] = [
  {
    id: 'paddle-gear-shaft',
    name: 'Paddle-gear shaft',
    entryUnit: 'mm',
    values: {
      title: 'Paddle-gear shaft, lock 7',
      quantity: '2',
      material: 'steel-free-cutting',
      steps: [
        { key: 'r1', length: '22', thread: 'M16' },
        { key: 'r2', diameter: '20', length: '35', fit: 'h7' },
        { key: 'r3', diameter: '28', length: '60' },
        { key: 'r4', diameter: '25', length: '40', fit: 'g6' },
        { key: 'r5', diameter: '18', length: '18 ±0.1' },
      ],
      leftChamfer: '',
      rightChamfer: '1',
    },
  },
  {
    id: 'pawl-pin',
    name: 'Pawl pin',
    entryUnit: 'mm',
    values: {
      title: 'Pawl pin, paddle gear',
      quantity: '6',
      steps: [
        { key: 'r1', diameter: '24', length: '6' },
        { key: 'r2', diameter: '16 f7', length: '42 +0.2/0' },
        { key: 'r3', length: '16', thread: 'M12-6g' },
      ],
      leftChamfer: '0.5',
      rightChamfer: '',
    },
  },
  {
    id: 'sluice-roller-spindle',
    name: 'Sluice roller spindle',
    entryUnit: 'in',
    values: {
      title: 'Sluice roller spindle',
      quantity: '4',
      steps: [
        { key: 'r1', diameter: '1', length: '1/2' },
        { key: 'r2', diameter: '3/4 +0/-.002', length: '2-1/4' },
        { key: 'r3', length: '.875', thread: '1/2-13 UNC-2A' },
      ],
      leftChamfer: '1/32',
      rightChamfer: '',
    },
  },
];
