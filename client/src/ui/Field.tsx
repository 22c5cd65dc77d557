import { useId, type ComponentProps, type ReactNode } from 'react';
import { classNames } from './class-names.ts';
import { Select } from './Select.tsx';

interface FieldFrameProps {
  label: ReactNode;
  /** Stands to the right of the label: a link, a figure. */
  beside?: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  className?: string | undefined;
}

interface FieldParts {
  id: string;
  'aria-invalid': true | undefined;
  'aria-describedby': string | undefined;
}

/** Label above, hint and error below, tied to the control by id. */
export function FieldFrame({
  label,
  beside,
  hint,
  error,
  className,
  children,
}: FieldFrameProps & { children: (parts: FieldParts) => ReactNode }) {
  const id = useId();
  const described = [hint !== undefined && `${id}-hint`, error !== undefined && `${id}-error`].filter(
    (part) => part !== false,
  );
  return (
    <div className={className}>
      <div className="mb-1 flex items-baseline justify-between gap-4">
        <label htmlFor={id} className="text-body font-semibold">
          {label}
        </label>
        {beside !== undefined && <span className="text-data text-ink3">{beside}</span>}
      </div>
      {children({
        id,
        'aria-invalid': error === undefined ? undefined : true,
        'aria-describedby': described.length > 0 ? described.join(' ') : undefined,
      })}
      {hint !== undefined && (
        <p id={`${id}-hint`} className="text-data text-ink3 mt-1">
          {hint}
        </p>
      )}
      {error !== undefined && <FieldError id={`${id}-error`}>{error}</FieldError>}
    </div>
  );
}

/** What is wrong with one field, said where it is wrong. */
export function FieldError({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <p id={id} role="alert" className="text-data text-stop mt-1 font-semibold">
      {children}
    </p>
  );
}

export const CONTROL =
  'w-full rounded-control border border-line bg-sheet px-3 text-value text-ink placeholder:text-ink3 aria-invalid:border-2 aria-invalid:border-stop disabled:border-hair disabled:bg-transparent disabled:text-ink2';

type FieldProps = FieldFrameProps & Omit<ComponentProps<'input'>, 'className' | 'id'>;

/** A line of text with its label, hint and error. */
export function Field({ label, beside, hint, error, className, ...input }: FieldProps) {
  return (
    <FieldFrame label={label} beside={beside} hint={hint} error={error} className={className}>
      {(parts) => <input type="text" {...input} {...parts} className={classNames(CONTROL, 'h-12')} />}
    </FieldFrame>
  );
}

type SelectFieldProps = FieldFrameProps & Omit<ComponentProps<'select'>, 'className' | 'id'>;

/** One of a list, with the device's own chooser. */
export function SelectField({ label, beside, hint, error, className, ...select }: SelectFieldProps) {
  return (
    <FieldFrame label={label} beside={beside} hint={hint} error={error} className={className}>
      {(parts) => <Select {...select} {...parts} className={classNames(CONTROL, 'h-12')} />}
    </FieldFrame>
  );
}
