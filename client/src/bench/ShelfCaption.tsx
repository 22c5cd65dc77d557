interface ShelfCaptionProps {
  isBeside: boolean;
  y: number;
  title: string;
  /** Below the heading, where there is room. */
  lines: readonly string[];
  /** The same in one line. */
  sentence: string;
}

/** A heading of the shelf with its words below it, or in one line where there is no room beside. */
export function ShelfCaption({ isBeside, y, title, lines, sentence }: ShelfCaptionProps) {
  if (!isBeside) {
    return (
      <text x={24} y={y - 5} className="bench-quiet-label bore-haloed">
        <tspan className="bench-label-strong">{title}</tspan>
        <tspan dx={8}>{sentence}</tspan>
      </text>
    );
  }
  return (
    <text x={40} y={y} className="bench-quiet-label">
      <tspan className="bench-label-strong">{title}</tspan>
      {lines.map((words) => (
        <tspan key={words} x={40} dy={16.5}>
          {words}
        </tspan>
      ))}
    </text>
  );
}
