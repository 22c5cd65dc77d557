import type { Temperament } from '#shared/document/design-document.ts';
import { SelectField } from '../../ui/Field.tsx';
import { NumberField } from '../../ui/NumberField.tsx';
import { a4Format, temperatureFormat } from '../../ui/number-format.ts';
import { chooseLowestNote, lowestNotesOf, tonicOf, type Answers } from './answers.ts';

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

const TEMPERAMENTS: readonly (readonly [Exclude<Temperament, 'own'>, string])[] = [
  ['equal', 'Equal'],
  ['just', 'Just'],
  ['pythagorean', 'Pythagorean'],
  ['quarter-comma-meantone', 'Quarter-comma meantone'],
];

interface ScaleQuestionsProps {
  answers: Answers;
  onChange: (answers: Answers) => void;
}

export function ScaleQuestions({ answers, onChange }: ScaleQuestionsProps) {
  return (
    <div className="grid gap-4">
      <div className="grid grid-cols-2 gap-4">
        <SelectField
          label="Lowest note"
          value={answers.lowestNote}
          onChange={(event) => onChange(chooseLowestNote(answers, event.currentTarget.value))}
        >
          {lowestNotesOf(answers.kind).map((note) => (
            <option key={note}>{note}</option>
          ))}
        </SelectField>
        <SelectField
          label="Key"
          value={tonicOf(answers)}
          onChange={(event) => onChange({ ...answers, tonic: event.currentTarget.value })}
        >
          {TONICS.map((tonic) => (
            <option key={tonic}>{tonic}</option>
          ))}
        </SelectField>
      </div>
      <SelectField
        label="Tuning"
        value={answers.temperament}
        onChange={(event) => {
          const chosen = TEMPERAMENTS.find(([value]) => value === event.currentTarget.value);
          if (chosen !== undefined) onChange({ ...answers, temperament: chosen[0] });
        }}
      >
        {TEMPERAMENTS.map(([value, label]) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </SelectField>
      <div className="desk:grid-cols-2 grid gap-4">
        <NumberField
          label="Pitch of A"
          labelLook="strong"
          format={a4Format}
          min={300}
          max={600}
          value={answers.a4Hz}
          onChange={(a4Hz) => onChange({ ...answers, a4Hz })}
        />
        <NumberField
          label="Air in the bore"
          labelLook="strong"
          format={temperatureFormat}
          min={0}
          max={40}
          value={answers.temperatureC}
          onChange={(temperatureC) => onChange({ ...answers, temperatureC })}
        />
      </div>
    </div>
  );
}
