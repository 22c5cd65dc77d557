import {
  BEYOND,
  COMBINATIONS,
  type Beyond,
  type Combination,
  type FittedBore,
} from '#shared/measured-bore/fit-stations.ts';
import { MM_PER_INCH } from '#shared/lengths/drills.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { lengthFormat } from '../../ui/length-format.ts';
import { NumberField } from '../../ui/NumberField.tsx';
import { FigureRow, FormRow } from './FormRow.tsx';
import { printWidth } from './measured-words.ts';
import { SmallSelect } from './SmallSelect.tsx';
import type { MeasuredBoreDesk } from './use-measured-bore.ts';

interface LimitsFormProps extends Pick<PanelProps, 'unit'> {
  desk: Pick<MeasuredBoreDesk, 'source' | 'fit'>;
  fitted: FittedBore;
  isWide: boolean;
}

const COMBINATION_WORDS: Record<Combination, string> = {
  mean: 'mean of all',
  widest: 'the widest',
  narrowest: 'the narrowest',
};
const BEYOND_WORDS: Record<Beyond, string> = { held: 'nearest reading', drawn: 'as drawn' };
const COMBINED = COMBINATIONS.map((value) => ({ value, label: COMBINATION_WORDS[value] }));
const BEYOND_OPTIONS = BEYOND.map((value) => ({ value, label: BEYOND_WORDS[value] }));

/** One press of a stepper: in mm, and about the same in inch. */
const STEP_MM = { limit: 0.01, within: 0.005 };
const stepOf = (unit: PanelProps['unit'], mm: number) =>
  unit === 'mm' ? mm : (Math.round((mm / MM_PER_INCH) * 1e4) / 1e4) * MM_PER_INCH;

/** By which limit readings are left out, how finely the rest is kept, and what counts where several were taken. */
export function LimitsForm({ desk, fitted, unit, isWide }: LimitsFormProps) {
  const { source, fit } = desk;
  const { outOfRound, gaps } = fitted;
  return (
    <>
      <FigureRow>
        <NumberField
          layout={isWide ? 'row' : 'stack'}
          label="Leave out beyond"
          value={fitted.limitMm}
          format={lengthFormat(unit, stepOf(unit, STEP_MM.limit))}
          min={stepOf(unit, STEP_MM.limit)}
          max={50}
          onChange={(limitMm) => fit({ limitMm })}
        />
      </FigureRow>
      <FigureRow>
        <NumberField
          layout={isWide ? 'row' : 'stack'}
          label="Thin to within"
          value={source.fit.withinMm}
          format={lengthFormat(unit, stepOf(unit, STEP_MM.within))}
          min={0}
          max={5}
          onChange={(withinMm) => fit({ withinMm })}
        />
      </FigureRow>
      {outOfRound !== null && (
        <>
          <FormRow label="Out of round">
            <b className="text-data font-semibold">{printWidth(outOfRound.usualMm, unit)}</b>
            <span className="text-small text-ink3">at most {printWidth(outOfRound.mostMm, unit)}</span>
          </FormRow>
          <FormRow label="Use">
            <span className="w-36 shrink-0">
              <SmallSelect
                label="Use, of several diameters at one place"
                value={source.fit.combination}
                options={COMBINED}
                onChange={(combination) => fit({ combination })}
              />
            </span>
          </FormRow>
        </>
      )}
      {gaps.length > 0 && (
        <FormRow label="Not measured">
          <span className="w-36 shrink-0">
            <SmallSelect
              label="Where nothing was measured"
              value={fitted.beyond}
              options={BEYOND_OPTIONS}
              onChange={(beyond) => fit({ beyond })}
            />
          </span>
        </FormRow>
      )}
    </>
  );
}
