import { useEffect, useState, type ReactNode } from 'react';

/** A bench without its instrument: while it comes, and where it cannot come. */
export function EmptyBench({ children }: { children: ReactNode }) {
  return (
    <div>
      <div className="bg-bench border-hair h-54.5 border-b" />
      <div className="px-margin text-ink2 py-6">{children}</div>
    </div>
  );
}

/** After so long a wait is worth a word, ms. */
const PATIENT_MS = 4000;

export function BenchWaiting() {
  const [isLong, setLong] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setLong(true), PATIENT_MS);
    return () => clearTimeout(timer);
  }, []);
  return (
    <EmptyBench>
      <p role="status">{isLong ? 'Fetching the drawing…' : ''}</p>
    </EmptyBench>
  );
}
