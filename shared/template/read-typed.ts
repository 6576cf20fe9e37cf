import type { Problem } from '../problem';
import type { LengthUnit } from '../units/length';
import { isUnset, MAX_TEXT, readValue } from './read-value';
import type {
  EvaluatedRow,
  EvaluatedValue,
  Parameter,
  ParameterBase,
  TableParameter,
  Template,
} from './template';

/** A table larger than this, or more unknown names than this, is not looked through. */
const MAX_UNKNOWN_NAMED = 10;
/** Kinds whose cleared field means the default; a cleared size is asked for. */
const FALLS_BACK: ReadonlySet<ParameterBase['kind']> = new Set(['choice', 'material', 'count', 'yes-no']);
const ROW_KEY = /^[A-Za-z0-9_-]{1,64}$/;

/** What was read, field by field, and what could not be. `problems` is keyed by path so that a hidden field can be let off. */
export interface ReadParameters {
  parameters: { values: Record<string, EvaluatedValue>; tables: Record<string, EvaluatedRow[]> };
  problems: Map<string, Problem>;
  /** Problems that stand whatever the field shows: unknown names, not-yet parameters, oversized texts. */
  firm: Problem[];
}

export function isTable(parameter: Parameter): parameter is TableParameter {
  return parameter.kind === 'table';
}

/** Reads everything typed, by kind and bounded in size. Takes any value whatever and never throws. */
export function readTyped(template: Template, typed: unknown, entryUnit: LengthUnit): ReadParameters {
  const read: ReadParameters = { parameters: { values: {}, tables: {} }, problems: new Map(), firm: [] };
  const given = asRecord(typed);
  if (!given) {
    read.firm.push({ path: 'parameters', message: 'The sizes are given as a list of names and values.' });
  }
  const values = given ?? {};
  reportUnknown(read, Object.keys(values), template.parameters, (name) => name);
  for (const parameter of template.parameters) {
    const own = Object.hasOwn(values, parameter.id) ? values[parameter.id] : undefined;
    if (isTable(parameter)) readTable(read, parameter, own, entryUnit);
    else read.parameters.values[parameter.id] = readField(read, parameter, parameter.id, own, entryUnit);
  }
  return read;
}

function asRecord(value: unknown): Record<string, unknown> | undefined {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
    ? (value as Record<string, unknown>)
    : undefined;
}

function reportUnknown(
  read: ReadParameters,
  names: readonly string[],
  known: readonly ParameterBase[],
  pathOf: (name: string) => string,
): void {
  const ids = new Set(known.map(({ id }) => id));
  const unknown = names.filter((name) => !ids.has(name));
  for (const name of unknown.slice(0, MAX_UNKNOWN_NAMED)) {
    const short = name.length > 40 ? `${name.slice(0, 39)}…` : name;
    read.firm.push({
      path: pathOf(short),
      message: `There is no size called “${short}” here. The names are ${listNames([...ids])}.`,
    });
  }
  if (unknown.length > MAX_UNKNOWN_NAMED) {
    read.firm.push({
      path: pathOf('…'),
      message: `${unknown.length} names are not known here. The names are ${listNames([...ids])}.`,
    });
  }
}

function listNames(names: readonly string[]): string {
  return names.length < 2
    ? names.join('')
    : `${names.slice(0, -1).join(', ')} and ${names[names.length - 1]}`;
}

/** A value as text: a JSON number or yes/no counts as if it had been typed. */
function asText(value: unknown): string | undefined {
  if (typeof value === 'string') return value;
  if (typeof value === 'number' || typeof value === 'boolean') return String(value);
  return undefined;
}

function readField(
  read: ReadParameters,
  parameter: ParameterBase,
  path: string,
  given: unknown,
  entryUnit: LengthUnit,
): EvaluatedValue {
  const absent = given === undefined || given === null;
  const text = absent ? (parameter.default ?? '') : asText(given);
  if (text === undefined) {
    read.firm.push({ path, message: 'A list stands where one value is expected. Type one value.' });
    return { text: '', value: null };
  }
  if (text.length > MAX_TEXT) {
    read.firm.push({
      path,
      message: `The text is ${text.length} characters long. This field takes at most ${MAX_TEXT}.`,
    });
    return { text: '', value: null };
  }
  if (parameter.notYet !== undefined) {
    if (!isUnset(text) && text !== parameter.default) read.firm.push({ path, message: parameter.notYet });
    return { text, value: null };
  }
  const cleared = text.trim() === '' && !parameter.optional && FALLS_BACK.has(parameter.kind);
  const value = readValue(parameter, cleared ? (parameter.default ?? '') : text, absent ? 'mm' : entryUnit);
  if (value.ok) return value.value;
  read.problems.set(path, { path, message: value.message });
  return { text, value: null };
}

function readTable(read: ReadParameters, table: TableParameter, given: unknown, entryUnit: LengthUnit): void {
  const rows = given === undefined || given === null ? (table.defaultRows ?? []) : given;
  const unit = rows === given ? entryUnit : 'mm';
  read.parameters.tables[table.id] = [];
  const range =
    table.minimumRows === table.maximumRows
      ? String(table.minimumRows)
      : `${table.minimumRows} to ${table.maximumRows}`;
  if (!Array.isArray(rows)) {
    read.firm.push({
      path: table.id,
      message: `The ${table.label.toLowerCase()} are given as ${range} rows.`,
    });
    return;
  }
  if (rows.length < table.minimumRows || rows.length > table.maximumRows) {
    read.firm.push({
      path: table.id,
      message: `${rows.length === 1 ? '1 row was' : `${rows.length} rows were`} given. Give ${range} rows.`,
    });
    return;
  }
  const keys = new Set<string>();
  rows.forEach((row: unknown, index) => {
    const path = `${table.id}[${index}]`;
    const cells = asRecord(row);
    if (!cells) {
      read.firm.push({ path, message: 'A row is given as a list of names and values.' });
    }
    reportUnknown(
      read,
      Object.keys(cells ?? {}).filter((name) => name !== 'key'),
      table.columns,
      (name) => `${path}.${name}`,
    );
    const key = rowKey(cells?.['key'], index, keys);
    keys.add(key);
    const values: Record<string, EvaluatedValue> = {};
    for (const column of table.columns) {
      const own = cells && Object.hasOwn(cells, column.id) ? cells[column.id] : undefined;
      values[column.id] = readField(read, column, `${path}.${column.id}`, own, unit);
    }
    read.parameters.tables[table.id]?.push({ key, values });
  });
}

/** A row's own key where it has a fit one; a row typed by hand or read from a file is called by its place. */
function rowKey(given: unknown, index: number, taken: ReadonlySet<string>): string {
  if (typeof given === 'string' && ROW_KEY.test(given) && !taken.has(given)) return given;
  let key = `r${index + 1}`;
  while (taken.has(key)) key = `${key}x`;
  return key;
}
