import { useEffect } from 'react';
import { useLoaderData, useParams } from 'react-router';
import type { DesignSummary } from '#shared/contract/designs.ts';
import { useDraft } from '../features/draft/use-draft.ts';
import { BenchWaiting, EmptyBench } from '../features/workbench/BenchWaiting.tsx';
import { keepLastPanel } from '../lib/last-panel.ts';
import { isWorkbenchPanel } from '../paths.ts';
import { Button } from '../ui/Button.tsx';
import { OpenWorkbench } from './OpenWorkbench.tsx';

/** The workbench: one design's draft, in the panel that the address names. */
export function WorkbenchPage() {
  const design = useLoaderData<DesignSummary>();
  const { panel } = useParams();
  const draft = useDraft(design.id);
  const shown = isWorkbenchPanel(panel) ? panel : 'holes';
  useEffect(() => keepLastPanel(shown), [shown]);
  switch (draft.status) {
    case 'loading':
      return <BenchWaiting />;
    case 'unreachable':
      return (
        <EmptyBench>
          <p>
            No line to the workshop. Nothing of yours is lost: what was not sent yet is kept on this device.
            Try again when the line is back.
          </p>
          <Button className="mt-3" onClick={draft.retry}>
            Try again
          </Button>
        </EmptyBench>
      );
    case 'refused':
      return (
        <EmptyBench>
          <p role="alert">{draft.problem.detail}</p>
        </EmptyBench>
      );
    case 'open':
      return <OpenWorkbench key={design.id} design={design} draft={draft} panel={shown} />;
  }
}
