/** The tolerance of the verdict: a ratio is over where it exceeds 1 by more than this. */
export const ratioTolerance = 1e-9;

export const isOver = (ratio: number | null): boolean => ratio === null || ratio > 1 + ratioTolerance;

/**
 * Two decimals, rounded up after the tolerance is taken off: 1.003 reads 1.01, 1.0000000005 reads 1.00. What is over never
 * reads 1.00 and what is within never more, whatever the last bits of the product do.
 */
export function formatRatio(ratio: number): string {
  const hundredths = Math.ceil((ratio - ratioTolerance) * 100);
  const agreeing = isOver(ratio) ? Math.max(101, hundredths) : Math.min(100, hundredths);
  return (Math.max(0, agreeing) / 100).toFixed(2);
}
