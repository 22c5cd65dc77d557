import type { DesignSensitivities } from '#shared/analysis/prediction.ts';
import type { MouthEnd, MouthEndKind } from '#shared/document/design-document.ts';
import { diameterAt } from '#shared/document/profile.ts';
import { formatCents } from '#shared/music/cents.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { SelectField } from '../../ui/Field.tsx';
import { lengthFormat } from '../../ui/length-format.ts';
import { NumberField } from '../../ui/NumberField.tsx';
import { plainFormat } from '../../ui/number-format.ts';
import { percentFormat } from '../../ui/percent-format.ts';
import { usualMouthEnd } from '../../bench/usual-mouth-end.ts';
import { withMouthEnd } from '../../bench/end-edits.ts';
import { MOUTH_FIELDS, MOUTH_NAMES, mouthFigure, withMouthFigure, type MouthField } from './mouth-fields.ts';
import { UndercutFields } from './UndercutFields.tsx';
import { WindowSection } from './WindowSection.tsx';

const FORMATS = {
  share: percentFormat({ stepPercent: 1, example: '35' }),
  degrees: plainFormat({ suffix: '°', step: 1, digits: 0, example: '20' }),
  volume: plainFormat({ suffix: 'mm³', step: 10, digits: 0, example: '500' }),
};
const SCALE = plainFormat({ suffix: '×', step: 0.01, digits: 2, example: '1.05' });

/** What excites the air column, with every size of it, and the one number that calibration sets. */
export function MouthForm({ document, unit, sensitivities, selection, readOnly, onEdit }: PanelProps) {
  const { mouthEnd } = document;
  const disabled = readOnly !== null;
  const change = (label: string, to: (before: MouthEnd) => MouthEnd, mergeKey?: string) =>
    onEdit({
      label,
      change: (before) => withMouthEnd(before, to(before.mouthEnd)),
      ...(mergeKey === undefined ? {} : { mergeKey: `mouthEnd.${mergeKey}` }),
    });
  const field = ({ key, label, hint, measure, min, max }: MouthField) => (
    <NumberField
      key={key}
      layout="stack"
      label={label}
      hint={hint}
      beside={
        <CentsPerTenth
          sensitivities={measure === 'length' ? sensitivities : null}
          fingering={selection.fingering}
          path={`mouthEnd.${key}`}
        />
      }
      value={mouthFigure(mouthEnd, key)}
      format={measure === 'length' ? lengthFormat(unit) : FORMATS[measure]}
      min={min}
      max={max}
      disabled={disabled}
      onChange={(value) => change(label, (before) => withMouthFigure(before, key, value), key)}
    />
  );
  return (
    <section aria-labelledby="mouth-heading" className="mt-4 min-w-0 flex-1 min-[1280px]:mt-0">
      <div>
        <h2 id="mouth-heading" className="text-section font-semibold">
          {MOUTH_NAMES[mouthEnd.kind]}
        </h2>
        {sensitivities !== null && selection.fingering !== null && (
          <p className="text-small text-ink3 text-right">cents per 0.1 mm</p>
        )}
      </div>
      {mouthEnd.kind === 'window' && <WindowSection window={mouthEnd} unit={unit} />}
      <div className="mt-1 flex flex-col gap-2">
        {MOUTH_FIELDS[mouthEnd.kind].map(field)}
        {mouthEnd.kind === 'embouchure' && (
          <UndercutFields
            undercut={mouthEnd.undercut}
            holeMm={mouthEnd.lengthMm}
            unit={unit}
            disabled={disabled}
            onChange={(undercut) =>
              change('Undercut', (before) => ({ ...before, undercut }) as MouthEnd, 'undercut')
            }
          />
        )}
        <NumberField
          layout="stack"
          label="Correction"
          hint={mouthEnd.kind === 'reed' ? 'times the volume' : 'times the end length'}
          value={mouthEnd.correctionScale}
          format={SCALE}
          min={0.2}
          max={5}
          disabled={disabled}
          onChange={(value) =>
            change('Correction', (before) => ({ ...before, correctionScale: value }), 'correctionScale')
          }
        />
        <p className="text-small text-ink3">
          1.00 is the formula. Measured notes set it for your own mouth ends.
        </p>
        <SelectField
          label="Kind"
          value={mouthEnd.kind}
          disabled={disabled}
          onChange={(event) => {
            const kind = event.currentTarget.value as MouthEndKind;
            const boreMm = diameterAt(document.bore.stations, 0);
            change(`Mouth end: ${MOUTH_NAMES[kind].toLowerCase()}`, () => usualMouthEnd(kind, boreMm));
          }}
        >
          {Object.entries(MOUTH_NAMES).map(([kind, name]) => (
            <option key={kind} value={kind}>
              {name}
            </option>
          ))}
        </SelectField>
      </div>
    </section>
  );
}

interface CentsPerTenthProps {
  sensitivities: DesignSensitivities | null;
  fingering: string | null;
  path: string;
}

/** What 0.1 mm more does to the chosen note. */
function CentsPerTenth({ sensitivities, fingering, path }: CentsPerTenthProps) {
  const cents = sensitivities?.fingerings.find(({ id }) => id === fingering)?.centsPerUnit[path];
  if (cents === undefined) return null;
  return <span className="text-label text-ink3">{formatCents(cents / 10, 2)} </span>;
}
