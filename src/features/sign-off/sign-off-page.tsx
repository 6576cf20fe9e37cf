import { useMemo } from 'react';
import { DrawnPicture } from '../../components/drawn-picture';
import { SpeakingLine, StandingCaution, StopLine } from '../../components/lines';
import { SizeList } from '../../components/sheet/size-list';
import { verdictWords } from '../../components/verdict';
import { ButtonLink } from '../../components/button';
import { useDocumentTitle } from '../../lib/document-title';
import { api, paths } from '../../lib/paths';
import { useOpenRevision } from '../../revision/open-revision';
import { sheetSizes } from '../../revision/sheet-sizes';
import { Decide } from './decide';
import { Decisions, Revisions, Signatures } from './records';

/** The checker's desk: the sheet as it stands, what the checks say, what may be decided. */
export function SignOffPage() {
  const { answer, good, draft, address, template, problems } = useOpenRevision();
  const { revision } = answer;
  const { settings } = draft;
  useDocumentTitle(`Sign-off, ${revision.drawing.number} ${draft.title}`);
  const sizes = useMemo(
    () => (good ? sheetSizes(good.scheme, template, { unit: settings.unit, style: settings.style }) : []),
    [good, template, settings.unit, settings.style],
  );
  const verdict = good ? verdictWords(good.capacity) : null;
  const { shop, drawing, revision: id } = address;
  return (
    <main id="page" className="sign-off" tabIndex={-1}>
      <div className="sign-off-sheet">
        <div className="sheet-bar">
          <span className="soft">
            {revision.state === 'draft' ? 'The sheet as it is typed now.' : 'The sheet as it was stored.'}
          </span>
          <span className="bar-group">
            <ButtonLink size="dense" to={paths.printSheet(shop, drawing, id)}>
              Print
            </ButtonLink>
            {revision.result && (
              <>
                <a className="button plain dense" href={api.sheetPdf(shop, drawing, id, false)}>
                  PDF
                </a>
                <a className="button plain dense" href={api.sheetPdf(shop, drawing, id, true)}>
                  PDF with route card
                </a>
              </>
            )}
          </span>
        </div>
        {revision.state === 'withdrawn' && <StopLine>This revision was withdrawn. Do not make it.</StopLine>}
        <div className="sheet-frame still">
          {good ? (
            <DrawnPicture
              svg={good.svg}
              label={`Sheet ${revision.drawing.number} revision ${revision.letter}, ${draft.title}`}
              className="on-sheet"
            />
          ) : (
            <p className="no-sheet">There is no sheet yet.</p>
          )}
        </div>
        <SizeList id="sheet-in-words" sizes={sizes} />
        <div className="sheet-lines">
          <SpeakingLine head="Sheet check">
            {good ? (
              good.findings.length === 0 ? (
                'Clean.'
              ) : (
                <b className="is-no">{good.findings.length} found.</b>
              )
            ) : (
              'No sheet yet.'
            )}
            {problems.length > 0 && (
              <span className="is-wrong-text"> {problems.length} of what is typed is wrong.</span>
            )}
          </SpeakingLine>
          <SpeakingLine head="Can we make it?">
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
      </div>
      <div className="sign-off-side">
        <Decide />
        <Signatures />
        <Decisions />
        <Revisions />
      </div>
    </main>
  );
}
