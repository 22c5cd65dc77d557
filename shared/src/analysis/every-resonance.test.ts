import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { randomDesigns } from '../../../tests/support/random-design.ts';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { impedanceAt, slowResonances } from '../../../tests/support/slow-resonances.ts';
import { findResonances } from '../acoustics/response/resonances.ts';
import type { DesignDocument, ToneHole } from '../document/design-document.ts';
import { prepareDesign, type PreparedDesign } from './prepare-design.ts';

/** Of the slow search, Hz. */
const STEP = 2;
const HIGHEST = 4000;

function resonancesOf({ prepared, fingerings }: PreparedDesign, count: number) {
  const search = { count, coupling: true, maxima: prepared.playsMaxima };
  return findResonances(prepared, fingerings, search)[0] ?? [];
}

/** Holds the engine's resonances up to the highest asked for against those of the slow search. */
function expectSameResonances(document: DesignDocument, count: number): void {
  const design = prepareDesign(document);
  const { prepared, fingerings } = design;
  const found = resonancesOf(design, count);
  const last = found.length < count ? Infinity : (found.at(-1)?.frequency ?? Infinity);
  const to = Math.min(last, HIGHEST, (1.7 * prepared.speedOfSound) / (2 * Math.PI * prepared.widestRadius));
  const slow = slowResonances(prepared, fingerings[0]!, { to, step: STEP });
  const frequencies = found.map(({ frequency }) => frequency);
  for (const frequency of slow) {
    const near = frequencies.filter((other) => other >= frequency - 1.01 * STEP && other <= frequency + 0.01);
    expect(near.length, `${frequency} Hz of ${frequencies.join(', ')}`).toBeGreaterThan(0);
  }
  found.forEach(({ order, frequency }, i) => {
    expect(order).toBe(i + 1);
    expect(frequency).toBeGreaterThan((frequencies[i - 1] ?? 0) + 1e-5);
    const [below, above] = [-1, 1].map(
      (way) => impedanceAt(prepared, fingerings[0]!, frequency * (1 + way * 1e-7)).im,
    );
    const turn = prepared.playsMaxima ? -1 : 1;
    expect(turn * below!).toBeLessThan(0);
    expect(turn * above!).toBeGreaterThan(0);
  });
}

type Body = Pick<DesignDocument, 'mouthEnd' | 'foot'> & {
  bore: [positionMm: number, diameterMm: number][];
  outsideMm: number;
  holes: [positionMm: number, diameterMm: number, cover: ToneHole['cover']][];
  covered: string[];
};

function designOf({ mouthEnd, foot, bore, outsideMm, holes, covered }: Body): DesignDocument {
  const whistle = whistleDocument();
  return {
    ...whistle,
    mouthEnd,
    foot,
    bore: { stations: bore.map(([positionMm, diameterMm]) => ({ positionMm, diameterMm })) },
    outside: {
      stations: [0, bore.at(-1)![0]].map((positionMm) => ({ positionMm, diameterMm: outsideMm })),
    },
    air: { ...whistle.air, fixed: { speedOfSound: 345, density: 1.1769 } },
    holes: holes.map(([positionMm, diameterMm, cover], i) => ({
      ...whistle.holes[0]!,
      id: `h${i + 1}`,
      positionMm,
      diameterMm,
      cover,
      ...(cover === 'pad' ? { padHeightMm: 0.3 * diameterMm } : {}),
    })),
    fingerings: [{ ...whistle.fingerings[0]!, covered }],
  };
}

const SOUNDS_ON_ABOVE: Body = {
  mouthEnd: { kind: 'ideal-closed', correctionScale: 1 },
  foot: { kind: 'stopped' },
  bore: [
    [0, 11],
    [514, 11],
  ],
  outsideMm: 17,
  holes: [
    [190, 9.7, 'finger'],
    [260, 8, 'finger'],
    [330, 4, 'finger'],
    [390, 8.4, 'finger'],
  ],
  covered: [],
};

const COMES_BACK: Body = {
  mouthEnd: { kind: 'ideal-open', correctionScale: 1 },
  foot: { kind: 'open' },
  bore: [
    [0, 8.4],
    [133.4, 8.4],
    [133.4, 7.6],
    [296.4, 8.4],
  ],
  outsideMm: 12.4,
  holes: [
    [124.4, 1.44, 'vent'],
    [138.3, 7, 'pad'],
    [167.9, 4.1, 'thumb'],
    [213.6, 1.4, 'thumb'],
    [232.2, 2.9, 'pad'],
    [270.4, 1.7, 'pad'],
  ],
  covered: ['h3', 'h5'],
};

describe('resonances', () => {
  it.each([
    ['clear ones above others that leaked away', SOUNDS_ON_ABOVE],
    ['one just above another that leaked away', COMES_BACK],
  ])('are all found: %s', (_, body) => expectSameResonances(designOf(body), 6));

  it('of random designs are all that a search in small steps finds, each once, and each where the reactance passes 0', () => {
    fc.assert(
      fc.property(randomDesigns(), (document) => expectSameResonances(document, 8)),
      { numRuns: 40, seed: 1860, endOnFailure: true },
    );
  });
});
