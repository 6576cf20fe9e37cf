import type {
  CentreHoleInput,
  ChamferInput,
  CrownInput,
  FlatsInput,
  LengthInput,
  PartInput,
  ThreadInput,
} from '../part/part-input';
import { parseThread } from '../standards/threads';
import { compileExpression } from './expression';
import { atRow, type Scope } from './scope';
import type { FeatureTemplate, Template } from './template';

/** A feature template made real: its id, its figures' scope, and the parameter path that answers for it. */
interface FeatureHere {
  template: FeatureTemplate;
  id: string;
  path?: string;
  scope: Scope;
}

/** `{key}` in an id stands for the key of the row in hand. */
export function withKey(id: string, scope: Scope): string {
  return id.replaceAll('{key}', scope.row?.key ?? '');
}

function featuresHere(template: Template, scope: Scope): FeatureHere[] {
  const found: FeatureHere[] = [];
  for (const feature of template.features) {
    const { each, when } = feature;
    const rows = each === undefined ? [undefined] : (scope.tables.get(each) ?? []).map((_, index) => index);
    for (const index of rows) {
      const here = each === undefined || index === undefined ? scope : atRow(scope, each, index);
      if (when !== undefined && compileExpression(when).run(here) !== true) continue;
      const path =
        feature.parameter === undefined || each === undefined
          ? feature.parameter
          : `${each}[${index}].${feature.parameter}`;
      found.push({ template: feature, id: withKey(feature.id, here), path, scope: here });
    }
  }
  return found;
}

function read(here: FeatureHere, name: string): unknown {
  const source = here.template.figures[name];
  return source === undefined ? undefined : (compileExpression(source).run(here.scope) ?? undefined);
}

/** @throws when a figure of a template that passed its constraints is not a finite number: the template's fault */
function figure(here: FeatureHere, name: string): number {
  const value = read(here, name);
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    throw new TypeError(`Figure “${name}” of feature “${here.id}” came to ${String(value)}`);
  }
  return value;
}

function figureIfAny(here: FeatureHere, name: string): number | undefined {
  return read(here, name) === undefined ? undefined : figure(here, name);
}

function end(here: FeatureHere): 'left' | 'right' {
  return read(here, 'end') === 'right' ? 'right' : 'left';
}

export interface TemplatePart {
  input: PartInput;
  /** Parameter path that answers for an input of `buildPart`. */
  pathOf: ReadonlyMap<string, string>;
}

/** The features of a template, in its order, as `buildPart` takes them. All parameters must be good. */
export function partInput(template: Template, scope: Scope): TemplatePart {
  const lengths: LengthInput[] = [];
  const chamfers: ChamferInput[] = [];
  const crowns: CrownInput[] = [];
  const threads: ThreadInput[] = [];
  const flats: FlatsInput[] = [];
  const centreHoles: CentreHoleInput[] = [];
  const pathOf = new Map<string, string>();
  for (const here of featuresHere(template, scope)) {
    const { id } = here;
    if (here.path !== undefined) pathOf.set(id, here.path);
    switch (here.template.kind) {
      case 'cylinder':
        lengths.push({
          form: 'cylinder',
          id,
          length: figure(here, 'length'),
          diameter: figure(here, 'diameter'),
        });
        break;
      case 'cone':
        lengths.push({
          form: 'cone',
          id,
          length: figure(here, 'length'),
          startDiameter: figure(here, 'startDiameter'),
          endDiameter: figure(here, 'endDiameter'),
        });
        break;
      case 'chamfer':
        chamfers.push({
          id,
          on: String(read(here, 'on')),
          end: end(here),
          leg: figure(here, 'leg'),
          angle: figureIfAny(here, 'angle'),
        });
        break;
      case 'crown':
        crowns.push({ id, end: end(here), radius: figure(here, 'radius') });
        break;
      case 'thread': {
        const spec = parseThread(String(read(here, 'thread')));
        if (!spec.ok) throw new TypeError(`Feature “${id}” has no thread: ${spec.message}`);
        threads.push({
          id,
          on: String(read(here, 'on')),
          spec: spec.value,
          fullThread: figureIfAny(here, 'fullThread'),
          end: end(here),
        });
        break;
      }
      case 'flats':
        flats.push({
          id,
          from: figure(here, 'from'),
          length: figure(here, 'length'),
          count: figure(here, 'count'),
          acrossFlats: figure(here, 'acrossFlats'),
          phase: figureIfAny(here, 'phase'),
        });
        break;
      case 'centre-hole':
        centreHoles.push({ id, end: end(here), designation: String(read(here, 'designation')) });
        break;
    }
  }
  const datum = compileExpression(template.datum).run(scope);
  const input: PartInput = {
    lengths,
    chamfers,
    crowns,
    threads,
    flats,
    centreHoles,
    material: String(scope.values.get('material') ?? ''),
    datum: typeof datum === 'number' ? datum : 0,
  };
  return { input, pathOf };
}
