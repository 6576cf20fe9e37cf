import type { Tolerance } from '../units/tolerance';
import { compileExpression } from './expression';
import { withKey } from './part-from-template';
import { atRow, type ExpressionValue, type Scope } from './scope';
import type { EvaluatedParameters, EvaluatedValue, SizeTemplate, Template } from './template';

/** A size template made real for these values: one shown size, before limits and balloons. */
export interface SizeInstance {
  template: SizeTemplate;
  id: string;
  /** As the form knows it: `steps[2].diameter`. */
  parameter?: string;
  /** Where a remark about its tolerance belongs. */
  fitParameter?: string;
  features: string[];
  nominal: number;
  typed: string;
  /** Inch or millimetre as typed, where it was a length. */
  unit?: EvaluatedValue['unit'];
  /** As typed beside the size or in its fit's own field. */
  tolerance: Tolerance;
  figures: Readonly<Record<string, ExpressionValue>>;
}

/** Every size the template shows for these values, in the order written. All parameters must be good. */
export function sizeInstances(
  template: Template,
  parameters: EvaluatedParameters,
  scope: Scope,
): SizeInstance[] {
  return template.sizes.flatMap((size) => {
    const { each } = size;
    if (each === undefined) return instance(size, parameters, scope);
    return (parameters.tables[each] ?? []).flatMap((_, index) =>
      instance(size, parameters, atRow(scope, each, index), { table: each, index }),
    );
  });
}

function instance(
  size: SizeTemplate,
  parameters: EvaluatedParameters,
  scope: Scope,
  row?: { table: string; index: number },
): SizeInstance[] {
  if (size.when !== undefined && compileExpression(size.when).run(scope) !== true) return [];
  const figures: Record<string, ExpressionValue> = {};
  for (const [name, source] of Object.entries(size.figures))
    figures[name] = compileExpression(source).run(scope);
  const { nominal, lastRow } = figures;
  if (typeof nominal !== 'number' || !Number.isFinite(nominal)) {
    throw new TypeError(`Size “${size.id}” of template has no nominal: ${String(nominal)}`);
  }
  const rows = row ? (parameters.tables[row.table] ?? []) : [];
  const last = typeof lastRow === 'number' ? lastRow : (row?.index ?? 0);
  const span = row ? rows.slice(row.index, last + 1) : [];
  const cell = (id: string | undefined): EvaluatedValue | undefined =>
    id === undefined ? undefined : row ? rows[row.index]?.values[id] : parameters.values[id];
  const path = (id: string | undefined): string | undefined =>
    id === undefined ? undefined : row ? `${row.table}[${row.index}].${id}` : id;
  const own = cell(size.parameter);
  const toleranceColumns = [size.parameter, size.fit].filter((id) => id !== undefined);
  const typedIn = (values: Readonly<Record<string, EvaluatedValue>>): Tolerance =>
    toleranceColumns.map((id) => values[id]?.tolerance).find((found) => found && found.kind !== 'none') ?? {
      kind: 'none',
    };
  const merged = span.length > 1 && size.kind === 'length';
  return [
    {
      template: size,
      id: withKey(size.id, scope),
      parameter: path(size.parameter),
      fitParameter: path(cell(size.fit)?.tolerance ? size.fit : size.parameter),
      features: size.features.map((id) => withKey(id, scope)),
      nominal,
      typed: merged
        ? span.map(({ values }) => values[size.parameter ?? '']?.text.trim() ?? '').join(' + ')
        : (own?.text.trim() ?? ''),
      ...(own?.unit ? { unit: own.unit } : {}),
      tolerance: typedIn(row ? (span[0]?.values ?? {}) : parameters.values),
      figures,
    },
  ];
}
