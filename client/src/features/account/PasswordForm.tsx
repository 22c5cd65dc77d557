import { useMutation } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { changePasswordRequest } from '#shared/contract/session.ts';
import { apiRequest, isStatus } from '../../lib/api-client.ts';
import { problemFields } from '../../lib/api-problem.ts';
import { zodResolver } from '../../lib/zod-resolver.ts';
import { Button } from '../../ui/Button.tsx';
import { Field } from '../../ui/Field.tsx';
import { Problem } from '../../ui/Problem.tsx';

type Values = z.output<typeof changePasswordRequest>;

const EMPTY: Values = { currentPassword: '', newPassword: '' };

export function PasswordForm({ email }: { email: string }) {
  const { register, handleSubmit, formState, reset } = useForm<Values>({
    resolver: zodResolver(changePasswordRequest),
    defaultValues: EMPTY,
  });
  const change = useMutation({
    mutationFn: (body: Values) =>
      // A wrong password is an answer here, not a sign-in that ran out.
      apiRequest({ method: 'PUT', path: '/api/account/password', body, schema: z.unknown() }),
    onSuccess: () => reset(EMPTY),
  });
  const refused = problemFields(change.error);
  const hasFieldErrors = Object.keys(refused).length > 0;
  return (
    <form
      noValidate
      onSubmit={(event) => void handleSubmit((values) => change.mutate(values))(event)}
      className="grid justify-items-start gap-4"
    >
      <input type="text" name="username" autoComplete="username" value={email} readOnly hidden />
      <Field
        className="w-full max-w-105"
        label="Password now"
        type="password"
        autoComplete="current-password"
        {...register('currentPassword')}
        error={formState.errors.currentPassword?.message ?? refused.currentPassword}
      />
      <Field
        className="w-full max-w-105"
        label="New password"
        type="password"
        autoComplete="new-password"
        hint="10 characters or more. A sentence does well."
        {...register('newPassword')}
        error={formState.errors.newPassword?.message ?? refused.newPassword}
      />
      <Problem error={hasFieldErrors || isStatus(change.error, 401) ? null : change.error} />
      <Button type="submit" disabled={change.isPending}>
        Change the password
      </Button>
      <p role="status" className="text-true-ink empty:hidden">
        {change.isSuccess ? 'Changed. Other devices have to sign in again.' : ''}
      </p>
    </form>
  );
}
