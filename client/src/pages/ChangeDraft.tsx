import { useEffect, useRef } from 'react';
import { useNavigate } from 'react-router';
import type { DesignSummary } from '#shared/contract/designs.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { isSameDocument } from '../features/draft/document-changes.ts';
import { useDraft, type DraftOnBench, type UseDraft } from '../features/draft/use-draft.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/Button.tsx';

interface ChangeDraftProps {
  design: DesignSummary;
  /** What the change was worked out from. */
  base: DesignDocument;
  document: DesignDocument;
  /** What Undo will say. */
  label: string;
  onStop: () => void;
}

/** Takes one document in as one step of the draft, and leads to the bench, where it can be undone. */
export function ChangeDraft({ design, base, document, label, onStop }: ChangeDraftProps) {
  const draft = useDraft(design.id);
  const navigate = useNavigate();
  const hasEdited = useRef(false);
  const isOpen = draft.status === 'open';
  const isDone = isOpen && draft.document === document && isKept(draft.save);
  const complaint = complaintOf(draft, { base, document });
  useEffect(() => {
    if (!isOpen || hasEdited.current || complaint !== null) return;
    hasEdited.current = true;
    draft.edit({ label, change: () => document });
  }, [isOpen, complaint, draft, label, document]);
  useEffect(() => {
    if (isDone) void navigate(paths.workbench(design.id, design.revisionNumber, 'holes'));
  }, [isDone, navigate, design]);
  return (
    <div role="status" className="text-data text-ink2 flex w-full flex-wrap items-center justify-end gap-3">
      {complaint === null ? (
        'Changing the draft…'
      ) : (
        <>
          <span>{complaint}</span>
          <Button size="small" onClick={onStop}>
            Leave it
          </Button>
        </>
      )}
    </div>
  );
}

/** Stored, or safe on this device until the line is back; a conflict is settled on the bench. */
const isKept = ({ status }: DraftOnBench['save']) =>
  status === 'saved' || status === 'waiting' || status === 'conflict';

function complaintOf(
  draft: UseDraft,
  { base, document }: { base: DesignDocument; document: DesignDocument },
): string | null {
  switch (draft.status) {
    case 'loading':
      return null;
    case 'unreachable':
      return 'No line to the workshop. Nothing was changed. Try again when the line is back.';
    case 'refused':
      return draft.problem.detail;
    case 'open':
      if (draft.save.status === 'refused') return draft.save.problem.detail;
      return draft.document === document || isSameDocument(draft.document, base)
        ? null
        : 'This draft has changed since. Nothing was changed. Load the page again and look at it as it is now.';
  }
}
