import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import {
  designListSchema,
  designSummarySchema,
  draftSchema,
  type DesignList,
  type DesignSummary,
  type Draft,
  type ListDesignsQuery,
} from '#shared/contract/designs.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { apiRequest } from '../../lib/api-client.ts';

export const designListQuery = (list: ListDesignsQuery) =>
  queryOptions({
    queryKey: ['designs', 'list', list],
    queryFn: ({ signal }): Promise<DesignList> =>
      apiRequest({ path: '/api/designs', query: { ...list }, schema: designListSchema, signal }),
  });

export const designQuery = (id: number) =>
  queryOptions({
    queryKey: ['designs', 'one', id],
    queryFn: ({ signal }): Promise<DesignSummary> =>
      apiRequest({ path: `/api/designs/${id}`, schema: designSummarySchema, signal }),
  });

/** The draft as it is stored, to begin another design from. */
export const draftQuery = (id: number) =>
  queryOptions({
    queryKey: ['designs', 'draft', id],
    queryFn: ({ signal }): Promise<Draft> =>
      apiRequest({ path: `/api/designs/${id}/draft`, schema: draftSchema, signal }),
  });

/** Every change of a design moves it in the lists and changes their counts. */
function useDesignMutation<Input>(change: (input: Input) => Promise<DesignSummary>) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: change,
    onSuccess: () => queryClient.invalidateQueries({ queryKey: ['designs'] }),
  });
}

export const useCreateDesign = () =>
  useDesignMutation((document: DesignDocument) =>
    apiRequest({ method: 'POST', path: '/api/designs', body: { document }, schema: designSummarySchema }),
  );

interface Naming {
  id: number;
  name: string;
}

export const useCopyDesign = () =>
  useDesignMutation(({ id, name }: Naming) =>
    apiRequest({
      method: 'POST',
      path: `/api/designs/${id}/copies`,
      body: { name },
      schema: designSummarySchema,
    }),
  );

export const useRenameDesign = () =>
  useDesignMutation(({ id, name }: Naming) =>
    apiRequest({ method: 'PATCH', path: `/api/designs/${id}`, body: { name }, schema: designSummarySchema }),
  );

export const useArchiveDesign = () =>
  useDesignMutation(({ id, to }: { id: number; to: 'archive' | 'restore' }) =>
    apiRequest({ method: 'POST', path: `/api/designs/${id}/${to}`, schema: designSummarySchema }),
  );
