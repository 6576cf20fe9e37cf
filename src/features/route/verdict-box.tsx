import { Link } from 'react-router-dom';
import type { Capacity } from '../../../shared/route/route';
import { countOf, verdictWords } from '../../components/verdict';
import { NeedFacts } from './need-facts';

/** The verdict, and each need that is not simply held with what would help. */
export function VerdictBox({ capacity, allAt }: { capacity: Capacity; allAt?: string }) {
  const { word, state } = verdictWords(capacity);
  const held = capacity.needs.filter((need) => need.state === 'held').length;
  const open = capacity.needs.filter((need) => need.state !== 'held');
  return (
    <section className="verdict-box" data-state={state} aria-label="Can we make it?">
      <header>
        <h2 className="engraved">Can we make it?</h2>
        <p className={`is-${state}`}>{word}</p>
        <p className="aside">
          {held} of {countOf(capacity.needs.length, 'need')} held
          {open.length > 0 && `, ${open.length} not simply held`}.
        </p>
      </header>
      {open.map((need, index) => (
        <NeedFacts key={index} need={need} />
      ))}
      {allAt && (
        <footer>
          <Link to={allAt} className="button plain dense">
            All {countOf(capacity.needs.length, 'need')}
          </Link>
        </footer>
      )}
    </section>
  );
}
