import { DOCUMENT_LIMITS } from '#shared/document/design-document.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { Button } from '../../ui/Button.tsx';
import { addFingering } from './fingering-edits.ts';
import { lowestChartedNote, usualChart } from './usual-chart.ts';

type ChartFootProps = Pick<PanelProps, 'document' | 'selection' | 'readOnly' | 'onSelect' | 'onEdit'>;

/** What may be added to the chart; on an empty one, where to begin. */
export function ChartFoot({ document, selection, readOnly, onSelect, onEdit }: ChartFootProps) {
  if (readOnly !== null) return null;
  const { fingerings } = document;
  const lowest = lowestChartedNote(document);
  const usual = usualChart(document, lowest);
  const isFull = fingerings.length >= DOCUMENT_LIMITS.fingerings;
  const add = () => {
    onSelect({ fingering: addFingering(document, selection.fingering).id });
    onEdit({
      label: 'Add a fingering',
      change: (before) => addFingering(before, selection.fingering).document,
    });
  };
  return (
    <div className="border-hair px-margin mx-auto flex flex-wrap items-center gap-3 border-t py-3">
      {fingerings.length === 0 && <p>No fingerings yet, so there is nothing to predict.</p>}
      <Button size="small" onClick={add} disabled={isFull}>
        Add a fingering
      </Button>
      {usual !== null && (
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
      )}
      {isFull && <p className="text-ink3">A chart holds {DOCUMENT_LIMITS.fingerings} fingerings.</p>}
    </div>
  );
}
