/**
 * Vertical distribution of a base shear by the equivalent lateral force procedure, ASCE/SEI 7 12.8.3: Fx = Cvx V,
 * Cvx = w h^k / sum(w h^k), k = 1 up to T = 0.5 s, 2 from T = 2.5 s, linear between.
 *
 * Stands outside shared/engineering because a power gives other bits on other machines: the forces are made once, on demand, and stored
 * as input. Weights and base shear in any one unit of force, heights above the base in any one unit of length, the period in seconds.
 */
export interface WeightedLevel {
  readonly level: string;
  readonly weight: number;
  /** of the floor above the base */
  readonly height: number;
}

export interface StoryForce {
  readonly level: string;
  readonly force: number;
  /** sum of the forces at and above */
  readonly shear: number;
}

export function heightExponent(periodSeconds: number): number {
  return Math.min(2, Math.max(1, 1 + (periodSeconds - 0.5) / 2));
}

/** In the order of the levels, from the top down. Null where nothing weighs or nothing stands above the base. */
export function equivalentForces(
  levels: readonly WeightedLevel[],
  baseShear: number,
  periodSeconds: number,
): StoryForce[] | null {
  const k = heightExponent(periodSeconds);
  const parts = levels.map(({ weight, height }) => weight * Math.max(0, height) ** k);
  const sum = parts.reduce((total, part) => total + part, 0);
  if (!(sum > 0) || !Number.isFinite(sum)) return null;
  const forces = parts.map((part) => (baseShear * part) / sum);
  const shears = sumsFromTop(forces);
  return levels.map(({ level }, index) => ({ level, force: forces[index] ?? 0, shear: shears[index] ?? 0 }));
}

/** Story shears of forces from the top down. */
export function sumsFromTop(forces: readonly number[]): number[] {
  let sum = 0;
  return forces.map((force) => (sum += force));
}
