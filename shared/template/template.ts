import type { Advice, Problem } from '../problem';
import type { LengthUnit } from '../units/length';
import type { Tolerance } from '../units/tolerance';
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
  /** `notYet` on one choice refuses that choice alone. */
  choices?: readonly { id: string; label: string; notYet?: string }[];
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
  /** Rows of a drawing that says nothing of the table; bare numbers in mm. */
  defaultRows?: readonly TypedRow[];
}

export type Parameter = ParameterBase | TableParameter;

export interface Derived {
  id: string;
  value: Expression;
  /** Once for every row of this table: read as `row.id`. */
  each?: string;
}

export interface Constraint {
  /** Must be true; evaluated when all its parameters are good. */
  holds: Expression;
  /** Where the sentence appears; a column's name when `each`. */
  parameter: string;
  /**
   * `{name}` is replaced by the value formatted in the entry unit, `{=expression}` by its length in the entry unit,
   * `{>=expression}` and `{<=expression}` by a bound that may itself be typed (rounded to the safe side),
   * `{range:low|high}` by `8 to 500 mm`, `{#expression}` by a plain figure or text.
   */
  message: string;
  when?: Expression;
  /** Judged for every row of this table, bound as `row` and `index`. */
  each?: string;
}

/** Said of good values without refusing them. */
export interface Remark {
  code: string;
  parameter: string;
  when: Expression;
  /** As `Constraint.message`. */
  message: string;
}

export type FeatureTemplateKind =
  'cylinder' | 'cone' | 'chamfer' | 'crown' | 'thread' | 'flats' | 'centre-hole';

/**
 * One feature, its figures as expressions; `each` repeats it over a table's rows (bound as `row`, `index`),
 * and `{key}` in its id stands for the row's own key. Lengths are laid end to end in the order written.
 */
export interface FeatureTemplate {
  kind: FeatureTemplateKind;
  id: string;
  /** Where a remark about this feature appears: a parameter, or a column when `each`. */
  parameter?: string;
  each?: string;
  when?: Expression;
  figures: Readonly<Record<string, Expression>>;
}

/**
 * One shown size. `{key}` in `id` and `features` stands for the row's key when `each`.
 * Figures, as expressions: `nominal` (mm; degrees for an angle) always;
 * length: `from`, `to`; diameter and thread: `from`, `to`, `diameter`, and `at` where it can be read at one station only.
 * Chamfers, crowns and flats are read from the part's own features. `lastRow` (an index) says that
 * a length spans the rows up to it, so that all their typed texts are shown.
 */
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
  remarks?: readonly Remark[];
  features: readonly FeatureTemplate[];
  sizes: readonly SizeTemplate[];
  /** x of the datum face. */
  datum: Expression;
  example: TypedValues;
  /** Further worked examples; the first is the same as `example`. */
  examples?: readonly WorkedExample[];
}

export interface WorkedExample {
  id: string;
  name: string;
  /** What bare numbers in it mean. */
  entryUnit: LengthUnit;
  values: TypedValues;
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
  /** A tolerance typed with the size (`14 h9`), or the value of a `fit` parameter. */
  tolerance?: Tolerance;
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
