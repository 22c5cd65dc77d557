import { airProperties } from '../acoustics/air/air-properties.ts';
import { ICE_POINT } from '../acoustics/air/humid-air.ts';
import type { Medium } from '../acoustics/bore/wall-losses.ts';
import type {
  Column,
  ColumnFoot,
  ColumnHole,
  ColumnMouth,
  HoleLid,
  HoleState,
} from '../acoustics/response/column.ts';
import type { DesignDocument, Fingering, MouthEnd, ToneHole, Undercut } from '../document/design-document.ts';
import { boreEnds, chimneyMm, diameterAt } from '../document/profile.ts';

const MM = 1e-3;
const DEGREE = Math.PI / 180;

/** A pad's disc is taken as this much wider than its hole; the document does not say. */
export const PAD_TO_HOLE_RATIO = 1.3;

/** A design as the physics reads it, and how to read its fingerings. */
export interface DesignColumn {
  column: Column;
  /** Holes of the document in the order of the column, mouth side first. */
  holes: ToneHole[];
  /** For each fingering the state of each hole, in that order. */
  states: HoleState[][];
}

/**
 * The design in SI units, holes in order along the bore.
 *
 * The air outside may be handed in where it is known already: its properties cost more than all the rest here.
 *
 * Throws `EngineInputError` where the air is out of range.
 */
export function toColumn(
  document: DesignDocument,
  outside: Medium = mediumAt(document, document.air.temperatureC),
): DesignColumn {
  const holes = [...document.holes].sort((a, b) => a.positionMm - b.positionMm);
  const { footMm } = boreEnds(document);
  const column: Column = {
    bore: document.bore.stations.map((station) => ({
      position: station.positionMm * MM,
      radius: (station.diameterMm * MM) / 2,
    })),
    input: document.mouthEnd.kind === 'window' ? -document.mouthEnd.lengthMm * MM : 0,
    mouth: columnMouth(document),
    foot: columnFoot(document, footMm),
    holes: holes.map((hole) => columnHole(document, hole)),
    outside,
    warmth: warmth(document),
  };
  return { column, holes, states: document.fingerings.map((fingering) => holeStates(holes, fingering)) };
}

function mediumAt(document: DesignDocument, temperatureC: number): Medium {
  const { relativeHumidity, co2Fraction, pressurePa, losses, fixed } = document.air;
  const air = airProperties({
    temperature: temperatureC + ICE_POINT,
    pressure: pressurePa,
    relativeHumidity,
    carbonDioxideFraction: co2Fraction,
  });
  return {
    ...air,
    speedOfSound: fixed?.speedOfSound ?? air.speedOfSound,
    density: fixed?.density ?? air.density,
    lossless: !losses,
  };
}

/** A column warm at the mouth cools exponentially towards the room. */
function warmth(document: DesignDocument): ((position: number) => Medium) | null {
  const { temperatureC, mouthTemperatureC, warmLengthMm, fixed } = document.air;
  if (mouthTemperatureC === null || warmLengthMm === null || fixed !== null) return null;
  return (position) => {
    const share = Math.exp(-Math.max(position, 0) / (warmLengthMm * MM));
    return mediumAt(document, temperatureC + share * (mouthTemperatureC - temperatureC));
  };
}

function columnFoot(document: DesignDocument, footMm: number): ColumnFoot {
  if (document.foot.kind === 'stopped') return { kind: 'stopped' };
  return {
    kind: document.foot.kind,
    outerRadius: (diameterAt(document.outside.stations, footMm) * MM) / 2,
  };
}

const LIDS: Record<ToneHole['cover'], HoleLid> = {
  finger: 'fingertip',
  thumb: 'fingertip',
  pad: 'flat',
  vent: 'curved',
  lid: 'curved',
};

function columnHole(document: DesignDocument, hole: ToneHole): ColumnHole {
  const radius = (hole.diameterMm * MM) / 2;
  const height = hole.cover === 'pad' ? (hole.padHeightMm ?? null) : null;
  return {
    position: hole.positionMm * MM,
    radius,
    boreRadius: (diameterAt(document.bore.stations, hole.positionMm) * MM) / 2,
    outerRadius: (diameterAt(document.outside.stations, hole.positionMm) * MM) / 2,
    chimney: chimneyMm(document, hole) * MM,
    angle: hole.angleDeg * DEGREE,
    flare: flare(hole.undercut),
    lid: LIDS[hole.cover],
    pad: height === null ? null : { radius: PAD_TO_HOLE_RATIO * radius, height: height * MM },
  };
}

function flare(undercut: Undercut | null): ColumnHole['flare'] {
  if (undercut === null) return null;
  return { innerRadius: (undercut.innerDiameterMm * MM) / 2, depth: undercut.depthMm * MM };
}

function columnMouth(document: DesignDocument): ColumnMouth {
  const end = document.mouthEnd;
  const inputMm = end.kind === 'window' ? -end.lengthMm : 0;
  const boreRadius = (diameterAt(document.bore.stations, inputMm) * MM) / 2;
  const outerRadius = (diameterAt(document.outside.stations, inputMm) * MM) / 2;
  const body = { boreRadius, outerRadius, scale: end.correctionScale };
  return mouthOfKind(end, body);
}

function mouthOfKind(
  end: MouthEnd,
  body: { boreRadius: number; outerRadius: number; scale: number },
): ColumnMouth {
  switch (end.kind) {
    case 'ideal-open':
    case 'ideal-closed':
      return { kind: end.kind };
    case 'rim':
      return { kind: 'rim', cover: end.cover, ...body };
    case 'reed':
      return { kind: 'reed', volume: end.equivalentVolumeMm3 * 1e-9, scale: end.correctionScale };
    case 'window':
      return {
        kind: 'window',
        width: end.widthMm * MM,
        length: end.lengthMm * MM,
        wall: end.wallMm * MM,
        ramp: end.rampDeg * DEGREE,
        ...body,
      };
    case 'embouchure':
      return {
        kind: 'embouchure',
        along: end.lengthMm * MM,
        across: end.widthMm * MM,
        chimney: end.chimneyMm * MM,
        flare: flare(end.undercut),
        lipCover: end.lipCover,
        lipAngle: end.lipAngleDeg * DEGREE,
        stopper: end.stopperMm * MM,
        ...body,
      };
  }
}

function holeStates(holes: readonly ToneHole[], fingering: Fingering): HoleState[] {
  return holes.map((hole) => {
    if (fingering.covered.includes(hole.id)) return { kind: 'closed' };
    const half = fingering.half.find((cover) => cover.hole === hole.id);
    if (half === undefined || half.fraction === 0) return { kind: 'open' };
    return { kind: 'half', fraction: half.fraction, from: half.from };
  });
}
