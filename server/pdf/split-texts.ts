import { ADVANCE } from '../../shared/drawing/text-metrics';
import type { Subset } from './faces';
import { subsetOf } from './faces';

const TEXT = /<text ([^>]*)>([^<]*)<\/text>/g;
/** Entities the sheet's writer uses. */
const ENTITIES: Readonly<Record<string, string>> = { '&amp;': '&', '&lt;': '<', '&gt;': '>', '&quot;': '"' };

interface Run {
  subset: Subset;
  /** Characters before it. */
  from: number;
  /** As written in the SVG, one entry a character. */
  written: string[];
}

/**
 * The sheet's SVG with each text cut into runs that one file of the face can letter, named by `font-family`. Every glyph
 * takes the same room, so a run begins exactly where its first character stood, whatever the anchor and the turn. What
 * no file has stays in the first one and prints as its empty box. A text in plain Latin stays as it is.
 */
export function splitTexts(svg: string): string {
  return svg.replace(TEXT, (whole, attributes: string, content: string) => {
    const written = content.match(/&[a-z]+;|[^]/gu) ?? [];
    const runs = runsOf(written);
    if (runs.every((run) => run.subset === 'latin')) return whole;
    return runs
      .map(
        (run) =>
          `<text ${placed(attributes, run, written.length)} font-family="${run.subset}">${run.written.join('')}</text>`,
      )
      .join('');
  });
}

function runsOf(written: readonly string[]): Run[] {
  const runs: Run[] = [];
  written.forEach((character, from) => {
    const last = runs.at(-1);
    // A space has no ink: it stays with what stands before it.
    const subset =
      character === ' ' && last ? last.subset : (subsetOf(ENTITIES[character] ?? character) ?? 'latin');
    if (last?.subset === subset) last.written.push(character);
    else runs.push({ subset, from, written: [character] });
  });
  return runs;
}

/** The attributes of a text for one of its runs: where that begins, along the text. A turn stays about the text's own point. */
function placed(attributes: string, { from }: Run, characters: number): string {
  const figure = (name: string) => Number(new RegExp(`(?:^| )${name}="([^"]*)"`).exec(attributes)?.[1]);
  const anchor = /text-anchor="([^"]*)"/.exec(attributes)?.[1];
  const glyph = ADVANCE * figure('font-size');
  const before = anchor === 'middle' ? characters / 2 : anchor === 'end' ? characters : 0;
  const x = figure('x') + (from - before) * glyph;
  return attributes
    .replace(/(^| )x="[^"]*"/, `$1x="${x.toFixed(4)}"`)
    .replace(/text-anchor="[^"]*"/, 'text-anchor="start"');
}
