import { useRef, useState, type SyntheticEvent } from 'react';
import { signInRequest } from '#shared/contract/session.ts';
import { isStatus } from '../../lib/api-client.ts';
import { Button } from '../../ui/Button.tsx';
import { Field } from '../../ui/Field.tsx';
import { Problem } from '../../ui/Problem.tsx';
import { useSignIn } from './session.queries.ts';

/** Two fields, by hand: the first page of all fetches no form library. */
export function SignInForm({ onSignedIn }: { onSignedIn: () => void }) {
  const [values, setValues] = useState({ email: '', password: '' });
  const [wasSent, setSent] = useState(false);
  const password = useRef<HTMLInputElement>(null);
  const signIn = useSignIn();
  const reading = signInRequest.safeParse({ ...values, email: values.email.trim() });
  const complaintAbout = (name: 'email' | 'password') =>
    wasSent ? reading.error?.issues.find((issue) => issue.path[0] === name)?.message : undefined;

  const handleSubmit = (event: SyntheticEvent) => {
    event.preventDefault();
    setSent(!reading.success);
    if (!reading.success) return;
    signIn.mutate(reading.data, {
      onSuccess: onSignedIn,
      onError: (error) => {
        if (!isStatus(error, 401)) return;
        setValues((current) => ({ ...current, password: '' }));
        password.current?.focus();
      },
    });
  };

  return (
    <form noValidate onSubmit={handleSubmit} className="grid gap-4.5">
      <Field
        label="Email"
        type="email"
        name="email"
        autoComplete="username"
        value={values.email}
        onChange={(event) => setValues({ ...values, email: event.currentTarget.value })}
        error={complaintAbout('email')}
      />
      <Field
        ref={password}
        label="Password"
        type="password"
        name="password"
        autoComplete="current-password"
        value={values.password}
        onChange={(event) => setValues({ ...values, password: event.currentTarget.value })}
        error={complaintAbout('password')}
      />
      <Problem error={signIn.error} />
      <Button type="submit" look="go" size="big" disabled={signIn.isPending} className="mt-1.5 w-full">
        {signIn.isPending ? 'Signing in…' : 'Sign in'}
      </Button>
    </form>
  );
}
