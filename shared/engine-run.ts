import { templateById } from '../templates';
import type { EngineGood, EngineRequest, EngineResult } from './engine';
import type { Evaluation } from './template/template';
import type { Part } from './part/part';
import { checkSheet } from './drawing/check/check-sheet';
import { drawSheet } from './drawing/draw';
import { renderSvg } from './render/svg';
import { planRoute } from './route/plan';
import { buildScheme } from './scheme/build';
import { schemeFromDatum } from './scheme/from-datum';
import { simulate } from './simulate/simulate';
import { evaluate } from './template/evaluate';
import { titleBlockFor } from './title-block';

/** A template that the engine does not have is the caller's fault, not a person's: they choose from a list. */
export class UnknownTemplate extends Error {
  constructor(readonly template: string) {
    super(`There is no template named "${template}".`);
    this.name = 'UnknownTemplate';
  }
}

/**
 * Values as typed to part, scheme, sheet, route and verdict. The same request gives the same bytes anywhere.
 * @throws UnknownTemplate; anything else thrown is a fault of the engine.
 */
export function runEngine(request: EngineRequest): EngineResult {
  const template = templateById(request.template);
  if (!template) throw new UnknownTemplate(request.template);
  const evaluation = evaluate(template, request.typed, { entryUnit: request.entryUnit });
  if (!evaluation.part || evaluation.problems.length > 0) {
    return { evaluation, problems: evaluation.problems, advice: evaluation.advice };
  }
  return drawAndPlan(request, { ...evaluation, part: evaluation.part });
}

function drawAndPlan(request: EngineRequest, evaluation: Evaluation & { part: Part }): EngineResult {
  const template = templateById(request.template);
  if (!template) throw new UnknownTemplate(request.template);
  const { part } = evaluation;
  const designed = buildScheme(template, evaluation, {
    generalTolerance: generalToleranceOf(request),
    balloons: request.frozenBalloons,
  });
  const given =
    request.datum === undefined ? { scheme: designed } : schemeFromDatum(part, designed, request.datum);
  if ('refused' in given) {
    const problems = given.refused.map(({ message }) => ({ path: 'datum', message }));
    return { evaluation: { ...evaluation, problems }, problems, advice: evaluation.advice };
  }
  const { scheme } = given;
  const plan = planRoute(part, scheme, request.register, {
    quantity: quantityOf(evaluation),
    material: part.material,
    unit: request.entryUnit,
    style: request.style,
  });
  const drawing = drawSheet(part, scheme, {
    style: request.style,
    unit: request.unit,
    sheet: request.sheet,
    scale: request.scale,
    balloons: request.balloons,
    titleBlock: titleBlockFor(request, evaluation, scheme, plan.route),
    stamp: request.stamp,
  });
  if ('problem' in drawing) {
    const problems = [...evaluation.problems, drawing.problem];
    return { evaluation: { ...evaluation, problems }, problems, advice: evaluation.advice };
  }
  const good: EngineGood = {
    part,
    scheme,
    sheet: drawing.sheet,
    findings: checkSheet(drawing.sheet, scheme, part),
    svg: renderSvg(drawing.sheet),
    route: plan.route,
    capacity: plan.capacity,
    faults: plan.route ? simulate(plan.route, part) : [],
  };
  return { evaluation, problems: [], advice: evaluation.advice, good };
}

function quantityOf(evaluation: Evaluation): number {
  const typed = evaluation.parameters.values['quantity']?.value;
  return typeof typed === 'number' && typed >= 1 ? typed : 1;
}

/** Inch sheets of the `asme` style are governed by the shop's block of decimals; every other by ISO 2768-1, class m. */
function generalToleranceOf({ style, unit }: EngineRequest): string {
  return style === 'asme' && unit === 'in' ? 'shop-inch' : 'ISO 2768-m';
}
