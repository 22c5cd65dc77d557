import type { RowMessage } from '#shared/measured-bore/bore-readings.ts';

interface RowMessagesProps {
  messages: readonly RowMessage[];
  onShow: (row: number) => void;
}

/** Beyond this many the rest follows from the first ones. */
const SHOWN = 12;

/** What is wrong with the table, row by row; the row's number leads to it. */
export function RowMessages({ messages, onShow }: RowMessagesProps) {
  if (messages.length === 0) return null;
  const ordered = messages.toSorted((a, b) => a.row - b.row);
  return (
    <section aria-label="What is wrong in the table" className="border-hair border-t py-2">
      <ul className="text-data">
        {ordered.slice(0, SHOWN).map(({ row, message }) => (
          <li key={`${row} ${message}`} className="flex gap-2 py-0.5">
            <button
              type="button"
              onClick={() => onShow(row)}
              className="text-link min-h-6 shrink-0 self-start font-semibold max-[1100px]:min-h-12 pointer-coarse:min-h-12"
            >
              Row {row}
            </button>
            <span className="text-ink2 min-w-0 self-center">{message}</span>
          </li>
        ))}
        {messages.length > SHOWN && (
          <li className="text-ink2 py-0.5">And {messages.length - SHOWN} more rows.</li>
        )}
      </ul>
    </section>
  );
}
