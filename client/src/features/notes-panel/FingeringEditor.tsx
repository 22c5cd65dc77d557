import type { Fingering } from '#shared/document/design-document.ts';
import { readNoteName, printNoteName } from '#shared/music/note-name.ts';
import type { LabelledHole } from '#shared/document/hole-labels.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { Button } from '../../ui/Button.tsx';
import { NumberField } from '../../ui/NumberField.tsx';
import { plainFormat } from '../../ui/number-format.ts';
import type { ChartRow } from './chart-rows.ts';
import { changeFingering, duplicateFingering, removeFingering } from './fingering-edits.ts';
import { HalfCoverFields } from './HalfCoverFields.tsx';
import { NoteField } from './NoteField.tsx';
import { accuracyWords } from '../../bench/accuracy-words.ts';

const REGISTER = plainFormat({ suffix: '', step: 1, digits: 0, example: '2' });
const OFFSET = plainFormat({ suffix: 'cents', step: 1, digits: 1, example: '−5' });
const WEIGHT = plainFormat({ suffix: '', step: 0.5, digits: 1, example: '1' });

interface FingeringEditorProps extends Pick<PanelProps, 'onSelect' | 'onEdit'> {
  row: ChartRow;
  holes: readonly LabelledHole[];
  readOnly: boolean;
}

/** All that a fingering holds, below its row in the chart. */
export function FingeringEditor({ row, holes, readOnly, onSelect, onEdit }: FingeringEditorProps) {
  const { fingering } = row;
  const { id } = fingering;
  const edit = (label: string, change: (before: Fingering) => Fingering, mergeKey?: string) =>
    onEdit({
      label: `${fingering.note}: ${label}`,
      change: (document) => changeFingering(document, id, change),
      ...(mergeKey === undefined ? {} : { mergeKey: `fingering.${id}.${mergeKey}` }),
    });
  const set = (key: 'register' | 'centsOffset' | 'weight', label: string) => (value: number) =>
    edit(label, (before) => ({ ...before, [key]: key === 'register' ? Math.round(value) : value }), key);
  return (
    <div
      role="group"
      aria-label={`Fingering of ${fingering.note}`}
      className="bg-mark-soft mx-4 px-3 pt-1 pb-3 min-[1100px]:mx-7"
    >
      <Sounding row={row} />
      <div className="mt-2 flex flex-wrap items-end gap-x-4 gap-y-2">
        <NoteField
          note={fingering.note}
          disabled={readOnly}
          onChange={(text) => {
            const note = readNoteName(text);
            if (note !== null) edit('note', (before) => ({ ...before, note: printNoteName(note) }));
          }}
        />
        <div className="w-32 max-[1100px]:w-56">
          <NumberField
            label="Register"
            value={fingering.register}
            format={REGISTER}
            min={1}
            max={8}
            disabled={readOnly}
            onChange={set('register', 'register')}
          />
        </div>
        <div className="w-44 max-[1100px]:w-56">
          <NumberField
            label="Wanted above the scale"
            value={fingering.centsOffset}
            format={OFFSET}
            min={-1200}
            max={1200}
            disabled={readOnly}
            onChange={set('centsOffset', 'offset')}
          />
        </div>
        <div className="w-36 max-[1100px]:w-56">
          <NumberField
            label="Weight in a fit"
            value={fingering.weight}
            format={WEIGHT}
            min={0}
            max={100}
            disabled={readOnly}
            onChange={set('weight', 'weight')}
          />
        </div>
        <HalfCoverFields
          fingering={fingering}
          holes={holes}
          readOnly={readOnly}
          onChange={(half) => edit('half covering', (before) => ({ ...before, half }), 'half')}
        />
        <div className="ml-auto flex flex-wrap gap-2">
          {!readOnly && (
            <>
              <Button
                size="small"
                onClick={() => {
                  onEdit({
                    label: `Copy ${fingering.note}`,
                    change: (document) => duplicateFingering(document, id).document,
                  });
                }}
              >
                Copy the fingering
              </Button>
              <Button
                size="small"
                onClick={() => {
                  onEdit({
                    label: `Remove ${fingering.note}`,
                    change: (document) => removeFingering(document, id),
                  });
                  onSelect({ fingering: null });
                }}
              >
                Remove the fingering
              </Button>
            </>
          )}
        </div>
      </div>
    </div>
  );
}

/** What sounds, against what is wanted, and how far the figure can be trusted. */
function Sounding({ row }: { row: ChartRow }) {
  const { predicted, targetHz } = row;
  if (predicted === null) return null;
  const { frequencyHz, beatsHz, notices } = predicted;
  return (
    <div className="text-data text-ink2">
      {frequencyHz !== null && (
        <p>
          Sounds at <b className="text-ink">{frequencyHz.toFixed(1)} Hz</b>, wanted {targetHz.toFixed(1)} Hz
          {beatsHz !== null && <>, {Math.abs(beatsHz).toFixed(1)} beats a second against it</>}.{' '}
          {accuracyWords(predicted)}
        </p>
      )}
      {notices.map((notice) => (
        <p key={notice.code + notice.message}>{notice.message}</p>
      ))}
    </div>
  );
}
