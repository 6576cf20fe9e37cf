/** What a plan is judged by, in this order; less is better everywhere. */
export interface Score {
  shorts: number;
  /** Holdings in which long work hangs on a short grip. */
  rocks: number;
  setups: number;
  /** Rows cut behind a collar: slow and fiddly, so as good as half a set-up. */
  awkward: number;
  /** Fits turned in different holdings, which then run true only as well as they were indicated. */
  apart: number;
  alternatives: number;
  minutes: number;
  blank: number;
}

/** Negative where the first plan is better. Whole numbers first, then minutes to a tenth and metal to a cubic centimetre. */
export function compareScores(a: Score, b: Score): number {
  return (
    a.shorts - b.shorts ||
    a.rocks - b.rocks ||
    a.setups + a.awkward - (b.setups + b.awkward) ||
    a.apart - b.apart ||
    a.alternatives - b.alternatives ||
    Math.round(a.minutes * 10) - Math.round(b.minutes * 10) ||
    Math.round(a.blank / 1000) - Math.round(b.blank / 1000)
  );
}

/** What stands against the loser, in words. */
export function whyWorse(best: Score, loser: Score): string {
  if (loser.shorts > best.shorts) return `${loser.shorts - best.shorts} more that the shop has not`;
  if (loser.rocks > best.rocks) return 'long work would hang on a short grip';
  if (loser.setups + loser.awkward > best.setups + best.awkward)
    return loser.setups > best.setups ? `${Math.ceil(loser.setups)} settings instead of ${Math.ceil(best.setups)}` : 'more is cut behind collars';
  if (loser.apart > best.apart) return 'fits that belong together would be turned in different settings';
  if (loser.alternatives > best.alternatives) return 'leans on more makeshifts';
  if (loser.minutes > best.minutes + 0.05) return `${Math.round((loser.minutes - best.minutes) * 10) / 10} min longer`;
  return 'uses more metal, or is as good';
}
