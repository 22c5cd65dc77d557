import type { ComponentProps } from 'react';
import { classNames } from './class-names.ts';

/** The device's own chooser behind our own arrow. */
export function Select({ className, ...select }: ComponentProps<'select'>) {
  return (
    <span className="relative block">
      <select {...select} className={classNames(className, 'appearance-none truncate pr-9')} />
      <svg
        width="11"
        height="7"
        viewBox="0 0 11 7"
        aria-hidden="true"
        className="text-ink2 pointer-events-none absolute top-1/2 right-3.5 -translate-y-1/2"
      >
        <path d="M1 1l4.5 4.5L10 1" fill="none" stroke="currentColor" strokeWidth="1.6" />
      </svg>
    </span>
  );
}
