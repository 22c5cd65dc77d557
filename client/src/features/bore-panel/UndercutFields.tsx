import type { Undercut } from '#shared/document/design-document.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { Button } from '../../ui/Button.tsx';
import { lengthFormat } from '../../ui/length-format.ts';
import { NumberField } from '../../ui/NumberField.tsx';

interface UndercutFieldsProps {
  undercut: Undercut | null;
  /** Width of the hole that is undercut, mm. */
  holeMm: number;
  unit: LengthUnit;
  disabled: boolean;
  onChange: (undercut: Undercut | null) => void;
}

/** The cone at the inner end of the embouchure hole, or the offer to cut one. */
export function UndercutFields({ undercut, holeMm, unit, disabled, onChange }: UndercutFieldsProps) {
  if (undercut === null) {
    return (
      <Button
        size="small"
        disabled={disabled}
        onClick={() => onChange({ innerDiameterMm: holeMm + 1, depthMm: 2 })}
      >
        Undercut the hole
      </Button>
    );
  }
  return (
    <>
      <NumberField
        label="Undercut to"
        value={undercut.innerDiameterMm}
        format={lengthFormat(unit)}
        min={0.1}
        max={500}
        disabled={disabled}
        onChange={(innerDiameterMm) => onChange({ ...undercut, innerDiameterMm })}
      />
      <NumberField
        label="Undercut deep"
        value={undercut.depthMm}
        format={lengthFormat(unit)}
        min={0.1}
        max={500}
        disabled={disabled}
        onChange={(depthMm) => onChange({ ...undercut, depthMm })}
      />
      <Button size="small" look="bare" disabled={disabled} onClick={() => onChange(null)}>
        Leave it straight
      </Button>
    </>
  );
}
