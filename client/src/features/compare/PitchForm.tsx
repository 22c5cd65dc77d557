import type { DesignDocument } from '#shared/document/design-document.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { referenceNote } from '#shared/transform/reference-note.ts';
import { SelectField } from '../../ui/Field.tsx';
import { NumberField } from '../../ui/NumberField.tsx';
import { a4Format } from '../../ui/number-format.ts';
import { Segment } from '../../ui/Segment.tsx';
import type { CompareTerms } from './compare-address.ts';
import { keyChoices } from './key-choices.ts';

interface PitchFormProps {
  /** As it is now. */
  document: DesignDocument;
  terms: CompareTerms;
  unit: LengthUnit;
  onTerms: (change: Partial<CompareTerms>) => void;
}

const BORES = [
  { value: 'scaled', label: 'Scale it too' },
  { value: 'kept', label: 'Keep it' },
] as const;

const HOLE_SIZES = [
  { value: 'exact', label: 'Exact size' },
  { value: 'nearest-drill', label: 'Nearest drill' },
] as const;

/** In which key and at which pitch standard the instrument is to be looked at. */
export function PitchForm({ document, terms, unit, onTerms }: PitchFormProps) {
  const present = referenceNote(document);
  const choices = keyChoices(document);
  const key = terms.key ?? present;
  const isListed = choices.some(({ note }) => note === key);
  return (
    <section aria-labelledby="pitch-heading">
      <h2 id="pitch-heading" className="text-section font-semibold">
        At another pitch
        <span className="text-data text-ink3 ml-2 font-normal">nothing is changed until you ask for it</span>
      </h2>
      <div className="mt-2 flex flex-wrap items-end gap-x-4 gap-y-3">
        <SelectField
          label={document.fingerings.length > 0 ? 'Lowest note' : 'Key note'}
          className="w-57"
          value={key}
          onChange={({ currentTarget: { value } }) => onTerms({ key: value === present ? null : value })}
        >
          {!isListed && <option value={key}>{key}</option>}
          {choices.map(({ note, label }) => (
            <option key={note} value={note}>
              {label}
            </option>
          ))}
        </SelectField>
        <div className="w-44 max-[1100px]:w-60">
          <NumberField
            label="A4"
            labelLook="strong"
            value={terms.a4Hz ?? document.pitch.a4Hz}
            format={a4Format}
            min={300}
            max={600}
            onChange={(a4Hz) => onTerms({ a4Hz: a4Hz === document.pitch.a4Hz ? null : a4Hz })}
          />
        </div>
        <div>
          <p className="mb-1 font-semibold" aria-hidden="true">
            Bore
          </p>
          <Segment label="Bore" value={terms.bore} options={BORES} onChange={(bore) => onTerms({ bore })} />
        </div>
        {terms.bore === 'scaled' && (
          <div>
            <p className="mb-1 font-semibold" aria-hidden="true">
              Holes
            </p>
            <Segment
              label={unit === 'mm' ? 'Holes, metric drills' : 'Holes, inch drills'}
              value={terms.holeSizes}
              options={HOLE_SIZES}
              onChange={(holeSizes) => onTerms({ holeSizes })}
            />
          </div>
        )}
      </div>
    </section>
  );
}
