/** The mark: a plumb bob hanging in a bore. */
export function Mark({ size = 26 }: { size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 26 26" aria-hidden="true" className="shrink-0">
      <circle cx="13" cy="13" r="11.2" fill="none" stroke="currentColor" strokeWidth="2.4" />
      <line x1="13" y1="1.8" x2="13" y2="13.6" stroke="currentColor" strokeWidth="1.8" />
      <path d="M13 12.2l3.4 4.4-3.4 5-3.4-5z" fill="currentColor" />
    </svg>
  );
}
