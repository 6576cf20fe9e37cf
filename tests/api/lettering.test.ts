import { describe, expect, it } from 'vitest';
import { subsetOf } from '../../server/pdf/faces';
import { sheetPdf } from '../../server/pdf/sheet-pdf';
import { splitTexts } from '../../server/pdf/split-texts';
import { isInRepertoire } from '../../shared/template/repertoire';
import { readPdf } from '../factories/pdf';

/** Letters of four files of the face, with spaces between, and characters that are entities in an SVG. */
const TITLE = 'Łódź <żółw> Ωμέγα & Шлюз';
const SIZE = 12;
const GLYPH = 0.6 * SIZE;
const DOTS_PER_MM = 100 / 25.4;

function svgOf(text: string): string {
  return `<svg xmlns="http://www.w3.org/2000/svg" width="297mm" height="210mm" viewBox="0 0 297 210" font-family="JetBrains Mono, monospace">${text}</svg>`;
}

function written(text: string, place: string): string {
  const escaped = text.replace(/&/g, '&amp;').replace(/</g, '&lt;').replace(/>/g, '&gt;');
  return `<text ${place} font-size="${SIZE}" class="ink text" stroke="none" fill="#000000" xml:space="preserve">${escaped}</text>`;
}

/** Dark dots in each character's own cell of a text that runs from (x, y) to the right, or upwards. */
async function inkOfCells(
  text: string,
  place: string,
  x: number,
  y: number,
  upwards = false,
): Promise<number[]> {
  const pdf = await sheetPdf([svgOf(written(text, place))], { title: 'lettering' });
  const [page] = (await readPdf(Buffer.from(pdf))).pages;
  if (!page) throw new Error('no page');
  return [...text].map((_, index) => {
    const along = [index * GLYPH, (index + 1) * GLYPH] as const;
    const across = [-SIZE, 0.3 * SIZE] as const;
    let ink = 0;
    for (let a = along[0] + 0.2; a < along[1] - 0.2; a += 1 / DOTS_PER_MM) {
      for (let b = across[0]; b < across[1]; b += 1 / DOTS_PER_MM) {
        const at = upwards ? [x + b, y - a] : [x + a, y + b];
        if (
          page.dots.at(Math.round((at[0] ?? 0) * DOTS_PER_MM), Math.round((at[1] ?? 0) * DOTS_PER_MM)) < 128
        )
          ink += 1;
      }
    }
    return ink;
  });
}

describe('lettering on paper', () => {
  const width = [...TITLE].length * GLYPH;
  it.each([
    ['from its start', 'x="40" y="60" text-anchor="start"', 40, 60, false],
    ['about its middle', `x="${40 + width / 2}" y="60" text-anchor="middle"`, 40, 60, false],
    ['up to its end', `x="${40 + width}" y="60" text-anchor="end"`, 40, 60, false],
    ['upwards', 'x="100" y="195" text-anchor="start" transform="rotate(-90 100 195)"', 100, 195, true],
    [
      'upwards about its middle',
      `x="100" y="${195 - width / 2}" text-anchor="middle" transform="rotate(-90 100 ${195 - width / 2})"`,
      100,
      195,
      true,
    ],
  ] as const)(
    'has ink in the cell of every letter, of whatever alphabet, and none in a space: written %s',
    async (_name, place, x, y, upwards) => {
      const cells = await inkOfCells(TITLE, place, x, y, upwards);
      [...TITLE].forEach((letter, index) => {
        if (letter === ' ') expect(cells[index], `space ${index}`).toBe(0);
        else expect(cells[index], letter).toBeGreaterThan(25);
      });
    },
  );

  it('shows each letter as itself, not as the box that stands for none', async () => {
    const place = 'x="40" y="60" text-anchor="start"';
    const [box = 0] = await inkOfCells('名', place, 40, 60);
    expect(box).toBeGreaterThan(25);
    const letters = await inkOfCells('żШΩ', place, 40, 60);
    expect(new Set([box, ...letters]).size).toBe(4);
  });

  it('leaves a text alone that one file letters, and cuts others where the file changes', () => {
    const plain = svgOf(written('Shaft Ø12 ±0.1', 'x="1" y="2" text-anchor="middle"'));
    expect(splitTexts(plain)).toBe(plain);
    const parts = [
      ...splitTexts(written('aж<b', 'x="10" y="2" text-anchor="end"')).matchAll(
        / ?x="([^"]*)".*?font-family="([^"]*)">([^<]*)</g,
      ),
    ];
    const starts = [4, 3, 2].map((left) => (10 - left * GLYPH).toFixed(4));
    expect(parts.map(([, x, family, text]) => [x, family, text])).toEqual([
      [starts[0], 'latin', 'a'],
      [starts[1], 'cyrillic', 'ж'],
      [starts[2], 'latin', '&lt;b'],
    ]);
  });

  it('has a glyph for every character that a field lets through', () => {
    const through = Array.from({ length: 0x1_0000 }, (_, code) => String.fromCharCode(code)).filter(
      isInRepertoire,
    );
    expect(through.length).toBeGreaterThan(500);
    expect(through.filter((character) => subsetOf(character) === undefined)).toEqual([]);
  });
});
