import { Dialog as Radix } from 'radix-ui';
import { useRef, type ReactNode } from 'react';

interface DialogProps {
  title: string;
  /** One or two sentences under the title; read out with it. */
  description?: ReactNode | undefined;
  open: boolean;
  onOpenChange: (open: boolean) => void;
  /** False for what has to be answered before work goes on. */
  dismissible?: boolean;
  /** A cross at the corner, for what has no verbs of its own. */
  hasClose?: boolean;
  width?: 'narrow' | 'wide';
  children: ReactNode;
}

/** Floats over the page and keeps the focus; only for what cannot be done in place. */
export function Dialog({
  title,
  description,
  open,
  onOpenChange,
  dismissible = true,
  hasClose = false,
  width = 'narrow',
  children,
}: DialogProps) {
  const cameFrom = useRef<HTMLElement | null>(null);
  const hold = (event: Event) => {
    if (!dismissible) event.preventDefault();
  };
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="bg-scrim fixed inset-0 z-40" />
        <Radix.Content
          onOpenAutoFocus={() => {
            const { activeElement } = document;
            cameFrom.current = activeElement instanceof HTMLElement ? activeElement : null;
          }}
          // Most dialogs here come by themselves: nothing was pressed that Radix could give the focus back to.
          onCloseAutoFocus={(event) => {
            event.preventDefault();
            cameFrom.current?.focus();
          }}
          onEscapeKeyDown={hold}
          onPointerDownOutside={hold}
          onInteractOutside={hold}
          {...(description === undefined ? { 'aria-describedby': undefined } : {})}
          className={`rounded-control bg-sheet text-ink shadow-pop fixed top-1/2 left-1/2 z-50 max-h-[calc(100dvh-32px)] w-[calc(100vw-32px)] -translate-x-1/2 -translate-y-1/2 overflow-y-auto p-6 ${width === 'wide' ? 'max-w-190' : 'max-w-115'}`}
        >
          <Radix.Title className="text-title font-semibold">{title}</Radix.Title>
          {description !== undefined && (
            <Radix.Description className="text-ink2 mt-1">{description}</Radix.Description>
          )}
          <div className="mt-4">{children}</div>
          {hasClose && (
            <Radix.Close
              aria-label="Close"
              className="rounded-control text-ink2 hover:text-ink absolute top-3.5 right-3.5 flex size-11 items-center justify-center"
            >
              <svg
                width="14"
                height="14"
                viewBox="0 0 14 14"
                aria-hidden="true"
                stroke="currentColor"
                strokeWidth="1.8"
              >
                <path d="M1 1l12 12M13 1L1 13" />
              </svg>
            </Radix.Close>
          )}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

/** The row of verbs at a dialog's foot; the primary one comes last, at the right. */
export function DialogActions({ children }: { children: ReactNode }) {
  return <div className="mt-6 flex flex-wrap justify-end gap-2">{children}</div>;
}
