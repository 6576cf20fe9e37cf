import { describe, expect, it } from 'vitest';
import { svgFaults } from '../../../shared/api/svg-contract';
import { pairPicture, profilePicture } from '../../../shared/drawing/picture';
import { renderPicture, renderSvg } from '../../../shared/render/svg';
import { TAPERED_HANDLE_EXAMPLES } from '../../../templates/tapered-handle-examples';
import { sheetOf } from '../../corpus/sheet-of';
import { svgTree } from '../contract/svg-tree';

const typed = TAPERED_HANDLE_EXAMPLES[0].values;
const drawn = sheetOf('tapered-handle', typed, { style: 'iso', unit: 'mm' });

describe('the SVG of a sheet', () => {
  it('keeps the contract, element by element', () => {
    expect(svgFaults(svgTree(renderSvg(drawn.sheet)))).toEqual([]);
  });

  it('is true to size, in millimetres of paper', () => {
    const root = svgTree(renderSvg(drawn.sheet));
    expect(root.attributes['width']).toBe('297mm');
    expect(root.attributes['viewBox']).toBe('0 0 297 210');
    expect(root.attributes['data-scale']).toBe(String(drawn.sheet.scale));
  });

  it('names each size once, with its kind and value, beside the views', () => {
    const groups = svgTree(renderSvg(drawn.sheet)).children.filter(
      (g) => g.attributes['data-role'] === 'dimension',
    );
    expect(groups.map((g) => g.attributes['data-id']).sort()).toEqual(
      drawn.scheme.sizes.map((s) => s.id).sort(),
    );
    const taper = groups.find((g) => g.attributes['data-id'] === 'taperLength');
    expect(taper?.attributes).toMatchObject({
      'data-kind': 'length',
      'data-value': '95',
      'data-for-view': 'axis',
      'data-reference': 'false',
    });
  });

  it('writes no figure with more than three decimals', () => {
    const text = renderSvg(drawn.sheet).replace(/data-value="[^"]*"/g, '');
    expect(text.match(/\d\.\d{4,}/g)).toBeNull();
  });

  it('escapes what a person typed', () => {
    const title = 'A--B -> <b>&"';
    const sheet = sheetOf('tapered-handle', typed, {
      style: 'iso',
      unit: 'mm',
      options: { titleBlock: { ...drawnTitle(), title } },
    }).sheet;
    expect(renderSvg(sheet)).toContain('A--B -&gt; &lt;b&gt;&amp;&quot;');
    expect(svgFaults(svgTree(renderSvg(sheet)))).toEqual([]);
  });

  it('refuses a place that is no number', () => {
    const groups = [
      {
        role: 'notes' as const,
        marks: [{ type: 'line' as const, line: 'thin' as const, x1: NaN, y1: 0, x2: 1, y2: 1 }],
      },
    ];
    expect(() => renderSvg({ ...drawn.sheet, groups })).toThrow(RangeError);
  });
});

function drawnTitle() {
  return {
    title: '',
    number: 'PN-0001',
    revision: 'A',
    sheetOf: '1 of 1',
    materialText: '',
    stockText: '',
    mass: '',
    generalTolerance: '',
    texture: '',
    finish: '',
    quantity: '',
    drawn: null,
    checked: null,
    state: 'DRAFT',
    owner: '',
    revisions: [],
  };
}

describe('small profiles', () => {
  const { body, length } = drawn.part;

  it('draws a part for a list', () => {
    const root = svgTree(renderPicture(profilePicture(body)));
    expect(root.attributes['viewBox']).toBe('0 0 150 48');
    expect(root.children.map((g) => g.attributes['class'])).toEqual(['metal', 'axis']);
  });

  it('shows before over after with what was cut heavy and the grip in jaws', () => {
    const bar = {
      ...body,
      outer: [{ kind: 'line' as const, from: -30, to: length + 2, start: 12.5, end: 12.5 }],
      x0: -30,
      x1: length + 2,
      cuts: [],
      treatments: [],
    };
    const picture = pairPicture(bar, body, {
      gripFrom: -30,
      gripTo: -5,
      freeEnd: 'right',
      support: 'centre',
    });
    const classes = picture.parts.map((p) => p.class);
    expect(classes.filter((c) => c === 'metal')).toHaveLength(2);
    expect(classes).toContain('cut');
    expect(classes).toContain('held');
    expect(classes.filter((c) => c === 'centre')).toHaveLength(2);
  });

  it('turns the work round when its left end is free, so that the headstock stays on the left', () => {
    const grip = { gripFrom: length - 40, gripTo: length };
    const turned = pairPicture(body, body, { ...grip, freeEnd: 'left' });
    const held = turned.parts.find((p) => p.class === 'held')?.marks[0];
    const middle = turned.width / 2;
    expect(held?.type === 'polyline' && held.points.every((p) => p.x < middle)).toBe(true);
  });
});
