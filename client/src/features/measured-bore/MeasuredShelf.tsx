import { useMemo } from 'react';
import type { Station } from '#shared/document/design-document.ts';
import { boreEnds } from '#shared/document/profile.ts';
import { DropLines } from '../../bench/DropLines.tsx';
import type { PanelProps } from '../../bench/panel-props.ts';
import { ShelfCaption } from '../../bench/ShelfCaption.tsx';
import '../../bench/shelf.css';
import { timesWider } from '../../bench/width-scale.ts';
import { WidthGrid } from '../../bench/WidthGrid.tsx';
import { MEASURED_SHELF, measuredScale } from './measured-scale.ts';
import { counted } from './measured-words.ts';
import { LeftOutMarks, ReadingDots } from './ReadingMarks.tsx';
import { ShelfKey } from './ShelfKey.tsx';
import type { MeasuredBoreDesk } from './use-measured-bore.ts';
import './measured-bore.css';

interface MeasuredShelfProps extends PanelProps {
  desk: Pick<MeasuredBoreDesk, 'measured' | 'fitted'>;
}

/** Captions stand beside the drawing where the bore leaves so much room at the left, px. */
const ROOM_FOR_CAPTIONS = 150;
/** More knots than this are drawn small. */
const MANY_STATIONS = 40;

/** The readings, the stations made of them and the bore as drawn, laid over each other many times wider than true. */
export function MeasuredShelf({ desk, ...bench }: MeasuredShelfProps) {
  const { document, geometry, unit } = bench;
  const { fitted, measured } = desk;
  const stations = fitted === null || fitted.stations.length === 0 ? null : fitted.stations;
  const scale = useMemo(() => measuredScale(document, fitted), [document, fitted]);
  const drawn = document.bore.stations;
  const { mouthMm, footMm } = boreEnds(document);
  const [left, right] = [geometry.x(mouthMm), geometry.x(footMm)];
  const isBeside = left >= ROOM_FOR_CAPTIONS;
  const times = `${timesWider(scale, geometry.pxPerMm)} times wider`;
  return (
    <svg
      width={geometry.widthPx}
      height={MEASURED_SHELF.height}
      role="img"
      aria-label={spoken(desk)}
      className="border-hair block border-b"
    >
      <DropLines {...bench} height={MEASURED_SHELF.height} />
      <WoodAbove line={stations ?? drawn} geometry={geometry} y={scale.y} />
      <WidthGrid scale={scale} unit={unit} from={left} to={right} isBeside={isBeside} />
      <ShelfCaption
        isBeside={isBeside}
        y={20}
        title="Measured"
        lines={[times, 'than it is long']}
        sentence={`${times} than it is long`}
      />
      <BoreLines drawn={drawn} stations={stations} geometry={geometry} y={scale.y} />
      {stations === null && (
        <text
          x={Math.max(24, left)}
          y={MEASURED_SHELF.narrowY}
          className="bench-label bore-haloed"
          aria-hidden="true"
        >
          Readings lie here, over the bore as drawn, once there is a table.
        </text>
      )}
      {measured?.status === 'read' && fitted !== null && (
        <>
          <ReadingDots geometry={geometry} scale={scale} measured={measured} fitted={fitted} />
          <StationKnots stations={stations} geometry={geometry} y={scale.y} />
          <LeftOutMarks geometry={geometry} scale={scale} unit={unit} fitted={fitted} />
        </>
      )}
      <ShelfKey desk={desk} geometry={geometry} unit={unit} drawn={drawn} from={isBeside ? left : 24} />
    </svg>
  );
}

const pathOf = (line: readonly Station[], geometry: PanelProps['geometry'], y: (mm: number) => number) =>
  line
    .map(({ positionMm, diameterMm }) => `${geometry.x(positionMm).toFixed(1)} ${y(diameterMm).toFixed(1)}`)
    .join('L');

interface BoreLinesProps extends Pick<PanelProps, 'geometry'> {
  drawn: readonly Station[];
  stations: readonly Station[] | null;
  y: (diameterMm: number) => number;
}

function BoreLines({ drawn, stations, geometry, y }: BoreLinesProps) {
  return (
    <>
      <path
        d={`M${pathOf(drawn, geometry, y)}`}
        className={stations === null ? 'bore-line' : 'measured-drawn'}
      />
      {stations !== null && <path d={`M${pathOf(stations, geometry, y)}`} className="bore-line" />}
    </>
  );
}

interface WoodAboveProps extends Pick<PanelProps, 'geometry'> {
  line: readonly Station[];
  y: (diameterMm: number) => number;
}

function WoodAbove({ line, geometry, y }: WoodAboveProps) {
  const [first, last] = [line[0], line.at(-1)];
  if (first === undefined || last === undefined) return null;
  const { woodY } = MEASURED_SHELF;
  return (
    <path
      d={`M${geometry.x(first.positionMm)} ${woodY}L${pathOf(line, geometry, y)}L${geometry.x(last.positionMm)} ${woodY}Z`}
      className="bore-wood"
    />
  );
}

interface StationKnotsProps extends Pick<PanelProps, 'geometry'> {
  stations: readonly Station[] | null;
  y: (diameterMm: number) => number;
}

function StationKnots({ stations, geometry, y }: StationKnotsProps) {
  if (stations === null) return null;
  const size = stations.length > MANY_STATIONS ? 6 : 11;
  return stations.map(({ positionMm, diameterMm }, index) => (
    <rect
      // Stations have no name of their own; their order is what they are.
      key={index}
      x={geometry.x(positionMm) - size / 2}
      y={y(diameterMm) - size / 2}
      width={size}
      height={size}
      rx={2}
      className="bore-knot"
    />
  ));
}

function spoken({ measured, fitted }: MeasuredShelfProps['desk']): string {
  if (measured?.status !== 'read' || fitted === null)
    return 'The bore as drawn. No readings lie over it yet.';
  const { readings } = measured;
  return `${counted(readings.length, 'reading')} over the bore as drawn, ${fitted.leftOut.length} left out, ${counted(fitted.stations.length, 'station')} kept.`;
}
