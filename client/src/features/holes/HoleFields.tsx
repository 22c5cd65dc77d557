import { titleInSentence } from '#shared/document/title-in-sentence.ts';
import type { ToneHole } from '#shared/document/design-document.ts';
import { chimneyMm, fromFootMm } from '#shared/document/profile.ts';
import { formatCents } from '#shared/music/cents.ts';
import { removeHole, widestHoleMm } from '../../bench/hole-edits.ts';
import { centsPerStep, SENSITIVITY_STEP } from '../../bench/hole-sensitivity.ts';
import { useStable } from '../../bench/use-stable.ts';
import { Button } from '../../ui/Button.tsx';
import { CoverFields } from './CoverFields.tsx';
import { DrillRow } from './DrillRow.tsx';
import type { HoleFieldsProps } from './hole-fields-props.ts';
import { EveryNote } from './EveryNote.tsx';
import { HoleSuggestion } from './HoleSuggestion.tsx';
import { footRange, SIZE_WORDS, withSize, type HoleSize } from './inspector-fields.ts';
import { SizeField } from './SizeField.tsx';

/** Steppers for every size of a hole, the drills, what covers it, and the suggestion. */
export function HoleFields({ chosen, leading, suggestion, ...props }: HoleFieldsProps) {
  const { document, unit, readOnly, onEdit, onSelect } = props;
  const { hole, title } = chosen;
  const disabled = readOnly !== null;
  const isWide = props.geometry.layout === 'wide';
  const widestMm = widestHoleMm(document, hole.positionMm);
  const resize = useStable((size: HoleSize, value: number | null) =>
    onEdit({
      label: `${SIZE_WORDS[size]} of ${titleInSentence(title)}`,
      change: (before) => withSize(before, hole.id, size, value),
    }),
  );
  const chooseDrill = useStable((diameterMm: number) => resize('diameterMm', diameterMm));
  const size = { unit, isWide, disabled, onResize: resize };
  const beside = (dimension: HoleSize) => centsFigure({ chosen, leading, ...props }, dimension);
  const isStanding = props.geometry.layout === 'standing';
  return (
    // The drawer of a standing tablet is wide and low: sizes stand in two columns there.
    <div className={isStanding ? 'grid grid-cols-2 items-start gap-x-6' : undefined}>
      {isWide && (
        <p className="text-small text-ink3 pb-1 text-right">cents per {SENSITIVITY_STEP[unit].label}</p>
      )}
      <SizeField
        {...size}
        size="positionMm"
        label="From foot"
        value={fromFootMm(document, hole.positionMm)}
        {...footRange(document)}
        cents={beside('positionMm')}
      />
      <div>
        <SizeField
          {...size}
          size="diameterMm"
          label="Diameter"
          value={hole.diameterMm}
          min={0.5}
          max={widestMm}
          cents={beside('diameterMm')}
        />
        <DrillRow
          diameterMm={hole.diameterMm}
          widestMm={widestMm}
          unit={unit}
          suggestedMm={suggestion.suggestions?.find(({ kind }) => kind === 'drill')?.mm ?? null}
          disabled={disabled}
          count={isWide ? 6 : 5}
          onChoose={chooseDrill}
        />
      </div>
      <WallFields
        size={size}
        hole={hole}
        wallMm={chimneyMm(document, hole)}
        widestMm={widestMm}
        beside={beside}
      />
      <CoverFields
        holeId={hole.id}
        cover={hole.cover}
        hand={hole.hand}
        disabled={disabled}
        onEdit={onEdit}
        title={title}
      />
      <HoleSuggestion {...props} chosen={chosen} leading={leading} suggestion={suggestion} />
      <EveryNote
        index={chosen.index}
        hasUndercut={hole.undercut !== null}
        fingerings={document.fingerings}
        sensitivities={props.sensitivities}
        unit={unit}
        leading={leading}
      />
      {!disabled && (
        <Button
          look="bare"
          size="small"
          className="-ml-3"
          onClick={() => {
            onEdit({
              label: `Take away ${titleInSentence(title)}`,
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

type CentsSource = Pick<HoleFieldsProps, 'sensitivities' | 'unit' | 'chosen' | 'leading'>;

/** What one small step of a size does to the leading note; empty until it is known. */
function centsFigure({ sensitivities, unit, chosen, leading }: CentsSource, dimension: HoleSize): string {
  // Positions count from the mouth end inside, and from the foot on the bench.
  const sign = dimension === 'positionMm' ? -1 : 1;
  const stepMm = SENSITIVITY_STEP[unit].mm * sign;
  const cents = centsPerStep(sensitivities, leading, `holes.${chosen.index}.${dimension}`, stepMm);
  return cents === null ? '' : formatCents(cents, 2);
}

interface WallFieldsProps {
  size: Pick<Parameters<typeof SizeField>[0], 'unit' | 'isWide' | 'disabled' | 'onResize'>;
  hole: ToneHole;
  wallMm: number;
  widestMm: number;
  beside: (size: HoleSize) => string;
}

/** What of the hole lies in the wall: chimney, undercut, angle. */
function WallFields({ size, hole, wallMm, widestMm, beside }: WallFieldsProps) {
  const { undercut } = hole;
  return (
    <>
      <SizeField
        {...size}
        size="chimneyMm"
        label="Chimney"
        hint={hole.chimneyMm === null ? 'from wall' : 'as typed'}
        // What is taken from the wall was never typed: a hundredth is as much as it is good for.
        value={hole.chimneyMm ?? Math.round(wallMm * 100) / 100}
        min={0.1}
        max={100}
        cents={beside('chimneyMm')}
        resetWords={hole.chimneyMm === null ? null : 'Take it from the wall'}
      />
      <SizeField
        {...size}
        size="undercut.innerDiameterMm"
        label="Undercut"
        hint={undercut === null ? 'none' : 'at the bore'}
        value={undercut?.innerDiameterMm ?? hole.diameterMm}
        min={hole.diameterMm}
        max={Math.max(hole.diameterMm, widestMm)}
        cents={beside('undercut.innerDiameterMm')}
      />
      {undercut !== null && (
        <SizeField
          {...size}
          size="undercut.depthMm"
          label="Depth"
          hint="of undercut"
          value={undercut.depthMm}
          min={0.1}
          max={wallMm}
          cents={beside('undercut.depthMm')}
        />
      )}
      <SizeField
        {...size}
        size="angleDeg"
        label="Angle"
        value={hole.angleDeg}
        min={-360}
        max={360}
        cents=""
      />
    </>
  );
}
