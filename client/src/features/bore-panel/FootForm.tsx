import { boreEnds } from '#shared/document/profile.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { lengthFormat } from '../../ui/length-format.ts';
import { NumberField } from '../../ui/NumberField.tsx';
import { Segment } from '../../ui/Segment.tsx';
import { moveFoot } from '../../bench/end-edits.ts';

const KINDS = [
  { value: 'open', label: 'open' },
  { value: 'flanged', label: 'flanged' },
  { value: 'stopped', label: 'stopped' },
] as const;

/** How the pipe ends, and where. */
export function FootForm({ document, unit, readOnly, onEdit }: PanelProps) {
  const { footMm } = boreEnds(document);
  return (
    <section aria-labelledby="foot-heading" className="mt-4">
      <h2 id="foot-heading" className="text-section font-semibold">
        Foot
      </h2>
      <div className="mt-1 flex flex-col gap-2">
        <NumberField
          layout="row"
          label="Length"
          hint="mouth end to foot"
          value={footMm}
          format={lengthFormat(unit, 0.5)}
          min={20}
          max={5000}
          disabled={readOnly !== null}
          onChange={(length) =>
            onEdit({
              label: 'Length of the pipe',
              change: (before) => moveFoot(before, length),
              mergeKey: 'foot.positionMm',
            })
          }
        />
        <div className="flex items-center justify-between">
          <span>Foot end</span>
          <Segment
            label="Foot end"
            size="small"
            value={document.foot.kind}
            options={KINDS}
            disabled={readOnly !== null}
            onChange={(kind) =>
              onEdit({ label: `Foot ${kind}`, change: (before) => ({ ...before, foot: { kind } }) })
            }
          />
        </div>
      </div>
    </section>
  );
}
