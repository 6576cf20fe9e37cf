// Materials of a small shop. Densities: handbook or page values where one was seen, else from memory. Cutting speeds: shop charts and
// training manuals agree only within a third of one another, so they are common practice: a safe start, not a limit.
// kc is the cutting force per area of chip at about 0.2 mm thickness, from memory of published tables.
import type { Source } from './certainty';

export type MachinabilityGroup =
  | 'free-cutting-steel'
  | 'steel'
  | 'alloy-steel'
  | 'tool-steel'
  | 'stainless'
  | 'cast-iron'
  | 'brass'
  | 'bronze'
  | 'copper'
  | 'aluminium'
  | 'titanium'
  | 'plastic';

export type CuttingToolMaterial = 'hss' | 'carbide';

/** The operations a speed is tabled for; all others are factors of these (`speeds.ts`). m/min. */
export interface BaseSpeeds {
  turning: number;
  finishing: number;
  drilling: number;
  milling: number;
}

export interface Material {
  /** Stable id that drawings keep. */
  id: string;
  /** What the title block prints. */
  name: string;
  /** Other designations of the same or a near material, for search. */
  alsoKnownAs: readonly string[];
  /** kg/m³. */
  density: number;
  group: MachinabilityGroup;
  /** Usual tensile strength in words; never a promise: a certificate decides. */
  strengthNote: string;
  cuttingSpeeds: Readonly<Record<CuttingToolMaterial, BaseSpeeds>>;
  /** Specific cutting force, N/mm². */
  kc: number;
  basis: { density: Source; speeds: Source; kc: Source };
}

/** Speeds by group, m/min, in the order turning, finishing, drilling, milling. */
const SPEEDS: Readonly<
  Record<MachinabilityGroup, Readonly<Record<CuttingToolMaterial, readonly [number, number, number, number]>>>
> = {
  'free-cutting-steel': { hss: [35, 42, 30, 30], carbide: [130, 160, 80, 120] },
  steel: { hss: [28, 34, 25, 25], carbide: [110, 140, 70, 100] },
  'alloy-steel': { hss: [18, 22, 16, 16], carbide: [80, 105, 50, 75] },
  'tool-steel': { hss: [15, 19, 13, 13], carbide: [70, 90, 45, 60] },
  stainless: { hss: [20, 25, 12, 15], carbide: [80, 110, 45, 70] },
  'cast-iron': { hss: [25, 30, 25, 22], carbide: [90, 120, 70, 80] },
  brass: { hss: [75, 100, 60, 60], carbide: [180, 200, 120, 150] },
  bronze: { hss: [30, 40, 30, 30], carbide: [120, 150, 80, 100] },
  copper: { hss: [40, 55, 35, 35], carbide: [150, 200, 90, 120] },
  aluminium: { hss: [90, 130, 65, 80], carbide: [250, 350, 130, 220] },
  titanium: { hss: [12, 15, 8, 10], carbide: [45, 60, 25, 40] },
  plastic: { hss: [100, 150, 50, 90], carbide: [200, 300, 80, 150] },
};

const SPEED_BASIS: Source = {
  source: 'workshop speed charts and training manuals',
  certainty: 'common practice',
};
const KC_BASIS: Source = {
  source: 'published specific cutting forces at 0.2 mm chip',
  certainty: 'from memory',
};
const SEEN: Source = { source: 'published density tables', certainty: 'handbook' };
const REMEMBERED: Source = { source: 'usual data-sheet value', certainty: 'from memory' };

function baseSpeeds([turning, finishing, drilling, milling]: readonly [
  number,
  number,
  number,
  number,
]): BaseSpeeds {
  return { turning, finishing, drilling, milling };
}

function material(
  id: string,
  name: string,
  alsoKnownAs: readonly string[],
  density: number,
  group: MachinabilityGroup,
  strengthNote: string,
  kc: number,
  densityBasis: Source,
): Material {
  const speeds = SPEEDS[group];
  return {
    id,
    name,
    alsoKnownAs,
    density,
    group,
    strengthNote,
    cuttingSpeeds: { hss: baseSpeeds(speeds.hss), carbide: baseSpeeds(speeds.carbide) },
    kc,
    basis: { density: densityBasis, speeds: SPEED_BASIS, kc: KC_BASIS },
  };
}

export const DEFAULT_MATERIAL_ID = 'steel-free-cutting';

export const MATERIALS: readonly Material[] = [
  material(
    DEFAULT_MATERIAL_ID,
    'Free-cutting low-carbon steel 230M07',
    ['EN1A', '11SMn30', '1.0715', '1215'],
    7850,
    'free-cutting-steel',
    'About 370 to 460 N/mm² drawn',
    1700,
    SEEN,
  ),
  material(
    'steel-free-cutting-leaded',
    'Leaded free-cutting steel 230M07 Pb',
    ['EN1A Pb', '11SMnPb30', '12L14'],
    7850,
    'free-cutting-steel',
    'About 370 to 460 N/mm² drawn',
    1600,
    SEEN,
  ),
  material(
    'steel-low-carbon',
    'Low-carbon steel 070M20',
    ['EN3B', 'C20', '1018', '1020'],
    7860,
    'steel',
    'About 430 to 560 N/mm² drawn',
    1900,
    SEEN,
  ),
  material(
    'steel-case-hardening',
    'Case-hardening steel 080M15',
    ['EN32', 'C15', '1015'],
    7860,
    'steel',
    'About 430 N/mm² in the core',
    1900,
    REMEMBERED,
  ),
  material(
    'steel-medium-carbon',
    'Medium-carbon steel 080M40',
    ['EN8', 'C40', '1040', '1045'],
    7850,
    'steel',
    'About 550 to 700 N/mm²',
    2100,
    SEEN,
  ),
  material(
    'steel-chromium-molybdenum',
    'Chromium-molybdenum steel 709M40',
    ['EN19', '42CrMo4', '4140'],
    7850,
    'alloy-steel',
    'About 850 to 1000 N/mm² in condition T',
    2300,
    REMEMBERED,
  ),
  material(
    'steel-nickel-chromium',
    'Nickel-chromium-molybdenum steel 817M40',
    ['EN24', '34CrNiMo6', '4340'],
    7850,
    'alloy-steel',
    'About 850 to 1000 N/mm² in condition T',
    2400,
    REMEMBERED,
  ),
  material(
    'silver-steel',
    'Silver steel',
    ['115CrV3', '1.2210'],
    7850,
    'tool-steel',
    'About 750 N/mm² as supplied, before hardening',
    2300,
    REMEMBERED,
  ),
  material(
    'stainless-303',
    'Free-cutting stainless steel 303',
    ['303S31', '1.4305'],
    7930,
    'stainless',
    'About 500 to 750 N/mm²',
    2100,
    REMEMBERED,
  ),
  material(
    'stainless-304',
    'Stainless steel 304',
    ['304S15', '1.4301'],
    7930,
    'stainless',
    'About 500 to 700 N/mm²',
    2400,
    REMEMBERED,
  ),
  material(
    'stainless-316',
    'Stainless steel 316',
    ['316S31', '1.4401'],
    7980,
    'stainless',
    'About 500 to 700 N/mm²',
    2400,
    REMEMBERED,
  ),
  material(
    'stainless-416',
    'Free-cutting stainless steel 416',
    ['416S21', '1.4005'],
    7750,
    'stainless',
    'About 550 to 700 N/mm²',
    2000,
    REMEMBERED,
  ),
  material(
    'cast-iron-grey',
    'Grey cast iron grade 250',
    ['EN-GJL-250', 'GG25'],
    7200,
    'cast-iron',
    'About 250 N/mm²',
    1150,
    SEEN,
  ),
  material(
    'brass-free-cutting',
    'Free-cutting brass CZ121',
    ['CW614N', 'CuZn39Pb3', 'C38500'],
    8470,
    'brass',
    'About 380 to 500 N/mm²',
    700,
    REMEMBERED,
  ),
  material(
    'bronze-phosphor',
    'Phosphor bronze PB2',
    ['CW459K', 'CuSn8', 'PB102'],
    8800,
    'bronze',
    'About 350 to 500 N/mm²',
    900,
    SEEN,
  ),
  material(
    'bronze-gunmetal',
    'Leaded gunmetal LG2',
    ['CC491K', 'C83600'],
    8800,
    'bronze',
    'About 200 to 270 N/mm²',
    750,
    REMEMBERED,
  ),
  material(
    'bronze-leaded',
    'Leaded tin bronze',
    ['SAE 660', 'C93200', 'CC493K'],
    8930,
    'bronze',
    'About 220 to 270 N/mm²',
    750,
    REMEMBERED,
  ),
  material(
    'copper',
    'Copper C101',
    ['CW004A', 'Cu-ETP'],
    8930,
    'copper',
    'About 220 to 300 N/mm²',
    1100,
    SEEN,
  ),
  material(
    'aluminium-6082',
    'Aluminium alloy 6082-T6',
    ['HE30', 'AlSi1MgMn'],
    2700,
    'aluminium',
    'About 290 to 310 N/mm²',
    700,
    REMEMBERED,
  ),
  material(
    'aluminium-2011',
    'Free-cutting aluminium alloy 2011-T3',
    ['FC1', 'AlCu6BiPb'],
    2830,
    'aluminium',
    'About 300 to 370 N/mm²',
    650,
    REMEMBERED,
  ),
  material(
    'titanium-6al-4v',
    'Titanium alloy Ti-6Al-4V',
    ['grade 5', '3.7165'],
    4430,
    'titanium',
    'About 900 N/mm²',
    1600,
    REMEMBERED,
  ),
  material(
    'acetal',
    'Acetal',
    ['POM', 'polyoxymethylene'],
    1410,
    'plastic',
    'About 65 N/mm²',
    200,
    REMEMBERED,
  ),
  material(
    'nylon-6',
    'Nylon 6',
    ['PA6', 'polyamide'],
    1140,
    'plastic',
    'About 75 N/mm² dry',
    200,
    REMEMBERED,
  ),
  material('ptfe', 'PTFE', ['polytetrafluoroethylene'], 2180, 'plastic', 'About 25 N/mm²', 150, REMEMBERED),
];

/** The material of this id, or null when there is none. */
export function materialById(id: string): Material | null {
  return MATERIALS.find((each) => each.id === id) ?? null;
}

/** The material a part is made of when nothing else is said: a free-cutting low-carbon steel. */
export function defaultMaterial(): Material {
  const found = materialById(DEFAULT_MATERIAL_ID);
  if (!found) throw new Error(`The materials table has no ${DEFAULT_MATERIAL_ID}.`);
  return found;
}
