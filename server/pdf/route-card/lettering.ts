import type { LineMark, Mark, PolylineMark, TextMark } from '../../../shared/drawing/sheet';
import { DIAMETER_ROOM, diameterSymbol } from '../../../shared/drawing/symbols/diameter';
import { FONT, GLYPH, LETTER } from './measures';

/** Air after a drawn diameter sign (mm). */
const SIGN_AIR = 0.5;
const SIGN = DIAMETER_ROOM * LETTER + SIGN_AIR;

export interface Hand {
  weight?: TextMark['weight'];
  anchor?: 'start' | 'end';
}

/** Text on a baseline, with each `Ø` drawn as the sign: the lettered one is misread beside a slashed nought. */
export function lettering(x: number, y: number, text: string, hand: Hand = {}): Mark[] {
  const pieces = text.split(/(Ø)/).filter((piece) => piece !== '');
  const width = pieces.reduce((sum, piece) => sum + widthOf(piece), 0);
  let at = hand.anchor === 'end' ? x - width : x;
  return pieces.map((piece): Mark => {
    const start = at;
    at += widthOf(piece);
    if (piece === 'Ø') return diameterSymbol(start, y, LETTER, undefined);
    return { type: 'text', x: start, y, size: FONT, anchor: 'start', weight: hand.weight, text: piece };
  });
}

function widthOf(piece: string): number {
  return piece === 'Ø' ? SIGN : [...piece].length * GLYPH;
}

export function rule(x1: number, y1: number, x2: number, y2: number, wide = false): LineMark {
  return { type: 'line', line: wide ? 'visible' : 'table', x1, y1, x2, y2 };
}

export function box(x0: number, y0: number, x1: number, y1: number, wide = false): PolylineMark {
  const points = [
    { x: x0, y: y0 },
    { x: x1, y: y0 },
    { x: x1, y: y1 },
    { x: x0, y: y1 },
  ];
  return { type: 'polyline', line: wide ? 'visible' : 'table', points, closed: true };
}

/** An empty square to tick, standing on the baseline. */
export function tickBox(x: number, y: number): PolylineMark {
  return box(x, y - 2.7, x + 3, y + 0.3);
}
