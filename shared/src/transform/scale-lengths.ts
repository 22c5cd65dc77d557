import type { DesignDocument, MouthEnd, Station, ToneHole, Undercut } from '../document/design-document.ts';

/**
 * The design with every length times a factor: bore, outside, mouth end, holes, and the stretch that the breath warms.
 *
 * Angles, shares, the mouth end's correction and the air itself stay. Without losses every resonance moves by exactly the
 * inverse of the factor. Two things do not follow and shift notes by a few cents: losses at the wall go with the square root
 * of the size, and a fingertip stays as round as it is.
 */
export function scaleLengths(document: DesignDocument, factor: number): DesignDocument {
  const { air } = document;
  return {
    ...document,
    air: { ...air, warmLengthMm: scaled(air.warmLengthMm, factor) },
    mouthEnd: scaleMouthEnd(document.mouthEnd, factor),
    bore: { stations: scaleStations(document.bore.stations, factor) },
    outside: { stations: scaleStations(document.outside.stations, factor) },
    holes: document.holes.map((hole) => scaleHole(hole, factor)),
  };
}

const scaled = <Length extends number | null>(length: Length, factor: number) =>
  (length === null ? null : length * factor) as Length;

const scaleStations = (stations: readonly Station[], factor: number): Station[] =>
  stations.map(({ positionMm, diameterMm }) => ({
    positionMm: positionMm * factor,
    diameterMm: diameterMm * factor,
  }));

const scaleUndercut = (undercut: Undercut | null, factor: number): Undercut | null =>
  undercut === null
    ? null
    : { innerDiameterMm: undercut.innerDiameterMm * factor, depthMm: undercut.depthMm * factor };

function scaleHole(hole: ToneHole, factor: number): ToneHole {
  return {
    ...hole,
    positionMm: hole.positionMm * factor,
    diameterMm: hole.diameterMm * factor,
    chimneyMm: scaled(hole.chimneyMm, factor),
    undercut: scaleUndercut(hole.undercut, factor),
    ...(hole.padHeightMm === undefined ? {} : { padHeightMm: scaled(hole.padHeightMm, factor) }),
  };
}

function scaleMouthEnd(mouthEnd: MouthEnd, factor: number): MouthEnd {
  switch (mouthEnd.kind) {
    case 'window':
      return {
        ...mouthEnd,
        widthMm: mouthEnd.widthMm * factor,
        lengthMm: mouthEnd.lengthMm * factor,
        wallMm: mouthEnd.wallMm * factor,
      };
    case 'embouchure':
      return {
        ...mouthEnd,
        lengthMm: mouthEnd.lengthMm * factor,
        widthMm: mouthEnd.widthMm * factor,
        chimneyMm: mouthEnd.chimneyMm * factor,
        undercut: scaleUndercut(mouthEnd.undercut, factor),
        stopperMm: mouthEnd.stopperMm * factor,
      };
    case 'reed':
      return { ...mouthEnd, equivalentVolumeMm3: mouthEnd.equivalentVolumeMm3 * factor ** 3 };
    case 'rim':
    case 'ideal-open':
    case 'ideal-closed':
      return mouthEnd;
  }
}
