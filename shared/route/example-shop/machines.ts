import type { ColletBlock, ColletSet, Chuck, DividingHead, Lathe, Mill, Saw } from '../register';

/** Machines of the invented depot of Pellworth Navigation. */
const PITCHES = [0.5, 0.7, 0.75, 0.8, 1, 1.25, 1.5, 1.75, 2, 2.5, 3, 3.5, 4, 4.5, 5, 5.5, 6];
const THREADS_PER_INCH = [
  4, 4.5, 5, 6, 7, 8, 9, 10, 11, 11.5, 12, 13, 14, 16, 18, 19, 20, 22, 24, 26, 28, 32, 36, 40,
];

export const LATHES: readonly Lathe[] = [
  {
    id: 'lathe-1',
    name: 'Centre lathe, long bed',
    place: 'bay 1',
    swing: 360,
    swingOverSlide: 220,
    betweenCentres: 1000,
    spindleBore: 52,
    speeds: [45, 70, 105, 160, 240, 350, 520, 780, 1150, 1700],
    feeds: [0.05, 0.08, 0.1, 0.12, 0.15, 0.2, 0.25, 0.3, 0.4],
    pitches: PITCHES,
    threadsPerInch: THREADS_PER_INCH,
    slideTravel: 90,
    slideGraduation: 0.5,
    tailTravel: 120,
    taperAttachment: false,
    powerKw: 3,
    ratePerHour: 18,
  },
  {
    id: 'lathe-2',
    name: 'Bench lathe',
    place: 'bay 2',
    swing: 250,
    swingOverSlide: 140,
    betweenCentres: 500,
    spindleBore: 26,
    speeds: [60, 95, 150, 235, 370, 580, 920, 1450, 2000],
    feeds: [0.05, 0.08, 0.1, 0.15, 0.2],
    pitches: [0.5, 0.7, 0.75, 0.8, 1, 1.25, 1.5, 1.75, 2, 2.5],
    threadsPerInch: [8, 9, 10, 11, 12, 13, 14, 16, 18, 20, 24, 28, 32, 40],
    slideTravel: 60,
    slideGraduation: 1,
    tailTravel: 70,
    taperAttachment: false,
    powerKw: 0.75,
    ratePerHour: 12,
  },
];

export const MILLS: readonly Mill[] = [
  {
    id: 'mill-1',
    name: 'Turret mill',
    place: 'bay 3',
    speeds: [80, 135, 210, 325, 540, 660, 1115, 1750, 2720],
    feedsPerMin: [20, 30, 45, 60, 90, 120, 180, 250],
    travelX: 700,
    travelY: 300,
    travelZ: 380,
    ratePerHour: 18,
  },
];

export const SAWS: readonly Saw[] = [
  { id: 'saw-1', name: 'Band saw', place: 'by the rack', kerf: 2, maximumDiameter: 150, ratePerHour: 8 },
];

export const CHUCKS: readonly Chuck[] = [
  {
    id: 'chuck-1',
    name: 'Three-jaw 200',
    place: 'lathe 1',
    kind: 'three-jaw',
    minimum: 5,
    maximum: 160,
    jawLength: 38,
    machines: ['lathe-1'],
    maximumSpeed: 2000,
  },
  {
    id: 'chuck-2',
    name: 'Four-jaw 250',
    place: 'shelf 1',
    kind: 'four-jaw',
    minimum: 10,
    maximum: 220,
    jawLength: 45,
    machines: ['lathe-1'],
    maximumSpeed: 1200,
  },
  {
    id: 'chuck-3',
    name: 'Three-jaw 125',
    place: 'lathe 2',
    kind: 'three-jaw',
    minimum: 3,
    maximum: 100,
    jawLength: 28,
    machines: ['lathe-2'],
    maximumSpeed: 2500,
  },
];

const HALF_MILLIMETRES = Array.from({ length: 51 }, (_, k) => 1 + k * 0.5);

export const COLLET_SETS: readonly ColletSet[] = [
  {
    id: 'collets-1',
    name: 'Draw-in collets 1 to 26',
    place: 'drawer 4',
    sizes: HALF_MILLIMETRES,
    range: 0.5,
    gripLength: 30,
    machines: ['lathe-1', 'lathe-2'],
  },
];

export const COLLET_BLOCKS: readonly ColletBlock[] = [
  { id: 'block-4', name: 'Collet block, four-way', place: 'drawer 4', faces: 4, colletSet: 'collets-1' },
  { id: 'block-6', name: 'Collet block, six-way', place: 'drawer 4', faces: 6, colletSet: 'collets-1' },
];

export const DIVIDING_HEADS: readonly DividingHead[] = [
  {
    id: 'head-1',
    name: 'Dividing head 40:1 with 160 chuck',
    place: 'mill 1',
    ratio: 40,
    plates: [
      [15, 16, 17, 18, 19, 20],
      [21, 23, 27, 29, 31, 33],
      [37, 39, 41, 43, 47, 49],
    ],
    minimum: 3,
    maximum: 125,
  },
];
