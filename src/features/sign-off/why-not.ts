import type { RevisionAnswer } from '../../../shared/api/drawings';

/** Why approving is not offered, from what the record itself tells; the rule stays on the server. */
export function whyNot({ revision, abilities }: RevisionAnswer): string {
  if (abilities['take-back'] === true && abilities['return'] !== true)
    return 'You worked on this revision, so somebody else must check it. You may take it back.';
  if (abilities['return'] === true)
    return 'You worked on this revision, so somebody else must approve it. You may still return it with reasons.';
  return `Checking is for a checker or the lead who did not work on it. It was last saved by ${revision.saved.name}.`;
}
