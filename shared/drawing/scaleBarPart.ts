/** Length of one of the four parts of the scale bar: round, and at least 28 px long. */
export function scaleBarPart(pixelsPerLength: number, units: 'us' | 'si'): number {
  const steps = units === 'us' ? [2, 5, 10, 20, 50, 100, 200] : [1, 2, 5, 10, 20, 50];
  return steps.find((step) => step * pixelsPerLength >= 28) ?? steps[steps.length - 1] ?? 1;
}
