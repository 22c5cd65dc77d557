import { boreEnds } from '#shared/document/profile.ts';
import type { FittedBore } from '#shared/measured-bore/fit-stations.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { widthScale, type WidthScale } from '../../bench/width-scale.ts';

/** Heights on the shelf, px from its top. */
export const MEASURED_SHELF = {
  height: 262,
  woodY: 20,
  wideY: 44,
  narrowY: 186,
  mostPxPerMm: 420,
  /** Between these stand even the readings that are left out. */
  topY: 20,
  bottomY: 212,
  keyY: 242,
} as const;

/** Widths of what is drawn for good; readings that are left out may stand beyond and are held at the edge. */
export function measuredScale(
  document: Pick<PanelProps['document'], 'bore'>,
  fitted: Pick<FittedBore, 'stations' | 'places'> | null,
): WidthScale {
  const { mouthMm, footMm } = boreEnds(document);
  const inside = (fitted?.places ?? []).filter(
    ({ positionMm }) => positionMm >= mouthMm && positionMm <= footMm,
  );
  const lines = [...document.bore.stations, ...(fitted?.stations ?? []), ...inside];
  return widthScale(
    lines.map(({ diameterMm }) => diameterMm),
    MEASURED_SHELF,
  );
}

export const heldY = (y: number) => Math.min(MEASURED_SHELF.bottomY, Math.max(MEASURED_SHELF.topY, y));
