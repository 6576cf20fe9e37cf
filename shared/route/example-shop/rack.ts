import { inchesToMm } from '../../units/length';
import type { Bar } from '../register';

/** The stock rack of the invented depot. Materials are ids of the materials table. */
const FREE_CUTTING = 'steel-free-cutting';
const MEDIUM_CARBON = 'steel-medium-carbon';
const STAINLESS = 'stainless-303';
const BRASS = 'brass-free-cutting';
const BRONZE = 'bronze-phosphor';
const ALUMINIUM = 'aluminium-6082';

interface Row {
  material: string;
  shape: Bar['shape'];
  /** mm for metric sizes; sixteenths of an inch for inch sizes. */
  metric: readonly number[];
  sixteenths: readonly number[];
  /** Currency a kilogram, and kilograms a cubic decimetre, to price a metre. */
  perKg: number;
  density: number;
  length: number;
  quantity: number;
  place: string;
  certificate?: string;
}

const ROWS: readonly Row[] = [
  {
    material: FREE_CUTTING,
    shape: 'round',
    metric: [
      6, 8, 10, 12, 14, 16, 18, 20, 22, 25, 28, 30, 32, 35, 40, 45, 50, 55, 60, 65, 70, 80, 90, 100, 110, 120,
    ],
    sixteenths: [4, 5, 6, 7, 8, 9, 10, 12, 14, 16, 18, 20, 22, 24, 28, 32, 40, 48],
    perKg: 2.4,
    density: 7.85,
    length: 3000,
    quantity: 4,
    place: 'rack 3',
  },
  {
    material: FREE_CUTTING,
    shape: 'hex',
    metric: [8, 10, 13, 17, 19, 22, 24, 27, 30, 32, 36],
    sixteenths: [6, 8, 10, 12, 14, 16, 20],
    perKg: 2.8,
    density: 7.85,
    length: 3000,
    quantity: 1,
    place: 'rack 4',
  },
  {
    material: MEDIUM_CARBON,
    shape: 'round',
    metric: [10, 12, 16, 20, 25, 30, 35, 40, 50, 60, 80],
    sixteenths: [8, 12, 16, 20, 24, 32],
    perKg: 2.9,
    density: 7.85,
    length: 3000,
    quantity: 1,
    place: 'rack 5',
    certificate: 'PN-C 2291',
  },
  {
    material: STAINLESS,
    shape: 'round',
    metric: [6, 8, 10, 12, 16, 20, 25, 30, 40, 50],
    sixteenths: [4, 6, 8, 10, 12, 16],
    perKg: 8.5,
    density: 7.9,
    length: 2000,
    quantity: 1,
    place: 'rack 6',
    certificate: 'PN-C 2304',
  },
  {
    material: BRASS,
    shape: 'round',
    metric: [6, 8, 10, 12, 16, 20, 25, 30, 40, 50],
    sixteenths: [4, 6, 8, 12, 16],
    perKg: 9.2,
    density: 8.5,
    length: 2000,
    quantity: 1,
    place: 'rack 7',
  },
  {
    material: BRASS,
    shape: 'hex',
    metric: [10, 13, 17, 19, 22],
    sixteenths: [8, 12],
    perKg: 9.6,
    density: 8.5,
    length: 2000,
    quantity: 1,
    place: 'rack 7',
  },
  {
    material: BRONZE,
    shape: 'round',
    metric: [20, 30, 40, 50, 60],
    sixteenths: [16, 24],
    perKg: 14,
    density: 8.8,
    length: 1000,
    quantity: 1,
    place: 'rack 8',
  },
  {
    material: ALUMINIUM,
    shape: 'round',
    metric: [10, 16, 20, 25, 30, 40, 50, 60, 80],
    sixteenths: [8, 12, 16, 24],
    perKg: 6.5,
    density: 2.71,
    length: 2500,
    quantity: 1,
    place: 'rack 9',
  },
];

export const BARS: readonly Bar[] = ROWS.flatMap((row) => [
  ...row.metric.map((size) => bar(row, size, `${size}`)),
  ...row.sixteenths.map((n) => bar(row, inchesToMm(n / 16), `${inchText(n)} in`)),
]);

function bar(row: Row, size: number, label: string): Bar {
  const areaFactor = row.shape === 'round' ? Math.PI / 4 : row.shape === 'hex' ? Math.sqrt(3) / 2 : 1;
  const kgPerMetre = (areaFactor * size * size * row.density) / 1000;
  return {
    id: `bar-${row.material}-${row.shape}-${label.replace(/[^0-9a-z]+/gi, '-')}`,
    name: `${label} ${row.shape === 'hex' ? 'hexagon' : row.shape}`,
    place: row.place,
    material: row.material,
    certified: row.certificate !== undefined,
    ...(row.certificate ? { certificate: row.certificate } : {}),
    shape: row.shape,
    size,
    length: row.length,
    quantity: row.quantity,
    costPerMetre: Math.round(kgPerMetre * row.perKg * 100) / 100,
  };
}

/** Sixteenths as a person says them: 6 -> 3/8, 20 -> 1-1/4. */
function inchText(sixteenths: number): string {
  const whole = Math.floor(sixteenths / 16);
  let top = sixteenths % 16;
  if (top === 0) return String(whole);
  let bottom = 16;
  while (top % 2 === 0) {
    top /= 2;
    bottom /= 2;
  }
  return whole > 0 ? `${whole}-${top}/${bottom}` : `${top}/${bottom}`;
}
