import { useMemo, useState } from 'react';
import type { Draft } from '#shared/contract/designs.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { documentFaults } from '#shared/document/document-faults.ts';
import { wordsFromFoot } from '#shared/document/fault-words.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { Button } from '../../ui/Button.tsx';
import { Dialog, DialogActions } from '../../ui/Dialog.tsx';
import { conflictRows, firstChoices, mergedDocument, type ConflictRow, type Side } from './conflict-rows.ts';
import { timeWords } from './time-words.ts';
import { valueWords } from '../../bench/value-words.ts';

interface ConflictDialogProps {
  mine: DesignDocument;
  newer: Draft;
  /** What both started from. */
  ancestor: DesignDocument;
  unit: LengthUnit;
  onSettle: (document: DesignDocument, label: string) => void;
}

/** Two people saved one draft: both side by side, value by value, until somebody has chosen. */
export function ConflictDialog({ mine, newer, ancestor, unit, onSettle }: ConflictDialogProps) {
  const theirs = newer.document;
  const who = newer.savedBy.name;
  const rows = useMemo(() => conflictRows(mine, theirs, ancestor), [mine, theirs, ancestor]);
  const words = { before: reading(ancestor, unit), mine: reading(mine, unit), theirs: reading(theirs, unit) };
  const [chosen, setChosen] = useState<Record<string, Side | undefined>>({});
  const choices = { ...firstChoices(rows), ...chosen };
  const open = rows.filter((row) => choices[row.key] === undefined).length;
  const merged = mergedDocument(mine, rows, choices);
  const fault = open === 0 ? documentFaults(merged, wordsFromFoot(unit))[0] : undefined;
  return (
    <Dialog
      open
      onOpenChange={() => undefined}
      dismissible={false}
      width="wide"
      title={`${who} saved this draft while you worked on it`}
      description={`Saved at ${timeWords(newer.savedAt)}, ${rows.length === 1 ? 'one value differs' : `${rows.length} values differ`} from yours. Nothing of either is lost: choose for each, and the rest can be undone.`}
    >
      <div className="overflow-x-auto">
        <table className="text-data w-full border-collapse">
          <thead>
            <tr className="text-small text-ink3 text-left">
              <th className="pr-3 pb-1 font-normal">What differs</th>
              <th className="pr-3 pb-1 font-normal">Before</th>
              <th className="pr-3 pb-1 font-normal">Mine</th>
              <th className="pb-1 font-normal">{who}</th>
            </tr>
          </thead>
          <tbody>
            {rows.map((row) => (
              <ConflictLine
                key={row.key}
                row={row}
                who={who}
                words={words}
                choice={choices[row.key]}
                onChoose={(side) => setChosen((before) => ({ ...before, [row.key]: side }))}
              />
            ))}
          </tbody>
        </table>
      </div>
      <p role="status" className="text-data text-ink2 mt-3 min-h-5">
        {open > 0 && `Both of you changed ${open === 1 ? 'one value' : `${open} values`}: choose there.`}
        {fault !== undefined && `These do not fit together. ${fault.message}`}
      </p>
      <DialogActions>
        <Button onClick={() => onSettle(theirs, `Took the draft of ${who}`)}>Take all of theirs</Button>
        <Button onClick={() => onSettle(mine, 'Kept mine')}>Keep all of mine</Button>
        <Button
          look="go"
          disabled={open > 0 || fault !== undefined}
          onClick={() => onSettle(merged, `Merged with the draft of ${who}`)}
        >
          Use what is chosen
        </Button>
      </DialogActions>
    </Dialog>
  );
}

const reading = (document: DesignDocument, unit: LengthUnit) => (value: unknown, key: string) =>
  valueWords(value, key, { document, unit });

interface ConflictLineProps {
  row: ConflictRow;
  who: string;
  words: Record<'before' | Side, (value: unknown, key: string) => string>;
  choice: Side | undefined;
  onChoose: (side: Side) => void;
}

function ConflictLine({ row, who, words, choice, onChoose }: ConflictLineProps) {
  const key = row.path.at(-1) ?? '';
  const cell = (side: Side, value: unknown) => (
    <td className={`border-hair border-t py-1 pr-3 ${choice === side ? 'bg-mark-soft' : ''}`}>
      <label className="flex min-h-6 cursor-pointer items-center gap-2 pointer-coarse:min-h-11">
        <input
          type="radio"
          name={`conflict-${row.key}`}
          checked={choice === side}
          onChange={() => onChoose(side)}
          aria-label={`${row.label}: ${side === 'mine' ? 'mine' : `that of ${who}`}, ${words[side](value, key)}`}
          className="accent-mark size-4 shrink-0"
        />
        <span className={choice === side ? 'font-semibold' : 'text-ink2'}>{words[side](value, key)}</span>
      </label>
    </td>
  );
  return (
    <tr className={row.changedBy === 'both' && choice === undefined ? 'bg-wait' : undefined}>
      <th scope="row" className="border-hair border-t py-1 pr-3 text-left font-semibold">
        {row.label}
      </th>
      <td className="border-hair text-ink3 border-t py-1 pr-3">{words.before(row.ancestor, key)}</td>
      {cell('mine', row.before)}
      {cell('theirs', row.after)}
    </tr>
  );
}
