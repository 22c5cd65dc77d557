import { Link, useNavigate, useSearchParams } from 'react-router';
import { SignInForm } from '../features/session/SignInForm.tsx';
import { paths } from '../paths.ts';
import { Button } from '../ui/Button.tsx';
import { PageTitle } from '../ui/PageTitle.tsx';
import { BenchAcross } from './BenchAcross.tsx';
import { PlainFrame } from './PlainFrame.tsx';

/** Only addresses of this program: a link to the sign-in must not lead anybody elsewhere. */
function placeToGoBackTo(back: string | null): string {
  if (back === null) return paths.today();
  const target = new URL(back, window.location.origin);
  return target.origin === window.location.origin &&
    back.startsWith('/') &&
    target.pathname !== paths.signIn()
    ? target.pathname + target.search
    : paths.today();
}

export function SignInPage() {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const goBack = () => void navigate(placeToGoBackTo(search.get('back')), { replace: true });
  return (
    <PlainFrame>
      <PageTitle>Sign in</PageTitle>
      <BenchAcross />
      <div className="px-margin lying:grid-cols-[minmax(0,420px)_1fr] grid gap-x-30 gap-y-10 py-8">
        <div>
          <h1 className="text-page mb-3.5 font-semibold">Sign in</h1>
          <SignInForm onSignedIn={goBack} />
        </div>
        <section className="border-hair lying:self-start max-w-105 border-t pt-4">
          <h2 className="text-section font-semibold">New here?</h2>
          <p className="text-ink2 mt-0.5 mb-3.5 max-w-88">
            A workshop holds designs, tools, sheets and builds. Nobody outside it sees them.
          </p>
          <Button asChild>
            <Link to={paths.start()}>Create a workshop</Link>
          </Button>
        </section>
      </div>
    </PlainFrame>
  );
}
