import type { PanelProps } from '../../bench/panel-props.ts';
import { Segment } from '../../ui/Segment.tsx';

/** One register at a time, on a phone where rows have no room one below another. */
export function RegisterChoice({ document, geometry, selection, onSelect }: PanelProps) {
  const registers = [...new Set(document.fingerings.map(({ register }) => register))].sort((a, b) => a - b);
  if (geometry.layout !== 'phone' || registers.length < 2) return null;
  const [first = 1] = registers;
  const shown = selection.register === 'all' ? first : selection.register;
  return (
    <div className="flex justify-center px-4 py-2">
      <Segment
        label="Register"
        value={String(shown)}
        options={registers.map((register) => ({ value: String(register), label: `Register ${register}` }))}
        onChange={(register) => onSelect({ register: Number(register) })}
      />
    </div>
  );
}
