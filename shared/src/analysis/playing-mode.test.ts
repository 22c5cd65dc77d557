import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import type { DesignDocument, Fingering, MouthEnd, ToneHole } from '../document/design-document.ts';
import type { FingeringPrediction } from './prediction.ts';
import { predictDesign } from './predict-design.ts';

const ALL = ['h1', 'h2', 'h3', 'h4', 'h5', 'h6'];

const fingering = (changes: Partial<Fingering>): Fingering => ({
  id: 'f',
  note: 'D5',
  register: 1,
  covered: [],
  half: [],
  weight: 1,
  centsOffset: 0,
  ...changes,
});

interface Pipe {
  mouthEnd: MouthEnd;
  foot?: DesignDocument['foot'];
  bore: [positionMm: number, diameterMm: number][];
  holes?: Partial<ToneHole>[];
}

function pipe({ mouthEnd, foot, bore, holes = [] }: Pipe): DesignDocument {
  const whistle = whistleDocument();
  return {
    ...whistle,
    mouthEnd,
    foot: foot ?? { kind: 'open' },
    bore: { stations: bore.map(([positionMm, diameterMm]) => ({ positionMm, diameterMm })) },
    outside: {
      stations: bore.map(([positionMm, diameterMm]) => ({ positionMm, diameterMm: diameterMm + 8 })),
    },
    holes: holes.map((hole, i) => ({ ...whistle.holes[0]!, id: `h${i + 1}`, ...hole })),
  };
}

const window = whistleDocument().mouthEnd;
const cylinder: Pipe['bore'] = [
  [0, 14],
  [400, 14],
];
const ventedPipe = pipe({
  mouthEnd: { kind: 'reed', equivalentVolumeMm3: 1500, correctionScale: 1 },
  bore: cylinder,
  holes: [{ positionMm: 80, diameterMm: 2.5, cover: 'thumb' }],
});
const recorder = pipe({
  mouthEnd: window,
  bore: [
    [-4.4, 14],
    [330, 10],
  ],
  holes: [{ positionMm: 110, diameterMm: 4, angleDeg: 180, cover: 'thumb' }],
});

function played(document: DesignDocument, ...fingerings: Partial<Fingering>[]): FingeringPrediction[] {
  const asked = fingerings.map((changes, i) => fingering({ ...changes, id: `f${i}` }));
  return predictDesign({ ...document, fingerings: asked }).fingerings;
}

function interval(document: DesignDocument, covered: string[]): number {
  const [low, high] = played(document, { covered, register: 1 }, { covered, register: 2 });
  return 1200 * Math.log2(high!.frequencyHz! / low!.frequencyHz!);
}

const codes = ({ notices }: FingeringPrediction) => notices.map(({ code }) => code);

describe('the second register', () => {
  // Open–open columns and closed cones sound 1:2:3…, open–closed cylinders 1:3:5…; any textbook of musical acoustics.
  const octave = 1200;
  const twelfth = 1200 * Math.log2(3);
  it.each([
    ['of a whistle is the octave', whistleDocument(), ALL, octave],
    ['of a closed cylinder is the twelfth', ventedPipe, ['h1'], twelfth],
    [
      'of a stopped flute is the twelfth',
      pipe({
        mouthEnd: { kind: 'ideal-open', correctionScale: 1 },
        foot: { kind: 'stopped' },
        bore: cylinder,
      }),
      [],
      twelfth,
    ],
    [
      'of a closed cone, its missing tip replaced, is the octave',
      pipe({
        // A cone of 4 to 13 mm over 330 mm lacks a tip of 146.7 mm, π·2²·146.7/3 mm³.
        mouthEnd: { kind: 'reed', equivalentVolumeMm3: (Math.PI * 4 * 146.7) / 3, correctionScale: 1 },
        bore: [
          [0, 4],
          [330, 13],
        ],
      }),
      [],
      octave,
    ],
  ] as const)('%s', (_, document, covered, cents) => {
    expect(Math.abs(interval(document, [...covered]) - cents)).toBeLessThan(80);
  });

  it('keeps its rung when a vent weakens the one below, whole or half', () => {
    const [shut, open] = played(ventedPipe, { covered: ['h1'], register: 2 }, { covered: [], register: 2 });
    expect([shut!.mode, open!.mode]).toEqual([2, 2]);
    const [plain, pinched] = played(
      recorder,
      { covered: ['h1'], register: 2 },
      { half: [{ hole: 'h1', fraction: 0.8, from: 'side' }], register: 2 },
    );
    expect([plain!.mode, pinched!.mode]).toEqual([2, 2]);
    // Pinching weakens the lower rung against the upper, and hardly moves the upper.
    const lead = ({ ladder }: FingeringPrediction) => ladder[1]!.strength - ladder[0]!.strength;
    expect(lead(pinched!)).toBeGreaterThan(lead(plain!) + 3);
    expect(Math.abs(1200 * Math.log2(pinched!.frequencyHz! / plain!.frequencyHz!))).toBeLessThan(100);
  });
});

describe('notices of what a fingering would do', () => {
  it('say that a reed slips to the lower rung without its vent, and not with it', () => {
    const [shut, open, low] = played(
      ventedPipe,
      { covered: ['h1'], register: 2 },
      { covered: [], register: 2 },
      { covered: ['h1'], register: 1 },
    );
    expect(codes(shut!)).toEqual(['register-slips']);
    expect(codes(open!)).toEqual([]);
    expect(codes(low!)).toEqual([]);
  });

  it('say that a jet slips to a stronger rung near by, and not to the one an octave below', () => {
    const [cross, plain] = played(
      whistleDocument(),
      { note: 'A6', covered: ALL.filter((hole) => hole !== 'h2'), register: 2 },
      { covered: ALL, register: 2 },
    );
    expect(codes(cross!)).toEqual(['register-slips']);
    expect(codes(plain!)).toEqual([]);
  });

  it('advise gentler blowing where the stronger rung lies above', () => {
    const [low] = played(ventedPipe, { covered: [], register: 1 });
    expect(low!.notices.map(({ code, message }) => [code, message.includes('gentler')])).toEqual([
      ['register-slips', true],
    ]);
  });

  it('call a rung above the cutoff weak, and a clear one not', () => {
    const [weak, clear] = played(whistleDocument(), { register: 3 }, { register: 2 });
    expect(codes(weak!)).toEqual(['weak-resonance']);
    expect(weak!.ladder[2]!.weak).toBe(true);
    expect(codes(clear!)).not.toContain('weak-resonance');
  });

  it('say where another rung than the register plays, and not where the register does', () => {
    const covered = ALL.slice(1);
    const [third, second] = played(
      whistleDocument(),
      { note: 'D6', covered, register: 3 },
      { note: 'D6', covered, register: 2 },
    );
    expect(codes(third!)).toContain('other-rung-plays');
    expect([third!.mode, second!.mode]).toEqual([2, 2]);
    expect(codes(second!)).not.toContain('other-rung-plays');
  });

  it('blame no open hole for silence where none is open', () => {
    const hose = pipe({
      mouthEnd: { kind: 'ideal-open', correctionScale: 1 },
      bore: [
        [0, 2],
        [5000, 2],
      ],
    });
    const [silent] = played(hose, {});
    expect(silent!.notices.map(({ code }) => code)).toEqual(['no-resonance']);
    expect(silent!.notices[0]!.message).not.toContain('hole');
  });

  it('say where the bore is wide against the wavelength, and not below', () => {
    const wide = pipe({
      mouthEnd: { kind: 'ideal-closed', correctionScale: 1 },
      bore: [
        [0, 24],
        [150, 24],
      ],
      holes: [{ positionMm: 120, diameterMm: 5 }],
    });
    const [high, low] = played(wide, { register: 3 }, { register: 1 });
    expect(codes(high!)).toContain('frequency-above-formula');
    expect(codes(low!)).not.toContain('frequency-above-formula');
  });
});
