import type { Part } from '../part/part';
import { lengthsCompleteness } from './completeness-lengths';
import { rankCompleteness } from './completeness-rank';
import type { Completeness, Size } from './scheme';

/** Whether the sizes say the part completely and once; names what is missing in words and what is twice by id. */
export function completenessOf(part: Part, sizes: readonly Size[]): Completeness {
  const lengths = lengthsCompleteness(part, sizes);
  const others = rankCompleteness(part, sizes);
  return {
    missing: [...lengths.missing, ...others.missing],
    redundant: [...lengths.redundant, ...others.redundant],
  };
}
