import { MOUTH_WORDS } from '../../bench/mouth-words.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { lengthFormat } from '../../ui/length-format.ts';
import { NumberField } from '../../ui/NumberField.tsx';
import type { MeasuredPlace } from '#shared/measured-bore/read-measured-bore.ts';
import { FigureRow, FormRow } from './FormRow.tsx';
import { EDGE_WORDS } from './measured-words.ts';
import { SmallSelect } from './SmallSelect.tsx';
import type { MeasuredBoreDesk } from './use-measured-bore.ts';

interface PlaceFormProps extends Pick<PanelProps, 'document' | 'unit'> {
  place: MeasuredPlace;
  isWide: boolean;
  onMean: MeasuredBoreDesk['mean'];
}

/** From which end the distances run, and what the table calls that end's zero. */
export function PlaceForm({ document, unit, place, isWide, onMean }: PlaceFormProps) {
  const { kind } = document.mouthEnd;
  const edge = place.from === 'foot' ? 'Foot' : EDGE_WORDS[kind];
  return (
    <>
      <FormRow label="Counted from">
        <span className="w-30 shrink-0 max-[1100px]:w-42">
          <SmallSelect
            label="Distances are counted from"
            value={place.from}
            options={[
              { value: 'mouth', label: mouthEndWords(MOUTH_WORDS[kind]) },
              { value: 'foot', label: 'foot' },
            ]}
            onChange={(from) => onMean({ from, zeroMm: null })}
          />
        </span>
      </FormRow>
      <FigureRow>
        <NumberField
          layout={isWide ? 'row' : 'stack'}
          label={`${edge} at`}
          value={place.zeroMm}
          format={lengthFormat(unit)}
          min={-5000}
          max={5000}
          onChange={(zeroMm) => onMean({ zeroMm })}
        />
      </FigureRow>
    </>
  );
}

/** `window end`, but not `open end end`. */
const mouthEndWords = (mouth: string) => (mouth.endsWith(' end') ? mouth : `${mouth} end`);
