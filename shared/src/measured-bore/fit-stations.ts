import { mean, median } from 'd3';
import { DOCUMENT_LIMITS, type DesignDocument, type Station } from '../document/design-document.ts';
import { boreEnds, diameterAt } from '../document/profile.ts';
import { aloneByMm, usualLimitMm } from './lone-readings.ts';
import type { BoreReading } from './read-measured-bore.ts';
import { thinStations } from './thin-stations.ts';

/** Which diameter counts where several were measured at one place. */
export const COMBINATIONS = ['mean', 'widest', 'narrowest'] as const;
export type Combination = (typeof COMBINATIONS)[number];

/** What the bore is beyond the first or last reading: as wide as that reading, or as drawn. */
export const BEYOND = ['held', 'drawn'] as const;
export type Beyond = (typeof BEYOND)[number];

export interface FitChoices {
  /** A reading that stands alone by more is left out, mm; null for the usual limit. */
  limitMm: number | null;
  /** Most that a place may lie from the line, mm. */
  withinMm: number;
  combination: Combination;
  beyond: Beyond | null;
  /** Keys of readings that are used although they stand alone. */
  restored: readonly string[];
}

export interface LoneReading extends BoreReading {
  /** Signed distance from its neighbours, mm. */
  aloneByMm: number;
}

/** A stretch of the drawn bore in which nothing was measured. */
export interface Gap {
  end: 'mouth' | 'foot';
  lengthMm: number;
}

export interface FittedBore {
  limitMm: number;
  usualLimitMm: number;
  /** Beyond the limit, save those restored. */
  leftOut: LoneReading[];
  /** Beyond the limit, but used all the same. */
  restored: LoneReading[];
  /** Beyond the ends of the drawn bore. */
  outside: BoreReading[];
  /** One diameter for each place that was measured. */
  places: Station[];
  /** What the bore becomes; empty when there is nothing to make it of. */
  stations: Station[];
  /** Widest less narrowest at one place, mm; null where each was measured once. */
  outOfRound: { usualMm: number; mostMm: number } | null;
  gaps: Gap[];
  beyond: Beyond;
  /** Why the stations cannot be used, or null. */
  refusal: string | null;
}

/** Leaves out what stands alone, makes one diameter of each place, and thins the places to the fewest stations. */
export function fitStations(
  readings: readonly BoreReading[],
  drawn: Pick<DesignDocument, 'bore'>,
  choices: FitChoices,
): FittedBore {
  const series = seriesOf(readings);
  const usual = usualLimitMm(series);
  const limitMm = choices.limitMm ?? usual;
  const lone = series.flatMap((each) => loneIn(each, limitMm)).sort((a, b) => a.positionMm - b.positionMm);
  const leftOut = lone.filter(({ key }) => !choices.restored.includes(key));
  const without = new Set(leftOut.map(({ key }) => key));
  const kept = readings.filter(({ key }) => !without.has(key));
  const { mouthMm, footMm } = boreEnds(drawn);
  const isInside = ({ positionMm }: Station) =>
    positionMm >= mouthMm - TOUCH_MM && positionMm <= footMm + TOUCH_MM;
  const groups = placesIn(kept);
  const places = groups.map((group) => combined(group, choices.combination));
  const reached = withinEnds(places, mouthMm, footMm);
  const gaps = gapsOf(reached, mouthMm, footMm);
  const beyond = choices.beyond ?? usualBeyond(gaps, reached);
  const stations =
    reached.length < 2 ? [] : stationsOf(reached, { drawn, beyond, withinMm: choices.withinMm });
  return {
    limitMm,
    usualLimitMm: usual,
    leftOut,
    restored: lone.filter(({ key }) => choices.restored.includes(key)),
    outside: readings.filter((reading) => !isInside(reading)),
    places,
    stations,
    outOfRound: outOfRound(groups),
    gaps,
    beyond,
    refusal: refusalOf(stations, mouthMm, footMm),
  };
}

/** Positions nearer than this are one place, mm. */
const TOUCH_MM = 0.005;

function seriesOf(readings: readonly BoreReading[]): BoreReading[][] {
  const columns = [...new Set(readings.map(({ column }) => column))];
  return columns.map((column) => readings.filter((reading) => reading.column === column));
}

function loneIn(series: readonly BoreReading[], limitMm: number): LoneReading[] {
  return aloneByMm(series).flatMap((by, index) => {
    const reading = series[index];
    return reading !== undefined && Math.abs(by) > limitMm + 1e-9 ? [{ ...reading, aloneByMm: by }] : [];
  });
}

function placesIn(readings: readonly BoreReading[]): BoreReading[][] {
  const groups: BoreReading[][] = [];
  for (const reading of readings) {
    const group = groups.at(-1);
    if (group !== undefined && reading.positionMm - (group[0]?.positionMm ?? 0) < TOUCH_MM)
      group.push(reading);
    else groups.push([reading]);
  }
  return groups;
}

function combined(group: readonly BoreReading[], combination: Combination): Station {
  const diameters = group.map(({ diameterMm }) => diameterMm);
  const diameterMm = {
    mean: mean(diameters) ?? 0,
    widest: Math.max(...diameters),
    narrowest: Math.min(...diameters),
  }[combination];
  return { positionMm: tidy(group[0]?.positionMm ?? 0), diameterMm: tidy(diameterMm) };
}

/** A micrometre is finer than any gauge. */
const tidy = (mm: number) => Math.round(mm * 1000) / 1000;

/** The places inside the drawn bore; where readings go on past an end, the end itself lies on the line between two. */
function withinEnds(places: readonly Station[], mouthMm: number, footMm: number): Station[] {
  const inside = places
    .filter(({ positionMm }) => positionMm > mouthMm - TOUCH_MM && positionMm < footMm + TOUCH_MM)
    .map((place) => ({ ...place, positionMm: Math.min(footMm, Math.max(mouthMm, place.positionMm)) }));
  if (inside.length === 0) return [];
  const isCrossed = (endMm: number) =>
    places.some(({ positionMm }) => positionMm < endMm - TOUCH_MM) &&
    places.some(({ positionMm }) => positionMm > endMm + TOUCH_MM) &&
    !inside.some(({ positionMm }) => positionMm === endMm);
  const ends = [mouthMm, footMm]
    .filter(isCrossed)
    .map((positionMm) => ({ positionMm, diameterMm: tidy(diameterAt(places, positionMm)) }));
  return [...ends, ...inside].sort((a, b) => a.positionMm - b.positionMm);
}

function gapsOf(places: readonly Station[], mouthMm: number, footMm: number): Gap[] {
  const [first, last] = [places[0], places.at(-1)];
  if (first === undefined || last === undefined) return [];
  const gaps: Gap[] = [
    { end: 'mouth', lengthMm: first.positionMm - mouthMm },
    { end: 'foot', lengthMm: footMm - last.positionMm },
  ];
  return gaps.filter(({ lengthMm }) => lengthMm > TOUCH_MM);
}

/** Beyond so much unmeasured bore the drawing says more than the nearest reading, mm. */
const FAR_MM = 10;

function usualBeyond(gaps: readonly Gap[], places: readonly Station[]): Beyond {
  const steps = places.slice(1).map(({ positionMm }, index) => positionMm - (places[index]?.positionMm ?? 0));
  const far = Math.max(FAR_MM, 2 * (median(steps) ?? 0));
  return gaps.some(({ lengthMm }) => lengthMm > far) ? 'drawn' : 'held';
}

interface EndRules {
  drawn: Pick<DesignDocument, 'bore'>;
  beyond: Beyond;
  withinMm: number;
}

/** Stations from end to end of the drawn bore: its length is not what was measured here. */
function stationsOf(places: readonly Station[], { drawn, beyond, withinMm }: EndRules): Station[] {
  const [first, last] = [places[0], places.at(-1)];
  if (first === undefined || last === undefined) return [];
  const { mouthMm, footMm } = boreEnds(drawn);
  const isShort = { mouth: first.positionMm > mouthMm, foot: last.positionMm < footMm };
  if (beyond === 'held') {
    // Thinned together with the places: an end that is held costs no station of its own.
    const before = isShort.mouth ? [{ ...first, positionMm: mouthMm }] : [];
    const after = isShort.foot ? [{ ...last, positionMm: footMm }] : [];
    return thinStations([...before, ...places, ...after], withinMm);
  }
  return [
    ...(isShort.mouth ? drawnUpTo(drawn.bore.stations, first) : []),
    ...thinStations(places, withinMm),
    ...(isShort.foot ? drawnFrom(drawn.bore.stations, last) : []),
  ];
}

/** The drawn bore up to a place, and a step there where the two differ. */
function drawnUpTo(stations: readonly Station[], place: Station): Station[] {
  const before = stations.filter(({ positionMm }) => positionMm < place.positionMm);
  // Where a step is drawn right there, its side toward the mouth.
  const end = stations.find(({ positionMm }) => positionMm === place.positionMm) ?? {
    positionMm: place.positionMm,
    diameterMm: tidy(diameterAt(stations, place.positionMm)),
  };
  return end.diameterMm === place.diameterMm ? before : [...before, end];
}

function drawnFrom(stations: readonly Station[], place: Station): Station[] {
  const after = stations.filter(({ positionMm }) => positionMm > place.positionMm);
  const start = { positionMm: place.positionMm, diameterMm: tidy(diameterAt(stations, place.positionMm)) };
  return start.diameterMm === place.diameterMm ? after : [start, ...after];
}

function outOfRound(groups: readonly (readonly BoreReading[])[]): FittedBore['outOfRound'] {
  const spreads = groups
    .filter((group) => group.length > 1)
    .map((group) => group.map(({ diameterMm }) => diameterMm))
    .map((diameters) => Math.max(...diameters) - Math.min(...diameters));
  if (spreads.length === 0) return null;
  return { usualMm: median(spreads) ?? 0, mostMm: Math.max(...spreads) };
}

function refusalOf(stations: readonly Station[], mouthMm: number, footMm: number): string | null {
  if (stations.length === 0)
    return `Fewer than two readings lie in the drawn bore, which runs ${(footMm - mouthMm).toFixed(1)} mm to the foot. See from which end the distances run, and where they begin.`;
  const most = DOCUMENT_LIMITS.stations;
  if (stations.length <= most) return null;
  return `${stations.length} stations would be needed; a bore has ${most} at most. Thin to within more.`;
}
