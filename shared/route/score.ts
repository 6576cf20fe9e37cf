/** What can be told of a plan before its minutes and needs are worked out; less is better everywhere. */
export interface Outline {
  /** Holdings in which long work hangs on a short grip. */
  rocks: number;
  /** A setting that only pulls the same bar further out counts half. */
  setups: number;
  /** Rows cut behind a collar and heavy parting: slow and fiddly, so each as good as a set-up. */
  awkward: number;
  /** Fits turned in different holdings, which then run true only as well as they were indicated. */
  apart: number;
}

/** What a plan is judged by: shorts first, then its outline, then makeshifts, minutes and metal. */
export interface Score extends Outline {
  shorts: number;
  alternatives: number;
  minutes: number;
  /** mm³ */
  blank: number;
}

export function compareOutlines(a: Outline, b: Outline): number {
  return a.rocks - b.rocks || a.setups + a.awkward - (b.setups + b.awkward) || a.apart - b.apart;
}

/** Negative where the first plan is better. Whole numbers first, then minutes and metal to a cubic centimetre. */
export function compareScores(a: Score, b: Score): number {
  return (
    a.shorts - b.shorts ||
    compareOutlines(a, b) ||
    a.alternatives - b.alternatives ||
    Math.round(a.minutes * 1e4) - Math.round(b.minutes * 1e4) ||
    Math.round(a.blank / 1000) - Math.round(b.blank / 1000)
  );
}

/** What stands against the loser, in words. */
export function whyWorse(best: Score, loser: Score): string {
  if (loser.shorts > best.shorts) return `${loser.shorts - best.shorts} more that the shop has not`;
  const outline = whyOutlineWorse(best, loser);
  if (outline) return outline;
  if (loser.alternatives > best.alternatives) return 'leans on more makeshifts';
  if (loser.minutes > best.minutes + 0.05)
    return `${Math.round((loser.minutes - best.minutes) * 10) / 10} min longer`;
  return 'uses more metal, or is as good';
}

/** Null where the outline of the loser is no worse. */
export function whyOutlineWorse(best: Outline, loser: Outline): string | null {
  if (loser.rocks > best.rocks) return 'long work would hang on a short grip';
  if (loser.setups + loser.awkward > best.setups + best.awkward) {
    if (loser.awkward > best.awkward) return 'more is cut behind collars, or parted where it is thick';
    return `${Math.ceil(loser.setups)} settings instead of ${Math.ceil(best.setups)}`;
  }
  return loser.apart > best.apart ? 'fits that belong together would be turned in different settings' : null;
}
