import { z } from 'zod';

/**
 * The SVG contract as schemas over a parsed element: `{ tag, attributes, children, text }`.
 * Checked against every sheet the tests make; other programs may rely on each attribute named here.
 */
export interface SvgElement {
  tag: string;
  attributes: Readonly<Record<string, string>>;
  children: readonly SvgElement[];
  /** Character data of the element itself. */
  text: string;
}

const figure = z.string().regex(/^-?\d+(\.\d{1,6})?$/, 'a plain decimal figure');
const flag = z.enum(['true', 'false']);
const colour = z.string().regex(/^(#[0-9a-f]{6}|none)$/);

export const rootAttributes = z.object({
  xmlns: z.literal('http://www.w3.org/2000/svg'),
  width: z.string().regex(/^\d+(\.\d+)?mm$/),
  height: z.string().regex(/^\d+(\.\d+)?mm$/),
  viewBox: z.string().regex(/^0 0 \d+(\.\d+)? \d+(\.\d+)?$/),
  'data-sheet': z.enum(['A4', 'A3', 'A2', 'A1', 'A', 'B', 'C', 'D']),
  'data-style': z.enum(['iso', 'asme']),
  'data-unit': z.enum(['mm', 'in']),
  'data-scale': figure,
});

export const groupRole = z.enum([
  'frame', 'title-block', 'revision-table', 'size-table', 'notes', 'view', 'dimension', 'balloon', 'stamp', 'symbol',
]); // prettier-ignore

export const viewAttributes = z.object({
  'data-role': z.literal('view'),
  'data-view': z.string().regex(/^(axis|end-left|end-right|section-[A-Z]|detail-[A-Z])$/),
  'data-scale': figure,
  'data-broken': z.literal('true').optional(),
});

export const dimensionAttributes = z.object({
  'data-role': z.literal('dimension'),
  'data-id': z.string().min(1),
  'data-for-view': z.string().min(1),
  'data-kind': z.enum([
    'length', 'diameter', 'radius', 'angle', 'taper', 'chamfer', 'thread', 'across-flats', 'knurl', 'groove', 'key', 'hole',
    'position', 'texture', 'centre-hole', 'geometrical', 'note',
  ]), // prettier-ignore
  'data-value': figure.optional(),
  'data-reference': flag,
});

export const symbolAttributes = z.object({
  'data-role': z.literal('symbol'),
  'data-box': z.string().regex(/^-?[\d.]+( -?[\d.]+){3}$/),
});

export const strokeTags = ['line', 'polyline', 'polygon', 'path', 'circle'] as const;

export const strokeAttributes = z.object({
  'data-line': z.enum([
    'visible', 'hidden', 'centre', 'thin', 'hatch', 'break', 'cutting', 'dimension', 'extension', 'leader', 'arrow', 'frame',
    'table', 'symbol',
  ]), // prettier-ignore
  class: z.string().min(1),
  stroke: colour,
  'stroke-width': figure,
  fill: colour,
  /** Only absolute moves, lines, arcs, curves and closings. */
  d: z
    .string()
    .regex(/^[MLACZ0-9eE .,-]*$/)
    .optional(),
});

export const textAttributes = z.object({
  x: figure,
  y: figure,
  'font-size': figure,
  'text-anchor': z.enum(['start', 'middle', 'end']),
  transform: z
    .string()
    .regex(/^rotate\(-90 -?[\d.]+ -?[\d.]+\)$/)
    .optional(),
  fill: colour,
  class: z.string().min(1),
});

const groupSchemas: Partial<Record<z.infer<typeof groupRole>, z.ZodType>> = {
  view: viewAttributes,
  dimension: dimensionAttributes,
  symbol: symbolAttributes,
};

/** Every departure from the contract, in words; empty when the document keeps it. */
export function svgFaults(root: SvgElement): string[] {
  const faults: string[] = [];
  const check = (schema: z.ZodType, element: SvgElement, place: string) => {
    const outcome = schema.safeParse(element.attributes);
    if (outcome.success) return;
    for (const issue of outcome.error.issues)
      faults.push(`${place} ${issue.path.join('.')}: ${issue.message}`);
  };
  const walk = (element: SvgElement, place: string, parents: readonly string[]) => {
    if (element.tag === 'g') {
      const role = groupRole.safeParse(element.attributes['data-role']);
      if (!role.success) {
        // A plain group carries nothing that a reader of the contract needs.
        if (element.attributes['data-role'] !== undefined) faults.push(`${place}: unknown role`);
      } else {
        const schema = groupSchemas[role.data];
        if (schema) check(schema, element, place);
        if (role.data === 'dimension' && parents.includes('view'))
          faults.push(`${place}: a size stands inside a view`);
      }
    } else if (element.tag === 'text') {
      check(textAttributes, element, place);
      if (element.children.length > 0) faults.push(`${place}: a text holds one run and no other element`);
    } else if ((strokeTags as readonly string[]).includes(element.tag)) {
      check(strokeAttributes, element, place);
      if (element.attributes['transform'] !== undefined) faults.push(`${place}: only a text may be turned`);
    } else if (!['title', 'desc', 'style'].includes(element.tag)) {
      faults.push(`${place}: <${element.tag}> is not in the contract`);
    }
    const role = element.attributes['data-role'];
    element.children.forEach((child, index) =>
      walk(child, `${place}/${child.tag}[${index}]`, role ? [...parents, role] : parents),
    );
  };
  check(rootAttributes, root, 'svg');
  root.children.forEach((child, index) => walk(child, `svg/${child.tag}[${index}]`, []));
  return faults;
}
