import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '../components/button';
import { Dialog } from '../components/dialog';
import { countOf, verdictWords } from '../components/verdict';
import { ApiFault } from '../lib/api/fault';
import { paths } from '../lib/paths';
import { useAct } from '../revision/api/act';
import { labelOf } from '../revision/labels';
import { useOpenRevision } from '../revision/open-revision';

/** The main act of a draft. While something is missing it says what, and takes the person there. */
export function SendForChecking() {
  const { address, answer, problems, keeper, template, good } = useOpenRevision();
  const [refusal, setRefusal] = useState<ApiFault | string | null>(null);
  const act = useAct(address);
  const navigate = useNavigate();
  if (answer.abilities['submit'] !== true) return null;
  const { shop, drawing, revision } = address;
  const first = problems[0];
  const verdict = good ? verdictWords(good.capacity) : null;

  const send = async () => {
    const version = await keeper.flush();
    if (version === null) {
      setRefusal(
        'What you typed is not kept yet, so it cannot be sent. It is held here; try again when it is kept.',
      );
      return;
    }
    try {
      await act.mutateAsync({ act: 'submit', body: { version } });
      void navigate(paths.revision(shop, drawing, revision, 'sign-off'));
    } catch (fault) {
      setRefusal(fault instanceof ApiFault ? fault : 'It could not be sent. Nothing was changed.');
    }
  };
  const goToFirst = () => {
    if (!first) return;
    void navigate(paths.revision(shop, drawing, revision, 'sizes'));
    window.setTimeout(() => document.getElementById(`field-${first.path}`)?.focus(), 50);
  };

  return (
    <div className="main-act">
      {verdict && (
        <p className="foot-verdict" aria-hidden="true">
          <span className="engraved">Can we make it?</span>{' '}
          <b className={`is-${verdict.state}`}>{verdict.word}</b>
        </p>
      )}
      {first ? (
        <Button className="waits" aria-describedby="why-not-sent" onClick={goToFirst}>
          Send: {countOf(problems.length, 'size')} wrong
        </Button>
      ) : (
        <Button look="go" disabled={act.isPending} onClick={() => void send()}>
          {act.isPending ? 'Sending' : 'Send for checking'}
        </Button>
      )}
      {first && (
        <span id="why-not-sent" className="sr-list">
          {labelOf(template, first.path)}: {first.message} Press to go to it.
        </span>
      )}
      <Dialog open={refusal !== null} onOpenChange={(open) => !open && setRefusal(null)} title="Not sent yet">
        {typeof refusal === 'string' ? (
          <p>{refusal}</p>
        ) : (
          <>
            <p>{refusal?.message}</p>
            {refusal && refusal.fields.length > 0 && (
              <ul className="plain-list">
                {refusal.fields.map((field) => (
                  <li key={field.path + field.message}>
                    <b>{labelOf(template, field.path)}</b>: {field.message}
                  </li>
                ))}
              </ul>
            )}
          </>
        )}
        <div className="dialog-acts">
          <Button onClick={() => setRefusal(null)}>Back to the sheet</Button>
        </div>
      </Dialog>
    </div>
  );
}
