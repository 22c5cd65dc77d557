/** One budget, measured. */
export interface Figure {
  what: string;
  unit: string;
  budget: number;
  /** Whether the figure is to stay below its budget or above it. */
  better: 'less' | 'more';
  median: number;
  /** What 95 of 100 runs keep: at most this where less is better, at least this where more is. */
  p95: number;
  runs: number;
}

type Description = Pick<Figure, 'what' | 'unit' | 'budget'> & { better?: Figure['better'] };

export function figureOf(description: Description, samples: readonly number[]): Figure {
  const better = description.better ?? 'less';
  const sorted = [...samples].sort((a, b) => (better === 'less' ? a - b : b - a));
  return {
    ...description,
    better,
    median: rounded(quantile(sorted, 0.5)),
    p95: rounded(quantile(sorted, 0.95)),
    runs: sorted.length,
  };
}

/** The sample below which the given share of them lies: one that was measured, never a mean of two. */
function quantile(sorted: readonly number[], share: number): number {
  const sample = sorted[Math.max(0, Math.ceil(share * sorted.length) - 1)];
  if (sample === undefined) throw new RangeError('Nothing was measured.');
  return sample;
}

const rounded = (value: number) => Number(value.toPrecision(4));
