import { Controller, useForm, type Control } from 'react-hook-form';
import { updateWorkshopRequest, type Workshop } from '#shared/contract/session.ts';
import { problemFields } from '../../lib/api-problem.ts';
import { zodResolver } from '../../lib/zod-resolver.ts';
import { Button } from '../../ui/Button.tsx';
import { Field } from '../../ui/Field.tsx';
import { NumberField } from '../../ui/NumberField.tsx';
import { a4Format, centsFormat, temperatureFormat, type NumberFormat } from '../../ui/number-format.ts';
import { Problem } from '../../ui/Problem.tsx';
import { Segment } from '../../ui/Segment.tsx';
import { useUpdateWorkshop } from './workshop.queries.ts';

type Values = Omit<Workshop, 'id'>;

export const UNITS = [
  { value: 'mm', label: 'mm' },
  { value: 'inch', label: 'inch' },
] as const;

export const REFERENCE_ENDS = [
  { value: 'foot', label: 'Foot' },
  { value: 'mouth', label: 'Mouth end' },
] as const;

function measuresOf({ name, unit, a4Hz, temperatureC, bandCents, referenceEnd }: Workshop): Values {
  return { name, unit, a4Hz, temperatureC, bandCents, referenceEnd };
}

/** The workshop's own measures, for those who may change them. */
export function DefaultsForm({ workshop }: { workshop: Workshop }) {
  const { register, control, handleSubmit, formState, reset } = useForm<Values>({
    resolver: zodResolver(updateWorkshopRequest),
    defaultValues: measuresOf(workshop),
  });
  const update = useUpdateWorkshop();
  const refused = problemFields(update.error);
  const handleKeep = handleSubmit((values) =>
    update.mutate(values, { onSuccess: (kept) => reset(measuresOf(kept)) }),
  );
  return (
    <form noValidate onSubmit={(event) => void handleKeep(event)} className="grid max-w-160 gap-6">
      <Field
        label="Name of the workshop"
        hint="It stands on drilling sheets."
        {...register('name')}
        error={formState.errors.name?.message ?? refused.name}
      />
      <Choice control={control} name="unit" label="Lengths in" options={UNITS} />
      <Choice control={control} name="referenceEnd" label="Positions count from" options={REFERENCE_ENDS} />
      <div className="tablet:grid-cols-2 grid gap-4">
        <Figure control={control} name="a4Hz" label="Pitch of A" format={a4Format} limits={[300, 600]} />
        <Figure
          control={control}
          name="temperatureC"
          label="Air in the bore"
          format={temperatureFormat}
          limits={[0, 40]}
        />
      </div>
      <fieldset className="m-0 border-0 p-0">
        <legend className="mb-1 font-semibold">In tune within</legend>
        <div className="desk:grid-cols-3 grid gap-4">
          {(['Register 1', 'Register 2', 'Register 3 and up'] as const).map((label, index) => (
            <Figure
              key={label}
              control={control}
              name={`bandCents.${index as 0 | 1 | 2}`}
              label={label}
              format={centsFormat}
              limits={[0.5, 50]}
            />
          ))}
        </div>
        <p className="text-data text-ink3 mt-1">The green band in every chart, either side of the scale.</p>
      </fieldset>
      <Problem error={Object.keys(refused).length > 0 && refused.name !== undefined ? null : update.error} />
      <div className="flex flex-wrap items-center gap-4">
        <Button type="submit" look="go" disabled={update.isPending || !formState.isDirty}>
          {update.isPending ? 'Keeping…' : 'Keep these'}
        </Button>
        <p role="status" className="text-true-ink">
          {update.isSuccess && !formState.isDirty ? 'Kept. New designs begin with these.' : ''}
        </p>
      </div>
    </form>
  );
}

interface ChoiceProps {
  control: Control<Values>;
  name: 'unit' | 'referenceEnd';
  label: string;
  options: readonly { value: string; label: string }[];
}

function Choice({ control, name, label, options }: ChoiceProps) {
  return (
    <Controller
      control={control}
      name={name}
      render={({ field }) => (
        <div>
          <p className="mb-1 font-semibold">{label}</p>
          <Segment<string> label={label} value={field.value} options={options} onChange={field.onChange} />
        </div>
      )}
    />
  );
}

interface FigureProps {
  control: Control<Values>;
  name: 'a4Hz' | 'temperatureC' | `bandCents.${0 | 1 | 2}`;
  label: string;
  format: NumberFormat;
  limits: readonly [number, number];
}

function Figure({ control, name, label, format, limits: [min, max] }: FigureProps) {
  return (
    <Controller
      control={control}
      name={name}
      render={({ field }) => (
        <NumberField
          labelLook={name.startsWith('bandCents') ? 'plain' : 'strong'}
          label={label}
          format={format}
          min={min}
          max={max}
          value={field.value}
          onChange={field.onChange}
        />
      )}
    />
  );
}
