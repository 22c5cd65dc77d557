import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { Button } from '../../ui/Button.tsx';
import { Field, SelectField } from '../../ui/Field.tsx';
import { lengthFormat } from '../../ui/length-format.ts';
import { NumberField } from '../../ui/NumberField.tsx';
import { Segment } from '../../ui/Segment.tsx';
import { adviseBore, boreOf, nameOf, type Answers } from './answers.ts';

export interface ExistingDesign {
  id: number;
  name: string;
}

interface StartFromProps {
  answers: Answers;
  onChange: (answers: Answers) => void;
  unit: LengthUnit;
  existing: readonly ExistingDesign[];
  /** The design begun from; null for sensible proportions. */
  from: number | null;
  onFrom: (id: number | null) => void;
  nameError: string | undefined;
}

const STARTS = [
  { value: 'proportions', label: 'Sensible proportions' },
  { value: 'design', label: 'A design we have' },
] as const;

export function StartFrom({ answers, onChange, unit, existing, from, onFrom, nameError }: StartFromProps) {
  const first = existing[0];
  return (
    <div className="grid gap-4">
      {first !== undefined && (
        <Segment
          label="Start from"
          value={from === null ? 'proportions' : 'design'}
          options={STARTS}
          onChange={(start) => onFrom(start === 'design' ? first.id : null)}
        />
      )}
      {from === null ? (
        <BoreQuestion answers={answers} onChange={onChange} unit={unit} />
      ) : (
        <SelectField
          label="Which one"
          hint="Its bore, holes, notes and air come along; the original stays as it is."
          value={from}
          onChange={(event) => onFrom(Number(event.currentTarget.value))}
        >
          {existing.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </SelectField>
      )}
      <Field
        label="Name"
        maxLength={120}
        autoComplete="off"
        value={answers.name ?? nameOf(answers)}
        onChange={(event) => onChange({ ...answers, name: event.currentTarget.value })}
        error={nameError}
      />
    </div>
  );
}

function BoreQuestion({ answers, onChange, unit }: Pick<StartFromProps, 'answers' | 'onChange' | 'unit'>) {
  const advice = adviseBore(answers, unit);
  return (
    <div>
      <NumberField
        label="Bore at the head"
        labelLook="strong"
        hint={answers.boreMm === null ? 'the usual one' : undefined}
        format={lengthFormat(unit)}
        min={2}
        max={120}
        value={boreOf(answers)}
        error={advice.status === 'wrong' ? advice.message : undefined}
        onChange={(boreMm) => onChange({ ...answers, boreMm })}
      />
      {answers.boreMm !== null && (
        <Button
          look="bare"
          size="small"
          className="mt-1 -ml-3"
          onClick={() => onChange({ ...answers, boreMm: null })}
        >
          Take the usual one
        </Button>
      )}
    </div>
  );
}
