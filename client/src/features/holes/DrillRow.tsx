import { memo } from 'react';
import { nearestDrills, type Drill } from '#shared/lengths/drills.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { drillsFor } from '../../bench/drill-choice.ts';
import { classNames } from '../../ui/class-names.ts';

interface DrillRowProps {
  diameterMm: number;
  widestMm: number;
  unit: LengthUnit;
  /** The drill that the suggestion names. */
  suggestedMm: number | null;
  disabled: boolean;
  count: number;
  onChoose: (diameterMm: number) => void;
}

/** Drills round the present size as circles that grow with them: chosen filled, suggested dashed. */
export const DrillRow = memo(function DrillRow(props: DrillRowProps) {
  const { diameterMm, suggestedMm, unit, disabled, count, onChoose } = props;
  const drills = drillsRound(props, count);
  const widest = Math.max(...drills.map((drill) => drill.diameterMm));
  return (
    <div role="group" aria-label="Drills" className="flex gap-0.75 max-[1279px]:gap-1">
      {drills.map((drill) => {
        const isOn = Math.abs(drill.diameterMm - diameterMm) < 1e-3;
        const isSuggested = !isOn && suggestedMm !== null && Math.abs(drill.diameterMm - suggestedMm) < 1e-3;
        return (
          <button
            key={drill.name}
            type="button"
            aria-label={`Drill ${drill.name}${unit === 'mm' ? ' mm' : ''}${isSuggested ? ', suggested' : ''}`}
            aria-pressed={isOn}
            disabled={disabled}
            onClick={() => onChoose(drill.diameterMm)}
            className={classNames(
              'rounded-control text-small flex min-h-11 min-w-0 flex-1 flex-col items-center justify-end border pb-0.5 max-[1279px]:min-h-13',
              isOn && 'border-mark bg-mark-soft text-mark font-bold',
              isSuggested && 'border-mark text-mark border-dashed font-semibold',
              !isOn &&
                !isSuggested &&
                'text-ink2 hover:border-line max-[1279px]:border-hair border-transparent',
            )}
          >
            <DrillCircle radius={4 + 7 * (drill.diameterMm / widest)} isOn={isOn} />
            {drill.name}
          </button>
        );
      })}
    </div>
  );
});

function DrillCircle({ radius, isOn }: { radius: number; isOn: boolean }) {
  return (
    <svg width="26" height="24" viewBox="-13 -12 26 24" aria-hidden="true" className="shrink-0">
      <circle r={radius} fill={isOn ? 'currentColor' : 'none'} stroke="currentColor" strokeWidth="1.5" />
    </svg>
  );
}

/** The suggested drill and the present size, then neighbours in steps that can be felt, narrowest first. */
function drillsRound({ diameterMm, widestMm, unit, suggestedMm }: DrillRowProps, count: number): Drill[] {
  const all = drillsFor(unit).filter((drill) => drill.diameterMm <= widestMm + 1e-9);
  const byName = new Map<string, Drill>();
  const add = (drill: Drill | null | undefined) => {
    if (drill !== null && drill !== undefined) byName.set(drill.name, drill);
  };
  const exact = nearestDrills(diameterMm, all).exact;
  add(exact ?? { name: diameterMm.toFixed(2), diameterMm, set: 'metric-0.1' });
  if (suggestedMm !== null) add(nearestDrills(suggestedMm, all).exact);
  const round = all
    .filter((drill) => isRound(drill, unit))
    .sort((a, b) => Math.abs(a.diameterMm - diameterMm) - Math.abs(b.diameterMm - diameterMm));
  for (const drill of round) {
    if (byName.size >= count) break;
    add(drill);
  }
  return [...byName.values()].sort((a, b) => a.diameterMm - b.diameterMm);
}

/** Of the metric drills those of the half-millimetre set are offered; of the inch drills all. */
const isRound = (drill: Drill, unit: LengthUnit) =>
  unit === 'inch' || Math.abs(drill.diameterMm * 2 - Math.round(drill.diameterMm * 2)) < 1e-6;
