import { useEffect, useMemo, useState, type ReactNode } from 'react';
import type { DesignPrediction, FingeringPrediction } from '#shared/analysis/prediction.ts';
import type { BenchGeometry } from '../../bench/bench-geometry.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import type { PredictionOptions } from '../../engine/engine-answers.ts';
import { useStable } from '../../bench/use-stable.ts';
import { useStudy } from '../../engine/use-study.ts';
import { classNames } from '../../ui/class-names.ts';
import { AirForm } from './AirForm.tsx';
import { AirHead } from './AirHead.tsx';
import { PressureTable } from './PressureTable.tsx';
import { playsMaxima } from './resonance-curve.ts';
import { ResonanceDrawing } from './ResonanceDrawing.tsx';
import { RibbonShelf } from './RibbonShelf.tsx';
import './air-panel.css';

interface AirPanelProps extends PanelProps {
  /** What the prediction leaves out, chosen here for comparison. */
  predictionOptions: PredictionOptions;
  onChoosePredictionOptions: (options: PredictionOptions) => void;
  /** Buttons that make the chosen note heard; handed in by the page. */
  sound?: ReactNode;
}

/** The drawing is not squeezed below this, px. */
const LEAST_WIDTH = 300;
/** So many resonances have a ribbon and a row of pressures. */
const RIBBONS = 4;

/** The air column of one fingering: what resonates, how strongly, where along the bore, and in which air. */
export function AirPanel({ sound, predictionOptions, onChoosePredictionOptions, ...props }: AirPanelProps) {
  const { document, prediction, selection, geometry, onSelect } = props;
  const [hasGhosts, setGhosts] = useState(true);
  const [chosenMode, setChosenMode] = useState<number | null>(null);
  const chosen = selection.fingering;
  const predicted = useMemo(() => chosenPrediction(prediction, chosen), [prediction, chosen]);
  const mode = chosenMode ?? soundingMode(predicted);
  const resonances = useMemo(
    () => (predicted === null ? [] : predicted.ladder.slice(0, RIBBONS)),
    [predicted],
  );
  const { coupling } = predictionOptions;
  const ribbons = useStudy(
    'ribbons',
    useMemo(
      () => (predicted === null ? null : { document, fingering: predicted.id, resonances, coupling }),
      [document, predicted, resonances, coupling],
    ),
  );
  const zone = zoneOf(geometry);
  const countAll = useStable(() => {
    if (!predictionOptions.coupling) onChoosePredictionOptions({ coupling: true });
  });
  // Figures without coupling are for comparison here; no other panel may show them.
  useEffect(() => countAll, [countAll]);
  return (
    <section aria-label="Air column">
      <RibbonShelf {...props} ribbons={ribbons} resonances={resonances} mode={mode} onMode={setChosenMode} />
      <div className={classNames('grid', !zone.isWide && 'pb-18')}>
        <div
          className={classNames('z-10 pt-2 pb-6', zone.isBeside && 'col-start-1 row-start-1')}
          style={{ marginInline: zone.x, ...(zone.isBeside ? { width: zone.width } : {}) }}
        >
          <AirHead
            {...props}
            predicted={predicted}
            hasGhosts={hasGhosts}
            onGhosts={setGhosts}
            options={predictionOptions}
            onOptions={onChoosePredictionOptions}
            onFingering={(fingering) => {
              setChosenMode(null);
              onSelect({ fingering });
            }}
          />
          {predicted !== null && (
            <ResonanceDrawing
              document={document}
              coupling={coupling}
              predicted={predicted}
              maxima={playsMaxima(document.mouthEnd.kind)}
              hasGhosts={hasGhosts}
              mode={mode}
              onMode={setChosenMode}
              width={Math.min(512, zone.width)}
            />
          )}
          {sound}
          <AirForm {...props} />
        </div>
        <div className={classNames(zone.isBeside && 'col-start-1 row-start-1')}>
          <PressureTable {...props} predicted={predicted} ribbons={ribbons} mode={mode} />
        </div>
      </div>
    </section>
  );
}

const soundingMode = (predicted: FingeringPrediction | null): number => predicted?.mode ?? 1;

/** Where the drawing and the form stand: left of the columns, or above them where the page is narrow. */
function zoneOf({ layout, measures, widthPx }: BenchGeometry) {
  const { x, width } = measures.leftZone;
  if (layout === 'wide') return { x, width: 512, isBeside: true, isWide: true };
  if (layout === 'tablet') return { x, width, isBeside: true, isWide: false };
  return { x, width: Math.max(LEAST_WIDTH, widthPx - 2 * x), isBeside: false, isWide: false };
}

/** The chosen fingering's, else the lowest note's. */
function chosenPrediction(
  prediction: DesignPrediction | null,
  chosen: string | null,
): FingeringPrediction | null {
  const predictions = prediction?.fingerings ?? [];
  const lowest = predictions.reduce<FingeringPrediction | null>(
    (least, one) => (least === null || one.targetHz < least.targetHz ? one : least),
    null,
  );
  return predictions.find(({ id }) => id === chosen) ?? lowest;
}
