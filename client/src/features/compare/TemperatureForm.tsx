import type { Air } from '#shared/document/design-document.ts';
import { formatCents } from '#shared/music/cents.ts';
import { NumberField } from '../../ui/NumberField.tsx';
import { temperatureFormat } from '../../ui/number-format.ts';
import type { NoteRow } from './note-rows.ts';

interface TemperatureFormProps {
  air: Air;
  temperatureC: number;
  rows: readonly NoteRow[];
  onTemperature: (temperatureC: number | null) => void;
}

/** The same instrument in warmer or cooler air, and what that does to it as a whole. */
export function TemperatureForm({ air, temperatureC, rows, onTemperature }: TemperatureFormProps) {
  return (
    <section aria-labelledby="temperature-heading">
      <h2 id="temperature-heading" className="text-section font-semibold">
        At another temperature
        <span className="text-data text-ink3 ml-2 font-normal">nothing is changed until you ask for it</span>
      </h2>
      <div className="mt-2 w-57 max-[1100px]:w-64">
        <NumberField
          label="Air in the bore"
          labelLook="strong"
          value={temperatureC}
          format={temperatureFormat}
          min={0}
          max={40}
          disabled={air.fixed !== null}
          onChange={(value) => onTemperature(value === air.temperatureC ? null : value)}
        />
      </div>
      <p role="status" className="mt-2">
        {temperatureWords(air, temperatureC, rows)}
      </p>
    </section>
  );
}

function temperatureWords(air: Air, temperatureC: number, rows: readonly NoteRow[]): string {
  if (air.fixed !== null)
    return 'The air of this design is fixed for a check. It has no temperature to change.';
  if (temperatureC === air.temperatureC)
    return `This is the temperature it was drawn for, ${air.temperatureC} °C.`;
  const moved = rows.flatMap(({ movedCents }) => movedCents ?? []);
  if (moved.length === 0) return 'Working out the notes…';
  const [least, most] = [Math.min(...moved), Math.max(...moved)];
  const middle = (least + most) / 2;
  const perDegree = middle / (temperatureC - air.temperatureC);
  const [from, to] = [formatCents(least), formatCents(most)];
  return `From ${air.temperatureC} to ${temperatureC} °C every note moves by ${from === to ? from : `${from} to ${to}`} cents, ${Math.abs(perDegree).toFixed(1)} cents a degree.`;
}
