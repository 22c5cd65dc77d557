import type { Pitch, Temperament } from '#shared/document/design-document.ts';
import { noteOfMidi, readNoteName, midiNumber } from '#shared/music/note-name.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { SelectField } from '../../ui/Field.tsx';
import { NumberField } from '../../ui/NumberField.tsx';
import { plainFormat } from '../../ui/number-format.ts';

const HERTZ = plainFormat({ suffix: 'Hz', step: 1, digits: 0, example: '440' });
const CENTS = plainFormat({ suffix: 'cents', step: 1, digits: 1, example: '−3.5' });

const TEMPERAMENT_NAMES: Record<Temperament, string> = {
  equal: 'Equal',
  just: 'Just',
  pythagorean: 'Pythagorean',
  'quarter-comma-meantone': 'Quarter-comma meantone',
  own: 'Own cents',
};

const TONICS = [
  'C',
  'C#',
  'Db',
  'D',
  'D#',
  'Eb',
  'E',
  'F',
  'F#',
  'Gb',
  'G',
  'G#',
  'Ab',
  'A',
  'A#',
  'Bb',
  'B',
];

interface ScaleFormProps extends Pick<PanelProps, 'readOnly' | 'onEdit'> {
  pitch: Pitch;
}

/** The scale that every note is held against: pitch standard, temperament, and the note it stands on. */
export function ScaleForm({ pitch, readOnly, onEdit }: ScaleFormProps) {
  const disabled = readOnly !== null;
  const edit = (label: string, change: Partial<Pitch>, mergeKey?: string) =>
    onEdit({
      label,
      change: (document) => ({ ...document, pitch: { ...document.pitch, ...change } }),
      ...(mergeKey === undefined ? {} : { mergeKey }),
    });
  const chooseTemperament = (temperament: Temperament) => {
    const centsOffsets =
      temperament === 'own' && pitch.centsOffsets === null
        ? Array.from({ length: 12 }, () => 0)
        : pitch.centsOffsets;
    edit('Temperament', { temperament, centsOffsets });
  };
  return (
    <section aria-labelledby="scale-heading" className="border-hair px-margin border-t pt-3 pb-8">
      <h2 id="scale-heading" className="text-section font-semibold">
        Scale
      </h2>
      <div className="mt-2 flex flex-wrap items-end gap-4">
        <div className="w-44 max-[1100px]:w-60">
          <NumberField
            label="A4"
            value={pitch.a4Hz}
            format={HERTZ}
            min={300}
            max={600}
            disabled={disabled}
            onChange={(a4Hz) => edit('Pitch standard', { a4Hz }, 'pitch.a4Hz')}
          />
        </div>
        <SelectField
          label="Temperament"
          className="w-60"
          value={pitch.temperament}
          disabled={disabled}
          onChange={(event) => chooseTemperament(event.currentTarget.value as Temperament)}
        >
          {Object.entries(TEMPERAMENT_NAMES).map(([value, name]) => (
            <option key={value} value={value}>
              {name}
            </option>
          ))}
        </SelectField>
        <SelectField
          label="Tonic"
          className="w-28"
          value={pitch.tonic}
          disabled={disabled}
          onChange={(event) => edit('Tonic', { tonic: event.currentTarget.value })}
        >
          {TONICS.map((tonic) => (
            <option key={tonic}>{tonic}</option>
          ))}
        </SelectField>
      </div>
      {pitch.temperament === 'own' && pitch.centsOffsets !== null && (
        <OwnCents
          tonic={pitch.tonic}
          offsets={pitch.centsOffsets}
          disabled={disabled}
          onChange={(centsOffsets, index) =>
            edit('Own cents', { centsOffsets }, `pitch.centsOffsets.${index}`)
          }
        />
      )}
    </section>
  );
}

interface OwnCentsProps {
  tonic: string;
  offsets: readonly number[];
  disabled: boolean;
  onChange: (offsets: number[], index: number) => void;
}

/** Twelve figures, one to a semitone upwards from the tonic, against equal temperament. */
function OwnCents({ tonic, offsets, disabled, onChange }: OwnCentsProps) {
  const root = readNoteName(`${tonic}4`);
  if (root === null) return null;
  return (
    <fieldset className="mt-3">
      <legend className="text-label text-ink3">Cents above equal temperament, from the tonic upwards</legend>
      <div className="mt-1 grid grid-cols-[repeat(auto-fill,minmax(170px,1fr))] gap-3 max-[1100px]:grid-cols-[repeat(auto-fill,minmax(230px,1fr))]">
        {offsets.map((cents, index) => {
          const { letter, accidental } = noteOfMidi(midiNumber(root) + index, root.accidental === 'b');
          const name = letter + accidental;
          return (
            <NumberField
              key={name}
              label={name}
              value={cents}
              format={CENTS}
              min={-100}
              max={100}
              disabled={disabled}
              onChange={(next) => onChange(offsets.with(index, next), index)}
            />
          );
        })}
      </div>
    </fieldset>
  );
}
