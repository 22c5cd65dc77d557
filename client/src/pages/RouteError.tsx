import { useEffect, type ReactNode } from 'react';
import { Link, useRouteError } from 'react-router';
import { isStatus } from '../lib/api-client.ts';
import { ApiProblem, NoLineError } from '../lib/api-problem.ts';
import { NothingHereError } from '../lib/nothing-here.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/Button.tsx';
import { PageTitle } from '../ui/PageTitle.tsx';
import { NotOnThisPeg } from './NotFoundPage.tsx';

/** Stands in place of a page that could not be shown: what is wrong, what is safe, what to do. */
export function RouteError() {
  const error = useRouteError();
  useEffect(() => {
    if (isOurFault(error)) reportError(error);
  }, [error]);
  if (error instanceof NothingHereError || isStatus(error, 404)) return <NotOnThisPeg />;
  if (error instanceof NoLineError)
    return (
      <Broken title="No line to the workshop">
        What you saved is safe, and what you drew waits on this device. Check the connection of this device,
        then load the page again.
      </Broken>
    );
  if (error instanceof ApiProblem) return <Broken title={error.problem.title}>{error.problem.detail}</Broken>;
  if (isMissingPart(error))
    return (
      <Broken title="This page has moved on">
        The workshop was renewed while this page was open. What you saved is safe. Load the page again.
      </Broken>
    );
  return (
    <Broken title="This page broke">
      The fault is in the program, not in your work. What you saved is safe. Load the page again; if it breaks
      once more, go another way and tell whoever looks after this workshop.
    </Broken>
  );
}

/** An answer of the server and a broken line are no news to whoever mends the program; everything else is. */
function isOurFault(error: unknown): boolean {
  return !(error instanceof ApiProblem || error instanceof NoLineError || error instanceof NothingHereError);
}

/** A part of the program that is fetched on demand is gone after an update. Browsers word it differently. */
function isMissingPart(error: unknown): boolean {
  return (
    error instanceof TypeError && /module/i.test(error.message) && /(import|fetch|load)/i.test(error.message)
  );
}

function Broken({ title, children }: { title: string; children: ReactNode }) {
  return (
    <div className="px-margin max-w-160 py-10">
      <PageTitle>{title}</PageTitle>
      <h1 className="text-page font-semibold">{title}</h1>
      <p className="text-ink2 mt-2 mb-6">{children}</p>
      <div className="flex flex-wrap gap-2">
        <Button look="go" onClick={() => window.location.reload()}>
          Load again
        </Button>
        <Button asChild>
          <Link to={paths.designs()}>Designs</Link>
        </Button>
      </div>
    </div>
  );
}
