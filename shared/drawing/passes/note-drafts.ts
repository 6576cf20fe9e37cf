/** Leaders for what is not read across or along: chamfers, crowns, tapers, and flats where no end view shows them. */
import type { AxisPaper, ReadySize } from '../layout';
import { reachWithin } from '../layout';
import type { Point } from '../sheet';
import { toPaper } from '../x-map';
import type { Drafts } from './candidate';
import { leaderDrafts } from './leader-drafts';

const CORNER_COST = 1.5;

interface Tip extends Point {
  cost: number;
}

/** Where on the upper outline a leader of this size may end, best first. */
function tipsOf(paper: AxisPaper, ready: ReadySize): { tips: Tip[]; lean: -1 | 0 | 1 } {
  const { anchor } = ready.size;
  const { knots } = paper.map;
  const edge = (x: number): number => -reachWithin(paper.top, x - 0.001, x + 0.001);
  switch (anchor.kind) {
    case 'corner': {
      const x = toPaper(knots, anchor.x);
      return { tips: [{ x, y: edge(x), cost: 0 }], lean: anchor.end === 'left' ? -1 : 1 };
    }
    case 'arc': {
      const a = toPaper(knots, Math.min(anchor.from, anchor.to));
      const b = toPaper(knots, Math.max(anchor.from, anchor.to));
      const outer = anchor.end === 'left' ? a : b;
      const inner = anchor.end === 'left' ? b : a;
      const tips = [0.35, 0.2, 0.5].map((t, i) => {
        const x = inner + (outer - inner) * t;
        return { x, y: edge(x), cost: i * 0.2 };
      });
      return { tips, lean: anchor.end === 'left' ? -1 : 1 };
    }
    case 'slope':
    case 'span':
    case 'across':
    case 'flats': {
      const a = toPaper(knots, anchor.from);
      const b = toPaper(knots, anchor.to);
      return {
        tips: [0.5, 0.25, 0.75].map((t, i) => {
          const x = a + (b - a) * t;
          return { x, y: edge(x), cost: i * 0.4 };
        }),
        lean: 0,
      };
    }
  }
}

/** Every leader of a note-like size. */
export function noteDrafts(paper: AxisPaper, ready: ReadySize, dense: boolean): Drafts {
  const { tips, lean } = tipsOf(paper, ready);
  return {
    first: tips.flatMap((tip) =>
      leaderDrafts(paper, ready.label, tip, { cost: CORNER_COST + tip.cost, lean, dense }),
    ),
  };
}
