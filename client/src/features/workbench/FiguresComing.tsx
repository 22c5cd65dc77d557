/** Hangs below the strip while the pale figures are still those of an earlier drawing. */
export function FiguresComing({ isComing }: { isComing: boolean }) {
  return (
    <p role="status" className="absolute top-full left-1/2 mt-1 -translate-x-1/2">
      {isComing && (
        <span className="bg-sheet border-line rounded-chip text-label text-ink2 border px-2">
          Working out the figures…
        </span>
      )}
    </p>
  );
}
