import { drawSheet } from '../../shared/drawing/draw';
import type { DraftingStyle, DrawingOptions, Sheet, TitleBlock } from '../../shared/drawing/sheet';
import type { Part } from '../../shared/part/part';
import { buildScheme } from '../../shared/scheme/build';
import type { Scheme } from '../../shared/scheme/scheme';
import { evaluate } from '../../shared/template/evaluate';
import type { TypedValues } from '../../shared/template/template';
import { templateById } from '../../templates';

/** A title block as the depot's drawing office fills it in. */
export const depotTitle: TitleBlock = {
  title: 'Windlass handle, hexagon grip',
  number: 'PN-0147',
  revision: 'B',
  sheetOf: '1 of 1',
  materialText: 'free-cutting steel, believed',
  stockText: 'round 25',
  mass: '0.42 kg',
  generalTolerance: 'ISO 2768-m',
  texture: 'Ra 3.2',
  finish: 'as machined',
  quantity: '6',
  drawn: { by: 'designer 1', date: '2026-03-07' },
  checked: null,
  state: 'DRAFT',
  owner: 'Pellworth Navigation',
  revisions: [{ letter: 'A', change: 'first release', by: 'designer 1', date: '2024-06-17' }],
};

export interface Drawn {
  part: Part;
  scheme: Scheme;
  sheet: Sheet;
}

export interface Asked {
  style: DraftingStyle;
  unit: 'mm' | 'in';
  entryUnit?: 'mm' | 'in';
  options?: Partial<DrawingOptions>;
}

/** Typed values to part and scheme. @throws when the values are refused: a test's own mistake */
export function partAndScheme(
  template: string,
  typed: TypedValues,
  asked: Asked,
): { part: Part; scheme: Scheme } {
  const family = templateById(template);
  if (!family) throw new Error(`No template ${template}`);
  const evaluation = evaluate(family, typed, { entryUnit: asked.entryUnit ?? 'mm' });
  const { part } = evaluation;
  if (!part)
    throw new Error(`${template}: ${evaluation.problems.map((p) => `${p.path}: ${p.message}`).join('; ')}`);
  const generalTolerance = asked.style === 'asme' && asked.unit === 'in' ? 'shop-inch' : 'ISO 2768-m';
  return { part, scheme: buildScheme(family, { ...evaluation, part }, { generalTolerance }) };
}

/** Draws part and scheme. @throws when nothing listed holds them */
export function draw(part: Part, scheme: Scheme, asked: Asked): Sheet {
  const result = drawSheet(part, scheme, {
    style: asked.style,
    unit: asked.unit,
    sheet: 'auto',
    scale: 'auto',
    balloons: true,
    stamp: 'DRAFT: not for manufacture',
    titleBlock: { ...depotTitle, generalTolerance: scheme.generalTolerance.text },
    ...asked.options,
  });
  if ('problem' in result) throw new Error(result.problem.message);
  return result.sheet;
}

/** Typed values to a finished sheet. */
export function sheetOf(template: string, typed: TypedValues, asked: Asked): Drawn {
  const { part, scheme } = partAndScheme(template, typed, asked);
  return { part, scheme, sheet: draw(part, scheme, asked) };
}
