import { useMemo } from 'react';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { boreEnds } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { labelledHoles, type LabelledHole } from '#shared/document/hole-labels.ts';
import { leadingNote } from '../../bench/hole-sensitivity.ts';
import { hungNotes, notesOfColumn, type HungNote } from '../../bench/hung-notes.ts';
import { MOUTH_WORDS } from '../../bench/mouth-words.ts';
import { NoteName } from '../../bench/NoteName.tsx';
import type { PanelProps } from '../../bench/panel-props.ts';
import { FurthestNotes } from './FurthestNotes.tsx';
import { HoleFields } from './HoleFields.tsx';
import type { SuggestionDesk } from './use-suggestion-desk.ts';

interface HoleInspectorProps extends PanelProps {
  suggestion: SuggestionDesk;
}

/** Everything about the chosen hole, and what a small step of each size does to its note. */
export function HoleInspector(props: HoleInspectorProps) {
  const { document, prediction, selection, onSelect } = props;
  const holes = useMemo(() => labelledHoles(document), [document]);
  const notes = useMemo(() => hungNotes(document, prediction), [document, prediction]);
  const at = holes.findIndex(({ hole }) => hole.id === selection.hole);
  const chosen = holes[at];
  if (chosen === undefined) return <NoHole {...props} holes={holes} notes={notes} />;
  const vents = notesOfColumn(notes, chosen.hole.id).slice(0, 3);
  return (
    <section aria-label={chosen.title}>
      <header className="flex min-h-8.5 items-center gap-2.5">
        <h2 className="text-section font-semibold max-[1279px]:text-[22px]">{chosen.title}</h2>
        {vents.length > 0 && (
          <p className="text-data text-ink3 min-w-0 truncate">
            vents{' '}
            {vents.map(({ fingering }, index) => (
              <span key={fingering.id}>
                {index > 0 && ', '}
                <NoteName note={fingering.note} />
              </span>
            ))}
          </p>
        )}
        <Neighbours before={holes[at - 1]} after={holes[at + 1]} onSelect={onSelect} />
      </header>
      <HoleFields
        {...props}
        chosen={chosen}
        leading={leadingNote(notes, chosen.hole.id, selection)?.fingering.id}
      />
    </section>
  );
}

interface NoHoleProps extends HoleInspectorProps {
  holes: readonly LabelledHole[];
  notes: readonly HungNote[];
}

function NoHole({ document, unit, selection, holes, notes, readOnly, bandCents, onSelect }: NoHoleProps) {
  const end = endWords(document, selection.hole, unit);
  return (
    <section aria-label="Holes">
      <h2 className="text-section font-semibold">{end?.title ?? 'Holes'}</h2>
      <p className="text-data text-ink2 mt-1">
        {end !== null && `${end.place} Drag it, or Alt with ← and →; its sizes stand under Bore. `}
        {holes.length === 0
          ? 'No holes yet. Double-click the instrument where the first one goes, or press Add a hole.'
          : 'Choose a hole on the instrument to see and change its sizes.'}
        {readOnly !== null && ` ${readOnly}`}
      </p>
      {holes.length > 0 && <FurthestNotes {...{ notes, holes, bandCents, onSelect }} />}
    </section>
  );
}

/** Heading and place of a chosen end; null while no end is chosen. */
function endWords(document: DesignDocument, key: string | null, unit: LengthUnit) {
  const length = (mm: number) => `${printLength(mm, unit)} ${unit}`;
  const { footMm } = boreEnds(document);
  if (key === 'foot') return { title: 'Foot', place: `${length(footMm)} from the mouth end.` };
  if (key !== 'mouth') return null;
  const words = MOUTH_WORDS[document.mouthEnd.kind];
  const title = `${words.charAt(0).toUpperCase()}${words.slice(1)}`;
  return { title, place: `${length(footMm)} from the foot.` };
}

interface NeighboursProps {
  before: LabelledHole | undefined;
  after: LabelledHole | undefined;
  onSelect: PanelProps['onSelect'];
}

/** The next hole toward the mouth end and toward the foot. */
function Neighbours({ before, after, onSelect }: NeighboursProps) {
  const side = (neighbour: LabelledHole | undefined, look: string) => (
    <button
      type="button"
      disabled={neighbour === undefined}
      aria-label={neighbour?.title ?? 'No further hole'}
      onClick={() => neighbour !== undefined && onSelect({ hole: neighbour.hole.id })}
      className={`border-line bg-sheet text-data text-ink2 disabled:text-line h-7.5 w-9 border font-semibold max-[1279px]:h-12 max-[1279px]:w-12 ${look}`}
    >
      {neighbour?.label ?? '–'}
    </button>
  );
  return (
    <div className="ml-auto flex shrink-0">
      {side(before, 'rounded-l-control')}
      {side(after, 'rounded-r-control border-l-0')}
    </div>
  );
}
