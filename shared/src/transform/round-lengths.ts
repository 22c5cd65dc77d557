import type { DesignDocument, MouthEnd, Station, ToneHole, Undercut } from '../document/design-document.ts';
import { WIDEST_HOLE_SHARE } from '../document/hole-faults.ts';
import { chimneyMm, diameterAt } from '../document/profile.ts';

/**
 * The design with every length at so many decimals of a millimetre.
 *
 * What rests on something else is kept within it: a hole no wider than its bore allows, an undercut no deeper than its wall.
 */
export function roundLengths(document: DesignDocument, decimals: number): DesignDocument {
  const round = rounder(decimals);
  const { air } = document;
  const rounded = {
    ...document,
    air: { ...air, warmLengthMm: air.warmLengthMm === null ? null : round(air.warmLengthMm) },
    mouthEnd: roundMouthEnd(document.mouthEnd, round),
    bore: { stations: roundStations(document.bore.stations, round) },
    outside: { stations: roundStations(document.outside.stations, round) },
  };
  return { ...rounded, holes: document.holes.map((hole) => roundHole(rounded, hole, decimals)) };
}

type Round = (length: number) => number;

const rounder = (decimals: number): Round => {
  const steps = 10 ** decimals;
  return (length) => Math.round(length * steps) / steps;
};

const roundedDown = (length: number, decimals: number) => {
  const steps = 10 ** decimals;
  return Math.floor(length * steps + 1e-6) / steps;
};

const roundStations = (stations: readonly Station[], round: Round): Station[] =>
  stations.map(({ positionMm, diameterMm }) => ({
    positionMm: round(positionMm),
    diameterMm: round(diameterMm),
  }));

const roundUndercut = (undercut: Undercut | null, round: Round): Undercut | null =>
  undercut === null
    ? null
    : { innerDiameterMm: round(undercut.innerDiameterMm), depthMm: round(undercut.depthMm) };

function roundMouthEnd(mouthEnd: MouthEnd, round: Round): MouthEnd {
  switch (mouthEnd.kind) {
    case 'window':
      return {
        ...mouthEnd,
        widthMm: round(mouthEnd.widthMm),
        lengthMm: round(mouthEnd.lengthMm),
        wallMm: round(mouthEnd.wallMm),
      };
    case 'embouchure':
      return {
        ...mouthEnd,
        lengthMm: round(mouthEnd.lengthMm),
        widthMm: round(mouthEnd.widthMm),
        chimneyMm: round(mouthEnd.chimneyMm),
        undercut: roundUndercut(mouthEnd.undercut, round),
        stopperMm: round(mouthEnd.stopperMm),
      };
    case 'reed':
      return { ...mouthEnd, equivalentVolumeMm3: round(mouthEnd.equivalentVolumeMm3) };
    case 'rim':
    case 'ideal-open':
    case 'ideal-closed':
      return mouthEnd;
  }
}

function roundHole(
  body: Pick<DesignDocument, 'bore' | 'outside'>,
  hole: ToneHole,
  decimals: number,
): ToneHole {
  const round = rounder(decimals);
  const positionMm = round(hole.positionMm);
  const widestMm = roundedDown(diameterAt(body.bore.stations, positionMm) * WIDEST_HOLE_SHARE, decimals);
  const rounded: ToneHole = {
    ...hole,
    positionMm,
    diameterMm: Math.min(round(hole.diameterMm), widestMm),
    chimneyMm: hole.chimneyMm === null ? null : round(hole.chimneyMm),
    ...(typeof hole.padHeightMm === 'number' ? { padHeightMm: round(hole.padHeightMm) } : {}),
  };
  if (hole.undercut === null) return rounded;
  const deepestMm = roundedDown(chimneyMm(body, rounded), decimals);
  return {
    ...rounded,
    undercut: {
      innerDiameterMm: Math.max(
        rounded.diameterMm,
        Math.min(round(hole.undercut.innerDiameterMm), roundedDown(widestMm, Math.min(decimals, 1))),
      ),
      depthMm: Math.min(round(hole.undercut.depthMm), deepestMm),
    },
  };
}
