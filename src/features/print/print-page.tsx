import { Link, useParams } from 'react-router-dom';
import { Button } from '../../components/button';
import { DrawnPicture } from '../../components/drawn-picture';
import { FaultBox } from '../../components/fault-box';
import { StandingCaution } from '../../components/lines';
import { Stamp } from '../../components/stamp';
import { Waiting } from '../../components/waiting';
import { useDocumentTitle } from '../../lib/document-title';
import { api, paths } from '../../lib/paths';
import { useShop } from '../../lib/session';
import { useRevision } from '../../revision/api/revision';
import { storedGood } from '../../revision/stored-result';
import { useSheetSvg } from './sheet-svg';

/** The sheet on paper at true size. On screen it says what will come out; on paper only the sheet is left. */
export function PrintPage() {
  const { shop: slug = '', drawing = '', revision: id = '' } = useParams();
  const shop = useShop(slug);
  const { data, error, refetch } = useRevision({ shop: slug, drawing, revision: id });
  const sheet = useSheetSvg(slug, drawing, id);
  const revision = data?.revision;
  useDocumentTitle(revision ? `Print ${revision.drawing.number} rev ${revision.letter}` : 'Print');
  const fault = error ?? sheet.error;
  if (fault)
    return (
      <main id="page" tabIndex={-1}>
        <FaultBox fault={fault} again={() => void Promise.all([refetch(), sheet.refetch()])} />
        {revision && (
          <p className="page">
            <Link to={paths.revision(slug, drawing, id)}>Back to the sizes</Link>
          </p>
        )}
      </main>
    );
  if (!revision || !sheet.data)
    return (
      <main id="page" tabIndex={-1}>
        <Waiting words="Fetching the sheet" rows={10} />
      </main>
    );
  const size = data ? storedGood(data)?.sheet.size : undefined;
  return (
    <main id="page" className="print-page" tabIndex={-1}>
      <div className="print-bar">
        <h1 className="title">
          {revision.drawing.number} {revision.title}
        </h1>
        <Stamp revision={revision} timeZone={shop?.timeZone} />
        <span className="bar-group">
          <Button look="go" onClick={() => window.print()}>
            Print the sheet
          </Button>
          <a className="button plain standard" href={api.sheetPdf(slug, drawing, id, false)}>
            PDF
          </a>
          <a className="button plain standard" href={api.sheetPdf(slug, drawing, id, true)}>
            PDF with route card
          </a>
          <Link className="button plain standard" to={paths.revision(slug, drawing, id)}>
            Back
          </Link>
        </span>
        <p className="aside">
          {size ? `${size} paper, landscape. ` : ''}Print at 100 %, without fitting to the page, then measure
          the check bar.
          {revision.state !== 'released' && ' It is not released: the sheet says so across it.'}
        </p>
      </div>
      <DrawnPicture
        svg={sheet.data}
        label={`Sheet ${revision.drawing.number} revision ${revision.letter}, ${revision.title}`}
        className={`paper on-sheet paper-${size ?? 'A4'}`}
      />
      <StandingCaution />
    </main>
  );
}
