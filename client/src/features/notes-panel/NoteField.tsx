import { useId, useState } from 'react';
import { readNoteName } from '#shared/music/note-name.ts';
import { CONTROL, FieldError } from '../../ui/Field.tsx';
import { classNames } from '../../ui/class-names.ts';

interface NoteFieldProps {
  note: string;
  disabled: boolean;
  /** Called with a text that reads as a note. */
  onChange: (note: string) => void;
}

/** A note name; what cannot be read stays in the field and says so. */
export function NoteField({ note, disabled, onChange }: NoteFieldProps) {
  const id = useId();
  const [typed, setTyped] = useState<string | null>(null);
  const [isFaulty, setFaulty] = useState(false);
  const commit = () => {
    if (typed === null) return;
    const canBeRead = readNoteName(typed) !== null;
    setFaulty(!canBeRead);
    if (!canBeRead) return;
    setTyped(null);
    if (typed !== note) onChange(typed);
  };
  return (
    <div className="w-24">
      <label htmlFor={id}>Note</label>
      <input
        id={id}
        type="text"
        autoComplete="off"
        spellCheck={false}
        disabled={disabled}
        value={typed ?? note}
        aria-invalid={isFaulty ? true : undefined}
        aria-describedby={isFaulty ? `${id}-error` : undefined}
        onChange={(event) => {
          setTyped(event.currentTarget.value);
          setFaulty(false);
        }}
        onBlur={commit}
        onKeyDown={(event) => {
          if (event.key === 'Enter') commit();
          if (event.key === 'Escape') {
            setTyped(null);
            setFaulty(false);
          }
        }}
        className={classNames(CONTROL, 'h-9 font-semibold max-[1100px]:h-13 pointer-coarse:h-13')}
      />
      {isFaulty && <FieldError id={`${id}-error`}>Type a note such as D5, F#5 or Bb4.</FieldError>}
    </div>
  );
}
