import type { Air } from '#shared/document/design-document.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { Button } from '../../ui/Button.tsx';
import { lengthFormat } from '../../ui/length-format.ts';
import { NumberField } from '../../ui/NumberField.tsx';
import { plainFormat, type NumberFormat } from '../../ui/number-format.ts';
import { percentFormat } from '../../ui/percent-format.ts';
import { LabelledSwitch } from './LabelledSwitch.tsx';

const CELSIUS = plainFormat({ suffix: '°C', step: 0.5, digits: 1, example: '24' });
const HUMIDITY = percentFormat({ stepPercent: 5, example: '50' });
const BREATH = percentFormat({ stepPercent: 0.5, digits: 1, example: '2.5' });
const HECTOPASCAL = plainFormat({ suffix: 'hPa', step: 100, digits: 0, example: '1013' });
/** Stored in pascal, shown as every barometer does. */
const PRESSURE: NumberFormat = {
  ...HECTOPASCAL,
  print: (pascal) => HECTOPASCAL.print(pascal / 100),
  read: (text) => {
    const reading = HECTOPASCAL.read(text);
    return reading.status === 'read' ? { status: 'read', value: reading.value * 100 } : reading;
  },
};

/** A column warmed by the breath, when nothing else is said. */
const WARM = { mouthTemperatureC: 30, warmLengthMm: 150 };

type FigureKey = 'temperatureC' | 'relativeHumidity' | 'co2Fraction' | 'pressurePa';

interface AirFigure {
  key: FigureKey;
  label: string;
  format: NumberFormat;
  min: number;
  max: number;
}

const FIGURES: readonly AirFigure[] = [
  { key: 'temperatureC', label: 'Temperature', format: CELSIUS, min: 0, max: 40 },
  { key: 'relativeHumidity', label: 'Humidity', format: HUMIDITY, min: 0, max: 1 },
  { key: 'co2Fraction', label: 'Breath, carbon dioxide', format: BREATH, min: 0, max: 0.06 },
  { key: 'pressurePa', label: 'Air pressure', format: PRESSURE, min: 60_000, max: 110_000 },
];

/** The air in the bore: what it is made of, how warm, and how it cools from the mouth. */
export function AirForm({ document, unit, readOnly, onEdit }: PanelProps) {
  const { air } = document;
  const disabled = readOnly !== null;
  const edit = (label: string, change: Partial<Air>, mergeKey?: string) =>
    onEdit({
      label,
      change: (before) => ({ ...before, air: { ...before.air, ...change } }),
      ...(mergeKey === undefined ? {} : { mergeKey: `air.${mergeKey}` }),
    });
  const isWarm = air.mouthTemperatureC !== null && air.warmLengthMm !== null;
  return (
    <section aria-labelledby="air-heading" className="border-hair mt-4 border-t pt-2">
      <h2 id="air-heading" className="text-section font-semibold">
        Air in the bore
      </h2>
      {air.fixed !== null && (
        <p className="text-data text-ink2 mt-1">
          Fixed for a check: sound at {air.fixed.speedOfSound} m/s, density {air.fixed.density} kg/m³. The
          figures below are not used.{' '}
          <Button
            size="small"
            look="bare"
            disabled={disabled}
            onClick={() => edit('Real air', { fixed: null })}
          >
            Use real air
          </Button>
        </p>
      )}
      <div className="mt-1 grid grid-cols-[repeat(auto-fill,minmax(230px,1fr))] gap-x-4 gap-y-2">
        {FIGURES.map(({ key, label, format, min, max }) => (
          <NumberField
            key={key}
            label={label}
            value={air[key]}
            format={format}
            min={min}
            max={max}
            disabled={disabled}
            onChange={(value) => edit(label, { [key]: value }, key)}
          />
        ))}
      </div>
      <div className="mt-3">
        <LabelledSwitch
          label="Warm at the mouth, cooling along the pipe"
          isOn={isWarm}
          disabled={disabled}
          onChange={(warm) =>
            edit('Warm mouth', warm ? WARM : { mouthTemperatureC: null, warmLengthMm: null })
          }
        />
      </div>
      {air.mouthTemperatureC !== null && air.warmLengthMm !== null && (
        <div className="mt-1 grid grid-cols-[repeat(auto-fill,minmax(230px,1fr))] gap-x-4 gap-y-2">
          <NumberField
            label="At the mouth"
            value={air.mouthTemperatureC}
            format={CELSIUS}
            min={0}
            max={40}
            disabled={disabled}
            onChange={(mouthTemperatureC) =>
              edit('Temperature at the mouth', { mouthTemperatureC }, 'mouthTemperatureC')
            }
          />
          <NumberField
            label="Cools over"
            value={air.warmLengthMm}
            format={lengthFormat(unit, 10)}
            min={1}
            max={5000}
            disabled={disabled}
            onChange={(warmLengthMm) => edit('Warm length', { warmLengthMm }, 'warmLengthMm')}
          />
        </div>
      )}
    </section>
  );
}
