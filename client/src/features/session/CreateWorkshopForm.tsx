import { useId, type ReactNode } from 'react';
import { Controller, useForm } from 'react-hook-form';
import type { z } from 'zod';
import { createWorkshopRequest } from '#shared/contract/session.ts';
import { problemFields } from '../../lib/api-problem.ts';
import { zodResolver } from '../../lib/zod-resolver.ts';
import { Button } from '../../ui/Button.tsx';
import { Field } from '../../ui/Field.tsx';
import { a4Format, temperatureFormat } from '../../ui/number-format.ts';
import { NumberField } from '../../ui/NumberField.tsx';
import { Problem } from '../../ui/Problem.tsx';
import { Segment } from '../../ui/Segment.tsx';
import { useCreateWorkshop } from './session.queries.ts';

type Values = z.output<typeof createWorkshopRequest>;

const DEFAULTS: Values = {
  workshopName: '',
  name: '',
  email: '',
  password: '',
  unit: 'mm',
  a4Hz: 440,
  temperatureC: 24,
};

const UNITS = [
  { value: 'mm', label: 'mm' },
  { value: 'inch', label: 'inch' },
] as const;

export function CreateWorkshopForm({ onCreated }: { onCreated: () => void }) {
  const { register, control, handleSubmit, formState } = useForm<Values>({
    resolver: zodResolver(createWorkshopRequest),
    defaultValues: DEFAULTS,
  });
  const create = useCreateWorkshop();
  const refused = problemFields(create.error);
  const handleCreate = handleSubmit((values) => create.mutate(values, { onSuccess: onCreated }));
  const text = (name: 'workshopName' | 'name' | 'email' | 'password') => ({
    ...register(name),
    error: formState.errors[name]?.message ?? refused[name],
  });

  return (
    <form noValidate onSubmit={(event) => void handleCreate(event)} className="grid gap-8">
      <Step number={1} title="The workshop">
        <Field
          label="Name"
          autoComplete="organization"
          hint="It stands on drilling sheets."
          {...text('workshopName')}
        />
      </Step>
      <Step number={2} title="You">
        <Field label="Your name" autoComplete="name" {...text('name')} />
        <Field label="Email" type="email" autoComplete="username" {...text('email')} />
        <Field
          label="Password"
          type="password"
          autoComplete="new-password"
          hint="10 characters or more. A sentence does well."
          {...text('password')}
        />
      </Step>
      <Step number={3} title="How you measure">
        <Controller
          control={control}
          name="unit"
          render={({ field }) => (
            <div>
              <p className="mb-1 font-semibold">Lengths in</p>
              <Segment label="Lengths in" value={field.value} options={UNITS} onChange={field.onChange} />
            </div>
          )}
        />
        <div className="tablet:grid-cols-2 grid gap-4">
          <Controller
            control={control}
            name="a4Hz"
            render={({ field }) => (
              <NumberField
                labelLook="strong"
                label="Pitch of A"
                format={a4Format}
                min={300}
                max={600}
                value={field.value}
                onChange={field.onChange}
              />
            )}
          />
          <Controller
            control={control}
            name="temperatureC"
            render={({ field }) => (
              <NumberField
                labelLook="strong"
                label="Air in the bore"
                hint="warm from playing"
                format={temperatureFormat}
                min={0}
                max={40}
                value={field.value}
                onChange={field.onChange}
              />
            )}
          />
        </div>
      </Step>
      <div className="grid gap-4">
        <Problem error={Object.keys(refused).length > 0 ? null : create.error} />
        <Button type="submit" look="go" size="big" disabled={create.isPending}>
          {create.isPending ? 'Opening…' : 'Open the workshop'}
        </Button>
      </div>
    </form>
  );
}

function Step({ number, title, children }: { number: number; title: string; children: ReactNode }) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="border-hair grid gap-4 border-t pt-4">
      <h2 id={id} className="text-section font-semibold">
        <span className="text-ink3 mr-2">{number}</span>
        {title}
      </h2>
      {children}
    </section>
  );
}
