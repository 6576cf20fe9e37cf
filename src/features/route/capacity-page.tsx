import type { Need } from '../../../shared/route/route';
import { Plate } from '../../components/plate';
import { Waiting } from '../../components/waiting';
import { verdictWords } from '../../components/verdict';
import { StandingCaution } from '../../components/lines';
import { useDocumentTitle } from '../../lib/document-title';
import { useOpenRevision } from '../../revision/open-revision';
import { NEED_WORDS, operationWords } from './need-facts';

const WORST_FIRST: readonly Need['state'][] = ['short', 'alternative', 'held'];

/** Every need of the route against the register, the worst first. */
export function CapacityPage() {
  const { good, answer, draft, drawing, engineFault } = useOpenRevision();
  useDocumentTitle(`Can we make it?, ${answer.revision.drawing.number} ${draft.title}`);
  if (!good)
    return (
      <main id="page" className="page" tabIndex={-1}>
        {drawing ? (
          <Waiting words="Judging it against the register" rows={10} />
        ) : (
          <p className="plate empty-words">{engineFault ?? 'It is judged when the sizes are right.'}</p>
        )}
      </main>
    );
  const { capacity, route } = good;
  const verdict = verdictWords(capacity);
  const lost = [
    ...new Map((route?.others ?? []).map((other) => [`${other.text} ${other.why}`, other])).values(),
  ];
  const groups = WORST_FIRST.map((state) => ({
    state,
    needs: capacity.needs.filter((need) => need.state === state),
  })).filter(({ needs }) => needs.length > 0);
  return (
    <main id="page" className="capacity-page" tabIndex={-1}>
      <section className="verdict-box" data-state={verdict.state} aria-label="Verdict">
        <header>
          <h2 className="engraved">Can we make it?</h2>
          <p className={`is-${verdict.state}`}>{verdict.word}</p>
          <p>{verdict.more}</p>
        </header>
      </section>
      {groups.map(({ state, needs }) => (
        <Plate key={state} head={headOf(state)} aside={needs.length}>
          <table className="ruled needs">
            <thead>
              <tr>
                <th scope="col">need</th>
                <th scope="col">for</th>
                <th scope="col">state</th>
                <th scope="col">why</th>
              </tr>
            </thead>
            <tbody>
              {needs.map((need, index) => (
                <tr key={index} data-state={need.state}>
                  <th scope="row">{need.need}</th>
                  <td>{operationWords(need.operation)}</td>
                  <td className="need-state">{NEED_WORDS[need.state]}</td>
                  <td>
                    {need.why}
                    {need.alternatives.map((alternative) => (
                      <span key={alternative} className="instead">
                        instead: {alternative}
                      </span>
                    ))}
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        </Plate>
      ))}
      {lost.length > 0 && (
        <Plate head="Ways not taken" aside={lost.length}>
          <table className="ruled needs not-taken">
            <tbody>
              {lost.map((other) => (
                <tr key={`${other.text} ${other.why}`}>
                  <th scope="row">{other.text}</th>
                  <td>{other.why}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </Plate>
      )}
      <StandingCaution />
    </main>
  );
}

function headOf(state: Need['state']): string {
  if (state === 'short') return 'Short';
  return state === 'alternative' ? 'Another way' : 'Held';
}
