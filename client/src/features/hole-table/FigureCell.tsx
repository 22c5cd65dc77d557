import { memo, useState } from 'react';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { classNames } from '../../ui/class-names.ts';
import { lengthFormat } from '../../ui/length-format.ts';
import { plainFormat } from '../../ui/number-format.ts';
import { useNumberEntry } from '../../ui/use-number-entry.ts';

interface FigureCellProps {
  row: string;
  hole: string;
  label: string;
  kind: 'length' | 'angle';
  value: number;
  min: number;
  max: number;
  unit: LengthUnit;
  isQuiet: boolean;
  quietText?: string | undefined;
  isChosen: boolean;
  canEdit: boolean;
  onFocus: (hole: string) => void;
  onCommit: (row: string, hole: string, value: number) => void;
}

const FORMATS = { mm: lengthFormat('mm'), inch: lengthFormat('inch') };
const ANGLE = plainFormat({ suffix: 'deg', step: 1, digits: 0, example: '15 or −30' });

/** A size in the table that is typed over in place; what cannot be taken is said under it. */
export const FigureCell = memo(function FigureCell(props: FigureCellProps) {
  const { label, kind, value, min, max, unit, isQuiet, isChosen, canEdit } = props;
  const format = kind === 'length' ? FORMATS[unit] : ANGLE;
  const onChange = (changed: number) => props.onCommit(props.row, props.hole, changed);
  const entry = useNumberEntry({ value, format, min, max, onChange });
  const [isFocused, setFocused] = useState(false);
  const look = classNames(isQuiet ? 'text-ink3' : 'text-ink', isChosen && 'font-bold');
  if (!canEdit) return <span className={look}>{props.quietText ?? format.print(value)}</span>;
  return (
    <>
      <input
        type="text"
        aria-label={label}
        aria-invalid={entry.complaint === null ? undefined : true}
        autoComplete="off"
        spellCheck={false}
        value={isFocused ? entry.text : (props.quietText ?? entry.text)}
        onChange={(event) => entry.onType(event.currentTarget.value)}
        onFocus={(event) => {
          setFocused(true);
          // What is typed over is the figure, which takes the place of a dash only after this event.
          requestAnimationFrame(() => event.target.select());
          props.onFocus(props.hole);
        }}
        onBlur={() => {
          setFocused(false);
          entry.commit();
        }}
        onKeyDown={entry.onKeyDown}
        className={classNames(
          'rounded-chip hover:border-line focus:bg-sheet w-full border border-transparent bg-transparent text-center outline-offset-0',
          'aria-invalid:border-stop h-[calc(100%-2px)]',
          look,
        )}
      />
      {entry.complaint !== null && (
        <span
          role="alert"
          className="bg-sheet border-stop text-small text-stop rounded-chip shadow-pop absolute top-full left-1/2 z-20 w-44 -translate-x-1/2 border p-1.5 text-left font-semibold"
        >
          {entry.complaint}
        </span>
      )}
    </>
  );
});
