import type { QueryClient } from '@tanstack/react-query';
import { createBrowserRouter, Outlet, redirect, type RouteObject } from 'react-router';
import { signedInLoader } from './lib/signed-in-loader.ts';
import { NotFoundPage } from './pages/NotFoundPage.tsx';
import { PlainFrame } from './pages/PlainFrame.tsx';
import { RouteError } from './pages/RouteError.tsx';
import { paths, patterns } from './paths.ts';
import { fetchMenuParts } from './ui/Menu.tsx';

/** Every screen, fetched when it is first opened. */
export function createRouter(queryClient: QueryClient) {
  return createBrowserRouter([
    {
      // Until the first page knows its data an empty bench stands there, not a spinner.
      hydrateFallbackElement: <PlainFrame>{null}</PlainFrame>,
      errorElement: (
        <PlainFrame>
          <RouteError />
        </PlainFrame>
      ),
      children: [
        { path: paths.home(), element: null, loader: () => redirect(paths.today()) },
        ...openRoutes(),
        {
          loader: signedInLoader(queryClient),
          // Apart, so that the sign-in need not fetch what stands round the pages behind it.
          lazy: async () => ({ Component: (await import('./pages/AppFrame.tsx')).AppFrame }),
          shouldRevalidate: () => false,
          children: [
            { element: <Outlet />, errorElement: <RouteError />, children: signedInRoutes(queryClient) },
          ],
        },
        { path: '*', element: <NotFoundPage /> },
      ],
    },
  ]);
}

function openRoutes(): RouteObject[] {
  return [
    {
      path: paths.signIn(),
      lazy: async () => ({ Component: (await import('./pages/SignInPage.tsx')).SignInPage }),
    },
    {
      path: paths.start(),
      lazy: async () => ({ Component: (await import('./pages/StartPage.tsx')).StartPage }),
    },
  ];
}

function signedInRoutes(queryClient: QueryClient): RouteObject[] {
  return [...designRoutes(queryClient), ...settingsRoutes(queryClient)];
}

function designRoutes(queryClient: QueryClient): RouteObject[] {
  return [
    {
      path: paths.today(),
      handle: { name: 'Today' },
      lazy: async () => {
        const { TodayPage, todayLoader } = await import('./pages/TodayPage.tsx');
        return { Component: TodayPage, loader: todayLoader(queryClient) };
      },
    },
    {
      path: paths.designs(),
      handle: { name: 'Designs' },
      lazy: async () => {
        const { DesignsPage, designsLoader } = await import('./pages/DesignsPage.tsx');
        return { Component: DesignsPage, loader: designsLoader(queryClient) };
      },
    },
    {
      path: paths.newDesign(),
      handle: { name: 'New design' },
      lazy: async () => {
        const { NewDesignPage, newDesignLoader } = await import('./pages/NewDesignPage.tsx');
        return { Component: NewDesignPage, loader: newDesignLoader(queryClient) };
      },
    },
    {
      path: patterns.compare,
      handle: { name: 'Compare' },
      lazy: async () => {
        const { ComparePage, compareLoader } = await import('./pages/ComparePage.tsx');
        return { Component: ComparePage, loader: compareLoader(queryClient) };
      },
      // Another view, temperature or key is another address of the same two instruments.
      shouldRevalidate: ({ currentParams, nextParams }) =>
        currentParams.a !== nextParams.a || currentParams.b !== nextParams.b,
    },
    {
      path: patterns.design,
      // Leads on to the workbench and shows nothing itself; the router wants to be told so.
      element: null,
      lazy: async () => ({ loader: (await import('./pages/design-gate.ts')).designGate(queryClient) }),
    },
    {
      path: patterns.workbench,
      handle: { name: 'Workbench' },
      lazy: async () => {
        const [{ WorkbenchPage }, { workbenchLoader }] = await Promise.all([
          import('./pages/WorkbenchPage.tsx'),
          import('./pages/design-gate.ts'),
          fetchMenuParts(),
        ]);
        return { Component: WorkbenchPage, loader: workbenchLoader(queryClient) };
      },
      // Another panel, hole or note is another address of the same bench: nothing need be asked for.
      shouldRevalidate: ({ currentParams, nextParams }) =>
        currentParams.id !== nextParams.id || currentParams.rev !== nextParams.rev,
    },
  ];
}

function settingsRoutes(queryClient: QueryClient): RouteObject[] {
  return [
    {
      path: paths.account(),
      handle: { name: 'Account' },
      lazy: async () => {
        const { AccountPage, accountLoader } = await import('./pages/AccountPage.tsx');
        return { Component: AccountPage, loader: accountLoader(queryClient) };
      },
    },
    {
      path: paths.workshopMembers(),
      handle: { name: 'Members and roles' },
      lazy: async () => {
        const { WorkshopMembersPage, workshopMembersLoader } =
          await import('./pages/WorkshopMembersPage.tsx');
        return { Component: WorkshopMembersPage, loader: workshopMembersLoader(queryClient) };
      },
    },
    {
      path: paths.workshopDefaults(),
      handle: { name: 'Defaults' },
      lazy: async () => {
        const { WorkshopDefaultsPage, workshopDefaultsLoader } =
          await import('./pages/WorkshopDefaultsPage.tsx');
        return { Component: WorkshopDefaultsPage, loader: workshopDefaultsLoader(queryClient) };
      },
    },
  ];
}
