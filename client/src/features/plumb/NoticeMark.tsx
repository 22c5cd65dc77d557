import { Popover } from 'radix-ui';
import type { Notice } from '#shared/analysis/prediction.ts';

interface NoticeMarkProps {
  /** What the notices are about, spoken: "E flat 7". */
  about: string;
  notices: readonly Notice[];
  accuracyCents: number | null;
  x: number;
  y: number;
}

/** A small triangle beside a note that opens what has to be known about its figure. */
export function NoticeMark({ about, notices, accuracyCents, x, y }: NoticeMarkProps) {
  return (
    <Popover.Root>
      <Popover.Trigger
        aria-label={`What to know about ${about}`}
        className="absolute top-0 left-0 flex size-6 items-center justify-center"
        style={{ transform: `translate(${x - 12}px, ${y - 12}px)` }}
      >
        <svg width="13" height="12" viewBox="0 0 13 12" aria-hidden="true">
          <path d="M6.5 1L12.2 11H.8Z" className="bench-notice" />
          <path d="M6.5 4.6v3M6.5 9.3v.1" className="bench-notice-mark" />
        </svg>
      </Popover.Trigger>
      <Popover.Portal>
        <Popover.Content
          sideOffset={6}
          collisionPadding={12}
          className="border-hair bg-sheet text-data text-ink shadow-pop rounded-control z-50 flex max-w-80 flex-col gap-2 border p-3"
        >
          {notices.map((notice) => (
            <p key={notice.message}>{notice.message}</p>
          ))}
          {accuracyCents !== null && (
            <p className="text-ink3">
              Expect this figure to be right within {accuracyCents.toFixed(0)} cents.
            </p>
          )}
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  );
}
