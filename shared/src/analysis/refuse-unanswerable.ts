import { EngineInputError } from '../acoustics/engine-input-error.ts';
import { holeShape } from '../acoustics/response/hole-shape.ts';
import type { DesignDocument } from '../document/design-document.ts';
import { holeTitle } from '../document/hole-labels.ts';
import type { DesignColumn } from './to-column.ts';

/** Names that formulas give what they refuse, and the document's keys for them. */
const HOLE_KEYS: Record<string, string> = {
  holeRadius: 'diameterMm',
  boreRadius: 'diameterMm',
  innerRadius: 'undercut.innerDiameterMm',
  undercut: 'undercut.innerDiameterMm',
  flare: 'undercut.innerDiameterMm',
  depth: 'undercut.depthMm',
  chimney: 'chimneyMm',
  outerRadius: 'chimneyMm',
  height: 'padHeightMm',
  fraction: 'diameterMm',
};

/** Below this a hole is a pinprick whose air sticks to its wall, mm. */
const NARROWEST_HOLE_MM = 0.1;

/** Throws `EngineInputError`, under the document's own field, for the first hole that no formula answers for. */
export function refuseUnanswerableHoles(document: DesignDocument, design: DesignColumn): void {
  design.column.holes.forEach((hole, index) => {
    const source = design.holes[index];
    const place = document.holes.findIndex((other) => other.id === source?.id);
    if (source !== undefined && source.diameterMm < NARROWEST_HOLE_MM) {
      throw new EngineInputError(
        `holes.${place}.diameterMm`,
        source.diameterMm,
        `A hole of ${source.diameterMm} mm is too narrow for the formulas. Make it ${NARROWEST_HOLE_MM} mm or more.`,
      );
    }
    for (const state of [{ kind: 'open' }, { kind: 'closed' }] as const) {
      const named = `${holeTitle(document, source?.id ?? '')}: `;
      answering(`holes.${place}`, HOLE_KEYS, () => holeShape(hole, state), named);
    }
  });
}

/** Runs a computation and gives what it refuses the document's name; `named` stands before its sentence. */
export function answering<T>(path: string, keys: Record<string, string>, compute: () => T, named = ''): T {
  try {
    return compute();
  } catch (error) {
    if (!(error instanceof EngineInputError)) throw error;
    const key = keys[error.field] ?? error.field;
    throw new EngineInputError(`${path}.${key}`, error.value, named + error.message);
  }
}

/** Names of what a mouth end or the air refuses, and the document's keys for them. */
export const MOUTH_KEYS: Record<string, string> = {
  width: 'widthMm',
  across: 'widthMm',
  length: 'lengthMm',
  along: 'lengthMm',
  wall: 'wallMm',
  ramp: 'rampDeg',
  chimney: 'chimneyMm',
  fraction: 'lipCover',
  angle: 'lipAngleDeg',
  undercut: 'undercut.innerDiameterMm',
  holeRadius: 'widthMm',
  boreRadius: 'widthMm',
};

export const AIR_KEYS: Record<string, string> = {
  temperature: 'temperatureC',
  pressure: 'pressurePa',
  relativeHumidity: 'relativeHumidity',
  carbonDioxideFraction: 'co2Fraction',
};
