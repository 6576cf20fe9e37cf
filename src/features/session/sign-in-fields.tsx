import { useState, type FormEvent } from 'react';
import { Button } from '../../components/button';
import { Field } from '../../components/field';
import { useSignIn } from '../../lib/session';

/** Address and password as plain fields, for the dialog that comes over a page whose session ran out. */
export function SignInFields({ mail = '', onDone }: { mail?: string; onDone: () => void }) {
  const [typedMail, setMail] = useState(mail);
  const [password, setPassword] = useState('');
  const signIn = useSignIn();
  const submit = (event: FormEvent) => {
    event.preventDefault();
    signIn.mutate({ mail: typedMail.trim(), password }, { onSuccess: onDone });
  };
  return (
    <form onSubmit={submit} className="grid gap-3">
      <Field
        label="Address"
        type="email"
        autoComplete="username"
        required
        value={typedMail}
        onChange={(e) => setMail(e.target.value)}
      />
      <Field
        label="Password"
        type="password"
        autoComplete="current-password"
        required
        value={password}
        onChange={(e) => setPassword(e.target.value)}
        wrong={signIn.error?.message}
      />
      <div className="dialog-acts">
        <Button type="submit" look="go" disabled={signIn.isPending}>
          Sign in
        </Button>
      </div>
    </form>
  );
}
