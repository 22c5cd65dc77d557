import type { MouthEnd } from '#shared/document/design-document.ts';

/** Sizes that a mouth end of each kind starts with on a bore of this width; common practice for a first drawing. */
export function usualMouthEnd(kind: MouthEnd['kind'], boreMm: number): MouthEnd {
  const correctionScale = 1;
  const share = (part: number) => Math.round(boreMm * part * 10) / 10;
  switch (kind) {
    case 'window':
      return { kind, widthMm: share(0.7), lengthMm: share(0.35), wallMm: 1.2, rampDeg: 20, correctionScale };
    case 'embouchure':
      return {
        kind,
        lengthMm: 10,
        widthMm: 11.5,
        chimneyMm: 4.5,
        undercut: null,
        lipCover: 0.35,
        lipAngleDeg: 100,
        stopperMm: boreMm,
        correctionScale,
      };
    case 'rim':
      return { kind, cover: 0.4, correctionScale };
    case 'reed':
      return { kind, equivalentVolumeMm3: Math.round(boreMm ** 3 / 4), correctionScale };
    case 'ideal-open':
    case 'ideal-closed':
      return { kind, correctionScale };
  }
}
