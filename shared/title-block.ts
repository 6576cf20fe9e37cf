import type { EngineRequest } from './engine';
import type { TitleBlock } from './drawing/sheet';
import type { Part } from './part/part';
import type { Route } from './route/route';
import type { Scheme } from './scheme/scheme';
import type { Evaluation } from './template/template';
import { partMass } from './part/volume';
import { materialById } from './standards/materials';
import { formatLength, formatNumber } from './units/format';

const GRAMS_PER_KILOGRAM = 1000;
const KILOGRAMS_PER_POUND = 0.45359237;

/** The title block as the engine knows it, with what only the records know (number, signatures, state) carried over. */
export function titleBlockFor(
  request: EngineRequest,
  evaluation: Evaluation & { part: Part },
  scheme: Scheme,
  route: Route | null,
): TitleBlock {
  const material = materialById(evaluation.part.material);
  const bar = route ? request.register.bars.find((candidate) => candidate.id === route.stock.bar) : undefined;
  return {
    ...request.titleBlock,
    title: textOf(evaluation, 'title'),
    sheetOf: '1 of 1',
    materialText: `${material?.name ?? evaluation.part.material}, ${route?.stock.certified ? `certified ${bar?.certificate ?? ''}`.trim() : 'believed'}`,
    stockText: route ? stockText(route, request) : 'no bar held',
    mass: material ? massText(partMass(evaluation.part, material.density), request) : 'not known',
    generalTolerance: scheme.generalTolerance.text,
    texture: request.register.settings.surfaceTexture,
    finish: 'as machined',
    quantity: textOf(evaluation, 'quantity') || '1',
  };
}

function textOf(evaluation: Evaluation, parameter: string): string {
  const value = evaluation.parameters.values[parameter]?.value;
  return value === null || value === undefined ? '' : String(value);
}

function stockText(route: Route, request: EngineRequest): string {
  const { shape, size } = route.stock;
  return `${shape === 'hex' ? 'hexagon' : shape} ${formatLength(size, { unit: request.unit, style: request.style })}`;
}

/** Three significant steps are enough to lift or post a part by: grams under a kilogram, ounces left to the reader. */
function massText(kilograms: number, request: EngineRequest): string {
  if (request.unit === 'in') return `${formatNumber(kilograms / KILOGRAMS_PER_POUND, 2)} lb`;
  return kilograms < 1
    ? `${formatNumber(kilograms * GRAMS_PER_KILOGRAM, kilograms < 0.1 ? 1 : 0)} g`
    : `${formatNumber(kilograms, 2)} kg`;
}
