import { MAX_TYPED_LENGTH, plainCharacters } from '../../units/parsed';
import type { Hand } from './thread-spec';

export { MAX_TYPED_LENGTH };

/** A designation parted from its hand: `M20x1.5 LH` -> `M20x1.5`, left. */
export interface HandedText {
  text: string;
  hand: Hand;
}

/** Brings a typed designation to plain characters, with a small x between diameter and pitch, and takes the hand off its end. */
export function readHand(given: string): HandedText {
  const plain = plainCharacters(given)
    .replace(/[\u00d7*]/g, 'x')
    .replace(/[\u2010-\u2015\u2212]/g, '-');
  const found =
    /^(.*?)[ -]*\b(LH|RH|left(?: hand)?|right(?: hand)?)\.?$/i.exec(plain) ?? /^(.*\d)(LH|RH)$/i.exec(plain);
  if (!found) return { text: plain, hand: 'right' };
  return { text: (found[1] ?? '').trim(), hand: /^l/i.test(found[2] ?? '') ? 'left' : 'right' };
}

/** Names the sizes beside one that is not in a series: `The neighbours are M12 and M14`. */
export function nameNeighbours(value: number, sizes: readonly { size: number; name: string }[]): string {
  const below = [...sizes].reverse().find((s) => s.size < value);
  const above = sizes.find((s) => s.size > value);
  if (below && above) return `The neighbours are ${below.name} and ${above.name}.`;
  return below ? `The largest is ${below.name}.` : `The smallest is ${above?.name ?? ''}.`;
}

/** Plain listing: `1.25, 1 and 0.75`, or with `or` where one is to be picked. */
export function listOf(items: readonly (string | number)[], joint: 'and' | 'or' = 'and'): string {
  if (items.length <= 1) return items.join('');
  return `${items.slice(0, -1).join(', ')} ${joint} ${items[items.length - 1]}`;
}
