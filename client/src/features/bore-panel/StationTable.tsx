import type { DesignDocument } from '#shared/document/design-document.ts';
import { fromFootMm } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { classNames } from '../../ui/class-names.ts';
import type { ProfilePart } from '../../bench/end-edits.ts';
import { taperWords } from './taper.ts';

interface StationTableProps {
  document: DesignDocument;
  part: ProfilePart;
  unit: LengthUnit;
  chosen: number | null;
  onChoose: (index: number) => void;
}

/** Where each station lies, how wide it is, and the taper to the next. A row is chosen by its first figure. */
export function StationTable({ document, part, unit, chosen, onChoose }: StationTableProps) {
  const { stations } = document[part];
  return (
    // A measured bore may have hundreds of stations: the table scrolls, the page does not grow.
    <div className="mt-1 max-h-81 overflow-y-auto">
      <table className="text-data w-full border-collapse">
        <thead className="bg-paper sticky top-0">
          <tr className="text-small text-ink3 text-left">
            <th className="px-2 pb-0.5 font-normal">from foot</th>
            <th className="px-2 pb-0.5 font-normal">diameter</th>
            <th className="px-2 pb-0.5 font-normal">to next</th>
          </tr>
        </thead>
        <tbody>
          {stations.map((station, index) => {
            const next = stations[index + 1];
            const isChosen = index === chosen;
            return (
              <tr key={index} className={classNames(isChosen && 'bg-mark-soft')}>
                <td className="border-hair border-t p-0">
                  <button
                    type="button"
                    aria-pressed={isChosen}
                    aria-label={`Station ${index + 1}, ${printLength(fromFootMm(document, station.positionMm), unit)} from foot`}
                    onClick={() => onChoose(index)}
                    className={classNames(
                      'h-6.5 w-full px-2 text-left max-[1100px]:h-11 pointer-coarse:h-11',
                      isChosen && 'border-mark border-l-3 font-semibold',
                    )}
                  >
                    {printLength(fromFootMm(document, station.positionMm), unit)}
                  </button>
                </td>
                <td className="border-hair border-t px-2 font-semibold">
                  {printLength(station.diameterMm, unit, unit === 'mm' ? 2 : 3)}
                </td>
                <td className="border-hair border-t px-2">
                  {next === undefined ? 'foot' : taperWords(station, next, unit)}
                </td>
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}
