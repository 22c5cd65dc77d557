import { lazy, Suspense, useState } from 'react';
import { useNavigate } from 'react-router';
import { takeDifference } from '#shared/document/document-difference.ts';
import { wordsFromFoot } from '#shared/document/fault-words.ts';
import { readDocument, type DocumentReading } from '#shared/document/read-document.ts';
import { permissionRefusal } from '#shared/rules/permissions.ts';
import type { Change } from '../features/compare/compare-changes.ts';
import { useCreateDesign } from '../features/designs/designs.queries.ts';
import { useSession } from '../lib/session.ts';
import { useUnit } from '../lib/unit.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/Button.tsx';
import type { ComparedDraft } from './compared-draft.ts';

const NameDialog = lazy(async () => ({
  default: (await import('../features/designs/NameDialog.tsx')).NameDialog,
}));

interface CopyChosenProps {
  /** What the new draft begins as. */
  base: ComparedDraft;
  changes: readonly Change[];
}

/** A new draft that begins as the first design and takes over what was ticked of the second. */
export function CopyChosen({ base, changes }: CopyChosenProps) {
  const [reading, setReading] = useState<DocumentReading | null>(null);
  const create = useCreateDesign();
  const navigate = useNavigate();
  const unit = useUnit();
  const refusal = permissionRefusal(useSession(), 'create-design');
  const merge = () =>
    setReading(
      readDocument(
        changes.flatMap(({ differences }) => differences).reduce(takeDifference, base.document),
        wordsFromFoot(unit),
      ),
    );
  return (
    <>
      <Button look="go" disabled={changes.length === 0 || refusal !== null} onClick={merge}>
        Copy chosen changes into a draft
      </Button>
      {refusal !== null && <p className="text-data text-ink2 w-full text-right">{refusal}</p>}
      {reading?.status === 'refused' && (
        <div
          role="alert"
          className="rounded-control border-stop bg-stop-soft text-ink mt-2 border-l-3 px-3 py-2"
        >
          <p className="font-semibold">These changes do not go together. Nothing was made.</p>
          <ul className="mt-1 grid gap-1">
            {reading.faults.map(({ path, message }) => (
              <li key={`${path.join('.')} ${message}`}>{message}</li>
            ))}
          </ul>
        </div>
      )}
      <Suspense fallback={null}>
        {reading?.status === 'read' && (
          <NameDialog
            title="Copy chosen changes"
            description={`A draft of your own that begins as ${base.design.name}, with ${changes.length === 1 ? 'the one change' : `the ${changes.length} changes`} chosen.`}
            verb="Make the draft"
            name={`${base.design.name}, changed`}
            mutation={create}
            onClose={() => setReading(null)}
            onName={(name) =>
              create.mutate(
                { ...reading.document, name },
                { onSuccess: (design) => void navigate(paths.design(design.id)) },
              )
            }
          />
        )}
      </Suspense>
    </>
  );
}
