import { useState } from 'react';
import { Button } from '../components/button';
import { Dialog } from '../components/dialog';
import type { RevisionAnswer } from '../../shared/api/drawings';
import { differences, draftOf, merged } from '../revision/draft';
import { labelOfDraft } from '../revision/labels';
import { useOpenRevision } from '../revision/open-revision';

/** Somebody else saved meanwhile: both values stand side by side, and the person chooses. */
export function StaleDialog() {
  const { keeper } = useOpenRevision();
  const { keeping } = keeper;
  if (keeping.state !== 'stale') return null;
  return <Choice key={keeping.theirs.revision.version} theirs={keeping.theirs} />;
}

function Choice({ theirs }: { theirs: RevisionAnswer }) {
  const { draft, replace, keeper, template } = useOpenRevision();
  const other = draftOf(theirs);
  const differs = differences(draft, other);
  const [mine, setMine] = useState<ReadonlySet<string>>(() => new Set(differs.map(({ path }) => path)));
  const [open, setOpen] = useState(true);
  const pick = (path: string, keep: boolean) => {
    const next = new Set(mine);
    if (keep) next.add(path);
    else next.delete(path);
    setMine(next);
  };
  const settle = () => {
    const next = merged(draft, other, mine);
    replace(next);
    keeper.settle(next, theirs);
  };
  return (
    <>
      {!open && (
        <Button look="stop" onClick={() => setOpen(true)}>
          Look at both
        </Button>
      )}
      <Dialog open={open} onOpenChange={setOpen} title="Somebody else changed it" wide>
        <p>
          {theirs.revision.saved.name} saved this draft while you were typing. Nothing of yours is lost.
          Choose what stands for each.
        </p>
        {differs.length === 0 ? (
          <p>Both are the same now.</p>
        ) : (
          <div className="both">
            {differs.map((difference) => (
              <fieldset key={difference.path}>
                <legend>{labelOfDraft(template, difference.path)}</legend>
                <label>
                  <input
                    type="radio"
                    name={difference.path}
                    checked={mine.has(difference.path)}
                    onChange={() => pick(difference.path, true)}
                  />
                  <span>
                    yours <b>{difference.mine || 'nothing'}</b>
                  </span>
                </label>
                <label>
                  <input
                    type="radio"
                    name={difference.path}
                    checked={!mine.has(difference.path)}
                    onChange={() => pick(difference.path, false)}
                  />
                  <span>
                    {theirs.revision.saved.name} <b>{difference.theirs || 'nothing'}</b>
                  </span>
                </label>
              </fieldset>
            ))}
          </div>
        )}
        <div className="dialog-acts">
          <Button onClick={() => setMine(new Set())}>All theirs</Button>
          <Button onClick={() => setMine(new Set(differs.map(({ path }) => path)))}>All mine</Button>
          <Button look="go" onClick={settle}>
            Keep these
          </Button>
        </div>
      </Dialog>
    </>
  );
}
