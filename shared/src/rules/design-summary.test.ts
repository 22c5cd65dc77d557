import { describe, expect, it } from 'vitest';
import type { DesignPrediction, FingeringPrediction } from '../analysis/prediction.ts';
import type { DesignDocument } from '../document/design-document.ts';
import { lowestNote, rackView } from './design-summary.ts';

const station = (positionMm: number) => ({ positionMm, diameterMm: 15 });

const document = (changes: Partial<DesignDocument> = {}): DesignDocument => ({
  format: 'borewright-design/1',
  name: 'Pipe',
  pitch: { a4Hz: 440, temperament: 'equal', tonic: 'D', centsOffsets: null },
  air: {
    temperatureC: 20,
    relativeHumidity: 0.5,
    co2Fraction: 0,
    pressurePa: 101325,
    mouthTemperatureC: null,
    warmLengthMm: null,
    losses: true,
    fixed: null,
  },
  mouthEnd: { kind: 'ideal-open', correctionScale: 1 },
  bore: { stations: [station(0), station(300)] },
  outside: { stations: [station(0), station(300)] },
  foot: { kind: 'open' },
  holes: [],
  fingerings: [],
  ...changes,
});

const heard = (note: string, register: number, cents: number | null): FingeringPrediction => ({
  id: `${note}-${register}`,
  note,
  register,
  targetHz: 440,
  frequencyHz: cents === null ? null : 440,
  centsFromScale: cents,
  beatsHz: null,
  mode: null,
  ladder: [],
  ventHole: note === 'D5' ? null : 'h1',
  cutoffHz: null,
  accuracyCents: 15,
  notices: [],
});

const prediction = (...fingerings: FingeringPrediction[]): DesignPrediction => ({
  engine: 'e',
  notices: [],
  fingerings,
});

describe('rackView', () => {
  it('hangs the notes of the first register under their holes, and leaves out what does not sound', () => {
    const view = rackView(
      document(),
      prediction(heard('D5', 1, 2), heard('E5', 1, null), heard('F5', 1, -3), heard('D6', 2, 9)),
    );
    expect(view.plumb).toEqual([
      { ventHole: null, cents: 2 },
      { ventHole: 'h1', cents: -3 },
    ]);
  });

  it('names the note furthest from the scale in either direction, for each register', () => {
    const view = rackView(document(), prediction(heard('D5', 1, 4), heard('E5', 1, -7), heard('D6', 2, 1)));
    expect(view.furthest1).toEqual({ note: 'E5', cents: -7 });
    expect(view.furthest2).toEqual({ note: 'D6', cents: 1 });
  });

  it('has nothing to say of a register without notes', () => {
    expect(rackView(document(), prediction())).toMatchObject({ plumb: [], furthest1: null, furthest2: null });
  });

  it.each([
    [2, 2],
    [60, 60],
    [61, 60],
    [400, 60],
  ])('draws an outline of %i stations with %i, both ends among them', (count, drawn) => {
    const stations = Array.from({ length: count }, (_, index) => station((300 * index) / (count - 1)));
    const { outside } = rackView(document({ outside: { stations } }), prediction()).outline;
    expect(outside).toHaveLength(drawn);
    expect([outside[0]!.positionMm, outside.at(-1)!.positionMm]).toEqual([0, 300]);
  });
});

describe('lowestNote', () => {
  it.each([
    [[], null],
    [['E5', 'D5', 'D6'], { name: 'D5', midi: 74 }],
    [['B4', 'C5'], { name: 'B4', midi: 71 }],
    [['Cb5', 'C5'], { name: 'Cb5', midi: 71 }],
  ])('of %j is %j', (notes, lowest) => {
    const fingerings = notes.map((note, index) => ({
      id: `f${index}`,
      note,
      register: 1,
      covered: [],
      half: [],
      weight: 1,
      centsOffset: 0,
    }));
    expect(lowestNote(document({ fingerings }))).toEqual(lowest);
  });
});
