import type { ReactNode } from 'react';
import type { SaveState } from './auto-saver.ts';
import { timeWords } from './time-words.ts';

interface DraftBandsProps {
  save: SaveState;
  keptOnDevice: boolean;
  mismatchCents: number | null;
  /** The page says already what is wrong with the drawing. */
  isToldBelow: boolean;
}

/** What has to be known about the draft beyond its time: one line each, across the page, gone when it is mended. */
export function DraftBands({ save, keptOnDevice, mismatchCents, isToldBelow }: DraftBandsProps) {
  return (
    <div role="status" aria-live="polite">
      {save.status === 'waiting' && (
        <Band>
          No line since {timeWords(save.since)}. Your work is on this device. Keep going; it will be sent.
        </Band>
      )}
      {save.status === 'refused' && (
        <Band>
          <b>The workshop did not accept the last change.</b> {!isToldBelow && save.problem.detail} What you
          typed stays here.
          {!isToldBelow && save.problem.errors !== undefined && <Reasons errors={save.problem.errors} />}
        </Band>
      )}
      {!keptOnDevice && save.status !== 'saved' && (
        <Band>This device has no room to keep your work. Stay on this page until it is saved.</Band>
      )}
      {mismatchCents !== null && (
        <Band>
          This device and the workshop’s server differ by{' '}
          {Number.isFinite(mismatchCents) ? `${mismatchCents.toFixed(2)} cents` : 'a whole note'} for the same
          sizes. The figures shown are the server’s. Load the page again before you cut anything.
        </Band>
      )}
    </div>
  );
}

function Band({ children }: { children: ReactNode }) {
  return <div className="bg-wait text-data text-ink border-hair px-margin border-b py-1.5">{children}</div>;
}

/** The sentences by field; those that only repeat the answer's own are left out by the server already. */
function Reasons({ errors }: { errors: readonly { path: string; message: string }[] }) {
  return (
    <ul className="mt-1 list-disc pl-5">
      {errors.map(({ path, message }) => (
        <li key={`${path} ${message}`}>{message}</li>
      ))}
    </ul>
  );
}
