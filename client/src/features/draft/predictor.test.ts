import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { DesignPrediction, DesignSensitivities } from '#shared/analysis/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import type { EngineAnswer } from '../../engine/engine-answers.ts';
import type { PredictionEngine } from './prediction-engine.ts';
import { Predictor } from './predictor.ts';

const named = (name: string) => whistleDocument({ name });

function predictionOf(frequencyHz: number | null): DesignPrediction {
  return {
    engine: 'test',
    notices: [],
    fingerings: [
      {
        id: 'f-d5',
        note: 'D5',
        register: 1,
        targetHz: 587.33,
        frequencyHz,
        centsFromScale: 0,
        beatsHz: 0,
        mode: 1,
        ladder: [],
        ventHole: null,
        cutoffHz: null,
        accuracyCents: 5,
        notices: [],
      },
    ],
  };
}

const noSensitivities: DesignSensitivities = { engine: 'test', fingerings: [] };

/** Answers when told to, in the order asked. */
class HeldEngine implements PredictionEngine {
  asked: string[] = [];
  refined: string[] = [];
  private held: { answer: (answer: EngineAnswer) => void; fail: (error: Error) => void }[] = [];

  predict = (document: DesignDocument) => {
    this.asked.push(document.name);
    return new Promise<EngineAnswer>((answer, fail) => this.held.push({ answer, fail }));
  };
  sensitivities = (document: DesignDocument) => {
    this.refined.push(document.name);
    return Promise.resolve(noSensitivities);
  };
  close = vi.fn();

  async answer(answer: EngineAnswer = { status: 'predicted', prediction: predictionOf(587) }) {
    this.held.shift()!.answer(answer);
    await vi.advanceTimersByTimeAsync(0);
  }
  async breakDown() {
    this.held.shift()!.fail(new Error('out of memory'));
    await vi.advanceTimersByTimeAsync(0);
  }
}

let engine: HeldEngine;
const broken = vi.fn();
const startPredictor = () => new Predictor(engine, () => undefined, broken);

beforeEach(() => {
  vi.useFakeTimers();
  engine = new HeldEngine();
  broken.mockClear();
});
afterEach(() => {
  vi.useRealTimers();
});

describe('figures beside a moving drawing', () => {
  it('are worked out for the newest document only, while the engine is busy', async () => {
    const predictor = startPredictor();
    const [first, last] = [named('a'), named('d')];
    predictor.ask(first);
    [named('b'), named('c'), last].forEach((document) => predictor.ask(document));
    await engine.answer();
    expect(predictor.state.figures?.of).toBe(first);
    await engine.answer();
    expect(engine.asked).toEqual(['a', 'd']);
    expect(predictor.state.figures?.of).toBe(last);
  });

  it('get their sensitivities once it is quiet, and only the newest ones', async () => {
    const predictor = startPredictor();
    predictor.ask(named('a'));
    await engine.answer();
    expect(predictor.state.figures?.sensitivities).toBeNull();
    predictor.ask(named('b'));
    await vi.advanceTimersByTimeAsync(1000);
    expect(engine.refined).toEqual([]);
    await engine.answer();
    await vi.advanceTimersByTimeAsync(1000);
    expect(engine.refined).toEqual(['b']);
    expect(predictor.state.figures?.sensitivities).toBe(noSensitivities);
  });

  it('say why there are none, keep the last ones with their own document, and come back', async () => {
    const predictor = startPredictor();
    const good = named('good');
    const wide = named('too wide');
    predictor.ask(good);
    await engine.answer();
    predictor.ask(wide);
    const faults = [
      { path: ['holes', 2, 'diameterMm'], message: 'Hole 3 is 13.0 and the bore there is 12.7.' },
    ];
    await engine.answer({ status: 'failed', faults });
    expect(predictor.state.failure).toEqual({ of: wide, faults });
    expect(predictor.state.figures?.of).toBe(good);
    predictor.ask(named('mended'));
    await engine.answer();
    expect(predictor.state.failure).toBeNull();
  });

  it('report an engine that broke, and go on with the next document', async () => {
    const predictor = startPredictor();
    predictor.ask(named('a'));
    await engine.breakDown();
    expect(predictor.state.failure?.faults[0]?.message).toMatch(/could not be worked out/);
    expect(broken).toHaveBeenCalledOnce();
    predictor.ask(named('b'));
    await engine.answer();
    expect(predictor.state.failure).toBeNull();
  });

  it('are asked anew when coupling is switched, and an answer from before does not count', async () => {
    const predictor = startPredictor();
    predictor.ask(named('a'));
    predictor.choose({ coupling: false });
    await engine.answer({ status: 'predicted', prediction: predictionOf(500) });
    expect(predictor.state.figures).toBeNull();
    await engine.answer({ status: 'predicted', prediction: predictionOf(600) });
    expect(predictor.state.figures?.prediction.fingerings[0]?.frequencyHz).toBe(600);
  });

  it('end with the bench', async () => {
    const predictor = startPredictor();
    predictor.ask(named('a'));
    predictor.close();
    await engine.answer();
    expect(predictor.state.figures).toBeNull();
    expect(engine.close).toHaveBeenCalledOnce();
  });
});

describe('the server’s figures', () => {
  const stored = (frequencyHz: number | null) => ({
    draftVersion: 2,
    documentHash: 'aa',
    computedAt: '2025-03-18T14:06:00Z',
    prediction: predictionOf(frequencyHz),
    sensitivities: noSensitivities,
  });

  it.each([
    ['the same', 587, 587, null],
    ['a hair apart', 587, 587 * 2 ** (0.005 / 1200), null],
    ['a cent apart', 587, 587 * 2 ** (1 / 1200), 1],
    ['silent where this device has a note', 587, null, Infinity],
  ])('that are %s are taken, and a difference is told', async (_case, here, there, told) => {
    const predictor = startPredictor();
    const document = named('a');
    predictor.ask(document);
    await engine.answer({ status: 'predicted', prediction: predictionOf(here) });
    predictor.takeStored(document, stored(there));
    expect(predictor.state.figures).toMatchObject({ of: document, source: 'server' });
    if (told === null) expect(predictor.state.mismatchCents).toBeNull();
    else expect(predictor.state.mismatchCents).toBeCloseTo(told, 6);
  });

  it('for an older document do not touch the newer figures', async () => {
    const predictor = startPredictor();
    const [older, newer] = [named('a'), named('b')];
    predictor.ask(older);
    await engine.answer();
    predictor.ask(newer);
    await engine.answer();
    predictor.takeStored(older, stored(700));
    expect(predictor.state.figures).toMatchObject({ of: newer, source: 'worker' });
  });
});
