import type { RevisionAnswer, SaveRevisionRequest } from '../../shared/api/drawings';
import type { TypedRow, TypedValues } from '../../shared/template/template';

/** What a person may change of a draft: everything a save sends but its version. */
export type Draft = Omit<SaveRevisionRequest, 'version'>;

export function draftOf({ revision }: RevisionAnswer): Draft {
  const { title, note, entryUnit, settings, values } = revision;
  return { title, note, entryUnit, settings, values };
}

const CELL = /^([^[.]+)\[(\d+)\]\.(.+)$/;

/** The text at a path (`gripLength`, `steps[2].diameter`); empty when nothing was typed. */
export function textAt(values: TypedValues, path: string): string {
  const cell = CELL.exec(path);
  if (!cell) {
    const value = values[path];
    return typeof value === 'string' ? value : '';
  }
  const [, table = '', index = '', column = ''] = cell;
  return rowsOf(values, table)[Number(index)]?.[column] ?? '';
}

/** The values with a text put at a path. */
export function withText(values: TypedValues, path: string, text: string): TypedValues {
  const cell = CELL.exec(path);
  if (!cell) return { ...values, [path]: text };
  const [, table = '', index = '', column = ''] = cell;
  const rows = rowsOf(values, table).map((row, at) =>
    at === Number(index) ? { ...row, [column]: text } : row,
  );
  return { ...values, [table]: rows };
}

export function rowsOf(values: TypedValues, table: string): TypedRow[] {
  const rows = values[table];
  return Array.isArray(rows) ? rows : [];
}

/** A row added after the last one, as long as it and with its own hidden key. */
export function withRowAdded(
  values: TypedValues,
  table: string,
  key: string,
  cells: Record<string, string>,
): TypedValues {
  return { ...values, [table]: [...rowsOf(values, table), { ...cells, key }] };
}

export function withRowRemoved(values: TypedValues, table: string, index: number): TypedValues {
  return { ...values, [table]: rowsOf(values, table).filter((_, at) => at !== index) };
}

/** The row at `index` changed places with its neighbour; unchanged at either end. */
export function withRowMoved(values: TypedValues, table: string, index: number, by: 1 | -1): TypedValues {
  const rows = [...rowsOf(values, table)];
  const row = rows[index];
  const other = rows[index + by];
  if (!row || !other) return values;
  rows[index] = other;
  rows[index + by] = row;
  return { ...values, [table]: rows };
}

export interface Difference {
  /** `title`, `note`, `settings.unit`, a value's path. */
  path: string;
  mine: string;
  theirs: string;
}

/** Every figure that differs between two drafts, in the order they are met. */
export function differences(mine: Draft, theirs: Draft): Difference[] {
  const left = flat(mine);
  const right = flat(theirs);
  const found: Difference[] = [];
  for (const path of new Set([...left.keys(), ...right.keys()])) {
    const [a, b] = [left.get(path) ?? '', right.get(path) ?? ''];
    if (a !== b) found.push({ path, mine: a, theirs: b });
  }
  return found;
}

function flat({ title, note, settings, values }: Draft): Map<string, string> {
  const all = new Map<string, string>([['note', note]]);
  if (values['title'] === undefined) all.set('title', title);
  for (const [name, value] of Object.entries(settings)) all.set(`settings.${name}`, String(value));
  for (const [name, value] of Object.entries(values)) {
    if (typeof value === 'string') all.set(name, value);
    else all.set(name, value.map(rowWords).join('; '));
  }
  return all;
}

function rowWords({ key: _key, ...cells }: TypedRow): string {
  return Object.entries(cells)
    .filter(([, text]) => text !== '')
    .map(([column, text]) => `${column} ${text}`)
    .join(', ');
}

/** Theirs with those values of mine that were picked; a picked table is taken whole. */
export function merged(mine: Draft, theirs: Draft, keepMine: ReadonlySet<string>): Draft {
  const values: TypedValues = { ...theirs.values };
  const settings = { ...theirs.settings };
  for (const path of keepMine) {
    const setting = /^settings\.(.+)$/.exec(path)?.[1];
    if (setting) Object.assign(settings, { [setting]: mine.settings[setting as keyof Draft['settings']] });
    else if (path !== 'note') {
      const value = mine.values[path];
      if (value === undefined) delete values[path];
      else values[path] = value;
    }
  }
  const typedTitle = typeof values['title'] === 'string' ? values['title'].trim() : '';
  return {
    ...theirs,
    title: typedTitle || (keepMine.has('title') ? mine.title : theirs.title),
    note: keepMine.has('note') ? mine.note : theirs.note,
    settings,
    values,
  };
}
