import { useState, type FormEvent } from 'react';
import { Navigate, useNavigate, useSearchParams } from 'react-router-dom';
import { DrawnPicture } from '../../components/drawn-picture';
import { useTemplatePicture } from '../../engine/use-template-picture';
import { useDocumentTitle } from '../../lib/document-title';
import { useSession, useSignIn } from '../../lib/session';
import { useShift } from '../../lib/shift';

/** Only an address of ours may follow the sign-in. */
function safeTarget(to: string | null): string {
  return to && /^\/(?![/\\])/.test(to) ? to : '/';
}

/** The title block of an empty sheet; the form is the block. */
export function SignInPage() {
  useDocumentTitle('Sign in');
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const session = useSession();
  const signIn = useSignIn();
  const picture = useTemplatePicture('tapered-handle');
  const [shift, chooseShift] = useShift();
  const [mail, setMail] = useState('');
  const [password, setPassword] = useState('');
  const to = safeTarget(search.get('to'));
  if (session.data && !signIn.isPending) return <Navigate to={to} replace />;

  const submit = (event: FormEvent) => {
    event.preventDefault();
    signIn.mutate({ mail: mail.trim(), password }, { onSuccess: () => void navigate(to, { replace: true }) });
  };
  const wrong = signIn.error?.message;
  return (
    <main id="page" className="sign-in">
      <div className="empty-sheet">
        <div className="empty-frame">
          <DrawnPicture
            svg={picture}
            label="A tapered handle, drawn from its worked example"
            className="sign-in-picture"
          />
          <form className="title-block" onSubmit={submit}>
            <div className="cell">
              <span className="small-label">Title</span>
              <h1>Sign in</h1>
            </div>
            <div className="cell">
              <span className="small-label">Of</span>
              <p className="of">BENCHLEAF</p>
            </div>
            <div className="cell">
              <label htmlFor="mail" className="small-label">
                Address
              </label>
              <input
                id="mail"
                type="email"
                autoComplete="username"
                required
                value={mail}
                onChange={(event) => setMail(event.target.value)}
                aria-invalid={wrong ? true : undefined}
              />
            </div>
            <div className="cell">
              <label htmlFor="password" className="small-label">
                Password
              </label>
              <input
                id="password"
                type="password"
                autoComplete="current-password"
                required
                value={password}
                onChange={(event) => setPassword(event.target.value)}
                aria-invalid={wrong ? true : undefined}
                aria-describedby={wrong ? 'sign-in-wrong' : undefined}
              />
            </div>
            {wrong && (
              <p id="sign-in-wrong" className="cell whole stop-cell" role="alert">
                {wrong}
              </p>
            )}
            <div className="cell">
              <button type="submit" className="button go tall w-full" disabled={signIn.isPending}>
                {signIn.isPending ? 'Signing in' : 'Sign in'}
              </button>
            </div>
            <div className="cell">
              <button
                type="button"
                className="word"
                onClick={() => chooseShift(shift === 'night' ? 'day' : 'night')}
              >
                {shift === 'night' ? 'Day shift' : 'Night shift'}
              </button>
            </div>
          </form>
        </div>
      </div>
    </main>
  );
}
