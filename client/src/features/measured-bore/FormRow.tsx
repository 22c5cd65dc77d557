import type { ReactNode } from 'react';

interface FormRowProps {
  label: ReactNode;
  children: ReactNode;
}

/** One line of the form under a hairline: what it is at the left, what it is set to at the right. */
export function FormRow({ label, children }: FormRowProps) {
  return (
    <div className="border-hair flex min-h-10 items-center gap-2 border-t py-1">
      <div className="text-label text-ink2 max-[1100px]:text-data min-w-0 flex-1 leading-tight">{label}</div>
      {children}
    </div>
  );
}

/** A figure to type, as one line of the form; its buttons are small where a mouse presses them. */
export function FigureRow({ children }: { children: ReactNode }) {
  return (
    <div className="border-hair text-label text-ink2 max-[1100px]:text-data border-t py-1 min-[1101px]:pointer-fine:[&_button]:w-7">
      {children}
    </div>
  );
}
