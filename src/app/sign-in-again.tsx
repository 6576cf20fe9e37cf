import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { Dialog } from '../components/dialog';
import { SignInFields } from '../features/session/sign-in-fields';
import { onSignedOut } from '../lib/api/client';
import { useSession } from '../lib/session';

/** Comes over the page when the session has run out, so that what was typed stays where it is. */
export function SignInAgain() {
  const [open, setOpen] = useState(false);
  const queries = useQueryClient();
  const { data } = useSession();
  useEffect(() => onSignedOut(() => setOpen(true)), []);
  return (
    <Dialog open={open} onOpenChange={setOpen} title="Sign in again" aside="Esc leaves it for later">
      <p className="reading">
        You have been away for a while. What you typed is still here and is kept as soon as you are signed in.
      </p>
      <SignInFields
        mail={data?.person.mail}
        onDone={() => {
          setOpen(false);
          window.dispatchEvent(new Event('benchleaf:signed-in'));
          void queries.invalidateQueries({ predicate: (query) => query.queryKey[0] !== 'session' });
        }}
      />
    </Dialog>
  );
}
