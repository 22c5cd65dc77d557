import { memo, type ReactNode } from 'react';
import { useLocation } from 'react-router';
import type { DesignSummary } from '#shared/contract/designs.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { permissionRefusal } from '#shared/rules/permissions.ts';
import { SaveNote } from '../features/draft/SaveNote.tsx';
import type { DraftOnBench } from '../features/draft/use-draft.ts';
import { Conditions, TrialConditions } from '../features/workbench/Conditions.tsx';
import { DesignHeader, type History } from '../features/workbench/DesignHeader.tsx';
import { PanelLinks } from '../features/workbench/PanelLinks.tsx';
import { CompareMenu } from '../features/workbench/CompareMenu.tsx';
import { SheetMenu } from '../features/workbench/SheetMenu.tsx';
import { unitPreference } from '../lib/preferences.ts';
import { useSession } from '../lib/session.ts';
import { paths, WORKBENCH_PANELS, type WorkbenchPanel } from '../paths.ts';
import { Button } from '../ui/Button.tsx';

interface WorkbenchHeadProps {
  design: DesignSummary;
  panel: WorkbenchPanel;
  name: string;
  /** One line about the instrument. */
  facts: string;
  conditions: Pick<DesignDocument, 'air' | 'pitch'>;
  bandCents: readonly number[];
  unit: LengthUnit;
  isWide: boolean;
  readOnly: string | null;
  save: DraftOnBench['save'];
  history: History;
  onAddHole: () => void;
  onReadBore: () => void;
  /** What can be done with something that is held against the design, in place of what can be done with the design. */
  instead: ReactNode;
}

const PANEL_WORDS: Record<WorkbenchPanel, string> = {
  bore: 'Bore',
  holes: 'Holes',
  notes: 'Notes',
  air: 'Air',
};

/** Header, panels and conditions of the design in hand; rests while a hole is dragged. */
export const WorkbenchHead = memo(function WorkbenchHead(props: WorkbenchHeadProps) {
  const { design, unit, save, history, readOnly, instead } = props;
  const { search } = useLocation();
  const panelTo = (to: WorkbenchPanel) => paths.workbench(design.id, design.revisionNumber, to) + search;
  const links = WORKBENCH_PANELS.map((each) => ({ to: panelTo(each), label: PANEL_WORDS[each] }));
  const saveNote = <SaveNote save={save} />;
  return (
    <>
      <DesignHeader
        name={props.name}
        revision={design.revisionNumber}
        state={design.state}
        facts={props.facts}
        history={instead === null ? history : null}
        saveNote={saveNote}
        actions={instead ?? <HeadActions {...props} />}
      />
      {readOnly !== null && <p className="bg-sheet px-margin text-data text-ink2 pb-1.5">{readOnly}</p>}
      {props.isWide ? (
        <div className="bg-sheet border-hair px-margin flex h-10 items-stretch border-b">
          <PanelLinks links={links} atBottom={false} />
          {instead === null ? (
            <Conditions
              document={props.conditions}
              bandCents={props.bandCents}
              unit={unit}
              saveNote={saveNote}
              airTo={panelTo('air')}
              pitchTo={panelTo('notes')}
              bandTo={paths.workshopDefaults()}
              onUnit={(chosen) => unitPreference.choose(chosen)}
            />
          ) : (
            <TrialConditions unit={unit} onUnit={(chosen) => unitPreference.choose(chosen)} />
          )}
        </div>
      ) : (
        <PanelLinks links={links} atBottom />
      )}
    </>
  );
});

function HeadActions({ design, panel, unit, save, readOnly, ...props }: WorkbenchHeadProps) {
  const { role } = useSession();
  const printing = permissionRefusal({ role }, 'print-sheet');
  const unsaved =
    save.status === 'saved' ? null : 'The sheet is printed from what is saved. Wait until this draft is.';
  return (
    <>
      <CompareMenu
        places={[
          { to: paths.chooseToCompare(design.id), label: 'With another design' },
          { to: paths.compare(design.id, design.id, 'pitch'), label: 'At another pitch' },
          { to: paths.compare(design.id, design.id, 'air'), label: 'At another temperature' },
        ]}
        refusal={save.status === 'saved' ? null : 'What is saved is compared. Wait until this draft is.'}
      />
      {panel === 'holes' && (
        <Button disabled={readOnly !== null} onClick={props.onAddHole}>
          Add a hole
        </Button>
      )}
      {panel === 'bore' && (
        <Button disabled={readOnly !== null} onClick={props.onReadBore}>
          Read in a measured bore
        </Button>
      )}
      <SheetMenu designId={design.id} unit={unit} refusal={printing ?? unsaved} />
    </>
  );
}
