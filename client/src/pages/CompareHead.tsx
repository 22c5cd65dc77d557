import { useState } from 'react';
import { Link, useLocation } from 'react-router';
import { permissionRefusal } from '#shared/rules/permissions.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { boreEnds } from '#shared/document/profile.ts';
import type { BenchGeometry } from '../bench/bench-geometry.ts';
import { MOUTH_WORDS } from '../bench/mouth-words.ts';
import type { CompareTerms } from '../features/compare/compare-address.ts';
import { CompareHeader } from '../features/compare/CompareHeader.tsx';
import { PanelLinks } from '../features/workbench/PanelLinks.tsx';
import type { ShownSide } from '../features/compare/comparison.ts';
import { unitPreference } from '../lib/preferences.ts';
import { useSession } from '../lib/session.ts';
import { COMPARE_VIEWS, paths, type CompareView } from '../paths.ts';
import { Button } from '../ui/Button.tsx';
import { Segment } from '../ui/Segment.tsx';
import { ApplyActions } from './ApplyActions.tsx';
import type { ComparedDraft } from './compared-draft.ts';
import { CopyChosen } from './CopyChosen.tsx';
import type { ChangeChoice } from './use-change-choice.ts';
import type { ComparisonDesk } from './use-comparison.ts';

interface CompareHeadProps {
  a: ComparedDraft;
  b: ComparedDraft;
  isSelf: boolean;
  view: CompareView;
  desk: ComparisonDesk;
  choice: ChangeChoice;
  terms: CompareTerms;
  unit: LengthUnit;
  side: ShownSide;
  geometry: BenchGeometry;
  onSide: (side: ShownSide) => void;
  onTerms: (change: Partial<CompareTerms>) => void;
}

const VIEW_WORDS: Record<CompareView, string> = {
  holes: 'Holes',
  bore: 'Bore',
  notes: 'Notes',
  pitch: 'At another pitch',
  air: 'At another temperature',
};
/** Where the tabs share the width of a hand. */
const SHORT_WORDS: Record<CompareView, string> = { ...VIEW_WORDS, pitch: 'Pitch', air: 'Air' };

const UNITS = [
  { value: 'mm', label: 'mm' },
  { value: 'inch', label: 'inch' },
] as const;

/** Names, views and conditions of the two on the bench. */
export function CompareHead(props: CompareHeadProps) {
  const { a, b, isSelf, desk, terms, unit, side, geometry, onSide } = props;
  const { search } = useLocation();
  const isWide = geometry.layout === 'wide';
  // At another pitch or temperature an instrument is held against itself: from two, the one in hand goes on.
  const addressOf = (view: CompareView) =>
    isSelf || (view !== 'pitch' && view !== 'air')
      ? paths.compare(a.design.id, b.design.id, view) + search
      : paths.compare(b.design.id, b.design.id, view);
  const links = COMPARE_VIEWS.map((view) => ({
    to: addressOf(view),
    label: (isWide ? VIEW_WORDS : SHORT_WORDS)[view],
  }));
  const { a: sideA, b: sideB } = desk.comparison;
  const showing = (
    <Segment
      label="Show"
      size="small"
      value={side}
      options={[
        { value: 'a', label: sideA.label },
        { value: 'both', label: 'both' },
        { value: 'b', label: sideB.label },
      ]}
      onChange={onSide}
    />
  );
  return (
    <>
      <CompareHeader
        a={headOf(a)}
        b={headOf(b)}
        itself={isSelf ? itselfWords(desk, terms) : null}
        actions={isSelf ? <SelfActions {...props} /> : <PairActions {...props} />}
      />
      <div className="bg-sheet border-hair px-margin flex min-h-10 flex-wrap items-stretch gap-x-5.5 gap-y-2 border-b max-[1279px]:py-2">
        {isWide && (
          <div className="flex h-10">
            <PanelLinks links={links} atBottom={false} />
          </div>
        )}
        <div className="text-data text-ink3 flex flex-wrap items-center gap-x-5.5 gap-y-2 min-[1280px]:ml-auto">
          <AirNote {...props} />
          <LaidAtSegment {...props} />
          {showing}
          {isWide && (
            <Segment
              label="Unit"
              size="small"
              value={unit}
              options={UNITS}
              onChange={(chosen) => unitPreference.choose(chosen)}
            />
          )}
        </div>
      </div>
      {!isWide && <PanelLinks links={links} atBottom />}
    </>
  );
}

function itselfWords({ comparison, isAsked }: ComparisonDesk, { airB }: CompareTerms): string {
  const words = [
    ...(isAsked ? [`in ${comparison.b.label}`] : []),
    ...(airB === null ? [] : [`at ${airB} °C`]),
  ];
  return ['itself', ...words].join(', ');
}

const headOf = ({ design }: ComparedDraft) => ({
  name: design.name,
  revision: design.revisionNumber,
  state: design.state,
});

/** In which air each is looked at; two designs can be brought to one temperature. */
function AirNote({ isSelf, desk, terms, onTerms }: CompareHeadProps) {
  const [airA, airB] = [desk.comparison.a.document.air, desk.comparison.b.document.air];
  const figure = (temperatureC: number) => <b className="text-ink font-semibold">{temperatureC} °C</b>;
  const isOne = airA.temperatureC === airB.temperatureC;
  const isChanged = terms.airA !== null || terms.airB !== null;
  return (
    <span className="inline-flex flex-wrap items-center gap-x-2">
      <span>
        Air {figure(airA.temperatureC)}
        {isOne ? ' for both' : <> and {figure(airB.temperatureC)}</>}
      </span>
      {!isSelf && !isOne && (
        <Button look="bare" size="small" onClick={() => onTerms({ airB: airA.temperatureC })}>
          Look at both at {airA.temperatureC} °C
        </Button>
      )}
      {!isSelf && isChanged && (
        <Button look="bare" size="small" onClick={() => onTerms({ airA: null, airB: null })}>
          Each at its own
        </Button>
      )}
    </span>
  );
}

/** Where two of different lengths are laid together. */
function LaidAtSegment({ desk, onTerms }: CompareHeadProps) {
  const { a, b, offsetMm } = desk.comparison;
  const apartMm = boreEnds(b.document).footMm - boreEnds(a.document).footMm;
  if (Math.abs(apartMm) < 0.05) return null;
  const mouth = MOUTH_WORDS[b.document.mouthEnd.kind];
  return (
    <span className="inline-flex items-center gap-2">
      <span aria-hidden="true">Together at</span>
      <Segment
        label="Laid together at"
        size="small"
        value={offsetMm === 0 ? 'mouth' : 'foot'}
        options={[
          { value: 'mouth', label: mouth },
          { value: 'foot', label: 'foot' },
        ]}
        onChange={(laidAt) => onTerms({ laidAt })}
      />
    </span>
  );
}

function PairActions({ a, b, view, choice }: CompareHeadProps) {
  const { changes, picked } = choice;
  return (
    <>
      <Button asChild look="bare">
        <Link to={paths.compare(b.design.id, a.design.id)}>Swap them</Link>
      </Button>
      <Button asChild>
        <Link to={paths.design(b.design.id)}>Open {b.design.name}</Link>
      </Button>
      {view === 'holes' && picked !== null && (
        <CopyChosen base={a} changes={changes.filter(({ key }) => picked.has(key))} />
      )}
    </>
  );
}

function SelfActions({ a, view, desk, terms }: CompareHeadProps) {
  const session = useSession();
  const [isBusy, setBusy] = useState(false);
  const isChanging = view === 'pitch' || view === 'air';
  return (
    <>
      <Button asChild look="bare">
        <Link to={paths.chooseToCompare(a.design.id)}>With another design</Link>
      </Button>
      <Button asChild look={isChanging ? 'bare' : 'plain'}>
        <Link to={paths.design(a.design.id)}>Open it</Link>
      </Button>
      <ApplyActions
        draft={a}
        desk={desk}
        terms={terms}
        isBusy={isBusy}
        onBusy={setBusy}
        refusals={{
          copy: permissionRefusal(session, 'create-design'),
          edit: permissionRefusal(session, 'edit-design'),
        }}
      />
    </>
  );
}
