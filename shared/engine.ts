import type { Problem, Advice } from './problem';
import type { LengthUnit } from './units/length';
import type { TypedValues, Evaluation } from './template/template';
import type { Part } from './part/part';
import type { Scheme } from './scheme/scheme';
import type { CheckFinding, DraftingStyle, Sheet, SheetSize, TitleBlock } from './drawing/sheet';
import type { Capacity, Fault, Route } from './route/route';
import type { Register } from './route/register';

/** Version of the engine that a stored revision names. */
export const ENGINE_VERSION = '0.1.0';

/** Everything the engine may know: the same request gives the same bytes in browser, server and tests. */
export interface EngineRequest {
  template: string;
  typed: TypedValues;
  entryUnit: LengthUnit;
  unit: LengthUnit;
  style: DraftingStyle;
  sheet: 'auto' | SheetSize;
  scale: 'auto' | number;
  balloons: boolean;
  register: Register;
  /** Station id that lengths are dimensioned from; absent: as the designer gave them. */
  datum?: string;
  titleBlock: EngineTitleBlock;
  stamp?: string;
  /** Balloons frozen by an earlier release, by size id. */
  frozenBalloons?: Readonly<Record<string, number>>;
}

/** Title-block fields that the records know; the engine fills in the rest. */
export type EngineTitleBlock = Pick<
  TitleBlock,
  'number' | 'revision' | 'drawn' | 'checked' | 'state' | 'stateDate' | 'owner' | 'revisions'
>;

export interface EngineGood {
  part: Part;
  scheme: Scheme;
  sheet: Sheet;
  findings: readonly CheckFinding[];
  svg: string;
  route: Route | null;
  capacity: Capacity;
  faults: readonly Fault[];
}

export interface EngineResult {
  evaluation: Evaluation;
  problems: readonly Problem[];
  advice: readonly Advice[];
  /** Absent while a value is wrong: the caller keeps its last good one. */
  good?: EngineGood;
}
