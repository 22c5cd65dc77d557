import { describe, expect, it } from 'vitest';
import { impedanceAt } from '../../../tests/support/slow-resonances.ts';
import type { DesignDocument } from '../document/design-document.ts';
import { predictDesign } from './predict-design.ts';
import { prepareDesign } from './prepare-design.ts';
import { standingWave } from './standing-wave.ts';

const LENGTH_MM = 600;

type Settings = Partial<Pick<DesignDocument, 'air' | 'foot'>> & {
  mouth?: 'ideal-open' | 'ideal-closed';
  diameterMm?: number;
};

const stillAir: DesignDocument['air'] = {
  temperatureC: 20,
  relativeHumidity: 0.5,
  co2Fraction: 0.0004,
  pressurePa: 101_325,
  mouthTemperatureC: null,
  warmLengthMm: null,
  losses: false,
  fixed: { speedOfSound: 343, density: 1.2 },
};

/** A thin-walled tube without holes. */
function tube({ mouth = 'ideal-open', diameterMm = 1, air = stillAir, foot }: Settings = {}): DesignDocument {
  const stations = (width: number) => ({
    stations: [
      { positionMm: 0, diameterMm: width },
      { positionMm: LENGTH_MM, diameterMm: width },
    ],
  });
  return {
    format: 'borewright-design/1',
    name: 'Tube',
    pitch: { a4Hz: 440, temperament: 'equal', tonic: 'D', centsOffsets: null },
    air,
    mouthEnd: { kind: mouth, correctionScale: 1 },
    bore: stations(diameterMm),
    outside: stations(diameterMm * 1.0001),
    foot: foot ?? { kind: 'open' },
    holes: [],
    fingerings: [{ id: 'all', note: 'D4', register: 1, covered: [], half: [], weight: 1, centsOffset: 0 }],
  };
}

function ladder(settings: Settings = {}): number[] {
  const rungs = predictDesign(tube(settings)).fingerings[0]?.ladder ?? [];
  expect(rungs).toHaveLength(6);
  return rungs.map(({ frequencyHz }) => frequencyHz);
}

const first = (settings: Settings) => ladder(settings)[0] ?? NaN;
const centsApart = (a: number, b: number) => 1200 * Math.log2(a / b);

describe('an ideal column', () => {
  // c/2L′ and c/4L′ with L′ = L + 0.6133 radii at the one real end; any textbook, H. Levine and J. Schwinger (1948).
  it.each([
    ['ideal-open', (mode: number) => mode / 2],
    ['ideal-closed', (mode: number) => (2 * mode - 1) / 4],
  ] as const)('sounds the textbook series from an %s mouth', (mouth, waves) => {
    const acousticLength = (LENGTH_MM + 0.6133 * 0.5) / 1000;
    ladder({ mouth }).forEach((frequency, i) => {
      const expected = (waves(i + 1) * 343) / acousticLength;
      expect(Math.abs(centsApart(frequency, expected))).toBeLessThan(0.02);
    });
  });

  it('sounds an octave lower when the mouth is closed', () => {
    const apart = centsApart(first({ mouth: 'ideal-open' }), first({ mouth: 'ideal-closed' }));
    expect(apart).toBeCloseTo(1200, 1);
  });

  it('sounds odd multiples when stopped, an octave below the open foot but for its end correction', () => {
    const stopped = ladder({ diameterMm: 15, foot: { kind: 'stopped' } });
    stopped.forEach((frequency, i) => {
      expect(frequency / (stopped[0] ?? NaN)).toBeCloseTo(2 * i + 1, 6);
    });
    const correction = 1200 * Math.log2(1 + (0.6133 * 7.5) / LENGTH_MM);
    const apart = centsApart(first({ diameterMm: 15 }), stopped[0] ?? NaN);
    expect(Math.abs(apart - (1200 - correction))).toBeLessThan(0.2);
  });
});

describe('the impedance of a lossless tube whose length is a whole number of quarter waves', () => {
  const impedance = (frequencies: number[], foot: DesignDocument['foot'] = { kind: 'open' }) => {
    const air = { ...stillAir, fixed: { speedOfSound: 345, density: 1.2 } };
    const document = tube({ mouth: 'ideal-closed', diameterMm: 15, air, foot });
    const { prepared, fingerings } = prepareDesign(document);
    return frequencies.map((frequency) => impedanceAt(prepared, fingerings[0]!, frequency));
  };

  it('is a number there, and what it is close by', () => {
    // 345 m/s over four times 0.6 m.
    const quarter = 345 / 2.4;
    for (const count of [1, 2, 3, 4, 5, 6, 7, 8]) {
      const at = count * quarter;
      const [low, there, high] = impedance([at * (1 - 1e-6), at, at * (1 + 1e-6)]);
      const [re, im] = [(low!.re + high!.re) / 2, (low!.im + high!.im) / 2];
      expect(Math.hypot(there!.re - re, there!.im - im) / Math.hypot(re, im)).toBeLessThan(1e-4);
    }
  });

  it('is a number where a stopped foot makes it endless or nothing', () => {
    for (const count of [1, 2, 3, 4]) {
      const [there] = impedance([(count * 345) / 2.4], { kind: 'stopped' });
      expect(Number.isFinite(there!.re) && Number.isFinite(there!.im)).toBe(true);
    }
  });
});

describe('a column warm at the mouth', () => {
  const warm = (mouthTemperatureC: number | null): DesignDocument['air'] => ({
    ...stillAir,
    losses: true,
    fixed: null,
    mouthTemperatureC,
    warmLengthMm: mouthTemperatureC === null ? null : 250,
  });
  const pitch = (air: DesignDocument['air']) => first({ diameterMm: 15, air });

  it('is the plain one when the mouth is no warmer than the room', () => {
    expect(Math.abs(centsApart(pitch(warm(20)), pitch(warm(null))))).toBeLessThan(1e-6);
  });

  it('rises with the warmth, and stays between a cool and a warm column', () => {
    const rising = [20, 24, 28, 32].map((temperatureC) => pitch(warm(temperatureC)));
    rising.slice(1).forEach((frequency, i) => {
      expect(frequency).toBeGreaterThan(rising[i] ?? NaN);
    });
    const throughout = pitch({ ...warm(null), temperatureC: 32 });
    expect(rising.at(-1)).toBeLessThan(throughout);
  });
});

describe('standingWave', () => {
  function wave(mouth: 'ideal-open' | 'ideal-closed', mode: number): number[] {
    const document = tube({ mouth });
    const frequency = ladder({ mouth })[mode - 1] ?? NaN;
    const points = standingWave(document, 'all', { frequencyHz: frequency, points: 241 });
    expect(points[0]?.positionMm).toBeCloseTo(0, 6);
    expect(points.at(-1)?.positionMm).toBeCloseTo(LENGTH_MM, 6);
    return points.map(({ pressure }) => pressure);
  }

  /** Dips of the pressure, those at the ends too. */
  const dips = (pressures: number[]) =>
    pressures.filter(
      (pressure, i) =>
        pressure < (pressures[i - 1] ?? Infinity) && pressure <= (pressures[i + 1] ?? Infinity),
    );

  it.each([1, 2, 3])('has nothing at both open ends and %i − 1 nodes between in that mode', (mode) => {
    const pressures = wave('ideal-open', mode);
    expect(pressures[0]).toBeLessThan(0.01);
    expect(pressures.at(-1)).toBeLessThan(0.01);
    expect(dips(pressures)).toHaveLength(mode + 1);
  });

  it.each([1, 2, 3])(
    'is largest at a closed mouth and has %i nodes with the open foot in that mode',
    (mode) => {
      const pressures = wave('ideal-closed', mode);
      expect(pressures[0]).toBeCloseTo(1, 4);
      expect(pressures.at(-1)).toBeLessThan(0.01);
      expect(dips(pressures)).toHaveLength(mode);
    },
  );
});
