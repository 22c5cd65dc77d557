import { titleInSentence } from '#shared/document/title-in-sentence.ts';

import { formatCents } from '#shared/music/cents.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { NoteName } from '../../bench/NoteName.tsx';
import { Button } from '../../ui/Button.tsx';
import type { Suggestion } from './find-suggestion.ts';

interface SuggestionWordsProps {
  note: string;
  cents: number | null;
  bandCents: number;
  holeTitle: string;
  presentMm: number;
  mouthWord: string;
  suggestions: readonly Suggestion[] | null;
  unit: LengthUnit;
  disabled: boolean;
  /** The last one tried, while it can be put back. */
  canPutBack: boolean;
  onTry: (suggestion: Suggestion) => void;
  onPutBack: () => void;
}

/** How the chosen note hangs, one change that would mend it, and exactly what that does to the others. */
export function SuggestionWords(props: SuggestionWordsProps) {
  const { note, cents, bandCents, suggestions, disabled, canPutBack, onTry, onPutBack } = props;
  const [first, second] = suggestions ?? [];
  return (
    <div className="border-hair text-data text-ink2 border-t pt-2.5 leading-4.5">
      <p>
        <b className="text-ink font-semibold">
          <NoteName note={note} /> {hangs(cents, bandCents)}
        </b>{' '}
        {first !== undefined && <EffectWords {...props} suggestion={first} />}
        {suggestions !== null && first === undefined && cents !== null && Math.abs(cents) > bandCents && (
          <>No drill and no move of this hole brings it nearer without spoiling others.</>
        )}
      </p>
      <div className="mt-2 flex flex-wrap items-center gap-1">
        {first !== undefined && (
          <Button disabled={disabled} onClick={() => onTry(first)} aria-keyshortcuts="T">
            {verb(first, props)}
          </Button>
        )}
        {second !== undefined && (
          <Button look="bare" disabled={disabled} onClick={() => onTry(second)}>
            {verb(second, props)} instead
          </Button>
        )}
        {canPutBack && (
          <Button look="bare" onClick={onPutBack}>
            Put it back
          </Button>
        )}
      </div>
    </div>
  );
}

function hangs(cents: number | null, bandCents: number): string {
  if (cents === null) return 'has no steady note.';
  const size = Math.abs(cents).toFixed(1);
  if (Number(size) === 0) return 'hangs straight.';
  const way = cents < 0 ? 'flat' : 'sharp';
  return Math.abs(cents) <= bandCents
    ? `hangs ${size} cents ${way}, inside the band.`
    : `hangs ${size} cents ${way}.`;
}

function verb(suggestion: Suggestion, { unit }: SuggestionWordsProps): string {
  if (suggestion.kind === 'drill') return `Try ${printLength(suggestion.mm, unit)} ${unit}`;
  return `Move it ${printLength(Math.abs(suggestion.mm), unit)} ${unit}`;
}

function EffectWords({ suggestion, ...props }: SuggestionWordsProps & { suggestion: Suggestion }) {
  const { effects, othersMoveCents } = suggestion;
  return (
    <>
      {sentence(suggestion, props)}:{' '}
      {effects.map(({ fingering, note, after }, index) => (
        <span key={fingering}>
          {index > 0 && ', '}
          <NoteName note={note} /> {formatCents(after)}
        </span>
      ))}
      .{' '}
      {othersMoveCents < 0.05
        ? 'No other note moves.'
        : `All others move ${othersMoveCents.toFixed(1)} or less.`}
    </>
  );
}

function sentence({ kind, mm }: Suggestion, { holeTitle, presentMm, unit, mouthWord }: SuggestionWordsProps) {
  const hole = titleInSentence(holeTitle);
  if (kind === 'move') {
    const way = mm > 0 ? 'footward' : `toward the ${mouthWord}`;
    return `Move ${hole} ${printLength(Math.abs(mm), unit)} ${unit} ${way}`;
  }
  return mm > presentMm
    ? `Open ${hole} to ${printLength(mm, unit)} ${unit}`
    : `Drill ${hole} ${printLength(mm, unit)} ${unit}, narrower`;
}
