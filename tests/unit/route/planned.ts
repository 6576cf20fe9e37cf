import type { Part } from '../../../shared/part/part';
import { exampleRegister } from '../../../shared/route/example-register';
import { planRoute } from '../../../shared/route/plan';
import type { PlanAnswer } from '../../../shared/route/plan';
import type { Register } from '../../../shared/route/register';
import type { Capacity, Route } from '../../../shared/route/route';
import { buildScheme } from '../../../shared/scheme/build';
import type { Scheme } from '../../../shared/scheme/scheme';
import { evaluate } from '../../../shared/template/evaluate';
import type { TypedValues } from '../../../shared/template/template';
import { templateById } from '../../../templates/index';

export interface HandleWish {
  /** A stepped shaft instead of a handle. */
  rows?: readonly { diameter: number; length: number; fit?: string; thread?: string }[];
  bar?: number;
  acrossFlats?: number;
  taperEnd?: number;
  taperLength?: number;
  thread?: string;
  material?: string;
  quantity?: number;
}

export interface Planned {
  part: Part;
  scheme: Scheme;
  answer: PlanAnswer;
  route: Route;
  capacity: Capacity;
}

/** A handle (or shaft) of the demo depot planned in a shop; a missing route fails unless it is expected. */
export function plannedHandle(
  wish: HandleWish,
  register: Register = exampleRegister,
  mayFail = false,
): Planned {
  const id = wish.rows ? 'stepped-shaft' : 'tapered-handle';
  const template = templateById(id);
  if (!template) throw new Error(`no template ${id}`);
  const evaluation = evaluate(template, wish.rows ? shaftValues(wish) : handleValues(wish), {
    entryUnit: 'mm',
  });
  const { part } = evaluation;
  if (!part) throw new Error(JSON.stringify(evaluation.problems));
  const scheme = buildScheme(template, { ...evaluation, part }, { generalTolerance: 'ISO 2768-m' });
  const answer = planRoute(part, scheme, register, { quantity: wish.quantity ?? 1, material: part.material });
  if (!answer.route && !mayFail) throw new Error(JSON.stringify(answer.capacity.needs));
  return { part, scheme, answer, route: answer.route as Route, capacity: answer.capacity };
}

/** As a person would type it: no more digits than are read. */
function typed(value: number): string {
  return String(Number(value.toFixed(8)));
}

function shaftValues(wish: HandleWish): TypedValues {
  return {
    title: 'Pawl pin',
    material: wish.material ?? 'steel-free-cutting',
    steps: (wish.rows ?? []).map((row, index) => ({
      key: `r${index + 1}`,
      diameter: row.thread ? '' : String(row.diameter),
      length: String(row.length),
      fit: row.fit ?? '',
      thread: row.thread ?? '',
    })),
    leftChamfer: '',
    rightChamfer: '',
  };
}

function handleValues(wish: HandleWish): TypedValues {
  return {
    title: 'Windlass handle',
    material: wish.material ?? 'steel-free-cutting',
    thread: wish.thread ?? 'M10',
    threadLength: '16',
    spigotDiameter: '14 h9',
    spigotLength: '10',
    grip: wish.acrossFlats ? 'hex' : 'round',
    barDiameter: typed(wish.bar ?? 25),
    acrossFlats: wish.acrossFlats ? typed(wish.acrossFlats) : '',
    gripLength: '60',
    flatsLength: '',
    taperEndDiameter: typed(wish.taperEnd ?? 16),
    taperLength: typed(wish.taperLength ?? 95),
    endForm: 'crown',
    endSize: '0',
  };
}
