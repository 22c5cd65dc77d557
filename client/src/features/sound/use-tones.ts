import { useEffect, useRef, useState } from 'react';
import { keepOnDevice, readFromDevice } from '../../lib/device-store.ts';
import { TonePlayer, type ScheduledTone } from './tone-player.ts';

export type Playing = 'predicted' | 'reference' | 'both' | 'scale';

const VOLUME_KEY = 'volume';
const USUAL_VOLUME = 0.5;

export interface Tones {
  playing: Playing | null;
  volume: number;
  hold: (what: Exclude<Playing, 'scale'>, frequencies: readonly number[]) => void;
  playScale: (row: readonly ScheduledTone[]) => void;
  stop: () => void;
  chooseVolume: (volume: number) => void;
  /** Bends what is held. */
  retune: (frequencies: readonly number[]) => void;
}

/** What sounds on this page. Nothing does until it is asked for, and nothing goes on when the page is left. */
export function useTones(): Tones {
  const player = useRef<TonePlayer | null>(null);
  const [playing, setPlaying] = useState<Playing | null>(null);
  const [volume, setVolume] = useState(keptVolume);
  useEffect(
    () => () => {
      void player.current?.close();
      player.current = null;
    },
    [],
  );
  const opened = () => {
    player.current ??= new TonePlayer(
      () => new AudioContext(),
      volume,
      () => setPlaying(null),
    );
    return player.current;
  };
  return {
    playing,
    volume,
    hold: (what, frequencies) => {
      opened().hold(frequencies);
      setPlaying(what);
    },
    playScale: (row) => {
      opened().playRow(row);
      setPlaying('scale');
    },
    stop: () => {
      player.current?.stop();
      setPlaying(null);
    },
    chooseVolume: (next) => {
      setVolume(next);
      player.current?.setVolume(next);
      keepOnDevice(VOLUME_KEY, String(next));
    },
    retune: (frequencies) => player.current?.retune(frequencies),
  };
}

function keptVolume(): number {
  const kept = Number(readFromDevice(VOLUME_KEY) ?? USUAL_VOLUME);
  return kept >= 0 && kept <= 1 ? kept : USUAL_VOLUME;
}
