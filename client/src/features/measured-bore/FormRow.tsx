import type { ReactNode } from 'react';

interface FormRowProps {
  label: ReactNode;
  children: ReactNode;
}

/** One line of the form under a hairline: what it is at the left, what it is set to at the right. */
export function FormRow({ label, children }: FormRowProps) {
  return (
    <div className="border-hair flex min-h-10 items-center gap-2 border-t py-1">
      <div className="text-data text-ink2 min-w-0 flex-1 leading-tight">{label}</div>
      {children}
    </div>
  );
}
