import type { ReactNode } from 'react';
import { Link } from 'react-router';
import { paths } from '../paths.ts';
import { Mark } from '../ui/Mark.tsx';

/** The frame of pages that need no sign-in: the mark, and room. */
export function PlainFrame({ children }: { children: ReactNode }) {
  return (
    <div className="flex min-h-dvh flex-col">
      <header className="h-top-bar border-hair bg-sheet px-margin flex items-center border-b">
        <Link
          to={paths.home()}
          className="text-ink target flex items-center gap-2.5 text-[17px] font-bold no-underline"
        >
          <Mark />
          Borewright
        </Link>
      </header>
      <main className="flex-1">{children}</main>
    </div>
  );
}
