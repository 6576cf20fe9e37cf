import { clockOf } from '../lib/dates';
import type { Keeping } from '../revision/keeping';

interface KeptWordsProps {
  keeping: Keeping;
  timeZone: string;
  onAgain: () => void;
}

/** Says whether what is typed is kept, and where it is if not. */
export function KeptWords({ keeping, timeZone, onAgain }: KeptWordsProps) {
  return (
    <span className="kept" data-state={keeping.state} role="status">
      {words(keeping, timeZone)}
      {keeping.state === 'held' && (
        <>
          {' '}
          <button type="button" className="word" onClick={onAgain}>
            Try now
          </button>
        </>
      )}
    </span>
  );
}

function words(keeping: Keeping, timeZone: string): string {
  switch (keeping.state) {
    case 'kept':
      return keeping.at ? `kept ${clockOf(keeping.at, timeZone)}` : 'kept';
    case 'typed':
    case 'keeping':
      return 'keeping';
    case 'held':
      return keeping.why === 'away' ? 'not kept: no connection, held here' : `not kept: ${keeping.message}`;
    case 'stale':
      return 'not kept: somebody else changed it';
  }
}
