import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import { formatCents } from '#shared/music/cents.ts';
import { NoteName } from '../../bench/NoteName.tsx';
import type { PanelProps } from '../../bench/panel-props.ts';
import { movedCents, noteMoves } from './measured-words.ts';

interface EffectTableProps extends Pick<PanelProps, 'document'> {
  drawn: DesignPrediction | null;
  measured: DesignPrediction | null;
}

const cents = (value: number | null) => (value === null ? '–' : formatCents(value));

/** Every note, with the bore as drawn and as measured. */
export function EffectTable({ document, drawn, measured }: EffectTableProps) {
  const moves = noteMoves(document, drawn, measured);
  if (moves.length === 0) return null;
  return (
    <details className="border-hair border-t">
      <summary className="text-mark target flex cursor-pointer items-center text-[14px] font-semibold">
        Every note, drawn and measured
      </summary>
      <table className="text-data mb-2 w-full">
        <caption className="sr-only">What the measured bore does to every note, in cents</caption>
        <thead className="text-ink3 text-left">
          <tr>
            <th scope="col" className="py-1 font-normal">
              Note
            </th>
            {['Drawn', 'Measured', 'Moves'].map((title) => (
              <th key={title} scope="col" className="py-1 text-right font-normal">
                {title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {moves.map((move) => (
            <tr key={move.fingering} className="border-hair border-t">
              <th scope="row" className="py-0.5 text-left font-normal">
                <NoteName note={move.note} />
              </th>
              <td className="text-ink3 text-right">{cents(move.drawnCents)}</td>
              <td className="text-right">{cents(move.measuredCents)}</td>
              <td className="text-right font-semibold">{cents(movedCents(move))}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  );
}
