import { Popover } from 'radix-ui';
import { memo, useRef, useState } from 'react';
import type { FingeringPrediction } from '#shared/analysis/prediction.ts';
import type { BenchMeasures } from '../../bench/bench-layout.ts';
import type { HungNote } from '../../bench/hung-notes.ts';
import { accuracyWords } from '../../bench/accuracy-words.ts';
import { spokenHungNote } from '../../bench/spoken-pitch.ts';
import { useStable } from '../../bench/use-stable.ts';
import { bobPlace } from './plumb-scale.ts';

interface NoticeMarksProps {
  notes: readonly (HungNote & { x: number; y: number })[];
  top: number;
  measures: BenchMeasures;
}

/** From a bob's column to the mark beside it, px. */
const ASIDE_PX = 20;

/** A small triangle beside every note whose figure has something to be known about it; it opens the sentences. */
export function NoticeMarks({ notes, top, measures }: NoticeMarksProps) {
  const [openId, setOpenId] = useState<string | null>(null);
  const anchor = useRef<HTMLButtonElement>(null);
  const marked = notes.filter(({ predicted }) => (predicted?.notices.length ?? 0) > 0);
  const open = marked.find(({ fingering }) => fingering.id === openId);
  const toggle = useStable((id: string, button: HTMLButtonElement) => {
    anchor.current = button;
    setOpenId(id === openId ? null : id);
  });
  return (
    <>
      {marked.map((note) => {
        // On the side that the bob does not hang to.
        const side = bobPlace(note.predicted?.centsFromScale ?? 0, measures).dx > 0 ? -1 : 1;
        return (
          <NoticeMark
            key={note.fingering.id}
            id={note.fingering.id}
            about={note.fingering.note}
            x={note.x + side * ASIDE_PX}
            y={top + note.y}
            isOpen={note === open}
            onToggle={toggle}
          />
        );
      })}
      <Popover.Root open={open !== undefined} onOpenChange={(isOpen) => !isOpen && setOpenId(null)}>
        <Popover.Anchor virtualRef={anchor} />
        <Popover.Portal>
          <Popover.Content
            sideOffset={6}
            collisionPadding={12}
            aria-label={open === undefined ? undefined : spokenHungNote(open)}
            className="border-hair bg-sheet text-data text-ink shadow-pop rounded-control z-50 flex max-w-80 flex-col gap-2 border p-3"
          >
            <Sentences predicted={open?.predicted ?? null} />
          </Popover.Content>
        </Popover.Portal>
      </Popover.Root>
    </>
  );
}

function Sentences({ predicted }: { predicted: FingeringPrediction | null }) {
  if (predicted === null) return null;
  return (
    <>
      {predicted.notices.map(({ message }) => (
        <p key={message}>{message}</p>
      ))}
      <p className="text-ink3">{accuracyWords(predicted)}</p>
    </>
  );
}

interface NoticeMarkProps {
  id: string;
  about: string;
  x: number;
  y: number;
  isOpen: boolean;
  onToggle: (id: string, button: HTMLButtonElement) => void;
}

const NoticeMark = memo(function NoticeMark({ id, about, x, y, isOpen, onToggle }: NoticeMarkProps) {
  return (
    <button
      type="button"
      aria-label={`What to know about ${about}`}
      aria-expanded={isOpen}
      aria-haspopup="dialog"
      onClick={(event) => onToggle(id, event.currentTarget)}
      className="absolute top-0 left-0 flex size-6 items-center justify-center pointer-coarse:size-11"
      style={{ transform: `translate(calc(${x}px - 50%), calc(${y}px - 50%))` }}
    >
      <svg width="13" height="12" viewBox="0 0 13 12" aria-hidden="true">
        <path d="M6.5 1L12.2 11H.8Z" className="bench-notice" />
        <path d="M6.5 4.6v3M6.5 9.3v.1" className="bench-notice-mark" />
      </svg>
    </button>
  );
});
