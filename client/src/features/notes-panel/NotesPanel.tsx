import { useMemo, type ReactNode } from 'react';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { classNames } from '../../ui/class-names.ts';
import { chartRows, type ChartRow } from './chart-rows.ts';
import { ChartFoot } from './ChartFoot.tsx';
import { ChartHead } from './ChartHead.tsx';
import { FingeringEditor } from './FingeringEditor.tsx';
import { NoteRow } from './NoteRow.tsx';
import { notesLayout } from './note-lane.ts';
import { ScaleForm } from './ScaleForm.tsx';
import './notes-panel.css';

interface NotesPanelProps extends PanelProps {
  /** Buttons that make the chosen note heard; handed in by the page. */
  sound?: ReactNode;
}

/** Every note with its pitch on one scale, and its fingering with each circle under its own hole. */
export function NotesPanel({ sound, ...props }: NotesPanelProps) {
  const { document, prediction, bandCents, selection, onSelect, onEdit, readOnly, geometry } = props;
  const layout = useMemo(() => notesLayout(geometry), [geometry]);
  const holes = useMemo(() => labelledHoles(document), [document]);
  const rows = useMemo(() => chartRows(document, prediction), [document, prediction]);
  const chosen = rows.find(({ fingering }) => fingering.id === selection.fingering);
  const step = (from: ChartRow, by: number) => {
    const next = rows[rows.indexOf(from) + by];
    if (next !== undefined) onSelect({ fingering: next.fingering.id });
  };
  return (
    <section
      aria-label="Notes and fingerings"
      className={classNames('relative', geometry.layout !== 'wide' && 'pb-18')}
    >
      <div role="table" aria-label="Fingering chart" className="relative">
        <ChartHead layout={layout} holes={holes} chosenHole={selection.hole} />
        {rows.map((row) => (
          <NoteRow
            key={row.fingering.id}
            row={row}
            holes={holes}
            layout={layout}
            kind={document.mouthEnd.kind}
            bandCents={bandCents[Math.min(row.fingering.register, bandCents.length) - 1] ?? 5}
            isChosen={row === chosen}
            isReached={row === (chosen ?? rows[0])}
            readOnly={readOnly !== null}
            onSelect={onSelect}
            onStep={step}
            onEdit={onEdit}
          >
            {row === chosen && (
              <div role="row">
                <div role="cell">
                  <FingeringEditor
                    row={row}
                    holes={holes}
                    readOnly={readOnly !== null}
                    onSelect={onSelect}
                    onEdit={onEdit}
                  />
                </div>
              </div>
            )}
          </NoteRow>
        ))}
      </div>
      <ChartFoot
        document={document}
        selection={selection}
        readOnly={readOnly}
        onSelect={onSelect}
        onEdit={onEdit}
      >
        {sound}
      </ChartFoot>
      <ScaleForm pitch={document.pitch} readOnly={readOnly} onEdit={onEdit} />
    </section>
  );
}
