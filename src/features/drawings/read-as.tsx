import { Button } from '../../components/button';
import type { ReadLine } from './search-line';

/** Says how the search line was read, so that nobody wonders why something is missing. */
export function ReadAs({ reading, onClear }: { reading: ReadLine; onClear?: () => void }) {
  if (reading.read.length === 0 && reading.unread.length === 0 && !onClear) return null;
  return (
    <div className="read-as" aria-live="polite">
      {reading.read.length > 0 && <span className="aside">read as</span>}
      {reading.read.map((term, index) => (
        <span key={index} className="term">
          {term.what} <b>{term.as}</b>
        </span>
      ))}
      {reading.unread.map((sentence) => (
        <span key={sentence} className="term is-unread">
          {sentence}
        </span>
      ))}
      {onClear && (
        <Button size="dense" onClick={onClear}>
          Clear the search
        </Button>
      )}
    </div>
  );
}
