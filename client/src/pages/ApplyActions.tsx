import { lazy, Suspense, useState } from 'react';
import { useNavigate } from 'react-router';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { CompareTerms } from '../features/compare/compare-address.ts';
import { useCreateDesign } from '../features/designs/designs.queries.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/Button.tsx';
import type { ComparedDraft } from './compared-draft.ts';
import type { ComparisonDesk } from './use-comparison.ts';

/** Fetched when something is to be changed. */
const ChangeDraft = lazy(async () => ({ default: (await import('./ChangeDraft.tsx')).ChangeDraft }));
const NameDialog = lazy(async () => ({
  default: (await import('../features/designs/NameDialog.tsx')).NameDialog,
}));

interface ApplyActionsProps {
  draft: ComparedDraft;
  desk: ComparisonDesk;
  terms: CompareTerms;
  isBusy: boolean;
  onBusy: (isBusy: boolean) => void;
  /** Why this person may not; null when they may. */
  refusals: { copy: string | null; edit: string | null };
}

/** What was only looked at becomes a design of its own, or one step of the draft that can be undone. */
export function ApplyActions({ draft, desk, terms, isBusy, onBusy, refusals }: ApplyActionsProps) {
  const [isNaming, setNaming] = useState(false);
  const [changing, setChanging] = useState<DesignDocument | null>(null);
  const create = useCreateDesign();
  const navigate = useNavigate();
  const { document } = desk.comparison.b;
  const waits = whyNot(desk, terms);
  const words = wordsFor(desk, terms);
  const edit =
    refusals.edit ?? (draft.design.state === 'draft' ? null : 'Only a draft can be changed. Make a copy.');
  const stop = () => {
    setChanging(null);
    onBusy(false);
  };
  return (
    <>
      <Button
        {...resting(edit, waits, isBusy)}
        onClick={() => {
          onBusy(true);
          setChanging(document);
        }}
      >
        Change this draft
      </Button>
      <Button look="go" {...resting(refusals.copy, waits, isBusy)} onClick={() => setNaming(true)}>
        Make a copy
      </Button>
      <Reasons reasons={[refusals.copy, edit]} />
      <Suspense fallback={null}>
        {changing !== null && (
          <ChangeDraft
            design={draft.design}
            base={draft.document}
            document={changing}
            label={words.step}
            onStop={stop}
          />
        )}
        {isNaming && (
          <NameDialog
            title="Make a copy"
            description={`A draft of your own, ${words.like}. ${draft.design.name} stays as it is.`}
            verb="Make the copy"
            name={`${draft.design.name}, ${words.name}`}
            mutation={create}
            onClose={() => setNaming(false)}
            onName={(name) =>
              create.mutate(
                { ...document, name },
                { onSuccess: (design) => void navigate(paths.design(design.id)) },
              )
            }
          />
        )}
      </Suspense>
    </>
  );
}

/** Quiet while it may not or cannot be done, with the reason. */
function resting(refusal: string | null, waits: string | null, isBusy: boolean) {
  return { disabled: isBusy || refusal !== null || waits !== null, title: refusal ?? waits ?? undefined };
}

function Reasons({ reasons }: { reasons: readonly (string | null)[] }) {
  return [...new Set(reasons)]
    .filter((reason) => reason !== null)
    .map((reason) => (
      <p key={reason} className="text-data text-ink2 w-full text-right">
        {reason}
      </p>
    ));
}

function whyNot({ outcome, isAsked, isSettled }: ComparisonDesk, { airB }: CompareTerms): string | null {
  if (!isAsked && airB === null) return 'Choose another pitch or another temperature first.';
  if (!isSettled) return 'Wait until it is worked out.';
  if (isAsked && outcome?.status !== 'transformed')
    return 'There is nothing to keep: it cannot be taken there.';
  return null;
}

/** What was chosen, in the words of the undo step, the new name and the sentence about the copy. */
function wordsFor({ comparison, isAsked }: ComparisonDesk, { airB }: CompareTerms) {
  const { b } = comparison;
  const parts = [...(isAsked ? [b.label] : []), ...(airB === null ? [] : [`${airB} °C`])].join(', ');
  return {
    step: isAsked ? `Take to ${parts}` : `Air at ${parts}`,
    name: isAsked ? `in ${parts}` : `at ${parts}`,
    like: isAsked ? `taken to ${parts}` : `in air at ${parts}`,
  };
}
