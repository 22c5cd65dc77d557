import { NoteWords } from './NoteWords.tsx';
import { classNames } from '../../ui/class-names.ts';
import type { Change } from './compare-changes.ts';
import { sameWords } from './compare-changes.ts';

interface ChangeListProps {
  changes: readonly Change[];
  chosenHole: string | null;
  /** Which changes are to be copied; null where nothing can be copied. */
  picked: ReadonlySet<string> | null;
  onChooseHole: (hole: string) => void;
  onPick: (key: string, isPicked: boolean) => void;
  /** Matched by where they lie: the two have different holes. */
  isByPlace: boolean;
}

/** What differs, in sentences; each leads to its hole. */
export function ChangeList({
  changes,
  chosenHole,
  picked,
  onChooseHole,
  onPick,
  isByPlace,
}: ChangeListProps) {
  const holes = changes.filter(({ part }) => part === 'hole').length;
  const others = changes.length - holes;
  return (
    <section aria-labelledby="changes-heading">
      <h2 id="changes-heading" className="text-section font-semibold">
        {headingOf(holes, others)}
        <span className="text-data text-ink3 ml-2 font-normal">{sameWords(changes)}</span>
      </h2>
      {isByPlace && (
        <p className="text-data text-ink2 mt-0.5">
          These have different holes. They are matched by where they lie; those without a fellow stand alone.
        </p>
      )}
      {changes.length === 0 && (
        <p className="text-ink2 mt-1">
          Nothing differs but, it may be, the name and the air they are looked at in.
        </p>
      )}
      <ul className="border-hair mt-1 border-b empty:border-0">
        {changes.map((change) => (
          <li
            key={change.key}
            className={classNames(
              'border-hair flex min-h-9 items-center gap-3 border-t px-2 py-1 max-[1100px]:min-h-12 pointer-coarse:min-h-12',
              change.hole !== null &&
                change.hole === chosenHole &&
                'bg-mark-soft shadow-[inset_3px_0_0_var(--mark)]',
            )}
          >
            {picked !== null && (
              <input
                type="checkbox"
                aria-label={`Copy: ${change.title} ${change.words}`}
                checked={picked.has(change.key)}
                onChange={(event) => onPick(change.key, event.currentTarget.checked)}
                className="accent-ink size-5 shrink-0"
              />
            )}
            <ChangeWords change={change} onChooseHole={onChooseHole} />
          </li>
        ))}
      </ul>
    </section>
  );
}

function headingOf(holes: number, others: number): string {
  if (holes + others === 0) return 'Nothing differs';
  if (holes === 0) return others === 1 ? '1 thing differs' : `${others} things differ`;
  const rest = others === 0 ? '' : `, ${others} more`;
  return `${holes === 1 ? '1 hole differs' : `${holes} holes differ`}${rest}`;
}

interface ChangeWordsProps {
  change: Change;
  onChooseHole: (hole: string) => void;
}

function ChangeWords({ change, onChooseHole }: ChangeWordsProps) {
  const { title, words, hole, pitch } = change;
  const sentence = (
    <span className="min-w-0 break-words">
      <b className="font-semibold">{title}</b> {words}
    </span>
  );
  const figures = pitch !== '' && (
    <span className="text-data text-ink2 ml-auto shrink-0 pl-2 whitespace-nowrap">
      <NoteWords text={pitch} />
    </span>
  );
  if (hole === null)
    return (
      <span className="flex min-w-0 flex-1 flex-wrap items-center text-left">
        {sentence}
        {figures}
      </span>
    );
  return (
    <button
      type="button"
      onClick={() => onChooseHole(hole)}
      className="flex min-h-7 min-w-0 flex-1 flex-wrap items-center text-left"
    >
      {sentence}
      {figures}
    </button>
  );
}
