import { useId, type ReactNode } from 'react';
import type { FingeringPrediction } from '#shared/analysis/prediction.ts';
import { beatsBetween } from '#shared/music/cents.ts';
import { NoteName } from '../../bench/NoteName.tsx';
import type { PanelProps } from '../../bench/panel-props.ts';
import { Button } from '../../ui/Button.tsx';
import { scaleUpAndDown } from './scale-row.ts';
import { soundingNote } from './use-held-note.ts';
import type { Playing, Tones } from './use-tones.ts';

interface SoundBarProps extends Pick<PanelProps, 'prediction' | 'selection'> {
  tones: Tones;
}

/** The chosen note as it will sound, as it should, and both at once; and the whole scale. */
export function SoundBar({ prediction, selection, tones }: SoundBarProps) {
  const predictions = prediction?.fingerings ?? [];
  const note = soundingNote(prediction, selection);
  const { playing, stop } = tones;
  if (note === undefined) return null;
  return (
    <div role="group" aria-label="Sound" className="flex flex-wrap items-center gap-2">
      <NoteButtons note={note} tones={tones} />
      <SoundButton
        what="scale"
        playing={playing}
        disabled={false}
        onPlay={() => tones.playScale(scaleUpAndDown(predictions))}
        onStop={stop}
      >
        Play the scale
      </SoundButton>
      <Volume tones={tones} />
    </div>
  );
}

function NoteButtons({ note, tones }: { note: FingeringPrediction; tones: Tones }) {
  const { frequencyHz, targetHz } = note;
  const { playing, hold, stop } = tones;
  const isSilent = frequencyHz === null;
  return (
    <>
      <SoundButton
        what="predicted"
        playing={playing}
        disabled={isSilent}
        onPlay={() => frequencyHz !== null && hold('predicted', [frequencyHz])}
        onStop={stop}
      >
        Play <NoteName note={note.note} />
      </SoundButton>
      <SoundButton
        what="reference"
        playing={playing}
        disabled={false}
        onPlay={() => hold('reference', [targetHz])}
        onStop={stop}
      >
        Play the reference
      </SoundButton>
      <SoundButton
        what="both"
        playing={playing}
        disabled={isSilent}
        onPlay={() => frequencyHz !== null && hold('both', [frequencyHz, targetHz])}
        onStop={stop}
      >
        Play both
      </SoundButton>
      <span className="is-predicted text-data text-ink2">
        {frequencyHz === null ? (
          'no steady note'
        ) : (
          <>
            <b className="text-ink">{beatsBetween(frequencyHz, targetHz).toFixed(1)}</b> beats a second
          </>
        )}
      </span>
    </>
  );
}

interface SoundButtonProps {
  what: Playing;
  playing: Playing | null;
  disabled: boolean;
  onPlay: () => void;
  onStop: () => void;
  children: ReactNode;
}

/** Pressed again it stops. */
function SoundButton({ what, playing, disabled, onPlay, onStop, children }: SoundButtonProps) {
  const isPlaying = playing === what;
  return (
    <Button size="small" disabled={disabled} aria-pressed={isPlaying} onClick={isPlaying ? onStop : onPlay}>
      {isPlaying ? 'Stop' : children}
    </Button>
  );
}

function Volume({ tones }: { tones: Tones }) {
  const id = useId();
  return (
    <span className="text-data text-ink2 flex items-center gap-2">
      <label htmlFor={id}>Volume</label>
      <input
        id={id}
        type="range"
        min={0}
        max={1}
        step={0.05}
        value={tones.volume}
        aria-valuetext={`${Math.round(tones.volume * 100)} percent`}
        onChange={(event) => tones.chooseVolume(Number(event.currentTarget.value))}
        className="accent-mark h-6 w-24 pointer-coarse:h-11"
      />
    </span>
  );
}
