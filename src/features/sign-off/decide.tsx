import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../components/button';
import { Plate } from '../../components/plate';
import { StandingCaution } from '../../components/lines';
import { verdictWords } from '../../components/verdict';
import { ApiFault } from '../../lib/api/fault';
import { paths } from '../../lib/paths';
import { useAct, type Act } from '../../revision/api/act';
import { useOpenRevision } from '../../revision/open-revision';
import { ReasonDialog } from './reason-dialog';
import { useStartRevision } from './start-revision';
import { whyNot } from './why-not';

/** What the signed-in person may decide about this revision now; the server says which. */
export function Decide() {
  const { address, answer, good, keeper } = useOpenRevision();
  const { revision, abilities } = answer;
  const act = useAct(address);
  const next = useStartRevision(address.shop, address.drawing);
  const navigate = useNavigate();
  const [asking, setAsking] = useState<'return' | 'withdraw' | null>(null);
  const may = (ability: string) => abilities[ability] === true;
  const { version, contentHash, letter } = revision;
  const fault = act.error ?? next.error;

  const decide = async (what: Act) => {
    const kept = await keeper.flush();
    if (kept === null) return;
    await act.mutateAsync({ ...what, body: { ...what.body, version: kept } } as Act);
  };
  const quietly = (what: Act) => void decide(what).catch(() => undefined);
  const startNext = () =>
    next.mutate(undefined, {
      onSuccess: ({ revision: made }) =>
        void navigate(paths.revision(address.shop, made.drawing.id, made.id)),
    });
  const verdict = good ? verdictWords(good.capacity) : null;
  const aside = good
    ? `sheet check ${good.findings.length === 0 ? 'clean' : `finds ${good.findings.length}`}, can we make it: ${verdict?.word.toLowerCase() ?? ''}`
    : 'no sheet yet';
  const nothing = !['submit', 'take-back', 'return', 'approve', 'withdraw', 'start-revision', 'trial'].some(
    may,
  );

  return (
    <Plate head="Decide" aside={aside} decides>
      <div className="decide">
        <p>{whatItDoes(revision.state, letter, revision.history.length === 0, may)}</p>
        {!may('approve') && revision.state === 'in review' && <p className="soft">{whyNot(answer)}</p>}
        {nothing && revision.state !== 'in review' && (
          <p className="soft">There is nothing for you to decide here.</p>
        )}
        {fault && (
          <p className="wrong" role="alert">
            {faultWords(fault)}
          </p>
        )}
        <div className="decide-acts">
          {may('approve') && contentHash && (
            <Button
              look="go"
              disabled={act.isPending}
              onClick={() => quietly({ act: 'approve', body: { version, contentHash } })}
            >
              Approve and release {letter}
            </Button>
          )}
          {may('return') && (
            <Button look="stop" onClick={() => setAsking('return')}>
              Return with reasons
            </Button>
          )}
          {may('take-back') && (
            <Button disabled={act.isPending} onClick={() => quietly({ act: 'take-back', body: { version } })}>
              Take it back
            </Button>
          )}
          {may('trial') && (
            <Button
              disabled={act.isPending}
              onClick={() => quietly({ act: 'trial', body: { version, trial: !revision.trial } })}
            >
              {revision.trial ? 'No longer a trial piece' : 'Mark as trial piece'}
            </Button>
          )}
          {may('start-revision') && (
            <Button disabled={next.isPending} onClick={startNext}>
              Start the next revision
            </Button>
          )}
          {may('withdraw') && (
            <Button look="stop" onClick={() => setAsking('withdraw')}>
              Withdraw
            </Button>
          )}
        </div>
        {may('approve') && <StandingCaution />}
      </div>
      <ReasonDialog
        open={asking === 'return'}
        title="Return with reasons"
        says={`${revision.drawing.number} revision ${letter} goes back as a draft, with your reasons.`}
        act="Return it"
        onClose={() => setAsking(null)}
        onGiven={(reason) => decide({ act: 'return', body: { version, reason } })}
      />
      <ReasonDialog
        open={asking === 'withdraw'}
        title="Withdraw"
        says={`${revision.drawing.number} revision ${letter} must not be made any more. Printed copies show it when they are looked up; it is not brought back.`}
        act="Withdraw it"
        onClose={() => setAsking(null)}
        onGiven={(reason) => decide({ act: 'withdraw', body: { version, reason } })}
      />
    </Plate>
  );
}

function whatItDoes(
  state: string,
  letter: string,
  isFirst: boolean,
  may: (ability: string) => boolean,
): string {
  if (state === 'draft')
    return may('submit')
      ? `Revision ${letter} is a draft. When its sizes are right, send it for checking.`
      : `Revision ${letter} is a draft. It is not for manufacture.`;
  if (state === 'in review')
    return may('approve')
      ? `You may approve it. Approving releases ${letter}${isFirst ? '' : ' and supersedes the release before it'}. Read the sheet, the route and the verdict first.`
      : `Revision ${letter} waits for a second person to check it.`;
  if (state === 'released') return `Revision ${letter} is released: the bench works to it.`;
  if (state === 'superseded') return `Revision ${letter} is superseded. A later revision is released.`;
  return `Revision ${letter} is withdrawn. Do not make it.`;
}

function faultWords(fault: Error): string {
  if (!(fault instanceof ApiFault)) return fault.message;
  return [fault.message, ...fault.fields.map(({ message }) => message)].join(' ');
}
