import type { RevisionSummary } from '../../shared/api/drawings';
import type { Revision } from '../models/revision';

type Summed = Pick<
  Revision,
  'id' | 'letter' | 'state' | 'trial' | 'returned' | 'version' | 'changedAt' | 'change'
>;

export function presentSummary(revision: Summed): RevisionSummary {
  const { id, letter, state, trial, returned, version, change } = revision;
  return { id, letter, state, trial, returned, version, changedAt: revision.changedAt.toISOString(), change };
}
