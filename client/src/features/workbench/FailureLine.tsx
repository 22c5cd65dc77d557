import type { DesignDocument } from '#shared/document/design-document.ts';
import { documentFaults } from '#shared/document/document-faults.ts';
import { wordsFromFoot, type DocumentFault } from '#shared/document/fault-words.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { Button } from '../../ui/Button.tsx';

interface FailureLineProps {
  faults: readonly DocumentFault[];
  document: DesignDocument;
  unit: LengthUnit;
  onChooseHole: (hole: string) => void;
}

/** Why the present drawing has no figures, over the chart whose bobs have turned to outlines. */
export function FailureLine({ faults, document, unit, onChooseHole }: FailureLineProps) {
  // What the drawing itself gets wrong is said in the figures of the bench; the rest only the engine knows.
  const drawn = documentFaults(document, wordsFromFoot(unit));
  const [first, ...others] = drawn.length > 0 ? drawn : faults;
  if (first === undefined) return null;
  const hole = first.path[0] === 'holes' ? document.holes[Number(first.path[1])] : undefined;
  return (
    <div role="alert" className="border-stop bg-stop-soft text-ink mx-margin my-2 border-l-3 px-3 py-2">
      <b className="font-semibold">Cannot work this out:</b> {first.message} The sizes stay as you drew them;
      the outlined bobs and the pale figures are from before.
      {others.length > 0 && (
        <ul className="text-data mt-1 list-disc pl-5">
          {others.map((fault) => (
            <li key={fault.message}>{fault.message}</li>
          ))}
        </ul>
      )}
      {hole !== undefined && (
        <Button look="bare" size="small" onClick={() => onChooseHole(hole.id)}>
          Show the hole
        </Button>
      )}
    </div>
  );
}
