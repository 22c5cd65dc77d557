import { useMemo, useState } from 'react';
import type { Station } from '#shared/document/design-document.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import { fromFootMm } from '#shared/document/profile.ts';
import { DropLines } from '../../bench/DropLines.tsx';
import type { PanelProps } from '../../bench/panel-props.ts';
import { ShelfCaption } from '../../bench/ShelfCaption.tsx';
import { timesWider, type WidthScale } from '../../bench/width-scale.ts';
import { WidthGrid } from '../../bench/WidthGrid.tsx';
import '../../bench/shelf.css';
import { BoreKnot } from './BoreKnot.tsx';
import { KnotReading } from './KnotReading.tsx';
import { moveStation } from './bore-edits.ts';
import { SHELF, shelfScale } from './shelf-scale.ts';
import { SpanLines } from './SpanLines.tsx';
import { WiderCurves } from './WiderCurves.tsx';

interface BoreShelfProps extends PanelProps {
  /** A second line over the drawn bore. */
  beside?: readonly Station[] | null;
  chosen: number | null;
  onChoose: (index: number) => void;
}

/** More knots than this are drawn small; only the chosen one is at full size. */
const MANY_STATIONS = 40;
/** Captions stand beside the drawing where the bore leaves so much room at the left, px. */
const ROOM_FOR_CAPTIONS = 150;

/** The bore's wall, drawn many times wider than true, with a knot at every station; below it, what a wider place does. */
export function BoreShelf(props: BoreShelfProps) {
  const { document, geometry, unit, chosen, onChoose, onEdit, readOnly } = props;
  const { stations } = document.bore;
  // While a knot is dragged the scale stands still, or the knot would run away from the hand.
  const [held, setHeld] = useState<WidthScale | null>(null);
  const { beside } = props;
  const fitted = useMemo(() => shelfScale([...stations, ...(beside ?? [])]), [stations, beside]);
  const scale = held ?? fitted;
  const lineOf = (profile: readonly Station[]) =>
    profile
      .map(
        ({ positionMm, diameterMm }) =>
          `${geometry.x(positionMm).toFixed(1)} ${scale.y(diameterMm).toFixed(1)}`,
      )
      .join('L');
  const line = lineOf(stations);
  const times = `${timesWider(scale, geometry.pxPerMm)} times wider`;
  const [left, right] = [
    geometry.x(stations[0]?.positionMm ?? 0),
    geometry.x(stations.at(-1)?.positionMm ?? 0),
  ];
  const chosenStation = chosen === null ? undefined : stations[chosen];
  const isBeside = left >= ROOM_FOR_CAPTIONS;
  return (
    <svg
      width={geometry.widthPx}
      height={SHELF.height}
      role="group"
      aria-label="Bore, drawn wider than true"
      className="border-hair block border-b"
    >
      <DropLines {...props} height={SHELF.height} />
      <g aria-hidden="true">
        <path d={`M${left} ${SHELF.woodY}L${line}L${right} ${SHELF.woodY}Z`} className="bore-wood" />
        <WidthGrid scale={scale} unit={unit} from={left} to={right} isBeside={isBeside} />
        <path d={`M${line}`} className="bore-line" />
        {beside && <path d={`M${lineOf(beside)}`} className="bore-beside" />}
        <ShelfCaption
          isBeside={isBeside}
          y={20}
          title="Bore wall"
          lines={['wood above, air below', times, 'than it is long']}
          sentence={`wood above, air below, ${times} than it is long`}
        />
        <SpanLines stations={stations} geometry={geometry} unit={unit} isLabelled={isBeside} />
      </g>
      {stations.map((station, index) => (
        <BoreKnot
          // Stations have no name of their own; their order is what they are.
          key={index}
          station={station}
          x={geometry.x(station.positionMm)}
          y={scale.y(station.diameterMm)}
          size={stations.length > MANY_STATIONS && index !== chosen ? 5 : 11}
          name={`Station ${index + 1}, ${printLength(fromFootMm(document, station.positionMm), unit)} from foot, ${printLength(station.diameterMm, unit, 2)} wide`}
          isChosen={index === chosen}
          readOnly={readOnly !== null}
          onChoose={() => onChoose(index)}
          onStep={(by) => onChoose(Math.max(0, Math.min(stations.length - 1, index + by)))}
          onHold={(isHeld) => setHeld(isHeld ? fitted : null)}
          toStation={(x, y) => ({ positionMm: geometry.mm(x), diameterMm: scale.diameterMm(y) })}
          onMove={(to, gesture) =>
            onEdit({
              label: `Move station ${index + 1}`,
              change: (before) => moveStation(before, 'bore', index, to),
              mergeKey: `bore.stations.${index}.${gesture}`,
            })
          }
        />
      ))}
      {chosenStation !== undefined && (
        <KnotReading
          x={geometry.x(chosenStation.positionMm)}
          y={scale.y(chosenStation.diameterMm)}
          figure={printLength(chosenStation.diameterMm, unit, unit === 'mm' ? 2 : 3)}
        />
      )}
      <WiderCurves {...props} isBeside={isBeside} />
    </svg>
  );
}
