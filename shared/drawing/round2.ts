/** Hundredths of a pixel are enough for a drawing and keep its text short. */
export const round2 = (value: number): number => Math.round(value * 100) / 100;
