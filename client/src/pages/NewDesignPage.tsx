import { useQuery, useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useNavigate } from 'react-router';
import { listDesignsQuery } from '#shared/contract/designs.ts';
import { permissionRefusal } from '#shared/rules/permissions.ts';
import { designListQuery, draftQuery, useCreateDesign } from '../features/designs/designs.queries.ts';
import { NewDesignForm } from '../features/new-design/NewDesignForm.tsx';
import { useSession } from '../lib/session.ts';
import { signedInLoader } from '../lib/signed-in-loader.ts';
import { useUnit } from '../lib/unit.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/Button.tsx';
import { PageTitle } from '../ui/PageTitle.tsx';
import { NewDesignStrip } from './NewDesignStrip.tsx';

const designsToStartFrom = designListQuery({
  ...listDesignsQuery.parse({}),
  sort: 'name',
  order: 'asc',
  pageSize: 100,
});

export const newDesignLoader = (queryClient: QueryClient) =>
  signedInLoader(queryClient, () => queryClient.query({ ...designsToStartFrom, staleTime: 'static' }));

export function NewDesignPage() {
  const refusal = permissionRefusal(useSession(), 'create-design');
  return (
    <>
      <PageTitle>New design</PageTitle>
      {refusal === null ? <NewDesign /> : <NotForYou refusal={refusal} />}
    </>
  );
}

function NewDesign() {
  const navigate = useNavigate();
  const { workshop } = useSession();
  const unit = useUnit();
  const [from, setFrom] = useState<number | null>(null);
  const { data: existing } = useSuspenseQuery(designsToStartFrom);
  const draft = useQuery({ ...draftQuery(from ?? 0), enabled: from !== null });
  const create = useCreateDesign();
  return (
    <NewDesignForm
      workshop={workshop}
      unit={unit}
      existing={existing.items}
      from={from}
      onFrom={setFrom}
      fromDocument={draft.data?.document ?? null}
      isCreating={create.isPending}
      error={create.error ?? draft.error}
      onCreate={(document) =>
        create.mutate(document, { onSuccess: (design) => void navigate(paths.design(design.id)) })
      }
      strip={(document) => <NewDesignStrip document={document} unit={unit} />}
    />
  );
}

function NotForYou({ refusal }: { refusal: string }) {
  return (
    <div className="px-margin py-8">
      <h1 className="text-page max-bar:sr-only font-semibold">New design</h1>
      <p className="text-ink2 mt-2 mb-6">{refusal}</p>
      <Button asChild>
        <Link to={paths.designs()}>Designs</Link>
      </Button>
    </div>
  );
}
