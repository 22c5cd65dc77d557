interface SideMarkProps {
  side: 'a' | 'b';
  label: string;
}

/** Which of the two: a dashed ring for the older, a disc for the one in hand, and its label. */
export function SideMark({ side, label }: SideMarkProps) {
  return (
    <span className="text-data inline-flex items-center gap-1.5 whitespace-nowrap">
      <svg width="16" height="16" viewBox="-8 -8 16 16" aria-hidden="true" className="shrink-0 self-center">
        {side === 'a' ? (
          <circle r="6.2" className="bench-bob-hollow" />
        ) : (
          <circle r="6.8" className="bench-bob1" />
        )}
      </svg>
      {label}
    </span>
  );
}
