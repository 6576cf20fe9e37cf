import type { RevisionSummary } from '../../shared/api/drawings';
import { dayOf } from '../lib/dates';

type Stamped = Pick<RevisionSummary, 'state' | 'trial' | 'returned' | 'letter' | 'changedAt'>;

/** The word a revision's state is stamped with. */
export function stampWord({ state, trial, returned }: Pick<Stamped, 'state' | 'trial' | 'returned'>): string {
  if (state !== 'draft') return state;
  if (trial) return 'trial';
  return returned ? 'returned' : 'draft';
}

/** State as a stamp on paper: word first, border second, colour third. */
export function Stamp({
  revision,
  timeZone,
  short,
}: {
  revision: Stamped;
  timeZone?: string;
  short?: boolean;
}) {
  const word = stampWord(revision);
  return (
    <span className="stamp" data-state={word}>
      <b>{word}</b>
      <span>
        {short ? '' : 'rev '}
        {revision.letter}, {dayOf(revision.changedAt, timeZone)}
      </span>
    </span>
  );
}
