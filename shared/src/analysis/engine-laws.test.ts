import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { randomDesigns, scaledDesign } from '../../../tests/support/random-design.ts';
import { impedanceAt } from '../../../tests/support/slow-resonances.ts';
import { chainImpedance } from '../acoustics/response/chain.ts';
import { coupledImpedance } from '../acoustics/response/input-impedance.ts';
import { prepareColumn, tuneColumn, type PreparedColumn } from '../acoustics/response/prepared-column.ts';
import { findResonances, type Resonance } from '../acoustics/response/resonances.ts';
import type { DesignDocument, ToneHole } from '../document/design-document.ts';
import { diameterAt } from '../document/profile.ts';
import { designDimensions } from './design-dimensions.ts';
import { predictDesign } from './predict-design.ts';
import { prepareDesign } from './prepare-design.ts';
import type { LadderRung } from './prediction.ts';
import { toColumn } from './to-column.ts';

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });
/** Fixed, so that a failure comes back; no shrinking, which takes minutes here. */
const runs = (numRuns: number) => ({ numRuns, seed: 1877, endOnFailure: true });

const ladder = (document: DesignDocument): LadderRung[] => predictDesign(document).fingerings[0]!.ladder;
const cents = (a: number, b: number) => 1200 * Math.log2(a / b);

/** Rungs below the first weak one; above it a pair may vanish, and later ones move up. */
function clearRungs(rungs: LadderRung[]): LadderRung[] {
  const weak = rungs.findIndex((rung) => rung.weak);
  return weak < 0 ? rungs : rungs.slice(0, weak);
}

type Complex = [re: number, im: number];
const at = (cells: Float64Array, address: number): Complex => [cells[address]!, cells[address + 1]!];
const times = ([ar, ai]: Complex, [br, bi]: Complex): Complex => [ar * br - ai * bi, ar * bi + ai * br];

function determinant(cells: Float64Array, address: number): Complex {
  const [a, b, c, d] = [0, 2, 4, 6].map((entry) => at(cells, address + entry)) as [
    Complex,
    Complex,
    Complex,
    Complex,
  ];
  const [ad, bc] = [times(a, d), times(b, c)];
  return [ad[0] - bc[0], ad[1] - bc[1]];
}

function twoPorts({ mouth, segments, branches }: PreparedColumn): number[] {
  return [
    mouth.twoPort,
    ...segments.flatMap(({ twoPort, links }) => [twoPort, ...links.map((link) => link.twoPort)]),
    ...branches.flatMap((branch) => [
      branch.inside,
      ...(branch.shift === 0 ? [] : [branch.before, branch.after]),
    ]),
  ];
}

function uncouple({ cells, coupling }: PreparedColumn): void {
  cells.fill(0, coupling.outer, coupling.outer + 2 * coupling.openings ** 2);
  cells.fill(0, coupling.inner, coupling.inner + coupling.openings ** 2);
}

/** How far two designs' input impedances differ, as a share. */
function difference(one: DesignDocument, other: DesignDocument, frequency: number): number {
  const [a, b] = [one, other].map((document) => {
    const { prepared, fingerings } = prepareDesign(document);
    return impedanceAt(prepared, fingerings[0]!, frequency);
  });
  return Math.hypot(a!.re - b!.re, a!.im - b!.im) / Math.hypot(a!.re, a!.im);
}

/** The design with a station more, on the line between its neighbours. */
function split(document: DesignDocument, share: number): DesignDocument {
  const { stations } = document.bore;
  const [first, last] = [stations[0]!, stations.at(-1)!];
  const positionMm = first.positionMm + share * (last.positionMm - first.positionMm);
  const more = { positionMm, diameterMm: diameterAt(stations, positionMm) };
  const index = stations.findIndex((station) => station.positionMm > positionMm);
  return { ...document, bore: { stations: stations.toSpliced(index, 0, more) } };
}

/** First resonances of the column, below what a prediction answers for. */
function bareLadder(document: DesignDocument): Resonance[] {
  const { column, states } = toColumn(document);
  const { prepared, fingerings } = prepareColumn(column, states);
  const search = { count: 3, coupling: true, maxima: prepared.playsMaxima };
  const found = findResonances(prepared, fingerings, search)[0]!;
  const weak = found.findIndex((resonance) => resonance.weak);
  return weak < 0 ? found : found.slice(0, weak);
}

/** The design with one more hole, of a thousandth of a millimetre. */
function withPinprick(document: DesignDocument, share: number, covered: boolean): DesignDocument {
  const positionMm = share * document.bore.stations.at(-1)!.positionMm;
  const pinprick: ToneHole = {
    id: 'pinprick',
    name: '',
    positionMm,
    diameterMm: 1e-3,
    angleDeg: 90,
    chimneyMm: 4,
    undercut: null,
    cover: 'lid',
    hand: 'left',
  };
  const fingering = document.fingerings[0]!;
  return {
    ...document,
    holes: [...document.holes, pinprick],
    fingerings: [{ ...fingering, covered: covered ? [...fingering.covered, 'pinprick'] : fingering.covered }],
  };
}

describe('laws of the engine over random designs', () => {
  it('gives every two-port the determinant 1', () => {
    fc.assert(
      fc.property(randomDesigns(), real(30, 6000), (document, frequency) => {
        const { prepared } = prepareDesign(document);
        tuneColumn(prepared, frequency, true);
        for (const address of twoPorts(prepared)) {
          const [re, im] = determinant(prepared.cells, address);
          expect(Math.hypot(re - 1, im)).toBeLessThan(1e-10);
        }
      }),
      runs(100),
    );
  });

  it('is reciprocal: openings hear each other alike, and a bore turned round has its two-port turned round', () => {
    fc.assert(
      fc.property(randomDesigns({ mouth: ['ideal-open'] }), real(30, 6000), (document, frequency) => {
        const { prepared } = prepareDesign(document);
        tuneColumn(prepared, frequency, true);
        const { cells, coupling } = prepared;
        for (let i = 0; i < coupling.openings; i += 1) {
          for (let j = 0; j < i; j += 1) {
            const [one, other] = [i * coupling.openings + j, j * coupling.openings + i];
            expect(at(cells, coupling.outer + 2 * one)).toEqual(at(cells, coupling.outer + 2 * other));
            expect(cells[coupling.inner + one]).toBe(cells[coupling.inner + other]);
          }
        }
        const turned = {
          ...document,
          holes: [],
          fingerings: [{ ...document.fingerings[0]!, covered: [], half: [] }],
        };
        const length = document.bore.stations.at(-1)!.positionMm;
        const round = (profile: DesignDocument['bore']) => ({
          stations: profile.stations
            .map((station) => ({ ...station, positionMm: length - station.positionMm }))
            .reverse(),
        });
        const ports = [
          turned,
          { ...turned, bore: round(document.bore), outside: round(document.outside) },
        ].map((bare) => {
          const { prepared: column } = prepareDesign(bare);
          tuneColumn(column, frequency, true);
          return [0, 2, 4, 6].map((entry) => at(column.cells, column.segments[0]!.twoPort + entry));
        });
        const [[a, b, c, d], [ra, rb, rc, rd]] = ports as [Complex[], Complex[]];
        const far = [a!, b!, c!, d!].map((entry, i) => {
          const mirror = [rd!, rb!, rc!, ra!][i]!;
          return Math.hypot(entry[0] - mirror[0], entry[1] - mirror[1]) / Math.hypot(...entry);
        });
        expect(Math.max(...far)).toBeLessThan(1e-8);
      }),
      runs(60),
    );
  });

  it('gives no power back: at no frequency is the real part of the input impedance below 0', () => {
    fc.assert(
      fc.property(randomDesigns(), real(1.05, 1.2), (document, ratio) => {
        const { prepared, fingerings } = prepareDesign(document);
        for (let frequency = 30; frequency < 8000; frequency *= ratio) {
          const { re, im } = impedanceAt(prepared, fingerings[0]!, frequency);
          expect(re / Math.hypot(re, im)).toBeGreaterThan(-1e-9);
        }
      }),
      runs(100),
    );
  });

  it('is the plain chain when no opening hears another', () => {
    fc.assert(
      fc.property(randomDesigns(), real(50, 2500), (document, frequency) => {
        const { prepared, fingerings } = prepareDesign(document);
        tuneColumn(prepared, frequency, true);
        uncouple(prepared);
        const [re, im] = at(prepared.cells, coupledImpedance(prepared, fingerings[0]!));
        const [chainRe, chainIm] = at(prepared.cells, chainImpedance(prepared, fingerings[0]!));
        expect(Math.hypot(chainRe - re, chainIm - im) / Math.hypot(re, im)).toBeLessThan(1e-10);
      }),
      runs(100),
    );
  });

  it('sounds an octave higher at half the size, without losses, every clear rung of it', () => {
    const lossless = randomDesigns({ losses: false, moist: false, scalable: true });
    fc.assert(
      fc.property(lossless, (document) => {
        const [whole, half] = [ladder(document), ladder(scaledDesign(document, 0.5))];
        clearRungs(whole).forEach(({ frequencyHz }, i) => {
          expect(Math.abs(cents(half[i]!.frequencyHz, frequencyHz) - 1200)).toBeLessThan(1e-4);
        });
      }),
      runs(40),
    );
  });

  it('does not notice a split of the bore without losses', () => {
    fc.assert(
      fc.property(
        randomDesigns({ losses: false }),
        real(0.05, 0.95),
        real(50, 2500),
        (document, share, frequency) => {
          expect(difference(document, split(document, share), frequency)).toBeLessThan(1e-7);
        },
      ),
      runs(100),
    );
  });

  it('hardly notices a split of the bore with losses, where it slices cones', () => {
    fc.assert(
      fc.property(randomDesigns({ losses: true }), real(0.05, 0.95), (document, share) => {
        const [whole, parts] = [ladder(document), ladder(split(document, share))];
        clearRungs(whole).forEach(({ frequencyHz }, i) => {
          expect(Math.abs(cents(parts[i]!.frequencyHz, frequencyHz))).toBeLessThan(0.02);
        });
      }),
      runs(40),
    );
  });

  it('does not notice a hole of vanishing size, open or covered', () => {
    fc.assert(
      fc.property(
        randomDesigns({ mouth: ['ideal-open', 'ideal-closed', 'reed', 'rim'] }),
        real(0.2, 0.95),
        fc.boolean(),
        (document, share, covered) => {
          const plain = bareLadder(document);
          bareLadder(withPinprick(document, share, covered)).forEach(({ frequency }, i) => {
            expect(Math.abs(cents(frequency, plain[i]!.frequency))).toBeLessThan(0.01);
          });
        },
      ),
      runs(40),
    );
  });

  it('moves every clear rung smoothly with a small change of any dimension', () => {
    fc.assert(
      fc.property(randomDesigns(), (document) => {
        const before = clearRungs(ladder(document)).slice(0, 4);
        for (const { key, value, at: changedTo } of designDimensions(document)) {
          const after = ladder(changedTo(value + 1e-4 * Math.max(Math.abs(value), 1)));
          for (const [i, { frequencyHz }] of before.entries()) {
            expect(Math.abs(cents(after[i]!.frequencyHz, frequencyHz)), key).toBeLessThan(1);
          }
        }
      }),
      runs(15),
    );
  });
});
