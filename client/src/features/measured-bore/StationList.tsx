import type { Station } from '#shared/document/design-document.ts';
import { fromFootMm } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { counted, printWidth } from './measured-words.ts';

interface StationListProps extends Pick<PanelProps, 'document' | 'unit'> {
  stations: readonly Station[];
}

/** What the bore would become, in figures. */
export function StationList({ document, unit, stations }: StationListProps) {
  if (stations.length === 0) return null;
  return (
    <details className="border-hair border-t">
      <summary className="text-mark target flex cursor-pointer items-center text-[14px] font-semibold">
        The {counted(stations.length, 'station')}
      </summary>
      <table className="text-data mb-2 w-full">
        <thead className="text-ink3 text-left">
          <tr>
            <th scope="col" className="py-1 font-normal">
              From foot
            </th>
            <th scope="col" className="py-1 font-normal">
              Diameter
            </th>
          </tr>
        </thead>
        <tbody>
          {stations.map((station, index) => (
            <tr key={index} className="border-hair border-t">
              <td className="py-0.5">{printLength(fromFootMm(document, station.positionMm), unit)}</td>
              <td className="font-semibold">{printWidth(station.diameterMm, unit)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  );
}
