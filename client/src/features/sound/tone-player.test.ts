import { describe, expect, it, vi } from 'vitest';
import { TonePlayer } from './tone-player.ts';

/** As much of an audio context as the player uses, remembering its graph. */
class FakeParameter {
  value = 0;
  set: [number, number][] = [];
  setTargetAtTime(value: number, at: number) {
    this.set.push([value, at]);
    this.value = value;
  }
  cancelScheduledValues() {
    this.set = [];
  }
}

class FakeNode {
  to: unknown = null;
  gain = new FakeParameter();
  frequency = new FakeParameter();
  type = '';
  onended: (() => void) | null = null;
  started: number | null = null;
  stopped: number | null = null;
  connect(node: unknown) {
    this.to = node;
    return node;
  }
  start(at: number) {
    this.started = at;
  }
  stop(at: number) {
    this.stopped = at;
  }
}

function fakeContext() {
  const oscillators: FakeNode[] = [];
  const gains: FakeNode[] = [];
  const context = {
    currentTime: 10,
    state: 'suspended',
    destination: 'speaker',
    resume: vi.fn(() => Promise.resolve()),
    close: vi.fn(() => Promise.resolve()),
    createOscillator: () => {
      const node = new FakeNode();
      oscillators.push(node);
      return node;
    },
    createGain: () => {
      const node = new FakeNode();
      gains.push(node);
      return node;
    },
  };
  const create = vi.fn(() => context as unknown as AudioContext);
  return { context, create, oscillators, gains };
}

describe('tones', () => {
  it('are silent until asked for, and wake the audio then', () => {
    const { create, context } = fakeContext();
    const player = new TonePlayer(create, 0.5, () => undefined);
    expect(create).not.toHaveBeenCalled();
    player.hold([440]);
    expect(create).toHaveBeenCalledOnce();
    expect(context.resume).toHaveBeenCalledOnce();
  });

  it('two together run through one volume to the speaker, so that they beat', () => {
    const { create, oscillators, gains } = fakeContext();
    const player = new TonePlayer(create, 0.5, () => undefined);
    player.hold([782.4, 784]);
    const [master, first, second] = gains;
    expect(oscillators.map(({ frequency, type }) => [frequency.value, type])).toEqual([
      [782.4, 'sine'],
      [784, 'sine'],
    ]);
    expect(oscillators.map(({ to }) => to)).toEqual([first, second]);
    expect([first!.to, second!.to]).toEqual([master, master]);
    expect(master!.to).toBe('speaker');
    expect(first!.gain.value + second!.gain.value).toBeLessThanOrEqual(1);
  });

  it('bend while they are held', () => {
    const { create, oscillators } = fakeContext();
    const player = new TonePlayer(create, 0.5, () => undefined);
    player.hold([780]);
    player.retune([784]);
    expect(oscillators).toHaveLength(1);
    expect(oscillators[0]!.frequency.value).toBe(784);
  });

  it('fade and end when stopped, and the next ones take their place', () => {
    const { create, oscillators, gains } = fakeContext();
    const player = new TonePlayer(create, 0.5, () => undefined);
    player.hold([440]);
    player.hold([660]);
    expect(oscillators[0]!.stopped).toBeGreaterThan(10);
    expect(gains[1]!.gain.value).toBe(0);
    expect(oscillators[1]!.stopped).toBeNull();
  });

  it('of a scale follow each other and tell when they are through', () => {
    const { create, oscillators } = fakeContext();
    const ended = vi.fn();
    const player = new TonePlayer(create, 0.5, ended);
    player.playRow([
      { frequencyHz: 440, atS: 0, lengthS: 0.5 },
      { frequencyHz: 495, atS: 0.5, lengthS: 0.5 },
    ]);
    expect(oscillators[1]!.started! - oscillators[0]!.started!).toBeCloseTo(0.5, 9);
    expect(oscillators[0]!.stopped).toBeCloseTo(oscillators[1]!.started!, 9);
    oscillators[1]!.onended!();
    expect(ended).toHaveBeenCalledOnce();
  });

  it('follow the volume, and close with the page', async () => {
    const { create, gains, context } = fakeContext();
    const player = new TonePlayer(create, 1, () => undefined);
    player.hold([440]);
    player.setVolume(0);
    expect(gains[0]!.gain.value).toBe(0);
    await player.close();
    expect(context.close).toHaveBeenCalledOnce();
  });
});
