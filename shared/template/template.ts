import type { Advice, Problem } from '../problem';
import type { LengthUnit } from '../units/length';
import type { Part } from '../part/part';
import type { SizeKind } from '../scheme/scheme';

/** mathjs source over parameters, derived values and the short list of functions; compiled once. */
export type Expression = string;

export type ParameterKind =
  | 'length'
  | 'diameter'
  | 'angle'
  | 'count'
  | 'ratio'
  | 'choice'
  | 'thread'
  | 'fit'
  | 'yes-no'
  | 'text'
  | 'material'
  | 'table';

export interface ParameterBase {
  id: string;
  label: string;
  kind: ParameterKind;
  /** As typed; a bare number is millimetres (the default is written in mm). */
  default?: string;
  /** Absent (empty, `none`, 0) is allowed. */
  optional?: boolean;
  /** Bounds in mm, radians or plain figures; expressions may use other parameters. */
  minimum?: Expression;
  maximum?: Expression;
  choices?: readonly { id: string; label: string }[];
  /** Shown only where this holds. */
  when?: Expression;
  /** Not built yet: any non-empty value is refused at its field with this sentence. */
  notYet?: string;
  /** A short line under the field. */
  hint?: string;
}

export interface TableParameter extends ParameterBase {
  kind: 'table';
  minimumRows: number;
  maximumRows: number;
  columns: readonly ParameterBase[];
}

export type Parameter = ParameterBase | TableParameter;

export interface Derived {
  id: string;
  value: Expression;
}

export interface Constraint {
  /** Must be true; evaluated when all its parameters are good. */
  holds: Expression;
  /** Where the sentence appears. */
  parameter: string;
  /** `{name}` is replaced by the value formatted in the entry unit; `{=expression}` by its length in the entry unit. */
  message: string;
  when?: Expression;
}

/** One feature, its figures as expressions; `each` repeats it over a table's rows (bound as `row`, `index`). */
export interface FeatureTemplate {
  kind: string;
  id: string;
  each?: string;
  when?: Expression;
  figures: Readonly<Record<string, Expression>>;
}

export interface SizeTemplate {
  id: string;
  kind: SizeKind;
  /** Parameter whose typed value it is (column name when `each`). */
  parameter?: string;
  /** Parameter that holds its fit. */
  fit?: string;
  each?: string;
  when?: Expression;
  features: readonly string[];
  /** Figures by name: from, to, at, diameter, nominal … as expressions; see scheme/build. */
  figures: Readonly<Record<string, Expression>>;
  reference?: boolean;
}

export interface Template {
  id: string;
  name: string;
  summary: string;
  parameters: readonly Parameter[];
  derived: readonly Derived[];
  constraints: readonly Constraint[];
  features: readonly FeatureTemplate[];
  sizes: readonly SizeTemplate[];
  datum: Expression;
  example: TypedValues;
}

/** What a person typed, as the form and the headless command hold it. Row keys are hidden and stable. */
export interface TypedRow {
  key: string;
  [column: string]: string;
}
export interface TypedValues {
  [parameter: string]: string | TypedRow[];
}

/** One value as it is kept: what was typed, the unit it was read in, and what it came to (mm, radians, count, text). */
export interface EvaluatedValue {
  text: string;
  unit?: LengthUnit | 'deg' | 'none';
  value: number | string | boolean | null;
}
export interface EvaluatedRow {
  key: string;
  values: Readonly<Record<string, EvaluatedValue>>;
}
export interface EvaluatedParameters {
  values: Readonly<Record<string, EvaluatedValue>>;
  tables: Readonly<Record<string, readonly EvaluatedRow[]>>;
}

export interface EvaluationOptions {
  entryUnit: LengthUnit;
}

/** Values to Part. On problems `part` is absent, so the caller keeps its last good one. */
export interface Evaluation {
  template: string;
  templateHash: string;
  entryUnit: LengthUnit;
  parameters: EvaluatedParameters;
  problems: readonly Problem[];
  advice: readonly Advice[];
  part?: Part;
}
