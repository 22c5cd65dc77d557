import { useMemo, type ReactNode } from 'react';
import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import type { PanelProps } from '../bench/panel-props.ts';
import { AirPanel } from '../features/air-panel/AirPanel.tsx';
import { BorePanel } from '../features/bore-panel/BorePanel.tsx';
import type { DraftOnBench } from '../features/draft/use-draft.ts';
import { HoleTable } from '../features/hole-table/HoleTable.tsx';
import { HoleInspector } from '../features/holes/HoleInspector.tsx';
import type { SuggestionDesk } from '../features/holes/use-suggestion-desk.ts';
import { Ladder } from '../features/ladder/Ladder.tsx';
import { MeasuredBorePanel } from '../features/measured-bore/MeasuredBorePanel.tsx';
import { MeasuredNote } from '../features/measured-bore/MeasuredNote.tsx';
import type { MeasuredBoreDesk } from '../features/measured-bore/use-measured-bore.ts';
import { NotesPanel } from '../features/notes-panel/NotesPanel.tsx';
import { PlumbChart } from '../features/plumb/PlumbChart.tsx';
import { RegisterChoice } from '../features/plumb/RegisterChoice.tsx';
import { SoundBar } from '../features/sound/SoundBar.tsx';
import type { Tones } from '../features/sound/use-tones.ts';
import { BottomDrawer } from '../features/workbench/BottomDrawer.tsx';
import { ColumnTint } from '../features/workbench/ColumnTint.tsx';
import { NoticeList } from '../features/workbench/NoticeList.tsx';
import type { WorkbenchPanel } from '../paths.ts';

interface WorkbenchPanelsProps {
  panel: WorkbenchPanel;
  bench: PanelProps;
  draft: DraftOnBench;
  isDragging: boolean;
  /** The figures belong to an earlier drawing. */
  isOld: boolean;
  suggestion: SuggestionDesk;
  tones: Tones;
  measured: MeasuredBoreDesk;
}

/** What stands below the strip. Features do not know each other: this is where they are put side by side. */
export function WorkbenchPanels({
  panel,
  bench,
  draft,
  isDragging,
  isOld,
  suggestion,
  tones,
  measured,
}: WorkbenchPanelsProps) {
  const chart = (
    <PlumbChart {...bench} isDragging={isDragging} isOld={isOld} showsFingering={panel === 'holes'} />
  );
  switch (panel) {
    case 'bore':
      if (measured.isOpen) return <MeasuredPanel bench={bench} draft={draft} measured={measured} />;
      return (
        <BorePanel
          {...bench}
          note={<MeasuredNote desk={measured} geometry={bench.geometry} readOnly={bench.readOnly} />}
          beside={measured.besideStations}
          hang={
            <HangZone bench={bench}>
              {chart}
              <RegisterChoice {...bench} />
            </HangZone>
          }
        />
      );
    case 'notes':
      return <NotesPanel {...bench} sound={<SoundBar {...bench} tones={tones} />} />;
    case 'air':
      return (
        <AirPanel
          {...bench}
          predictionOptions={draft.predictionOptions}
          onChoosePredictionOptions={draft.choosePredictionOptions}
          sound={<SoundBar {...bench} tones={tones} />}
        />
      );
    case 'holes':
      return (
        <HolesPanel
          bench={bench}
          chart={chart}
          sound={<SoundBar {...bench} tones={tones} />}
          suggestion={suggestion}
          isDragging={isDragging}
        />
      );
  }
}

interface MeasuredPanelProps {
  bench: PanelProps;
  draft: DraftOnBench;
  measured: MeasuredBoreDesk;
}

const GHOST_WORDS = { ghost: 'drawn', now: 'measured' };

/** The measured bore's notes hang over the drawn one's, which are dashed. */
function MeasuredPanel({ bench, draft, measured }: MeasuredPanelProps) {
  const drawn = draft.predictionOf === bench.document ? bench.prediction : null;
  const ghosts = useMemo(() => centsByFingering(drawn), [drawn]);
  const { proposed, prediction, lastPrediction } = measured;
  const chart =
    proposed === null ? (
      <PlumbChart {...bench} isDragging={false} isOld={drawn === null} showsFingering={false} />
    ) : (
      <PlumbChart
        {...bench}
        document={proposed}
        prediction={lastPrediction}
        isDragging={false}
        isOld={prediction === null}
        showsFingering={false}
        ghosts={ghosts}
        ghostWords={GHOST_WORDS}
      />
    );
  return (
    <MeasuredBorePanel
      {...bench}
      prediction={drawn}
      desk={measured}
      hang={
        <HangZone bench={bench}>
          {chart}
          <RegisterChoice {...bench} />
        </HangZone>
      }
    />
  );
}

function centsByFingering(prediction: DesignPrediction | null): Map<string, number> {
  return new Map(
    prediction?.fingerings.flatMap(({ id, centsFromScale }) =>
      centsFromScale === null ? [] : [[id, centsFromScale]],
    ),
  );
}

function HangZone({ bench, children }: { bench: PanelProps; children: ReactNode }) {
  return (
    <div className="relative" data-zone="columns" tabIndex={-1}>
      <ColumnTint geometry={bench.geometry} chosen={bench.selection.hole} />
      {/* Above the tint, which is placed and would otherwise cover the rows. */}
      <div className="relative">{children}</div>
    </div>
  );
}

interface HolesPanelProps {
  bench: PanelProps;
  chart: ReactNode;
  sound: ReactNode;
  suggestion: SuggestionDesk;
  isDragging: boolean;
}

/** Inspector and ladder at the left, where nothing hangs; plumb lines and sizes under the holes. */
function HolesPanel({ bench, chart, sound, suggestion, isDragging }: HolesPanelProps) {
  const { document, geometry, prediction, sensitivities, unit, selection, readOnly } = bench;
  const { leftZone } = geometry.measures;
  const chosen = selection.fingering ?? document.fingerings[0]?.id;
  const predicted = prediction?.fingerings.find(({ id }) => id === chosen) ?? null;
  const inspector = <HoleInspector {...bench} suggestion={suggestion} />;
  const hasLeftZone = leftZone.width > 0;
  return (
    <div className={geometry.layout === 'wide' ? 'grid' : 'grid pb-18'}>
      {hasLeftZone && (
        <div
          className="z-10 col-start-1 row-start-1 flex items-start gap-7.5 justify-self-start pt-3 pb-4"
          style={{ marginLeft: leftZone.x }}
        >
          <div style={{ width: leftZone.width }} data-zone="left" tabIndex={-1}>
            {inspector}
          </div>
          {geometry.ladderFits && <Ladder prediction={predicted} height={384} />}
        </div>
      )}
      <div className="col-start-1 row-start-1 min-w-0">
        <HangZone bench={bench}>
          {chart}
          <RegisterChoice {...bench} />
          <div data-zone="table" tabIndex={-1} className="mt-2">
            <HoleTable
              {...{ document, geometry, sensitivities, unit, selection, readOnly }}
              onSelect={bench.onSelect}
              onEdit={bench.onEdit}
            />
          </div>
        </HangZone>
        <div style={{ paddingLeft: Math.max(16, geometry.hangLeft - 112), paddingRight: 16 }}>
          <div className="pt-3">{sound}</div>
          <NoticeList prediction={prediction} isDragging={isDragging} />
        </div>
      </div>
      {!hasLeftZone && (
        <BottomDrawer label="Hole" isIdle={selection.hole === null}>
          {inspector}
        </BottomDrawer>
      )}
    </div>
  );
}
