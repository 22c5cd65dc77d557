import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useLoaderData } from 'react-router';
import { readSource, type CompareSource } from '../features/compare/compare-address.ts';
import { designQuery, draftQuery } from '../features/designs/designs.queries.ts';
import { NothingHereError } from '../lib/nothing-here.ts';
import { signedInLoader } from '../lib/signed-in-loader.ts';
import { isCompareView } from '../paths.ts';
import { OpenCompare } from './OpenCompare.tsx';

interface ComparePair {
  a: CompareSource;
  b: CompareSource;
}

/** Both are there, and as they are stored now: an edit on the bench a moment ago counts. */
export const compareLoader = (queryClient: QueryClient) =>
  signedInLoader(queryClient, async ({ params }): Promise<ComparePair> => {
    const [a, b] = [readSource(params.a), readSource(params.b)];
    if (a === null || b === null || !isCompareView(params.view)) throw new NothingHereError();
    await Promise.all(
      [...new Set([a.designId, b.designId])].flatMap((id) => [
        queryClient.query({ ...designQuery(id), staleTime: 0 }),
        queryClient.query({ ...draftQuery(id), staleTime: 0 }),
      ]),
    );
    return { a, b };
  });

/** Two instruments over each other, or one beside itself at another pitch or temperature. */
export function ComparePage() {
  const { a, b } = useLoaderData<ComparePair>();
  const { data: designA } = useSuspenseQuery(designQuery(a.designId));
  const { data: designB } = useSuspenseQuery(designQuery(b.designId));
  const { data: draftA } = useSuspenseQuery(draftQuery(a.designId));
  const { data: draftB } = useSuspenseQuery(draftQuery(b.designId));
  return (
    <OpenCompare
      key={`${a.designId} ${b.designId}`}
      a={{ design: designA, document: draftA.document }}
      b={{ design: designB, document: draftB.document }}
    />
  );
}
