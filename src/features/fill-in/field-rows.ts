import type { ParameterBase, TableParameter, Template, TypedValues } from '../../../shared/template/template';
import { isTable } from '../../revision/labels';
import { rowsOf, textAt } from '../../revision/draft';

export interface OneRow {
  kind: 'one';
  path: string;
  parameter: ParameterBase;
}
export interface TableRows {
  kind: 'table';
  parameter: TableParameter;
  rows: readonly { key: string; index: number; cells: readonly OneRow[]; notYet: readonly OneRow[] }[];
}
export type FormRow = OneRow | TableRows;

export interface FormRows {
  /** What gives the part its shape, in the family's order. */
  shape: readonly FormRow[];
  /** Title, material, quantity: what the sheet says beside the shape. */
  sheet: readonly OneRow[];
  /** Parameters that cannot be used yet; shown apart, each with its sentence. */
  notYet: readonly OneRow[];
  /** Choices that cannot be used yet, of fields that have others; shown apart too. */
  notYetChoices: readonly { label: string; sentence: string }[];
}

/** What may be chosen now, and what is chosen though it may not be, so that it can be left. */
export function offeredChoices({ choices = [] }: ParameterBase, typed: string) {
  return choices.filter(({ id, notYet }) => notYet === undefined || id === typed);
}

function choicesNotYet({ label, choices = [] }: ParameterBase): { label: string; sentence: string }[] {
  const bySentence = new Map<string, string[]>();
  for (const { label: choice, notYet } of choices)
    if (notYet !== undefined)
      bySentence.set(notYet, [...(bySentence.get(notYet) ?? []), choice.toLowerCase()]);
  return [...bySentence].map(([sentence, names]) => ({ label: `${label}: ${names.join(', ')}`, sentence }));
}

/** A choice that leaves nothing to choose is no field. */
function isSettled({ kind, choices, default: usual }: ParameterBase, typed: string): boolean {
  if (kind !== 'choice' || !choices?.some(({ notYet }) => notYet !== undefined)) return false;
  const [only, ...others] = choices.filter(({ notYet }) => notYet === undefined);
  return only !== undefined && others.length === 0 && (typed === '' ? usual : typed) === only.id;
}

const OF_SHEET = ['title', 'material', 'quantity'];

/**
 * The form of a family for these values: `shown` are the paths that count now. Before the engine has said (null), the
 * sizes of the stored sheet (`sized`, their paths) stand, so that no row comes late.
 */
export function formRows(
  template: Template,
  values: TypedValues,
  shown: readonly string[] | null,
  sized: ReadonlySet<string> = new Set(),
): FormRows {
  const known = shown ? new Set(shown) : null;
  const isShown = ({ path, parameter }: OneRow) =>
    parameter.notYet === undefined &&
    (known ? known.has(path) : parameter.when === undefined || sized.has(path));
  const shape: FormRow[] = [];
  const sheet: OneRow[] = [];
  const notYet: OneRow[] = [];
  const notYetChoices: { label: string; sentence: string }[] = [];
  for (const parameter of template.parameters) {
    if (isTable(parameter)) {
      shape.push(tableRows(parameter, values, isShown));
      continue;
    }
    const row: OneRow = { kind: 'one', path: parameter.id, parameter };
    if (parameter.notYet !== undefined) notYet.push(row);
    else if (OF_SHEET.includes(parameter.id)) sheet.push(row);
    else if (isShown(row)) {
      notYetChoices.push(...choicesNotYet(parameter));
      if (!isSettled(parameter, textAt(values, parameter.id))) shape.push(row);
    }
  }
  sheet.sort((a, b) => OF_SHEET.indexOf(a.path) - OF_SHEET.indexOf(b.path));
  return { shape, sheet, notYet, notYetChoices };
}

function tableRows(
  parameter: TableParameter,
  values: TypedValues,
  isShown: (row: OneRow) => boolean,
): TableRows {
  const rows = rowsOf(values, parameter.id).map((row, index) => {
    const cells = parameter.columns.map((column): OneRow => ({
      kind: 'one',
      path: `${parameter.id}[${index}].${column.id}`,
      parameter: column,
    }));
    return {
      key: row.key,
      index,
      // A row that was just added is not yet known to the engine: its cells stand until it says otherwise.
      cells: cells.filter(
        (cell) => isShown(cell) || (cell.parameter.notYet === undefined && cell.parameter.when === undefined),
      ),
      notYet: cells.filter(({ parameter: { notYet } }) => notYet !== undefined),
    };
  });
  return { kind: 'table', parameter, rows };
}
