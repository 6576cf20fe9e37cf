import { z } from 'zod';
import { compileExpression } from './expression';
import type { Template } from './template';

const expression = z
  .string()
  .max(600)
  .superRefine((source, context) => {
    try {
      compileExpression(source);
    } catch (cause) {
      context.addIssue({
        code: 'custom',
        message: cause instanceof Error ? cause.message : 'cannot be compiled',
      });
    }
  });

const identifier = z.string().regex(/^[a-z][A-Za-z0-9]{0,39}$/);
const templateId = z.string().regex(/^[a-z][a-z0-9-]{0,39}$/);
/** Ids of features and sizes may name their parts with dots and the row in hand with `{key}`. */
const path = z.string().regex(/^[a-z][A-Za-z0-9{}.-]{0,79}$/);
const sentence = z.string().min(1).max(400);
const text = z.string().max(200);

const base = {
  id: identifier,
  label: text.min(1),
  default: text.optional(),
  optional: z.boolean().optional(),
  minimum: expression.optional(),
  maximum: expression.optional(),
  choices: z
    .array(z.strictObject({ id: text.min(1), label: text.min(1), notYet: sentence.optional() }))
    .optional(),
  when: expression.optional(),
  notYet: sentence.optional(),
  hint: sentence.optional(),
};

const simpleKind = z.enum([
  'length',
  'diameter',
  'angle',
  'count',
  'ratio',
  'choice',
  'thread',
  'fit',
  'yes-no',
  'text',
  'material',
]);
const simple = z.strictObject({ ...base, kind: simpleKind });
const row = z.object({ key: z.string().min(1) }).catchall(z.string());
const table = z.strictObject({
  ...base,
  kind: z.literal('table'),
  minimumRows: z.int().min(0),
  maximumRows: z.int().min(1).max(100),
  columns: z.array(simple).min(1),
  defaultRows: z.array(row).optional(),
});

const typedValues = z.record(z.string(), z.union([z.string(), z.array(row)]));
const figures = z.record(identifier, expression);

/** What a template may hold: data only, every expression compiled. */
export const templateSchema = z.strictObject({
  id: templateId,
  name: text.min(1),
  summary: sentence,
  parameters: z
    .array(z.union([simple, table]))
    .min(1)
    .max(80),
  derived: z
    .array(z.strictObject({ id: identifier, value: expression, each: identifier.optional() }))
    .max(80),
  constraints: z
    .array(
      z.strictObject({
        holds: expression,
        parameter: identifier,
        message: sentence,
        when: expression.optional(),
        each: identifier.optional(),
      }),
    )
    .max(80),
  remarks: z
    .array(z.strictObject({ code: templateId, parameter: identifier, when: expression, message: sentence }))
    .optional(),
  features: z
    .array(
      z.strictObject({
        kind: z.enum(['cylinder', 'cone', 'chamfer', 'crown', 'thread', 'flats', 'centre-hole']),
        id: path,
        parameter: identifier.optional(),
        each: identifier.optional(),
        when: expression.optional(),
        figures,
      }),
    )
    .min(1)
    .max(80),
  sizes: z
    .array(
      z.strictObject({
        id: path,
        kind: z.enum([
          'length',
          'diameter',
          'radius',
          'angle',
          'taper',
          'chamfer',
          'thread',
          'across-flats',
          'knurl',
          'groove',
          'key',
          'hole',
          'position',
          'texture',
          'centre-hole',
          'geometrical',
          'note',
        ]),
        parameter: identifier.optional(),
        fit: identifier.optional(),
        each: identifier.optional(),
        when: expression.optional(),
        features: z.array(path).min(1),
        figures,
        reference: z.boolean().optional(),
      }),
    )
    .min(1)
    .max(80),
  datum: expression,
  example: typedValues,
  examples: z
    .array(
      z.strictObject({
        id: templateId,
        name: text.min(1),
        entryUnit: z.enum(['mm', 'in']),
        values: typedValues,
      }),
    )
    .optional(),
});

/**
 * A template, checked when it is loaded: its shape, every expression, and that every name an expression reads is one
 * of its parameters, columns or derived values.
 * @throws Error listing what is wrong: a fault of the template
 */
export function defineTemplate(template: Template): Template {
  const checked = templateSchema.safeParse(template);
  if (!checked.success) {
    throw new Error(`Template ${template.id}: ${z.prettifyError(checked.error)}`);
  }
  const unknown = unknownNames(template);
  if (unknown.length > 0)
    throw new Error(`Template ${template.id} reads names it does not have: ${unknown.join(', ')}`);
  return template;
}

/** Names read by expressions that are neither parameters nor derived before they are read. */
function unknownNames(template: Template): string[] {
  const names = new Set<string>();
  const columns = new Map<string, Set<string>>();
  for (const parameter of template.parameters) {
    names.add(parameter.id);
    if (parameter.kind === 'table' && 'columns' in parameter) {
      columns.set(parameter.id, new Set(parameter.columns.map(({ id }) => id)));
    }
  }
  const unknown: string[] = [];
  const look = (source: string | undefined, each?: string): void => {
    if (source === undefined) return;
    const { symbols, columns: read, tableColumns } = compileExpression(source);
    unknown.push(...[...symbols].filter((name) => !names.has(name)));
    unknown.push(
      ...[...read].filter((name) => !columns.get(each ?? '')?.has(name)).map((name) => `row.${name}`),
    );
    for (const name of tableColumns) {
      const [tableName = '', column = '*'] = name.split('.');
      const known = columns.get(tableName);
      if (!known || (column !== '*' && !known.has(column))) unknown.push(name);
    }
  };
  for (const derived of template.derived) {
    // A row's derived value may read the same one of the rows before it.
    if (derived.each !== undefined) columns.get(derived.each)?.add(derived.id);
    look(derived.value, derived.each);
    if (derived.each === undefined) names.add(derived.id);
  }
  for (const parameter of template.parameters) {
    const inner = parameter.kind === 'table' && 'columns' in parameter ? parameter.columns : [];
    for (const { minimum, maximum, when } of [parameter])
      [minimum, maximum, when].forEach((source) => look(source));
    for (const column of inner)
      [column.minimum, column.maximum, column.when].forEach((source) => look(source, parameter.id));
  }
  for (const { holds, when, each, parameter } of template.constraints) {
    look(holds, each);
    look(when, each);
    const known = each === undefined ? names.has(parameter) : columns.get(each)?.has(parameter);
    if (!known) unknown.push(parameter);
  }
  for (const { figures: worth, when, each } of [...template.features, ...template.sizes]) {
    look(when, each);
    Object.values(worth).forEach((source) => look(source, each));
  }
  for (const { when } of template.remarks ?? []) look(when);
  look(template.datum);
  return [...new Set(unknown)];
}
