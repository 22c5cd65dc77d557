import { useEffect, useRef } from 'react';
import { Outlet, ScrollRestoration, useLocation, useMatches, useNavigation } from 'react-router';
import { SessionExpiredDialog } from '../features/session/SessionExpiredDialog.tsx';
import { useSignOut } from '../features/session/session.queries.ts';
import { useSession } from '../lib/session.ts';
import { paths } from '../paths.ts';
import { KeyboardHelp } from '../ui/KeyboardHelp.tsx';
import { PersonMenu } from '../ui/PersonMenu.tsx';
import { Problem } from '../ui/Problem.tsx';
import { TopBar } from '../ui/TopBar.tsx';
import { TopBarProvider } from '../ui/TopBarFill.tsx';

const LINKS = [
  { to: paths.today(), label: 'Today' },
  { to: paths.designs(), label: 'Designs' },
] as const;

/** What stands round every page behind the sign-in. */
export function AppFrame() {
  const { pathname, search } = useLocation();
  const { person, workshop } = useSession();
  const signOut = useSignOut();
  const main = useFocusOnNewPage(pathname);
  const isWaiting = useNavigation().state !== 'idle';

  return (
    <TopBarProvider>
      <a
        href="#page"
        className="rounded-control bg-sheet text-mark shadow-pop fixed -top-20 left-2 z-30 px-4 py-3 focus-visible:top-2"
      >
        Skip to the page
      </a>
      <TopBar
        home={paths.today()}
        links={LINKS}
        title={usePageName()}
        right={
          <PersonMenu
            personName={person.name}
            workshopName={workshop.name}
            accountPath={paths.account()}
            workshopPath={paths.workshopDefaults()}
            isSigningOut={signOut.isPending}
            onSignOut={() => signOut.mutate()}
          />
        }
      />
      <Problem error={signOut.error} />
      <main id="page" ref={main} tabIndex={-1} aria-busy={isWaiting} className="outline-none">
        <Outlet />
      </main>
      <SessionExpiredDialog onGiveUp={() => window.location.assign(paths.signIn(pathname + search))} />
      <KeyboardHelp />
      <ScrollRestoration />
    </TopBarProvider>
  );
}

/** A page's name for the narrow bar, from its route. */
function usePageName(): string {
  const handles = useMatches().map(({ handle }) => handle);
  const named = handles.findLast(
    (handle): handle is { name: string } => typeof handle === 'object' && handle !== null && 'name' in handle,
  );
  return named?.name ?? 'Borewright';
}

/** Whoever reads by ear or by keyboard starts at the top of a new page, not at the link that led to it. */
function useFocusOnNewPage(pathname: string) {
  const main = useRef<HTMLElement>(null);
  const shown = useRef(pathname);
  useEffect(() => {
    // Panels of the workbench change the address and keep the place.
    const isSamePage = sectionOf(shown.current) === sectionOf(pathname);
    shown.current = pathname;
    if (!isSamePage) main.current?.focus({ preventScroll: true });
  }, [pathname]);
  return main;
}

const sectionOf = (pathname: string) => pathname.split('/').slice(0, 3).join('/');
