import type { Capacity } from '../../shared/route/route';

export interface VerdictWords {
  word: string;
  /** What follows the word: the count, or the first need that is not simply held. */
  more: string;
  state: 'yes' | 'other' | 'no';
}

/** The verdict as the shop says it. */
export function verdictWords({ verdict, needs }: Pick<Capacity, 'verdict' | 'needs'>): VerdictWords {
  const short = needs.filter(({ state }) => state === 'short');
  const other = needs.filter(({ state }) => state === 'alternative');
  if (verdict === 'can')
    return { word: 'Yes.', more: `${countOf(needs.length, 'need')} held.`, state: 'yes' };
  if (verdict === 'with-changes')
    return { word: 'Yes, by another way.', more: sentence(other[0] ?? short[0]), state: 'other' };
  return { word: 'No.', more: sentence(short[0]), state: 'no' };
}

function sentence(need: Capacity['needs'][number] | undefined): string {
  if (!need) return '';
  const why = need.why.trim() || need.need.trim();
  const whole = why.charAt(0).toUpperCase() + why.slice(1);
  return /[.!?]$/.test(whole) ? whole : `${whole}.`;
}

/** `1 need`, `31 needs`. */
export function countOf(count: number, noun: string): string {
  return `${count} ${noun}${count === 1 ? '' : 's'}`;
}
