import { Switch } from 'radix-ui';
import { useId } from 'react';

interface LabelledSwitchProps {
  label: string;
  isOn: boolean;
  disabled?: boolean;
  onChange: (isOn: boolean) => void;
}

/** On or off, at once. */
export function LabelledSwitch({ label, isOn, disabled = false, onChange }: LabelledSwitchProps) {
  const id = useId();
  return (
    <span className="text-data text-ink2 flex items-center gap-2 pointer-coarse:min-h-11">
      <label htmlFor={id}>{label}</label>
      <Switch.Root
        id={id}
        checked={isOn}
        disabled={disabled}
        onCheckedChange={onChange}
        className="rounded-disc border-line bg-groove data-[state=checked]:border-mark data-[state=checked]:bg-mark relative h-5 w-8.5 border disabled:opacity-60"
      >
        <Switch.Thumb className="rounded-disc bg-ink3 data-[state=checked]:bg-mark-ink block size-3.5 translate-x-0.5 transition-transform data-[state=checked]:translate-x-4" />
      </Switch.Root>
    </span>
  );
}
