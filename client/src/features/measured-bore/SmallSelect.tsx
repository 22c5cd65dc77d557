import { Select } from '../../ui/Select.tsx';

interface SmallSelectProps<Value extends string> {
  /** Read out; what is seen stands in the row at its left. */
  label: string;
  value: Value;
  options: readonly { value: Value; label: string }[];
  onChange: (value: Value) => void;
}

/** A chooser as low as a row of figures. */
export function SmallSelect<Value extends string>({
  label,
  value,
  options,
  onChange,
}: SmallSelectProps<Value>) {
  return (
    <Select
      aria-label={label}
      value={value}
      onChange={(event) => {
        const chosen = options.find((option) => option.value === event.currentTarget.value);
        if (chosen !== undefined) onChange(chosen.value);
      }}
      className="rounded-control border-line bg-sheet text-data text-ink h-7.5 w-full border pl-2 font-semibold max-[1100px]:h-12 max-[1100px]:text-[16px] pointer-coarse:h-12"
    >
      {options.map((option) => (
        <option key={option.value} value={option.value}>
          {option.label}
        </option>
      ))}
    </Select>
  );
}
