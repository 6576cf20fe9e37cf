import { inchesToMm } from '../../units/length';
import type { Tool } from '../register';

/** Tools of the invented depot: sizes are what such a shop would plausibly hold. */
const turning: readonly Tool[] = [
  tool('knife-r', 'turning', 'Knife tool, right hand, 12', 'drawer 1', 'carbide', {
    noseRadius: 0.4,
    shank: 12,
  }),
  tool('knife-l', 'turning', 'Knife tool, left hand, 12', 'drawer 1', 'carbide', {
    noseRadius: 0.4,
    shank: 12,
    hand: -1,
  }),
  tool('knife-hss', 'turning', 'Knife tool, finishing, 12', 'drawer 1', 'hss', {
    noseRadius: 0.2,
    shank: 12,
  }),
  tool('knife-hss-l', 'turning', 'Knife tool, finishing, left hand, 12', 'drawer 1', 'hss', {
    noseRadius: 0.2,
    shank: 12,
    hand: -1,
  }),
  tool('facing', 'facing', 'Facing tool, 12', 'drawer 1', 'hss', { noseRadius: 0.2, shank: 12 }),
  tool('chamfer-45', 'chamfering', '45° tool', 'drawer 2', 'hss', { angle: 45 }),
  tool('parting-2', 'parting', 'Parting blade 2', 'drawer 1', 'hss', { width: 2, reach: 18 }),
  tool('parting-3', 'parting', 'Parting blade 3', 'drawer 1', 'hss', { width: 3, reach: 32 }),
  tool('parting-4', 'parting', 'Parting blade 4', 'drawer 1', 'carbide', { width: 4, reach: 60 }),
  tool('thread-60', 'threading', 'Threading tool 60°', 'drawer 2', 'hss', { angle: 60 }),
  tool('thread-55', 'threading', 'Threading tool 55°', 'drawer 2', 'hss', { angle: 55 }),
];

const crowns: readonly Tool[] = [6, 8, 10, 12, 15, 16, 20, 25, 30, 40, 50].map((radius) => ({
  ...tool(`form-r${radius}`, 'form', `Form tool, hollow R${radius}`, 'drawer 2', 'hss', {
    radius,
    width: 12,
  }),
  madeHere: true,
  caution: 'Ground here: light cuts at a slow speed, and look at its edge first.',
}));

const DIES: readonly (readonly [string, number, number])[] = [
  ['M5', 5, 0.8],
  ['M6', 6, 1],
  ['M8', 8, 1.25],
  ['M8x1', 8, 1],
  ['M10', 10, 1.5],
  ['M10x1', 10, 1],
  ['M10x1.25', 10, 1.25],
  ['M12', 12, 1.75],
  ['M12x1.25', 12, 1.25],
  ['M12x1.5', 12, 1.5],
  ['M14', 14, 2],
  ['M16', 16, 2],
  ['M16x1.5', 16, 1.5],
  ['1/4-20 UNC', inchesToMm(1 / 4), 25.4 / 20],
  ['5/16-18 UNC', inchesToMm(5 / 16), 25.4 / 18],
  ['3/8-16 UNC', inchesToMm(3 / 8), 25.4 / 16],
  ['1/2-13 UNC', inchesToMm(1 / 2), 25.4 / 13],
  ['5/8-11 UNC', inchesToMm(5 / 8), 25.4 / 11],
  ['3/8-24 UNF', inchesToMm(3 / 8), 25.4 / 24],
  ['1/2-20 UNF', inchesToMm(1 / 2), 25.4 / 20],
];

const dies: readonly Tool[] = DIES.map(([designation, major, pitch]) => ({
  ...tool(`die-${slug(designation)}`, 'die', `Die ${designation}`, 'drawer 6', 'hss', {
    major,
    pitch,
    outside: 38,
  }),
  designation,
}));

const TAPS: readonly (readonly [string, number, number])[] = [
  ['M5', 5, 0.8],
  ['M6', 6, 1],
  ['M8', 8, 1.25],
  ['M10', 10, 1.5],
  ['M12', 12, 1.75],
  ['M16', 16, 2],
  ['3/8-16 UNC', inchesToMm(3 / 8), 25.4 / 16],
  ['1/2-13 UNC', inchesToMm(1 / 2), 25.4 / 13],
];

const taps: readonly Tool[] = TAPS.map(([designation, major, pitch]) => ({
  ...tool(`tap-${slug(designation)}`, 'tap', `Tap ${designation}, second`, 'drawer 7', 'hss', {
    major,
    pitch,
    lead: 4,
  }),
  designation,
}));

const CENTRE_DRILLS: readonly (readonly [string, number, number])[] = [
  ['A0.8', 0.8, 1.7],
  ['A1', 1, 2.12],
  ['A1.6', 1.6, 3.35],
  ['A2', 2, 4.25],
  ['A2.5', 2.5, 5.3],
  ['A3.15', 3.15, 6.7],
  ['A4', 4, 8.5],
];

const centreDrills: readonly Tool[] = CENTRE_DRILLS.map(([designation, pilot, mouth]) => ({
  ...tool(`centre-${slug(designation)}`, 'centre-drill', `Centre drill ${designation}`, 'drawer 5', 'hss', {
    diameter: pilot,
    mouth,
  }),
  designation,
}));

const drills: readonly Tool[] = Array.from({ length: 39 }, (_, k) => 1 + k * 0.5).map((diameter) =>
  tool(`drill-${slug(String(diameter))}`, 'drill', `Drill ${diameter}`, 'drill stand', 'hss', {
    diameter,
    fluteLength: Math.round(20 + 8 * diameter),
  }),
);

const endMills: readonly Tool[] = [6, 8, 10, 12, 16, 20].map((diameter) =>
  tool(`end-mill-${diameter}`, 'end-mill', `End mill ${diameter}`, 'drawer 8', 'hss', {
    diameter,
    fluteLength: Math.round(10 + 1.4 * diameter),
    teeth: 4,
  }),
);

const rest: readonly Tool[] = [
  tool('die-holder-1', 'die-holder', 'Die holder for the tail, 38', 'drawer 6', 'other', {
    outside: 38,
    bore: 26,
    depth: 90,
  }),
  tool('tail-centre-1', 'tail-centre', 'Running centre', 'drawer 5', 'other', {}),
  tool('steady-1', 'steady', 'Fixed steady', 'shelf 1', 'other', { minimum: 8, maximum: 80 }),
  {
    ...tool('knurl-straight', 'knurl', 'Straight wheels', 'drawer 2', 'hss', { pitch: 1, width: 8 }),
    designation: 'straight',
  },
  {
    ...tool('knurl-diamond', 'knurl', 'Diamond wheels, pair', 'drawer 2', 'hss', { pitch: 1, width: 8 }),
    designation: 'diamond',
  },
  tool('file-flat', 'file', 'Flat file, second cut, with handle', 'bench', 'other', { length: 200 }),
  tool('scriber-1', 'scriber', 'Scriber, blue and height gauge', 'bench', 'other', {}),
];

export const TOOLS: readonly Tool[] = [
  ...turning,
  ...crowns,
  ...dies,
  ...taps,
  ...centreDrills,
  ...drills,
  ...endMills,
  ...rest,
];

function tool(
  id: string,
  kind: Tool['kind'],
  name: string,
  place: string,
  material: Tool['material'],
  figures: Readonly<Record<string, number>>,
): Tool {
  return { id, kind, name, place, material, figures };
}

function slug(designation: string): string {
  return designation
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-|-$/g, '');
}
