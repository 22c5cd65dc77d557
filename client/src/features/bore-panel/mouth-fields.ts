import type { MouthEnd, MouthEndKind } from '#shared/document/design-document.ts';

/** One figure of a mouth end, as it is asked for. */
export interface MouthField {
  key: string;
  label: string;
  hint?: string;
  measure: 'length' | 'share' | 'degrees' | 'volume';
  min: number;
  max: number;
}

const length = (key: string, label: string, hint?: string): MouthField => ({
  key,
  label,
  ...(hint === undefined ? {} : { hint }),
  measure: 'length',
  min: 0.1,
  max: 500,
});

export const MOUTH_FIELDS: Record<MouthEndKind, readonly MouthField[]> = {
  window: [
    length('widthMm', 'Width'),
    length('lengthMm', 'Lip to windway'),
    length('wallMm', 'Wall at the lip'),
    { key: 'rampDeg', label: 'Ramp', measure: 'degrees', min: 5, max: 60 },
  ],
  embouchure: [
    length('lengthMm', 'Along the tube'),
    length('widthMm', 'Across the tube'),
    length('chimneyMm', 'Chimney'),
    { key: 'lipCover', label: 'Lip covers', measure: 'share', min: 0, max: 0.9 },
    { key: 'lipAngleDeg', label: 'Lip angle', measure: 'degrees', min: 30, max: 180 },
    length('stopperMm', 'Stopper', 'from the hole’s middle'),
  ],
  rim: [{ key: 'cover', label: 'Lip covers', hint: 'of the open end', measure: 'share', min: 0, max: 0.95 }],
  reed: [
    {
      key: 'equivalentVolumeMm3',
      label: 'Reed volume',
      hint: 'on a cone, the missing tip',
      measure: 'volume',
      min: 0,
      max: 1e6,
    },
  ],
  'ideal-open': [],
  'ideal-closed': [],
};

export const MOUTH_NAMES: Record<MouthEndKind, string> = {
  window: 'Window',
  embouchure: 'Embouchure hole',
  rim: 'Rim',
  reed: 'Reed',
  'ideal-open': 'Ideal, open',
  'ideal-closed': 'Ideal, closed',
};

export function mouthFigure(mouthEnd: MouthEnd, key: string): number {
  const value: unknown = Object.entries(mouthEnd).find(([name]) => name === key)?.[1];
  if (typeof value !== 'number') throw new TypeError(`A ${mouthEnd.kind} has no figure ${key}.`);
  return value;
}

export function withMouthFigure(mouthEnd: MouthEnd, key: string, value: number): MouthEnd {
  // The key comes from the list of its own kind, so the shape stays that of the kind.
  return { ...mouthEnd, [key]: value };
}
