import { useRef } from 'react';
import { DECIMAL_MARKS, SEPARATORS, type MeasurementTable } from '#shared/measured-bore/measurement-table.ts';
import { FormRow } from './FormRow.tsx';
import { RowMessages } from './RowMessages.tsx';
import { SmallSelect } from './SmallSelect.tsx';
import { SourceForm } from './SourceForm.tsx';
import type { MeasuredBoreDesk } from './use-measured-bore.ts';

interface TableFormProps {
  desk: MeasuredBoreDesk;
  table: MeasurementTable | null;
}

const SEPARATOR_WORDS = { tab: 'tabs', semicolon: 'semicolons', space: 'blanks', comma: 'commas' } as const;
const MARK_WORDS = { point: 'a point, 12.7', comma: 'a comma, 12,7' } as const;
const SEPARATOR_OPTIONS = SEPARATORS.map((value) => ({ value, label: SEPARATOR_WORDS[value] }));
const MARK_OPTIONS = DECIMAL_MARKS.map((value) => ({ value, label: MARK_WORDS[value] }));

/** The table itself, to be mended by hand, with what is wrong in it row by row. */
export function TableForm({ desk, table }: TableFormProps) {
  const fold = useRef<HTMLDetailsElement>(null);
  const text = useRef<HTMLTextAreaElement>(null);
  const { measured } = desk;
  const messages = measured?.status === 'read' ? [...measured.faults, ...measured.doubts] : [];
  const showRow = (row: number) => {
    if (fold.current !== null) fold.current.open = true;
    selectRow(text.current, row);
  };
  return (
    <>
      <RowMessages messages={messages} onShow={showRow} />
      <details ref={fold} className="border-hair border-t" open={measured?.status === 'refused'}>
        <summary className="text-mark target flex cursor-pointer items-center text-[14px] font-semibold">
          The table as it was read
        </summary>
        <div className="pb-2">
          {table !== null && (
            <div className="mb-3">
              <FormRow label="Between columns">
                <span className="w-46 shrink-0">
                  <SmallSelect
                    label="Between columns"
                    value={table.separator}
                    options={SEPARATOR_OPTIONS}
                    onChange={(separator) => desk.mean({ separator, columns: {} })}
                  />
                </span>
              </FormRow>
              <FormRow label="Decimals follow">
                <span className="w-46 shrink-0">
                  <SmallSelect
                    label="Decimals follow"
                    value={table.decimalMark}
                    options={MARK_OPTIONS}
                    onChange={(decimalMark) => desk.mean({ decimalMark })}
                  />
                </span>
              </FormRow>
            </div>
          )}
          <SourceForm desk={desk} rows={10} textRef={text} />
        </div>
      </details>
    </>
  );
}

/** Rows are counted from 1, with blank ones, as spreadsheets do. */
function selectRow(area: HTMLTextAreaElement | null, row: number): void {
  if (area === null) return;
  const lines = area.value.split('\n');
  const from = lines.slice(0, row - 1).reduce((sum, line) => sum + line.length + 1, 0);
  area.focus();
  area.setSelectionRange(from, from + (lines[row - 1]?.length ?? 0));
  // The browser scrolls to what is typed, not to what is selected.
  area.scrollTop = (area.scrollHeight / Math.max(1, lines.length)) * Math.max(0, row - 3);
}
