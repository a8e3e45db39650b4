/**
 * Whether a value agrees with a printed one by a tolerance as the published cases state it: `rel 0.0005`, or
 * `rel 0, abs 5.1e-06`.
 */
export function withinTolerance(value: number, printed: number, tolerance: string): boolean {
  const relative = /rel ([\d.e+-]+)/.exec(tolerance)?.[1];
  const absolute = /abs ([\d.e+-]+)/.exec(tolerance)?.[1];
  if (relative === undefined && absolute === undefined) return false;
  return Math.abs(value - printed) <= Number(relative ?? 0) * Math.abs(printed) + Number(absolute ?? 0);
}
