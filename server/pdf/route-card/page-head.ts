import type { Mark } from '../../../shared/drawing/sheet';
import type { Route } from '../../../shared/route/route';
import { box, lettering, rule, tickBox } from './lettering';
import { BASELINE, GLYPH, LINE, PAGE } from './measures';
import type { Block } from './setup-block';
import { charactersOf, wrap } from './wrap';

export interface HeadFacts {
  number: string;
  letter: string;
  title: string;
  bar: string;
  state: string;
}

const TITLE_HEIGHT = 2 * LINE + 1.6;

/** The card's own title block: what it belongs to, from which bar, in which state, and which card of how many. */
export function titleStrip(facts: HeadFacts, card: string): Block {
  const cells: readonly (readonly [string, string, number])[] = [
    ['', 'ROUTE CARD', 24],
    ['drawing', `${facts.number} ${facts.letter}`, 30],
    ['title', facts.title, 84],
    ['bar', facts.bar, 54],
    ['state', facts.state, 55],
    ['card', card, 24],
  ];
  return {
    height: TITLE_HEIGHT,
    marks: (y) => {
      let x: number = PAGE.left;
      const marks: Mark[] = [];
      for (const [label, value, width] of cells) {
        const room = Math.floor((width - 2) / GLYPH);
        const lines = label === '' ? [] : lettering(x + 1.5, y + 0.6 + BASELINE, label);
        const baseline = y + 0.6 + BASELINE + (label === '' ? LINE / 2 : LINE);
        marks.push(...lines, ...lettering(x + 1.5, baseline, shortened(value, room), { weight: 700 }));
        if (x > PAGE.left) marks.push(rule(x, y, x, y + TITLE_HEIGHT));
        x += width;
      }
      return [...marks, box(PAGE.left, y, PAGE.right, y + TITLE_HEIGHT, true)];
    },
  };
}

/** Everything to pull before starting, each with a box to tick and the place it lives. */
export function kittingStrip(kitting: Route['kitting']): Block {
  const room = Math.floor((PAGE.right - PAGE.left - 4) / GLYPH);
  const lines: string[][] = [[]];
  let used = PULL.length + 1;
  for (const { text, place } of kitting) {
    const item = shortened(place === '' ? text : `${text}, ${place}`, room - 4);
    const width = charactersOf(item) + 4;
    if (used + width > room) {
      lines.push([]);
      used = 0;
    }
    lines.at(-1)?.push(item);
    used += width;
  }
  const height = lines.length * LINE + 1.6;
  return {
    height,
    marks: (y) => [
      ...lines.flatMap((items, line) => itemMarks(items, line, y + 0.8 + BASELINE + line * LINE)),
      box(PAGE.left, y, PAGE.right, y + height, true),
    ],
  };
}

const PULL = 'PULL FIRST';

function itemMarks(items: readonly string[], line: number, baseline: number): Mark[] {
  let x = PAGE.left + 1.5;
  const marks: Mark[] = line === 0 ? lettering(x, baseline, PULL, { weight: 800 }) : [];
  if (line === 0) x += (PULL.length + 1) * GLYPH;
  for (const item of items) {
    marks.push(tickBox(x, baseline), ...lettering(x + 2 * GLYPH, baseline, item));
    x += (charactersOf(item) + 4) * GLYPH;
  }
  return marks;
}

function shortened(text: string, room: number): string {
  const [first = '', ...more] = wrap(text, room);
  if (more.length === 0) return first;
  return `${first.slice(0, room - 1).trimEnd()}…`;
}
