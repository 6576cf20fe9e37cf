import { describe, expect, it } from 'vitest';
import { svgTree } from './svg-tree';
import { drawResult } from '../../../shared/api/contract';
import { svgFaults, type SvgElement } from '../../../shared/api/svg-contract';
import { drawResultOf } from '../../../shared/draw-result';
import type { DraftingStyle } from '../../../shared/drawing/sheet';
import type { EngineGood, EngineResult } from '../../../shared/engine';
import { runEngine } from '../../../shared/engine-run';
import { exampleRegister } from '../../../shared/route/example-register';
import { templates } from '../../../templates';

function draw(
  template: string,
  style: DraftingStyle,
  unit: 'mm' | 'in',
): EngineResult & { good: EngineGood } {
  const family = templates.find(({ id }) => id === template);
  if (!family) throw new Error(`no family ${template}`);
  const result = runEngine({
    template,
    typed: family.example,
    entryUnit: 'mm',
    unit,
    style,
    sheet: 'auto',
    scale: 'auto',
    balloons: true,
    register: exampleRegister,
    titleBlock: {
      number: 'PN-0001',
      revision: 'A',
      drawn: null,
      checked: null,
      state: 'DRAFT',
      owner: '',
      revisions: [],
    },
  });
  if (!result.good) throw new Error(JSON.stringify(result.problems));
  return { ...result, good: result.good };
}

const cases = templates.flatMap(({ id }) =>
  (['iso', 'asme'] as const).flatMap((style) => (['mm', 'in'] as const).map((unit) => ({ id, style, unit }))),
);

describe.each(cases)('$id, $style, $unit', ({ id, style, unit }) => {
  const result = draw(id, style, unit);
  const root = svgTree(result.good.svg);

  it('writes JSON that keeps the published schema', () => {
    const outcome = drawResult.safeParse(JSON.parse(JSON.stringify(drawResultOf(result))));
    expect(outcome.error?.issues ?? []).toEqual([]);
  });

  it('writes an SVG that keeps the published schema', () => {
    expect(svgFaults(root)).toEqual([]);
  });

  it('shows every size once on the sheet, under the id the JSON names', () => {
    const onSheet = groups(root, 'dimension').map(({ attributes }) => attributes['data-id']);
    expect([...onSheet].sort()).toEqual(
      drawResultOf(result)
        .sizes.map((size) => size.id)
        .sort(),
    );
  });

  it('names the views of the JSON and no others', () => {
    const onSheet = groups(root, 'view').map(({ attributes }) => attributes['data-view']);
    expect(onSheet.sort()).toEqual([...drawResultOf(result).sheet.views].sort());
  });

  it('carries for each figure the nominal value of its size', () => {
    const nominal = new Map(drawResultOf(result).sizes.map((size) => [size.id, size.nominal]));
    for (const { attributes } of groups(root, 'dimension')) {
      if (attributes['data-value'] === undefined) continue;
      expect(Number(attributes['data-value'])).toBeCloseTo(
        nominal.get(attributes['data-id'] ?? '') ?? NaN,
        3,
      );
    }
  });
});

function groups(element: SvgElement, role: string): SvgElement[] {
  const own = element.tag === 'g' && element.attributes['data-role'] === role ? [element] : [];
  return [...own, ...element.children.flatMap((child) => groups(child, role))];
}
