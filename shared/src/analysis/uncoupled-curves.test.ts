import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { impedanceCurve } from './impedance-curve.ts';
import { predictDesign } from './predict-design.ts';
import { standingWave } from './standing-wave.ts';

const document = { ...whistleDocument(), mouthEnd: { kind: 'ideal-open', correctionScale: 1 } as const };
document.bore = { stations: document.bore.stations.map((s, i) => (i === 0 ? { ...s, positionMm: 0 } : s)) };
document.air = { ...document.air, losses: false };
const open = { ...document.fingerings[0]!, id: 'open', covered: [], half: [], register: 1 };
document.fingerings = [open];

/** Where the reactance goes through zero upwards nearest to a frequency, by a straight line between two points. */
function zeroNear(frequencyHz: number, coupling: boolean): number {
  const range = { fromHz: frequencyHz - 2, toHz: frequencyHz + 2, stepHz: 0.02 };
  const { points } = impedanceCurve(document, 'open', range, coupling);
  const at = points.findIndex(({ im }, i) => im < 0 && (points[i + 1]?.im ?? -1) >= 0);
  const [a, b] = [points[at], points[at + 1]];
  if (a === undefined || b === undefined) return NaN;
  return a.frequencyHz - (a.im * (b.frequencyHz - a.frequencyHz)) / (b.im - a.im);
}

describe('openings that do not hear each other', () => {
  const played = (coupling: boolean) => predictDesign(document, { coupling }).fingerings[0]!.frequencyHz!;

  it.each([true, false])('resonate in the impedance where the ladder says, coupling %s', (coupling) => {
    const frequencyHz = played(coupling);
    expect(zeroNear(frequencyHz, coupling)).toBeCloseTo(frequencyHz, 2);
  });

  it('sound and swing otherwise than coupled ones', () => {
    expect(Math.abs(played(true) - played(false))).toBeGreaterThan(0.5);
    const wave = (coupling: boolean) =>
      standingWave(document, 'open', { frequencyHz: played(true), points: 60, coupling });
    const apart = wave(true).map(({ pressure }, i) => Math.abs(pressure - (wave(false)[i]?.pressure ?? 0)));
    expect(Math.max(...apart)).toBeGreaterThan(1e-3);
  });
});
