import { useLocation } from 'react-router';
import type { DesignSummary } from '#shared/contract/designs.ts';
import { permissionRefusal } from '#shared/rules/permissions.ts';
import type { PanelProps } from '../bench/panel-props.ts';
import { SaveNote } from '../features/draft/SaveNote.tsx';
import type { DraftOnBench } from '../features/draft/use-draft.ts';
import { Conditions } from '../features/workbench/Conditions.tsx';
import { designFacts } from '../features/workbench/design-facts.ts';
import { DesignHeader } from '../features/workbench/DesignHeader.tsx';
import { PanelLinks } from '../features/workbench/PanelLinks.tsx';
import { SheetMenu } from '../features/workbench/SheetMenu.tsx';
import { unitPreference } from '../lib/preferences.ts';
import { useSession } from '../lib/session.ts';
import { paths, WORKBENCH_PANELS, type WorkbenchPanel } from '../paths.ts';
import { Button } from '../ui/Button.tsx';

interface WorkbenchHeadProps {
  design: DesignSummary;
  draft: DraftOnBench;
  panel: WorkbenchPanel;
  bench: PanelProps;
  onAddHole: () => void;
}

const PANEL_WORDS: Record<WorkbenchPanel, string> = {
  bore: 'Bore',
  holes: 'Holes',
  notes: 'Notes',
  air: 'Air',
};

/** Header, panels and conditions of the design in hand. */
export function WorkbenchHead({ design, draft, panel, bench, onAddHole }: WorkbenchHeadProps) {
  const { search } = useLocation();
  const { document, unit, geometry } = bench;
  const isWide = geometry.layout === 'wide';
  const panelTo = (to: WorkbenchPanel) => paths.workbench(design.id, design.revisionNumber, to) + search;
  const links = WORKBENCH_PANELS.map((each) => ({ to: panelTo(each), label: PANEL_WORDS[each] }));
  const saveNote = <SaveNote save={draft.save} />;
  return (
    <>
      <DesignHeader
        name={document.name}
        revision={design.revisionNumber}
        state={design.state}
        facts={designFacts(document, unit)}
        history={draft}
        saveNote={saveNote}
        actions={<HeadActions {...{ design, draft, panel, bench, onAddHole }} />}
      />
      {bench.readOnly !== null && (
        <p className="bg-sheet px-margin text-data text-ink2 pb-1.5">{bench.readOnly}</p>
      )}
      {isWide ? (
        <div className="bg-sheet border-hair px-margin flex h-10 items-stretch border-b">
          <PanelLinks links={links} atBottom={false} />
          <Conditions
            document={document}
            bandCents={bench.bandCents}
            unit={unit}
            saveNote={saveNote}
            airTo={panelTo('air')}
            pitchTo={panelTo('notes')}
            bandTo={paths.workshopDefaults()}
            onUnit={(chosen) => unitPreference.choose(chosen)}
          />
        </div>
      ) : (
        <PanelLinks links={links} atBottom />
      )}
    </>
  );
}

function HeadActions({ design, draft, panel, bench, onAddHole }: WorkbenchHeadProps) {
  const { role } = useSession();
  const printing = permissionRefusal({ role }, 'print-sheet');
  const unsaved =
    draft.save.status === 'saved'
      ? null
      : 'The sheet is printed from what is saved. Wait until this draft is.';
  return (
    <>
      {panel === 'holes' && (
        <Button disabled={bench.readOnly !== null} onClick={onAddHole}>
          Add a hole
        </Button>
      )}
      <SheetMenu designId={design.id} unit={bench.unit} refusal={printing ?? unsaved} />
    </>
  );
}
