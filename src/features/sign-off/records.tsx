import { Link } from 'react-router-dom';
import { Plate } from '../../components/plate';
import { Stamp } from '../../components/stamp';
import { countOf } from '../../components/verdict';
import { momentOf } from '../../lib/dates';
import { paths } from '../../lib/paths';
import { useDrawing } from '../../revision/api/drawing';
import { useOpenRevision } from '../../revision/open-revision';

/** An act as the shop says it, where the record's own word is shorter. */
const ACT_WORDS: Readonly<Record<string, string>> = {
  submitted: 'sent for checking',
  'trial on': 'marked as trial piece',
  'trial off': 'no longer a trial piece',
};

/** What was decided, by whom and when, with the reasons given. */
export function Decisions() {
  const { answer, shop } = useOpenRevision();
  const { decisions } = answer.revision;
  return (
    <Plate head="Decisions" aside={decisions.length}>
      {decisions.length === 0 && <p className="empty-words">None yet.</p>}
      <ol className="decisions">
        {[...decisions].reverse().map((decision, index) => (
          <li key={index}>
            <p>
              <b>{ACT_WORDS[decision.act] ?? decision.act}</b> by {decision.by}
              <span className="aside">{momentOf(decision.at, shop.timeZone)}</span>
            </p>
            {decision.reason && <blockquote>{decision.reason}</blockquote>}
            {decision.contentHash && decision.act === 'approved' && (
              <p className="aside hash">contents {decision.contentHash.slice(0, 12)}</p>
            )}
          </li>
        ))}
      </ol>
    </Plate>
  );
}

/** Every revision of the drawing, newest first; the one that is looked at is marked. */
export function Revisions() {
  const { address, shop } = useOpenRevision();
  const { data, error } = useDrawing(address.shop, address.drawing);
  return (
    <Plate head="Revisions" aside={data ? countOf(data.revisions.length, 'revision') : undefined}>
      {error && <p className="empty-words">They could not be read: {error.message}</p>}
      <ul className="revisions">
        {data?.revisions.map((revision) => (
          <li key={revision.id} data-here={revision.id === address.revision ? '' : undefined}>
            <Link
              to={paths.revision(address.shop, address.drawing, revision.id, 'sign-off')}
              aria-current={revision.id === address.revision ? 'page' : undefined}
            >
              {revision.letter}
            </Link>
            <Stamp revision={revision} timeZone={shop.timeZone} />
            <span className="soft">{revision.change}</span>
          </li>
        ))}
      </ul>
    </Plate>
  );
}

/** Who drew it and who checked it. */
export function Signatures() {
  const { answer, shop } = useOpenRevision();
  const { drawn, checked, noSecondCheck, saved, contentHash } = answer.revision;
  const signed = (person: { name: string; at: string } | null) =>
    person ? `${person.name}, ${momentOf(person.at, shop.timeZone)}` : 'not yet';
  return (
    <Plate head="Signatures">
      <dl className="signatures">
        <dt>drawn</dt>
        <dd>{signed(drawn ?? saved)}</dd>
        <dt>checked</dt>
        <dd>{noSecondCheck ? <b className="is-other">NO SECOND CHECK</b> : signed(checked)}</dd>
        {checked && contentHash && (
          <>
            <dt>signed for</dt>
            <dd className="hash">contents {contentHash.slice(0, 12)}</dd>
          </>
        )}
      </dl>
    </Plate>
  );
}
