/** What a shop owns: the register that plans are judged against. Lengths mm, speeds rpm, feeds mm. */
export interface ShopItem {
  id: string;
  name: string;
  /** Drawer, rack or bench where it lives. */
  place: string;
}
export interface Lathe extends ShopItem {
  swing: number;
  swingOverSlide: number;
  betweenCentres: number;
  spindleBore: number;
  speeds: readonly number[];
  feeds: readonly number[];
  /** Metric pitches and, apart, threads per inch that the gearbox cuts. */
  pitches: readonly number[];
  threadsPerInch: readonly number[];
  /** Top slide: travel and degrees per graduation. */
  slideTravel: number;
  slideGraduation: number;
  tailTravel: number;
  taperAttachment: boolean;
  powerKw: number;
  ratePerHour: number;
}
export interface Mill extends ShopItem {
  speeds: readonly number[];
  feedsPerMin: readonly number[];
  travelX: number;
  travelY: number;
  travelZ: number;
  ratePerHour: number;
}
export interface Saw extends ShopItem {
  kerf: number;
  maximumDiameter: number;
  ratePerHour: number;
}
export interface Chuck extends ShopItem {
  kind: 'three-jaw' | 'four-jaw';
  minimum: number;
  maximum: number;
  jawLength: number;
  machines: readonly string[];
  maximumSpeed: number;
}
export interface ColletSet extends ShopItem {
  sizes: readonly number[];
  /** A collet closes this much under its size. */
  range: number;
  gripLength: number;
  machines: readonly string[];
}
export interface ColletBlock extends ShopItem {
  faces: 4 | 6;
  colletSet: string;
}
export interface DividingHead extends ShopItem {
  ratio: number;
  plates: readonly (readonly number[])[];
  minimum: number;
  maximum: number;
}
export interface Tool extends ShopItem {
  kind:
    | 'turning'
    | 'facing'
    | 'chamfering'
    | 'parting'
    | 'form'
    | 'threading'
    | 'boring'
    | 'die'
    | 'die-holder'
    | 'tap'
    | 'drill'
    | 'reamer'
    | 'centre-drill'
    | 'knurl'
    | 'end-mill'
    | 'tail-centre'
    | 'steady'
    | 'threaded-bush'
    | 'file'
    | 'scriber';
  material: 'hss' | 'carbide' | 'other';
  /** Figures by kind: `width`, `reach`, `diameter`, `noseRadius`, `fluteLength`, `teeth`, `radius`, `length`. */
  figures: Readonly<Record<string, number>>;
  /** Thread designation for taps, dies, bushes; pattern for knurls; form for centre drills. */
  designation?: string;
  madeHere?: boolean;
  caution?: string;
}
export interface Instrument extends ShopItem {
  kind:
    | 'rule'
    | 'caliper'
    | 'micrometer'
    | 'depth'
    | 'ring-gauge'
    | 'plug-gauge'
    | 'radius-gauge'
    | 'dial'
    | 'protractor'
    | 'thread-wires';
  minimum: number;
  maximum: number;
  permissibleError: number;
  designation?: string;
}
export interface Bar extends ShopItem {
  material: string;
  certified: boolean;
  certificate?: string;
  shape: 'round' | 'hex' | 'square';
  size: number;
  length: number;
  quantity: number;
  costPerMetre: number;
}
export interface ShopSettings {
  currency: string;
  labourPerHour: number;
  /** A quarter or a tenth of the tolerance, for instruments. */
  instrumentRatio: number;
  /** Largest thread major the shop cuts by die (mm). */
  dieLimit: number;
  surfaceTexture: string;
}
export interface Register {
  schemaVersion: 1;
  lathes: readonly Lathe[];
  mills: readonly Mill[];
  saws: readonly Saw[];
  chucks: readonly Chuck[];
  colletSets: readonly ColletSet[];
  colletBlocks: readonly ColletBlock[];
  dividingHeads: readonly DividingHead[];
  tools: readonly Tool[];
  instruments: readonly Instrument[];
  bars: readonly Bar[];
  settings: ShopSettings;
}
