import { describe, expect, it } from 'vitest';
import { svgTree } from './svg-tree';
import { svgFaults } from '../../../shared/api/svg-contract';

const sound = (inside: string) =>
  `<svg xmlns="http://www.w3.org/2000/svg" width="297mm" height="210mm" viewBox="0 0 297 210" data-sheet="A4" data-style="iso" data-unit="mm" data-scale="0.5">${inside}</svg>`;
const stroke = 'class="visible" data-line="visible" stroke="#000000" stroke-width="0.5" fill="none"';

describe('svgFaults', () => {
  it('finds nothing in a sound document', () => {
    expect(
      svgFaults(svgTree(sound(`<g data-role="frame"><line x1="0" y1="0" x2="1" y2="0" ${stroke}/></g>`))),
    ).toEqual([]);
  });

  it.each([
    ['an element outside the contract', '<rect width="1" height="1"/>', /<rect> is not in the contract/],
    [
      'a transform on a stroke',
      `<line x1="0" y1="0" x2="1" y2="0" transform="scale(2)" ${stroke}/>`,
      /only a text may be turned/,
    ],
    [
      'a stroke without its line type',
      '<line x1="0" y1="0" x2="1" y2="0" class="a" stroke="#000000" stroke-width="1" fill="none"/>',
      /data-line/,
    ],
    [
      'a text in runs',
      '<text x="1" y="1" font-size="3.5" text-anchor="start" fill="#000000" class="t"><tspan>a</tspan></text>',
      /one run/,
    ],
    [
      'a size inside a view',
      '<g data-role="view" data-view="axis" data-scale="1"><g data-role="dimension" data-id="a" data-for-view="axis" data-kind="length" data-reference="false"/></g>',
      /inside a view/,
    ],
    ['a relative path', `<path d="m 0 0 l 1 1" ${stroke}/>`, /d:/],
    [
      'a colour by name',
      '<line x1="0" y1="0" x2="1" y2="0" class="a" data-line="visible" stroke="black" stroke-width="1" fill="none"/>',
      /stroke/,
    ],
  ])('finds %s', (_name, inside, expected) => {
    expect(svgFaults(svgTree(sound(inside))).join('\n')).toMatch(expected);
  });
});
