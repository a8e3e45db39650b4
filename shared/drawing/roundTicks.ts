/** Steps of 1, 2 or 5 by powers of ten: two or three round ticks over 0 up to `most`, the largest at or below it. */
export function roundTicks(most: number): readonly number[] {
  if (!(most > 0)) return [];
  let power = 1;
  while (power * 10 <= most) power *= 10;
  while (power > most) power /= 10;
  for (const step of [power * 5, power * 2, power, power / 2, power / 5]) {
    const count = Math.floor(most / step + 1e-9);
    if (count >= 2) return Array.from({ length: Math.min(count, 3) }, (_, index) => step * (index + 1));
  }
  return [power];
}
