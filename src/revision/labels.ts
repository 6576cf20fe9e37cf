import type { ParameterBase, TableParameter, Template } from '../../shared/template/template';

const CELL = /^([^[.]+)\[(\d+)\]\.(.+)$/;

export function isTable(parameter: ParameterBase): parameter is TableParameter {
  return parameter.kind === 'table';
}

/** The parameter a path leads to; undefined when the family has none of that name. */
export function parameterAt(template: Template, path: string): ParameterBase | undefined {
  const cell = CELL.exec(path);
  const parameter = template.parameters.find(({ id }) => id === (cell?.[1] ?? path));
  if (!cell || !parameter) return parameter;
  return isTable(parameter) ? parameter.columns.find(({ id }) => id === cell[3]) : undefined;
}

/** How a path is called aloud: `Taper length`, `Step 3, diameter`. */
export function labelOf(template: Template | undefined, path: string): string {
  if (!template) return path;
  const cell = CELL.exec(path);
  const label = parameterAt(template, path)?.label ?? path;
  if (!cell) return label;
  const table = template.parameters.find(({ id }) => id === cell[1]);
  return `${rowNoun(table?.label ?? cell[1] ?? '')} ${Number(cell[2]) + 1}, ${label.toLowerCase()}`;
}

/** One row of a table by its name: `Steps` gives `Step`. */
export function rowNoun(tableLabel: string): string {
  return tableLabel.replace(/s$/, '') || 'Row';
}

const SETTING_LABELS: Readonly<Record<string, string>> = {
  title: 'Title',
  note: 'Note',
  'settings.unit': 'Unit of the sheet',
  'settings.style': 'Drafting style',
  'settings.sheet': 'Sheet size',
  'settings.scale': 'Scale',
  'settings.balloons': 'Balloons',
};

/** As `labelOf`, for everything a draft holds besides its values too. */
export function labelOfDraft(template: Template | undefined, path: string): string {
  return SETTING_LABELS[path] ?? labelOf(template, path);
}
