import type { QueryClient } from '@tanstack/react-query';
import { redirect } from 'react-router';
import { designQuery } from '../features/designs/designs.queries.ts';
import { lastPanel } from '../lib/last-panel.ts';
import { NothingHereError } from '../lib/nothing-here.ts';
import { signedInLoader } from '../lib/signed-in-loader.ts';
import { isWorkbenchPanel, paths } from '../paths.ts';

const isNumber = (text: string | undefined): text is string =>
  text !== undefined && /^[1-9]\d{0,9}$/.test(text);

/** A design's bare address leads to its newest revision, in the panel last used. */
export const designGate = (queryClient: QueryClient) =>
  signedInLoader(queryClient, async ({ params, request }) => {
    if (!isNumber(params.id)) throw new NothingHereError();
    const design = await queryClient.query(designQuery(Number(params.id)));
    return redirect(
      paths.workbench(design.id, design.revisionNumber, lastPanel()) + new URL(request.url).search,
    );
  });

/** Before the workbench opens: the design is there, so is the revision, and the panel is one that we have. */
export const workbenchLoader = (queryClient: QueryClient) =>
  signedInLoader(queryClient, async ({ params }) => {
    const { id, rev, panel } = params;
    if (!isNumber(id) || !isNumber(rev) || !isWorkbenchPanel(panel)) throw new NothingHereError();
    const design = await queryClient.query(designQuery(Number(id)));
    // Only the newest revision can be opened: there is no older one to show yet.
    return design.revisionNumber === Number(rev) ? design : redirect(paths.design(design.id));
  });
