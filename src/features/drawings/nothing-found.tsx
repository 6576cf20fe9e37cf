import { Button } from '../../components/button';
import type { ReadLine } from './search-line';

/** Nothing found: says which terms there are to drop. */
export function NothingFound({ reading, onClear }: { reading: ReadLine; onClear: () => void }) {
  const narrow = reading.read.filter(({ what }) => what !== 'words' && what !== 'word');
  const drop = narrow.at(-1);
  return (
    <div className="plate nothing">
      <p>
        <strong>No drawing is like that.</strong>{' '}
        {drop
          ? `Leave out the ${drop.what} (${drop.as}) first: it shuts out the most.`
          : 'Try fewer words, another spelling, or tick more states.'}
      </p>
      <Button onClick={onClear}>Show all drawings</Button>
    </div>
  );
}
