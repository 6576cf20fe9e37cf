/**
 * The finished sheet as a display list: plain data, absolute millimetres of paper, y down.
 * Text boxes, symbols and strokes are complete here; a renderer only walks.
 */
export type DraftingStyle = 'iso' | 'asme';
export type SheetSize = 'A4' | 'A3' | 'A2' | 'A1' | 'A' | 'B' | 'C' | 'D';

export type LineType =
  | 'visible'
  | 'hidden'
  | 'centre'
  | 'thin'
  | 'hatch'
  | 'break'
  | 'cutting'
  | 'dimension'
  | 'extension'
  | 'leader'
  | 'arrow'
  | 'frame'
  | 'table'
  | 'symbol';

export interface Point {
  x: number;
  y: number;
}

export type PathCommand =
  | { op: 'M' | 'L'; x: number; y: number }
  | { op: 'A'; r: number; large: 0 | 1; sweep: 0 | 1; x: number; y: number }
  | { op: 'C'; x1: number; y1: number; x2: number; y2: number; x: number; y: number }
  | { op: 'Z' };

export interface LineMark {
  type: 'line';
  line: LineType;
  x1: number;
  y1: number;
  x2: number;
  y2: number;
}
export interface PolylineMark {
  type: 'polyline';
  line: LineType;
  points: readonly Point[];
  closed?: boolean;
  filled?: boolean;
}
export interface PathMark {
  type: 'path';
  line: LineType;
  commands: readonly PathCommand[];
  filled?: boolean;
}
export interface CircleMark {
  type: 'circle';
  line: LineType;
  cx: number;
  cy: number;
  r: number;
  filled?: boolean;
}
/** One run; baseline at y; `rotate` is −90 or absent. Size is the font size in mm. */
export interface TextMark {
  type: 'text';
  x: number;
  y: number;
  size: number;
  anchor: 'start' | 'middle' | 'end';
  rotate?: -90;
  weight?: 400 | 500 | 700 | 800;
  text: string;
  /** Grey word across an unreleased sheet: drawn under everything, exempt from collision rules. */
  faint?: boolean;
}
/** A drawn symbol (diameter, projection, texture): paths inside one box, nothing else may overlap it. */
export interface SymbolMark {
  type: 'symbol';
  name: string;
  box: readonly [number, number, number, number];
  marks: readonly (LineMark | PolylineMark | PathMark | CircleMark)[];
}
export type Mark = LineMark | PolylineMark | PathMark | CircleMark | TextMark | SymbolMark;

export type GroupRole =
  | 'frame'
  | 'title-block'
  | 'revision-table'
  | 'size-table'
  | 'notes'
  | 'view'
  | 'dimension'
  | 'balloon'
  | 'stamp';

export interface Group {
  role: GroupRole;
  marks: readonly Mark[];
  /** Views: `axis`, `end-left`, `end-right`. */
  view?: string;
  scale?: number;
  broken?: boolean;
  /** Dimensions and balloons: the size's id, kind, value, reference, the view it is read in. */
  sizeId?: string;
  sizeKind?: string;
  forView?: string;
  value?: number;
  reference?: boolean;
  /** Dimensions: points on paper that the value is measured between, already chosen (the check measures them again). */
  text?: string;
}

/** How the part's x and r came to paper, per view: piecewise linear where the view is interrupted. */
export interface ViewMap {
  view: string;
  scale: number;
  /** Paper y of the axis (axis view) or centre of the end view. */
  axisY: number;
  centreX?: number;
  /** Axis view: [part x, paper x] knots in order. */
  knots: readonly (readonly [number, number])[];
}

export interface Sheet {
  schemaVersion: 1;
  size: SheetSize;
  width: number;
  height: number;
  /** Drawing space inside the frame: x0, y0, x1, y1. */
  frame: readonly [number, number, number, number];
  style: DraftingStyle;
  unit: 'mm' | 'in';
  decimalSign: '.' | ',';
  scale: number;
  scaleText: string;
  groups: readonly Group[];
  maps: readonly ViewMap[];
  /** In words: why this sheet, scale and arrangement. */
  choice: string;
}

export interface CheckFinding {
  rule: string;
  message: string;
  /** Size ids, view names or group roles at fault. */
  entities: readonly string[];
}

/** What a draughtsman would do better, though no checker refuses it. */
export type AdviceFinding = CheckFinding;

/** What the title block says that no geometry knows. Absent strings print as a dash. */
export interface TitleBlock {
  title: string;
  number: string;
  revision: string;
  sheetOf: string;
  materialText: string;
  stockText: string;
  mass: string;
  generalTolerance: string;
  texture: string;
  finish: string;
  quantity: string;
  drawn: { by: string; date: string } | null;
  checked: { by: string; date: string } | 'NO SECOND CHECK' | null;
  /** `RELEASED` or, with its date, `RELEASED 2026-03-09`: the stamp's words. */
  state: string;
  /** Date of the state where `state` has none; absent: that of the signature which made it. */
  stateDate?: string;
  owner: string;
  revisions: readonly { letter: string; change: string; by: string; date: string }[];
}

export interface DrawingOptions {
  style: DraftingStyle;
  unit: 'mm' | 'in';
  sheet: 'auto' | SheetSize;
  scale: 'auto' | number;
  decimalSign?: '.' | ',';
  balloons: boolean;
  hiddenEdges?: boolean;
  titleBlock: TitleBlock;
  /** `DRAFT: not for manufacture`, `TRIAL PIECE ONLY` or nothing. */
  stamp?: string;
}
