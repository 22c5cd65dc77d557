import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { signInRequest } from '#shared/contract/session.ts';
import { isStatus } from '../../lib/api-client.ts';
import { zodResolver } from '../../lib/zod-resolver.ts';
import { Button } from '../../ui/Button.tsx';
import { Field } from '../../ui/Field.tsx';
import { Problem } from '../../ui/Problem.tsx';
import { useSignIn } from './session.queries.ts';

type Values = z.input<typeof signInRequest>;

export function SignInForm({ onSignedIn }: { onSignedIn: () => void }) {
  const { register, handleSubmit, formState, setFocus, resetField } = useForm<Values>({
    resolver: zodResolver(signInRequest),
    defaultValues: { email: '', password: '' },
  });
  const signIn = useSignIn();

  const handleSignIn = handleSubmit((values) =>
    signIn.mutate(values, {
      onSuccess: onSignedIn,
      onError: (error) => {
        if (!isStatus(error, 401)) return;
        resetField('password');
        setFocus('password');
      },
    }),
  );

  return (
    <form noValidate onSubmit={(event) => void handleSignIn(event)} className="grid gap-4.5">
      <Field
        label="Email"
        type="email"
        autoComplete="username"
        {...register('email')}
        error={formState.errors.email?.message}
      />
      <Field
        label="Password"
        type="password"
        autoComplete="current-password"
        {...register('password')}
        error={formState.errors.password?.message}
      />
      <Problem error={signIn.error} />
      <Button type="submit" look="go" size="big" disabled={signIn.isPending} className="mt-1.5 w-full">
        {signIn.isPending ? 'Signing in…' : 'Sign in'}
      </Button>
    </form>
  );
}
