import { useMemo, type ReactNode } from 'react';
import type { PanelProps } from '../bench/panel-props.ts';
import { BoreLines } from '../features/compare/BoreLines.tsx';
import { BoreTable } from '../features/compare/BoreTable.tsx';
import { ChangeList } from '../features/compare/ChangeList.tsx';
import type { CompareTerms } from '../features/compare/compare-address.ts';
import { CompareTable } from '../features/compare/CompareTable.tsx';
import type { Comparison } from '../features/compare/comparison.ts';
import { noteRows } from '../features/compare/note-rows.ts';
import { NotesTable } from '../features/compare/NotesTable.tsx';
import { PitchForm } from '../features/compare/PitchForm.tsx';
import { SideMark } from '../features/compare/SideMark.tsx';
import { summaryRows } from '../features/compare/summary-rows.ts';
import { TemperatureForm } from '../features/compare/TemperatureForm.tsx';
import { TransformWords } from '../features/compare/TransformWords.tsx';
import { WhatItDid } from '../features/compare/WhatItDid.tsx';
import { PlumbChart } from '../features/plumb/PlumbChart.tsx';
import { RegisterChoice } from '../features/plumb/RegisterChoice.tsx';
import { ColumnTint } from '../features/workbench/ColumnTint.tsx';
import type { CompareView } from '../paths.ts';
import type { ComparedDraft } from './compared-draft.ts';
import type { ChangeChoice } from './use-change-choice.ts';
import type { ComparisonDesk } from './use-comparison.ts';

interface ComparePanelsProps {
  a: ComparedDraft;
  view: CompareView;
  desk: ComparisonDesk;
  choice: ChangeChoice;
  terms: CompareTerms;
  bench: PanelProps;
  ghosts: ReadonlyMap<string, number> | undefined;
  onTerms: (change: Partial<CompareTerms>) => void;
}

/** What stands below the strip, by view. */
export function ComparePanels(props: ComparePanelsProps) {
  const { view, desk, bench, ghosts } = props;
  const { comparison } = desk;
  const chart = (
    <>
      <PlumbChart {...bench} isDragging={false} isOld={false} {...(ghosts === undefined ? {} : { ghosts })} />
      <RegisterChoice {...bench} />
    </>
  );
  const table = (
    <CompareTable
      comparison={comparison}
      geometry={bench.geometry}
      unit={bench.unit}
      chosen={bench.selection.hole}
    />
  );
  const legend = <Legend comparison={comparison} />;
  switch (view) {
    case 'holes':
      return (
        <Split bench={bench} left={<HolesLeft {...props} />}>
          {chart}
          {legend}
          {table}
        </Split>
      );
    case 'bore':
      return (
        <>
          <BoreLines comparison={comparison} geometry={bench.geometry} unit={bench.unit} />
          <Split bench={bench} left={<BoreTable comparison={comparison} unit={bench.unit} />}>
            {chart}
            {legend}
          </Split>
        </>
      );
    case 'notes':
      return <NotesView {...props} />;
    case 'pitch':
      return (
        <Split bench={bench} left={<PitchLeft {...props} />} isAsking>
          {chart}
          {legend}
          {table}
        </Split>
      );
    case 'air':
      return (
        <Split bench={bench} left={<AirLeft {...props} />} isAsking>
          {chart}
          {legend}
        </Split>
      );
  }
}

interface SplitProps {
  bench: PanelProps;
  left: ReactNode;
  /** What stands at the left is a question: on a narrow screen it comes before its answer. */
  isAsking?: boolean;
  children: ReactNode;
}

/** At the left what is read, under the holes what hangs; one below the other where the columns need the whole width. */
function Split({ bench, left, isAsking = false, children }: SplitProps) {
  const { geometry } = bench;
  const { leftZone } = geometry.measures;
  const room = geometry.hangLeft - LABELS_PX - leftZone.x;
  const isBeside = geometry.layout === 'wide' ? geometry.ladderFits : leftZone.width > 0;
  const width = isBeside ? Math.min(MOST_LEFT_PX, Math.max(leftZone.width, room)) : undefined;
  const hang = (
    <div className="relative min-w-0">
      <ColumnTint geometry={geometry} chosen={bench.selection.hole} />
      <div className="relative">{children}</div>
    </div>
  );
  if (!isBeside)
    return (
      <div className="flex flex-col pb-18">
        <div className={isAsking ? 'px-margin order-first pt-3 pb-6' : 'px-margin order-last pt-6'}>
          {left}
        </div>
        {hang}
      </div>
    );
  return (
    <div className={geometry.layout === 'wide' ? 'grid' : 'grid pb-18'}>
      <div
        className="z-10 col-start-1 row-start-1 justify-self-start pt-3 pb-4"
        style={{ marginLeft: leftZone.x, width }}
      >
        {left}
      </div>
      <div className="col-start-1 row-start-1 min-w-0">{hang}</div>
    </div>
  );
}

/** What the row labels take, left of the first column; and the most that reads well. */
const LABELS_PX = 148;
const MOST_LEFT_PX = 512;

function Legend({ comparison: { a, b } }: { comparison: Comparison }) {
  const failed = [a, b].filter(({ hasFailed }) => hasFailed);
  return (
    <div className="px-margin text-data text-ink2 flex flex-wrap justify-end gap-x-5 gap-y-1 pb-2">
      {failed.map(({ label }) => (
        <span key={label} role="status">
          Cannot work out the notes of {label}. Its sizes are as they are.
        </span>
      ))}
      <SideMark side="a" label={a.label} />
      <SideMark side="b" label={b.label} />
    </div>
  );
}

function HolesLeft({ desk, bench, choice }: ComparePanelsProps) {
  const { comparison } = desk;
  return (
    <>
      <ChangeList
        changes={choice.changes}
        isByPlace={comparison.match.isByPlace}
        chosenHole={bench.selection.hole}
        picked={choice.picked}
        onChooseHole={(hole) => bench.onSelect({ hole })}
        onPick={choice.pick}
      />
      <WhatItDid rows={summaryRows(comparison, bench.unit)} labels={labelsOf(comparison)} />
      <p className="text-data text-ink3 mt-2 max-[1024px]:hidden">
        Hold Space to see {comparison.a.label} alone.
      </p>
    </>
  );
}

const labelsOf = ({ a, b }: Comparison) => ({ a: a.label, b: b.label });

function NotesView({ desk, bench }: ComparePanelsProps) {
  const { comparison } = desk;
  const { layout } = bench.geometry;
  const rows = useMemo(() => noteRows(comparison), [comparison]);
  return (
    <div className="px-margin max-w-275 pt-3 pb-18">
      <h2 className="text-section mb-1 font-semibold">
        Notes
        <span className="text-data text-ink3 ml-2 font-normal">each against its own scale</span>
      </h2>
      <NotesTable
        rows={rows}
        labels={labelsOf(comparison)}
        bandCents={bench.bandCents}
        isWide={layout === 'wide' || layout === 'tablet'}
      />
      <Legend comparison={comparison} />
    </div>
  );
}

function PitchLeft({ a, desk, terms, bench, onTerms }: ComparePanelsProps) {
  const { isSettled, outcome, isAsked } = desk;
  return (
    <>
      <PitchForm document={a.document} terms={terms} unit={bench.unit} onTerms={onTerms} />
      <TransformWords outcome={isSettled ? outcome : null} isAsked={isAsked} />
    </>
  );
}

function AirLeft({ a, desk, terms, bench, onTerms }: ComparePanelsProps) {
  const { comparison } = desk;
  const rows = useMemo(() => noteRows(comparison), [comparison]);
  return (
    <>
      <TemperatureForm
        air={a.document.air}
        temperatureC={terms.airB ?? a.document.air.temperatureC}
        rows={rows}
        onTemperature={(airB) => onTerms({ airB })}
      />
      <div className="mt-4">
        <NotesTable rows={rows} labels={labelsOf(comparison)} bandCents={bench.bandCents} isWide={false} />
      </div>
    </>
  );
}
