import { MOUTH_WORDS } from '../../bench/mouth-words.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { lengthFormat } from '../../ui/length-format.ts';
import { NumberField } from '../../ui/NumberField.tsx';
import type { MeasuredPlace } from '#shared/measured-bore/read-measured-bore.ts';
import { FormRow } from './FormRow.tsx';
import { EDGE_WORDS } from './measured-words.ts';
import { SmallSelect } from './SmallSelect.tsx';
import type { MeasuredBoreDesk } from './use-measured-bore.ts';

interface PlaceFormProps extends Pick<PanelProps, 'document' | 'unit'> {
  place: MeasuredPlace;
  onMean: MeasuredBoreDesk['mean'];
}

/** From which end the distances run, and what the table calls that end's zero. */
export function PlaceForm({ document, unit, place, onMean }: PlaceFormProps) {
  const { kind } = document.mouthEnd;
  const edge = place.from === 'foot' ? 'Foot' : EDGE_WORDS[kind];
  const isAligned = place.isGuess && place.from === 'mouth' && place.zeroMm !== 0;
  return (
    <>
      <FormRow label="Distances run">
        <span className="w-46 shrink-0">
          <SmallSelect
            label="Distances run"
            value={place.from}
            options={[
              { value: 'mouth', label: `from the ${MOUTH_WORDS[kind]} end`.replace('end end', 'end') },
              { value: 'foot', label: 'from the foot' },
            ]}
            onChange={(from) => onMean({ from, zeroMm: null })}
          />
        </span>
      </FormRow>
      <div className="border-hair text-data text-ink2 border-t py-1">
        <NumberField
          layout="row"
          label={`${edge} lies at`}
          hint={isAligned ? 'so that the last reading is at the foot' : 'in the table'}
          value={place.zeroMm}
          format={lengthFormat(unit)}
          min={-5000}
          max={5000}
          onChange={(zeroMm) => onMean({ zeroMm })}
        />
      </div>
    </>
  );
}
