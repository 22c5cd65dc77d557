import type { FingeringPrediction } from '#shared/analysis/prediction.ts';
import { NoteName } from '../../bench/NoteName.tsx';
import type { PanelProps } from '../../bench/panel-props.ts';
import type { PredictionOptions } from '../../engine/engine-answers.ts';
import { LabelledSwitch } from './LabelledSwitch.tsx';

interface AirHeadProps extends PanelProps {
  predicted: FingeringPrediction | null;
  hasGhosts: boolean;
  onGhosts: (hasGhosts: boolean) => void;
  options: PredictionOptions;
  onOptions: (options: PredictionOptions) => void;
  onFingering: (id: string) => void;
}

/** Which note, and what of the physics is left out for comparison. */
export function AirHead(props: AirHeadProps) {
  const { document, prediction, predicted, options, readOnly, onEdit } = props;
  const order = (prediction?.fingerings ?? []).toSorted((a, b) => a.targetHz - b.targetHz);
  const at = order.findIndex(({ id }) => id === predicted?.id);
  const step = (by: number) => {
    const next = order[at + by];
    if (next !== undefined) props.onFingering(next.id);
  };
  return (
    <header className="flex flex-wrap items-center gap-x-3 gap-y-2">
      <h2 className="text-section font-semibold">Air column</h2>
      {predicted !== null && (
        <span className="rounded-control border-line flex h-7 items-stretch overflow-hidden border pointer-coarse:h-11">
          <button
            type="button"
            aria-label="Note before"
            disabled={at <= 0}
            onClick={() => step(-1)}
            className="bg-groove disabled:text-line w-7 pointer-coarse:w-11"
          >
            ‹
          </button>
          <b className="bg-sheet min-w-12 self-stretch px-2 text-center leading-7 font-semibold pointer-coarse:leading-11">
            <NoteName note={predicted.note} />
          </b>
          <button
            type="button"
            aria-label="Next note"
            disabled={at >= order.length - 1}
            onClick={() => step(1)}
            className="bg-groove disabled:text-line w-7 pointer-coarse:w-11"
          >
            ›
          </button>
        </span>
      )}
      <LabelledSwitch
        label="Losses"
        isOn={document.air.losses}
        disabled={readOnly !== null}
        onChange={(losses) =>
          onEdit({
            label: losses ? 'Count the losses' : 'Leave the losses out',
            change: (before) => ({ ...before, air: { ...before.air, losses } }),
          })
        }
      />
      <LabelledSwitch
        label="Coupling"
        isOn={options.coupling}
        onChange={(coupling) => props.onOptions({ ...options, coupling })}
      />
      <LabelledSwitch label="Exact multiples" isOn={props.hasGhosts} onChange={props.onGhosts} />
      {!options.coupling && (
        <p className="text-label bg-wait text-wait-ink rounded-chip basis-full px-2">
          Without coupling, for comparison: the openings do not feel each other. Saved figures always count
          it.
        </p>
      )}
    </header>
  );
}
