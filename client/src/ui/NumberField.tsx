import { useId, type ReactNode } from 'react';
import { classNames } from './class-names.ts';
import { FieldError } from './Field.tsx';
import type { NumberFormat } from './number-format.ts';
import { useNumberEntry, type NumberEntry } from './use-number-entry.ts';

interface NumberFieldProps {
  label: string;
  value: number;
  format: NumberFormat;
  onChange: (value: number) => void;
  min?: number;
  max?: number;
  /** `row`: label at the left of the stepper, as in an inspector; `stack`: label above; `cell`: label only read out. */
  layout?: 'row' | 'stack' | 'cell';
  /** A word under or after the label: "from wall". */
  hint?: ReactNode;
  /** Strong where it stands among the labels of a form. */
  labelLook?: 'plain' | 'strong';
  /** Stands to the right: what 0.1 mm does to the pitch. */
  beside?: ReactNode;
  /** What somebody else found wrong with the stored figure. What was typed and could not be read comes first. */
  error?: string | undefined;
  disabled?: boolean;
  onFocus?: () => void;
}

/** A figure with its unit, − and +. Arrows step, Shift ten; Enter or leaving keeps, Escape puts back. */
export function NumberField({ layout = 'stack', label, hint, beside, error, ...props }: NumberFieldProps) {
  const { format, disabled = false, onFocus } = props;
  const id = useId();
  const entry = useNumberEntry(props);
  const fault = entry.complaint ?? error;
  return (
    <div>
      <div className={layout === 'row' ? 'flex items-center justify-between gap-2' : undefined}>
        <div className={layout === 'cell' ? 'sr-only' : 'flex items-baseline justify-between gap-2'}>
          <StepperLabel
            id={id}
            label={label}
            look={props.labelLook}
            hint={hint}
            hintBelow={layout === 'row'}
          />
          {layout === 'stack' && beside}
        </div>
        <Stepper
          id={id}
          label={label}
          entry={entry}
          suffix={format.suffix}
          isFaulty={fault !== undefined}
          disabled={disabled}
          describedBy={describingIds(id, hint, fault)}
          onFocus={onFocus}
        />
        {layout === 'row' && beside}
      </div>
      {fault !== undefined && <FieldError id={`${id}-error`}>{fault}</FieldError>}
    </div>
  );
}

function describingIds(id: string, hint: ReactNode, fault: string | undefined): string | undefined {
  const ids = [hint === undefined ? null : `${id}-hint`, fault === undefined ? null : `${id}-error`];
  const present = ids.filter((part) => part !== null);
  return present.length === 0 ? undefined : present.join(' ');
}

interface StepperLabelProps {
  id: string;
  label: string;
  hint: ReactNode;
  look: 'plain' | 'strong' | undefined;
  hintBelow: boolean;
}

function StepperLabel({ id, label, look, hint, hintBelow }: StepperLabelProps) {
  return (
    <span className="leading-tight">
      <label htmlFor={id} className={look === 'strong' ? 'font-semibold' : undefined}>
        {label}
      </label>
      {hint !== undefined && (
        <span id={`${id}-hint`} className={classNames('text-label text-ink3', hintBelow ? 'block' : 'ml-2')}>
          {hint}
        </span>
      )}
    </span>
  );
}

interface StepperProps {
  id: string;
  label: string;
  entry: NumberEntry;
  suffix: string;
  isFaulty: boolean;
  disabled: boolean;
  describedBy: string | undefined;
  onFocus: (() => void) | undefined;
}

function Stepper({ id, label, entry, suffix, isFaulty, disabled, describedBy, ...props }: StepperProps) {
  return (
    <div
      className={classNames(
        'rounded-control bg-sheet flex h-9 min-w-0 items-stretch overflow-clip border max-[1100px]:h-13 pointer-coarse:h-13',
        'has-[input:focus-visible]:outline-mark has-[input:focus-visible]:outline-3 has-[input:focus-visible]:outline-offset-2',
        isFaulty ? 'border-stop border-2' : 'border-line',
      )}
    >
      <StepButton
        label={`Less: ${label}`}
        sign="−"
        disabled={disabled || entry.isLeast}
        onStep={entry.step}
      />
      <span className="flex min-w-0 flex-1 items-center">
        <input
          id={id}
          type="text"
          autoComplete="off"
          spellCheck={false}
          value={entry.text}
          disabled={disabled}
          size={6}
          aria-invalid={isFaulty ? true : undefined}
          aria-describedby={describedBy}
          onChange={(event) => entry.onType(event.currentTarget.value)}
          onFocus={(event) => {
            // What could not be read is there to be mended, not to be typed over.
            if (entry.complaint === null) event.currentTarget.select();
            props.onFocus?.();
          }}
          onBlur={entry.commit}
          onKeyDown={entry.onKeyDown}
          className="text-value text-ink disabled:text-ink2 h-full min-w-0 flex-1 bg-transparent pl-2.5 font-semibold outline-none max-[1100px]:pl-0 max-[1100px]:text-center max-[1100px]:text-[25px] pointer-coarse:pl-0 pointer-coarse:text-center pointer-coarse:text-[25px]"
        />
        {suffix !== '' && <span className="text-small text-ink3 max-[1100px]:text-data pr-2">{suffix}</span>}
      </span>
      <StepButton label={`More: ${label}`} sign="+" disabled={disabled || entry.isMost} onStep={entry.step} />
    </div>
  );
}

interface StepButtonProps {
  label: string;
  sign: '−' | '+';
  disabled: boolean;
  onStep: (steps: number) => void;
}

/** Outside the tab order: the arrow keys do the same in the field itself. */
function StepButton({ label, sign, disabled, onStep }: StepButtonProps) {
  return (
    <button
      type="button"
      tabIndex={-1}
      aria-label={label}
      disabled={disabled}
      // Keeps the focus, and what is typed, in the field.
      onPointerDown={(event) => event.preventDefault()}
      onClick={(event) => onStep((sign === '+' ? 1 : -1) * (event.shiftKey ? 10 : 1))}
      className="bg-groove text-ink disabled:text-line w-9 shrink-0 text-[18px] leading-none max-[1100px]:w-16 pointer-coarse:w-16"
    >
      {sign}
    </button>
  );
}
