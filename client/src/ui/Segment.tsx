import { classNames } from './class-names.ts';

interface SegmentProps<Value extends string> {
  /** What is chosen here; read out, and shown by the caller if it needs to be. */
  label: string;
  value: Value;
  options: readonly { value: Value; label: string }[];
  onChange: (value: Value) => void;
  disabled?: boolean;
  size?: 'small' | 'normal';
}

/** A few choices side by side, one of them taken: mm / inch, Register 1 / 2 / 3. */
export function Segment<Value extends string>({
  label,
  value,
  options,
  onChange,
  disabled = false,
  size = 'normal',
}: SegmentProps<Value>) {
  return (
    <div
      role="group"
      aria-label={label}
      className="rounded-control border-line bg-sheet text-data inline-flex w-fit border"
    >
      {options.map((option) => (
        <button
          key={option.value}
          type="button"
          aria-pressed={option.value === value}
          disabled={disabled}
          onClick={() => onChange(option.value)}
          className={classNames(
            'min-w-12 px-3 first:rounded-l-[3px] last:rounded-r-[3px] max-[1100px]:min-h-12 pointer-coarse:min-h-12',
            'not-first:border-line not-first:border-l focus-visible:relative',
            size === 'small' ? 'min-h-6' : 'min-h-10',
            option.value === value ? 'bg-ink text-paper font-semibold' : 'text-ink2 hover:text-ink',
          )}
        >
          {option.label}
        </button>
      ))}
    </div>
  );
}
