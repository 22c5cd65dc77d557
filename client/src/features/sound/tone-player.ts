/** Tones that sound together until they are stopped, or a row of tones one after the other. */
export interface ScheduledTone {
  frequencyHz: number;
  /** From the start, s. */
  atS: number;
  lengthS: number;
}

/** Short enough to feel at once, long enough not to click, s. */
const RAMP_S = 0.02;
/** Two tones at this size each stay below full scale together. */
const TONE_GAIN = 0.45;

interface Voice {
  oscillator: OscillatorNode;
  gain: GainNode;
}

/**
 * Plays plain tones. Sines, because two sines beat at exactly the difference of their frequencies, and nothing else does.
 *
 * The audio context is made at the first tone: browsers let a page sound only after somebody pressed something.
 */
export class TonePlayer {
  private context: AudioContext | null = null;
  private master: GainNode | null = null;
  private voices: Voice[] = [];
  private volume: number;

  /** @param onEnded - called when a row of tones has come to its end by itself */
  constructor(
    private readonly createContext: () => AudioContext,
    volume: number,
    private readonly onEnded: () => void,
  ) {
    this.volume = volume;
  }

  /** Holds these frequencies together until `stop` or the next tones. */
  hold(frequencies: readonly number[]): void {
    this.stop();
    const { context, master } = this.opened();
    this.voices = frequencies.map((frequencyHz) => {
      const voice = startVoice(context, master, frequencyHz);
      voice.gain.gain.setTargetAtTime(TONE_GAIN, context.currentTime, RAMP_S);
      return voice;
    });
  }

  /** Bends what is held to new frequencies, so that a dragged hole is heard. */
  retune(frequencies: readonly number[]): void {
    const { context } = this;
    if (context === null) return;
    this.voices.forEach(({ oscillator }, index) => {
      const frequencyHz = frequencies[index];
      if (frequencyHz !== undefined)
        oscillator.frequency.setTargetAtTime(frequencyHz, context.currentTime, RAMP_S);
    });
  }

  playRow(tones: readonly ScheduledTone[]): void {
    this.stop();
    const { context, master } = this.opened();
    const from = context.currentTime + RAMP_S;
    this.voices = tones.map(({ frequencyHz, atS, lengthS }) => {
      const voice = startVoice(context, master, frequencyHz, from + atS);
      const end = from + atS + lengthS;
      voice.gain.gain.setTargetAtTime(TONE_GAIN, from + atS, RAMP_S);
      voice.gain.gain.setTargetAtTime(0, end - 3 * RAMP_S, RAMP_S);
      voice.oscillator.stop(end);
      return voice;
    });
    const last = this.voices.at(-1)?.oscillator;
    if (last !== undefined) last.onended = this.onEnded;
  }

  stop(): void {
    const { context } = this;
    if (context === null) return;
    this.voices.forEach(({ oscillator, gain }) => {
      oscillator.onended = null;
      gain.gain.cancelScheduledValues(context.currentTime);
      gain.gain.setTargetAtTime(0, context.currentTime, RAMP_S);
      oscillator.stop(context.currentTime + 5 * RAMP_S);
    });
    this.voices = [];
  }

  /** @param volume - 0 to 1 */
  setVolume(volume: number): void {
    this.volume = volume;
    if (this.context !== null)
      this.master?.gain.setTargetAtTime(loudness(volume), this.context.currentTime, RAMP_S);
  }

  async close(): Promise<void> {
    this.stop();
    const { context } = this;
    this.context = null;
    this.master = null;
    await context?.close();
  }

  private opened(): { context: AudioContext; master: GainNode } {
    if (this.context === null || this.master === null) {
      this.context = this.createContext();
      this.master = this.context.createGain();
      this.master.gain.value = loudness(this.volume);
      this.master.connect(this.context.destination);
    }
    // Suspended where the browser waited for a press; the press has come.
    if (this.context.state === 'suspended') void this.context.resume();
    return { context: this.context, master: this.master };
  }
}

function startVoice(
  context: AudioContext,
  master: GainNode,
  frequencyHz: number,
  at = context.currentTime,
): Voice {
  const oscillator = context.createOscillator();
  const gain = context.createGain();
  oscillator.type = 'sine';
  oscillator.frequency.value = frequencyHz;
  gain.gain.value = 0;
  oscillator.connect(gain).connect(master);
  oscillator.start(at);
  return { oscillator, gain };
}

/** The ear counts in ratios: half the slider is about half as loud. */
const loudness = (volume: number) => volume ** 2;
