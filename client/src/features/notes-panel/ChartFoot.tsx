import type { ReactNode } from 'react';
import { DOCUMENT_LIMITS } from '#shared/document/design-document.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { Button } from '../../ui/Button.tsx';
import { addFingering } from './fingering-edits.ts';
import { lowestChartedNote, usualChart } from './usual-chart.ts';

interface ChartFootProps extends Pick<
  PanelProps,
  'document' | 'selection' | 'readOnly' | 'onSelect' | 'onEdit'
> {
  /** Buttons that make the notes heard. */
  children: ReactNode;
}

/** What may be added to the chart, and what makes it heard; on an empty one, where to begin. */
export function ChartFoot({ document, selection, readOnly, onSelect, onEdit, children }: ChartFootProps) {
  const isFull = document.fingerings.length >= DOCUMENT_LIMITS.fingerings;
  const add = () => {
    const added = addFingering(document, selection.fingering);
    onEdit({
      label: 'Add a fingering',
      change: (before) => addFingering(before, selection.fingering).document,
    });
    onSelect({ fingering: added.id });
  };
  return (
    <div className="border-hair px-margin mx-auto flex flex-wrap items-center gap-3 border-t py-3">
      {document.fingerings.length === 0 && <p>No fingerings yet, so there is nothing to predict.</p>}
      {readOnly === null && (
        <>
          <Button size="small" onClick={add} disabled={isFull}>
            Add a fingering
          </Button>
          <UsualChartButton document={document} onEdit={onEdit} />
        </>
      )}
      {isFull && <p className="text-ink3">A chart holds {DOCUMENT_LIMITS.fingerings} fingerings.</p>}
      <div className="ml-auto">{children}</div>
    </div>
  );
}

function UsualChartButton({ document, onEdit }: Pick<PanelProps, 'document' | 'onEdit'>) {
  const lowest = lowestChartedNote(document);
  const usual = usualChart(document, lowest);
  if (usual === null) return null;
  return (
    <Button
      size="small"
      look="bare"
      onClick={() =>
        onEdit({
          label: 'Lay in the usual chart',
          change: (before) => ({ ...before, fingerings: usual }),
        })
      }
    >
      Lay in the usual chart over {lowest}
    </Button>
  );
}
