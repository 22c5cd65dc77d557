import { memo, type ReactNode } from 'react';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { SENSITIVITY_STEP } from '../../bench/hole-sensitivity.ts';
import { Button } from '../../ui/Button.tsx';
import { NumberField } from '../../ui/NumberField.tsx';
import { ANGLE_FORMAT, LENGTH_FORMATS, type HoleSize } from './inspector-fields.ts';

interface SizeFieldProps {
  size: HoleSize;
  label: string;
  hint?: string;
  value: number;
  min: number;
  max: number;
  /** What one small step does to the leading note, as it stands beside the field; empty where it is not known. */
  cents: string;
  /** A verb that gives the size up to where it comes from by itself; null where it does so already. */
  resetWords?: string | null;
  unit: LengthUnit;
  isWide: boolean;
  disabled: boolean;
  /** null gives the size up. */
  onResize: (size: HoleSize, value: number | null) => void;
}

/** One size of the chosen hole. Drawn again only when its own figures change: the others rest during a drag. */
export const SizeField = memo(function SizeField({ size, label, hint, cents, ...props }: SizeFieldProps) {
  const { isWide, unit, disabled, resetWords = null, onResize } = props;
  const field = (
    <NumberField
      label={label}
      layout={isWide ? 'cell' : 'stack'}
      value={props.value}
      format={size === 'angleDeg' ? ANGLE_FORMAT : LENGTH_FORMATS[unit]}
      min={props.min}
      max={props.max}
      disabled={disabled}
      hint={hint}
      beside={isWide || cents === '' ? undefined : <CentsWords figure={cents} unit={unit} />}
      onChange={(value) => onResize(size, value)}
    />
  );
  return (
    <div className="border-hair border-t py-1.25 max-[1279px]:border-t-0">
      {isWide ? <SizeRow label={label} hint={hint} cents={cents} field={field} /> : field}
      {resetWords !== null && !disabled && (
        <Button look="bare" size="small" onClick={() => onResize(size, null)}>
          {resetWords}
        </Button>
      )}
    </div>
  );
});

interface SizeRowProps {
  label: string;
  hint: string | undefined;
  cents: string;
  field: ReactNode;
}

/** Label, stepper and cents in three columns that line up from row to row. */
function SizeRow({ label, hint, cents, field }: SizeRowProps) {
  return (
    <div className="flex items-center">
      <span aria-hidden="true" className="w-19 shrink-0 leading-4.25">
        {label}
        {hint !== undefined && <span className="text-small text-ink3 block leading-3.5">{hint}</span>}
      </span>
      <div className="w-39.5 shrink-0">{field}</div>
      <span className="text-body text-ink2 ml-auto font-semibold">{cents}</span>
    </div>
  );
}

function CentsWords({ figure, unit }: { figure: string; unit: LengthUnit }) {
  return (
    <span className="text-data text-ink3">
      {figure} cents per {SENSITIVITY_STEP[unit].label}
    </span>
  );
}
