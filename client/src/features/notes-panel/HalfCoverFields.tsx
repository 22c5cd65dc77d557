import type { Fingering } from '#shared/document/design-document.ts';
import type { LabelledHole } from '#shared/document/hole-labels.ts';
import { NumberField } from '../../ui/NumberField.tsx';
import { Segment } from '../../ui/Segment.tsx';
import { percentFormat } from '../../ui/percent-format.ts';

const COVERED = percentFormat({ stepPercent: 5, example: '50' });

interface HalfCoverFieldsProps {
  fingering: Fingering;
  holes: readonly LabelledHole[];
  readOnly: boolean;
  onChange: (half: Fingering['half']) => void;
}

/** How much of each half-covered hole the finger takes, and from where it comes. */
export function HalfCoverFields({ fingering, holes, readOnly, onChange }: HalfCoverFieldsProps) {
  const change = (hole: string, values: Partial<Fingering['half'][number]>) =>
    onChange(fingering.half.map((entry) => (entry.hole === hole ? { ...entry, ...values } : entry)));
  return fingering.half.map((entry) => {
    const title = holes.find(({ hole }) => hole.id === entry.hole)?.title ?? entry.hole;
    return (
      <div key={entry.hole} className="flex items-end gap-2">
        <div className="w-40 max-[1100px]:w-56">
          <NumberField
            label={`${title} covered`}
            value={entry.fraction}
            format={COVERED}
            min={0}
            max={0.95}
            disabled={readOnly}
            onChange={(fraction) => change(entry.hole, { fraction })}
          />
        </div>
        <Segment
          label={`Finger on ${title.toLowerCase()} comes from`}
          value={entry.from}
          options={[
            { value: 'side', label: 'side' },
            { value: 'end', label: 'end' },
          ]}
          disabled={readOnly}
          onChange={(from) => change(entry.hole, { from })}
        />
      </div>
    );
  });
}
