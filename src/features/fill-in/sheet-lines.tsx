import { useState } from 'react';
import { Button, ButtonLink } from '../../components/button';
import { SpeakingLine, StandingCaution } from '../../components/lines';
import { countOf, verdictWords } from '../../components/verdict';
import { paths } from '../../lib/paths';
import { labelOf } from '../../revision/labels';
import { useOpenRevision } from '../../revision/open-revision';
import { CHECKED_WORDS } from './checked-words';

const RULES = Object.values(CHECKED_WORDS);

/** What the sheet check and the register say, and the caution that always stands. */
export function SheetLines() {
  const { good, problems, template, address } = useOpenRevision();
  const [open, setOpen] = useState(false);
  const { shop, drawing, revision } = address;
  const findings = good?.findings ?? [];
  const first = problems[0];
  const verdict = good ? verdictWords(good.capacity) : null;
  return (
    <div className="sheet-lines">
      <SpeakingLine
        head="Sheet check"
        live
        act={
          good && (
            <Button size="dense" aria-expanded={open} aria-controls="checked" onClick={() => setOpen(!open)}>
              {findings.length > 0 ? 'What was found' : 'What was checked'}
            </Button>
          )
        }
      >
        {good &&
          (findings.length === 0 ? (
            `Clean, ${RULES.length} rules. `
          ) : (
            <b className="is-no">{findings.length} found. </b>
          ))}
        {first && (
          <span className="is-wrong-text">
            {labelOf(template, first.path)} {good ? 'stands at its last good figure.' : 'is wrong.'}
          </span>
        )}
        {!good && !first && 'No sheet yet.'}
      </SpeakingLine>
      {open && good && (
        <div id="checked" className="checked">
          {findings.length > 0 && (
            <ul className="plain-list is-wrong-text">
              {findings.map((finding, index) => (
                <li key={index}>{finding.message}</li>
              ))}
            </ul>
          )}
          <p className="soft">The sheet is checked as a drawing office checks it:</p>
          <ul className="plain-list">
            {RULES.map((words) => (
              <li key={words}>{words}</li>
            ))}
          </ul>
        </div>
      )}
      <SpeakingLine
        head="Can we make it?"
        live
        act={
          good && (
            <ButtonLink size="dense" to={paths.revision(shop, drawing, revision, 'capacity')}>
              {countOf(good.capacity.needs.length, 'need')}
            </ButtonLink>
          )
        }
      >
        {verdict ? (
          <>
            <b className={`is-${verdict.state}`}>{verdict.word}</b> {verdict.more}
          </>
        ) : (
          'Judged when there is a sheet.'
        )}
      </SpeakingLine>
      <StandingCaution />
    </div>
  );
}
