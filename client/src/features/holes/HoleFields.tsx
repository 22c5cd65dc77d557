import type { ReactNode } from 'react';
import { chimneyMm, fromFootMm } from '#shared/document/profile.ts';
import { formatCents } from '#shared/music/cents.ts';
import { changeHole, removeHole, widestHoleMm, withUndercut } from '../../bench/hole-edits.ts';
import type { LabelledHole } from '../../bench/hole-labels.ts';
import { centsPerStep, SENSITIVITY_STEP } from '../../bench/hole-sensitivity.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { Button } from '../../ui/Button.tsx';
import { NumberField } from '../../ui/NumberField.tsx';
import { CoverFields } from './CoverFields.tsx';
import { DrillRow } from './DrillRow.tsx';
import { HoleSuggestion } from './HoleSuggestion.tsx';
import { ANGLE_FORMAT, footRange, LENGTH_FORMATS } from './inspector-fields.ts';
import type { SuggestionDesk } from './use-suggestion-desk.ts';

export interface HoleFieldsProps extends PanelProps {
  chosen: LabelledHole;
  /** The fingering whose cents stand beside the sizes. */
  leading: string | undefined;
  suggestion: SuggestionDesk;
}

/** Steppers for every size of a hole, the drills, what covers it, and the suggestion. */
export function HoleFields({ chosen, leading, suggestion, ...props }: HoleFieldsProps) {
  const { document, unit, readOnly, onEdit, onSelect } = props;
  const { hole, title } = chosen;
  const disabled = readOnly !== null;
  const edit: EditHole = (what, change) =>
    onEdit({
      label: `${what} of ${title.toLowerCase()}`,
      change: typeof change === 'function' ? change : (before) => changeHole(before, hole.id, change),
    });
  const widestMm = widestHoleMm(document, hole.positionMm);
  const isWide = props.geometry.layout === 'wide';
  const size = { ...props, index: chosen.index, leading, disabled, isWide };
  return (
    <div>
      {isWide && (
        <p className="text-small text-ink3 pb-1 text-right">cents per {SENSITIVITY_STEP[unit].label}</p>
      )}
      <SizeField
        {...size}
        label="From foot"
        dimension="positionMm"
        // Positions count from the mouth end inside, and from the foot on the bench.
        sign={-1}
        value={fromFootMm(document, hole.positionMm)}
        {...footRange(document)}
        onChange={(value) => edit('Position', { positionMm: fromFootMm(document, value) })}
      />
      <SizeField
        {...size}
        label="Diameter"
        dimension="diameterMm"
        value={hole.diameterMm}
        min={0.5}
        max={widestMm}
        onChange={(diameterMm) => edit('Diameter', { diameterMm })}
      >
        <DrillRow
          diameterMm={hole.diameterMm}
          widestMm={widestMm}
          unit={unit}
          suggestedMm={suggestion.suggestions?.find(({ kind }) => kind === 'drill')?.mm ?? null}
          disabled={disabled}
          count={isWide ? 6 : 5}
          onChoose={(diameterMm) => edit('Diameter', { diameterMm })}
        />
      </SizeField>
      <WallFields size={size} chosen={chosen} edit={edit} widestMm={widestMm} />
      <CoverFields hole={hole} disabled={disabled} onEdit={onEdit} title={title} />
      <HoleSuggestion {...props} chosen={chosen} leading={leading} suggestion={suggestion} />
      {!disabled && (
        <Button
          look="bare"
          size="small"
          className="-ml-3"
          onClick={() => {
            onEdit({
              label: `Take away ${title.toLowerCase()}`,
              change: (before) => removeHole(before, hole.id),
            });
            onSelect({ hole: null });
          }}
        >
          Take this hole away
        </Button>
      )}
    </div>
  );
}

type EditHole = (
  what: string,
  change: Parameters<typeof changeHole>[2] | ((document: PanelProps['document']) => PanelProps['document']),
) => void;

interface SizeContext extends PanelProps {
  index: number;
  leading: string | undefined;
  disabled: boolean;
  isWide: boolean;
}

interface SizeFieldProps extends SizeContext {
  label: string;
  hint?: string | undefined;
  /** Key below the hole's own, for the cents beside it; null where nothing is known. */
  dimension: string | null;
  sign?: 1 | -1;
  value: number;
  min: number;
  max: number;
  format?: typeof ANGLE_FORMAT;
  onChange: (value: number) => void;
  children?: ReactNode;
}

function SizeField({ label, hint, dimension, sign = 1, children, ...props }: SizeFieldProps) {
  const { unit, isWide } = props;
  const figure = dimension === null ? '' : centsFigure(props, dimension, sign);
  const field = (
    <NumberField
      label={label}
      layout={isWide ? 'cell' : 'stack'}
      value={props.value}
      format={props.format ?? LENGTH_FORMATS[unit]}
      min={props.min}
      max={props.max}
      disabled={props.disabled}
      hint={hint}
      beside={
        isWide || figure === '' ? undefined : (
          <CentsWords figure={figure} step={SENSITIVITY_STEP[unit].label} />
        )
      }
      onChange={props.onChange}
    />
  );
  const below = children !== undefined && <div className="mt-1">{children}</div>;
  return isWide ? (
    <div className="border-hair border-t py-1.25">
      <SizeRow label={label} hint={hint} figure={figure} field={field} />
      {below}
    </div>
  ) : (
    <div className="py-1.25">
      {field}
      {below}
    </div>
  );
}

/** What one small step of a size does to the leading note; empty until it is known. */
function centsFigure({ sensitivities, unit, leading, index }: SizeContext, dimension: string, sign: 1 | -1) {
  const stepMm = SENSITIVITY_STEP[unit].mm * sign;
  const cents = centsPerStep(sensitivities, leading, `holes.${index}.${dimension}`, stepMm);
  return cents === null ? '' : formatCents(cents, 2);
}

interface SizeRowProps {
  label: string;
  hint: string | undefined;
  figure: string;
  field: ReactNode;
}

/** Label, stepper and cents in three columns that line up from row to row. */
function SizeRow({ label, hint, figure, field }: SizeRowProps) {
  return (
    <div className="flex items-center">
      <span aria-hidden="true" className="w-19 shrink-0 leading-4.25">
        {label}
        {hint !== undefined && <span className="text-small text-ink3 block leading-3.5">{hint}</span>}
      </span>
      <div className="w-39.5 shrink-0">{field}</div>
      <span className="text-body text-ink2 ml-auto font-semibold">{figure}</span>
    </div>
  );
}

function CentsWords({ figure, step }: { figure: string; step: string }) {
  return (
    <span className="text-data text-ink3">
      {figure} cents per {step}
    </span>
  );
}

interface WallFieldsProps {
  size: SizeContext;
  chosen: LabelledHole;
  edit: EditHole;
  widestMm: number;
}

/** What of the hole lies in the wall: chimney, undercut, angle. */
function WallFields({ size, chosen, edit, widestMm }: WallFieldsProps) {
  const { document, disabled } = size;
  const { hole } = chosen;
  const { undercut } = hole;
  const wallMm = chimneyMm(document, hole);
  // What is taken from the wall was never typed: a hundredth is as much as it is good for.
  const shownMm = hole.chimneyMm ?? Math.round(wallMm * 100) / 100;
  return (
    <>
      <SizeField
        {...size}
        label="Chimney"
        hint={hole.chimneyMm === null ? 'from wall' : 'as typed'}
        dimension="chimneyMm"
        value={shownMm}
        min={0.1}
        max={100}
        onChange={(value) => edit('Chimney', { chimneyMm: value })}
      >
        {hole.chimneyMm !== null && !disabled && (
          <Button look="bare" size="small" onClick={() => edit('Chimney', { chimneyMm: null })}>
            Take it from the wall
          </Button>
        )}
      </SizeField>
      <SizeField
        {...size}
        label="Undercut"
        hint={undercut === null ? 'none' : 'at the bore'}
        dimension="undercut.innerDiameterMm"
        value={undercut?.innerDiameterMm ?? hole.diameterMm}
        min={hole.diameterMm}
        max={Math.max(hole.diameterMm, widestMm)}
        onChange={(value) => edit('Undercut', (before) => withUndercut(before, hole.id, value))}
      />
      {undercut !== null && (
        <SizeField
          {...size}
          label="Depth"
          hint="of undercut"
          dimension="undercut.depthMm"
          value={undercut.depthMm}
          min={0.1}
          max={wallMm}
          onChange={(depthMm) => edit('Undercut', { undercut: { ...undercut, depthMm } })}
        />
      )}
      <SizeField
        {...size}
        label="Angle"
        dimension={null}
        value={hole.angleDeg}
        format={ANGLE_FORMAT}
        min={-360}
        max={360}
        onChange={(angleDeg) => edit('Angle', { angleDeg })}
      />
    </>
  );
}
