import type { Box } from './geometry/box';
import type { TextMark } from './sheet';

/** JetBrains Mono: every glyph this wide, in em. Source: the face's own metrics (600 of 1000 units). */
export const ADVANCE = 0.6;
/** Top of a line's box above the baseline, in em. */
export const ASCENT = 0.85;
/** Bottom of a line's box below the baseline, in em. */
export const DESCENT = 0.22;
/** Height of a capital, in em (730 of 1000 units). */
export const CAP_HEIGHT = 0.73;

const ACCENTED_CAPITAL = /[\u00c0-\u00d6\u00d8-\u00de]/;

/** Font size (mm) whose capitals are `letterHeight` mm high, to the thousandth the sheet prints. */
export function fontSizeFor(letterHeight: number): number {
  return Math.ceil((letterHeight / CAP_HEIGHT) * 1000) / 1000;
}

/** Width in mm of one run. */
export function textWidth(text: string, size: number): number {
  return ADVANCE * size * [...text].length;
}

/** The box of a text on paper: the one function layout, check and writer go by. */
export function textBox(mark: TextMark): Box {
  const width = textWidth(mark.text, mark.size);
  const back = mark.anchor === 'start' ? 0 : mark.anchor === 'middle' ? width / 2 : width;
  const up = (ACCENTED_CAPITAL.test(mark.text) && !mark.text.includes('Ø') ? 1 : ASCENT) * mark.size;
  const down = DESCENT * mark.size;
  if (mark.rotate === -90) return [mark.x - up, mark.y - width + back, mark.x + down, mark.y + back];
  return [mark.x - back, mark.y - up, mark.x - back + width, mark.y + down];
}
