import { useEffect, useState, type SyntheticEvent } from 'react';
import { onSessionExpired } from '../../lib/api-client.ts';
import { useSession } from '../../lib/session.ts';
import { Button } from '../../ui/Button.tsx';
import { Dialog, DialogActions } from '../../ui/Dialog.tsx';
import { Field } from '../../ui/Field.tsx';
import { Problem } from '../../ui/Problem.tsx';
import { useSignInAgain } from './session.queries.ts';

type Answer = (answer: 'signed-in' | 'given-up') => void;

interface SessionExpiredDialogProps {
  /** The person would rather stop here: leads to the sign-in. */
  onGiveUp: () => void;
}

/** Asks for the password over the page when the sign-in has run out; whatever was being sent is then sent again. */
export function SessionExpiredDialog({ onGiveUp }: SessionExpiredDialogProps) {
  const { person, workshop } = useSession();
  const [answer, setAnswer] = useState<{ give: Answer } | null>(null);
  useEffect(() => {
    let waiting: Answer | null = null;
    const stopAsking = onSessionExpired(
      () =>
        new Promise((give) => {
          waiting = give;
          setAnswer({ give });
        }),
    );
    return () => {
      stopAsking();
      // Whoever waits must not wait for a dialog that is gone.
      waiting?.('given-up');
    };
  }, []);

  const handleAnswer: Answer = (given) => {
    answer?.give(given);
    setAnswer(null);
    if (given === 'given-up') onGiveUp();
  };

  return (
    <Dialog
      title="Your sign-in has run out"
      description={`Everything on this page is kept. Type the password of ${person.email} at ${workshop.name}, and it goes on where it was.`}
      open={answer !== null}
      onOpenChange={() => undefined}
      dismissible={false}
    >
      <PasswordForm email={person.email} onAnswer={handleAnswer} />
    </Dialog>
  );
}

/** One field: a form library would only make the first load of every page longer. */
function PasswordForm({ email, onAnswer }: { email: string; onAnswer: Answer }) {
  const [password, setPassword] = useState('');
  const [isMissing, setMissing] = useState(false);
  const signIn = useSignInAgain();
  const handleSubmit = (event: SyntheticEvent) => {
    event.preventDefault();
    setMissing(password === '');
    if (password !== '') signIn.mutate({ email, password }, { onSuccess: () => onAnswer('signed-in') });
  };
  return (
    <form noValidate onSubmit={handleSubmit} className="grid gap-4">
      <input type="text" name="username" autoComplete="username" value={email} readOnly hidden />
      <Field
        label="Password"
        type="password"
        name="password"
        autoComplete="current-password"
        value={password}
        onChange={(event) => setPassword(event.currentTarget.value)}
        error={isMissing && password === '' ? 'Type the password.' : undefined}
      />
      <Problem error={signIn.error} />
      <DialogActions>
        <Button look="quiet" onClick={() => onAnswer('given-up')}>
          Leave this page
        </Button>
        <Button type="submit" look="go" disabled={signIn.isPending}>
          {signIn.isPending ? 'Signing in…' : 'Sign in and go on'}
        </Button>
      </DialogActions>
    </form>
  );
}
