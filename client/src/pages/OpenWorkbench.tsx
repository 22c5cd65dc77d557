import { useMemo, useState, type ReactNode } from 'react';
import { useLocation, useNavigate } from 'react-router';
import type { DesignSummary } from '#shared/contract/designs.ts';
import { permissionRefusal } from '#shared/rules/permissions.ts';
import { BenchDefs } from '../bench/BenchDefs.tsx';
import { WHOLE } from '../bench/bench-view.ts';
import type { PanelProps } from '../bench/panel-props.ts';
import { useStable } from '../bench/use-stable.ts';
import { ConflictDialog } from '../features/draft/ConflictDialog.tsx';
import { DraftBands } from '../features/draft/DraftBands.tsx';
import type { DraftOnBench } from '../features/draft/use-draft.ts';
import { useSuggestionDesk } from '../features/holes/use-suggestion-desk.ts';
import { MeasuredActions } from '../features/measured-bore/MeasuredActions.tsx';
import { useMeasuredBore, type MeasuredBoreDesk } from '../features/measured-bore/use-measured-bore.ts';
import { useHeldNote } from '../features/sound/use-held-note.ts';
import { useTones } from '../features/sound/use-tones.ts';
import { InstrumentStrip } from '../features/strip/InstrumentStrip.tsx';
import { benchCommands } from '../features/workbench/bench-commands.ts';
import { choosing } from '../features/workbench/choosing.ts';
import { designFacts } from '../features/workbench/design-facts.ts';
import { FailureLine } from '../features/workbench/FailureLine.tsx';
import { FiguresComing } from '../features/workbench/FiguresComing.tsx';
import { SpokenChange } from '../features/workbench/SpokenChange.tsx';
import { useBenchKeys } from '../features/workbench/use-bench-keys.ts';
import { useBenchView } from '../features/workbench/use-bench-view.ts';
import { useHistory } from '../features/workbench/use-history.ts';
import { useLagging } from '../features/workbench/use-lagging.ts';
import { usePlacing } from '../features/workbench/use-placing.ts';
import { useSelection } from '../features/workbench/use-selection.ts';
import { useZones } from '../features/workbench/use-zones.ts';
import { ZoomButtons } from '../features/workbench/ZoomButtons.tsx';
import { useSession } from '../lib/session.ts';
import { useUnit } from '../lib/unit.ts';
import { paths, WORKBENCH_PANELS, type WorkbenchPanel } from '../paths.ts';
import { useElementWidth } from '../ui/use-element-width.ts';
import { WorkbenchHead } from './WorkbenchHead.tsx';
import { WorkbenchPanels } from './WorkbenchPanels.tsx';

interface OpenWorkbenchProps {
  design: DesignSummary;
  draft: DraftOnBench;
  panel: WorkbenchPanel;
}

/** An open draft on the bench: the strip on top, below it what the panel shows. */
export function OpenWorkbench({ design, draft, panel }: OpenWorkbenchProps) {
  const { document } = draft;
  const { role, workshop } = useSession();
  const unit = useUnit();
  const navigate = useNavigate();
  const { search } = useLocation();
  const [measure, widthPx] = useElementWidth();
  // Until the strip is measured, the page's width is the nearest to it.
  const desk = useBenchView(document, widthPx ?? window.document.documentElement.clientWidth);
  const placing = usePlacing(document);
  const [isDragging, setDragging] = useState(false);
  const [selection, select] = useSelection(document);
  const bench: PanelProps = {
    document,
    prediction: draft.prediction,
    sensitivities: draft.predictionOf === document ? draft.sensitivities : null,
    unit,
    bandCents: workshop.bandCents,
    readOnly: permissionRefusal({ role }, 'edit-design'),
    selection,
    onSelect: useStable(choosing(document, selection, select)),
    onEdit: draft.edit,
    geometry: desk.geometry,
  };
  const { air, pitch } = document;
  const conditions = useMemo(() => ({ air, pitch }), [air, pitch]);
  const history = useHistory(draft);
  const suggestion = useSuggestionDesk(bench, isDragging);
  const measured = useMeasuredBore(bench, design.id, draft.predictionOptions);
  const tones = useTones();
  const playReference = useHeldNote(tones, bench);
  const [best] = suggestion.suggestions ?? [];
  const isLagging = useLagging(draft.predictionOf !== document && draft.predictionFailure === null);
  const isOld = isLagging || draft.predictionFailure !== null;
  const goTo = (next: WorkbenchPanel | undefined) => {
    if (next === undefined) return;
    const to = paths.workbench(design.id, design.revisionNumber, next) + search;
    void navigate(to, { preventScrollReset: true });
  };
  useZones();
  useBenchKeys({
    ...benchCommands(bench),
    stepPanel: (by) => goTo(WORKBENCH_PANELS[WORKBENCH_PANELS.indexOf(panel) + by]),
    fullLadder: () => goTo('air'),
    playReference,
    undo: draft.undo,
    redo: draft.redo,
    trySuggestion: () => best !== undefined && suggestion.tryOut(best),
    putBack: () => suggestion.canPutBack && suggestion.putBack(),
    zoom: desk.zoom,
  });
  return (
    <>
      <BenchDefs />
      <WorkbenchHead
        {...{ design, panel, unit, conditions, history }}
        name={document.name}
        facts={designFacts(document, unit)}
        bandCents={workshop.bandCents}
        isWide={desk.geometry.layout === 'wide'}
        readOnly={bench.readOnly}
        save={draft.save}
        onAddHole={useStable(placing.start)}
        onReadBore={useStable(measured.open)}
        instead={trialActions(panel, measured)}
      />
      <div
        className="bg-bench border-hair sticky top-0 z-20 border-b outline-offset-[-3px]"
        data-zone="strip"
        tabIndex={-1}
      >
        <div ref={measure} className="relative mx-auto max-w-400">
          <InstrumentStrip
            {...bench}
            desk={desk}
            placing={placing}
            isDragging={isDragging}
            onDragging={setDragging}
          />
          <FiguresComing isComing={isLagging} />
          {desk.geometry.layout === 'wide' && (
            <ZoomButtons
              isWhole={desk.view.kind === 'whole'}
              onZoom={desk.zoom}
              onWhole={() => desk.setView(WHOLE)}
              onHoles={desk.showHoles}
            />
          )}
        </div>
      </div>
      <DraftBands
        save={draft.save}
        keptOnDevice={draft.keptOnDevice}
        mismatchCents={draft.mismatchCents}
        isToldBelow={draft.predictionFailure !== null}
      />
      {draft.predictionFailure !== null && (
        <FailureLine
          faults={draft.predictionFailure.faults}
          document={document}
          unit={unit}
          onChooseHole={(hole) => bench.onSelect({ hole })}
        />
      )}
      <div className="mx-auto max-w-400" data-figures={isOld ? 'old' : undefined}>
        <WorkbenchPanels {...{ panel, bench, draft, isDragging, isOld, suggestion, tones, measured }} />
      </div>
      {draft.save.status === 'conflict' && (
        <ConflictDialog
          mine={document}
          newer={draft.save.newer}
          ancestor={draft.save.ancestor}
          unit={unit}
          onSettle={draft.settle}
        />
      )}
      <SpokenChange {...bench} isDragging={isDragging} />
    </>
  );
}

/** null while nothing is held against the design, so that the header rests while a hole is dragged. */
function trialActions(panel: WorkbenchPanel, measured: MeasuredBoreDesk): ReactNode {
  return panel === 'bore' && measured.isOpen ? <MeasuredActions desk={measured} /> : null;
}
