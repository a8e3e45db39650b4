import type { ResultCheck, ResultDocument, ResultLevel, Variant } from '#shared/contracts/result';

export interface DriftLimit {
  readonly demand: number;
  readonly limit: number;
  readonly ratio: number;
  readonly ok: boolean;
  /** case and variant that govern */
  readonly governs: string;
}

export interface LevelDrift {
  readonly level: string;
  /** elastic, of the case and variant in view, as ratios of the story height */
  readonly x: number | null;
  readonly y: number | null;
  readonly edge: number | null;
  /** the largest over the variants of the case: torsion is asked with accidental eccentricity */
  readonly torsionRatio: number | null;
  readonly ax: number | null;
  readonly theta: number | null;
  readonly seismic: DriftLimit | null;
  readonly wind: DriftLimit | null;
}

export type TorsionClass = 'regular' | 'irregular' | 'extreme';

/** ASCE/SEI 7 Table 12.3-1: irregular above 1.2, extreme above 1.4. */
export const torsionClass = (ratio: number): TorsionClass =>
  ratio > 1.4 ? 'extreme' : ratio > 1.2 ? 'irregular' : 'regular';

/** Drift, torsion and stability of every level from the top down; nulls where the whole-height solution is not there. */
export function levelDrifts(
  document: Pick<ResultDocument, 'drifts' | 'checks'>,
  down: readonly ResultLevel[],
  chosen: { readonly case: string; readonly variant: Variant },
): readonly LevelDrift[] {
  const ofCase = document.drifts.filter((one) => one.case === chosen.case);
  return down.map(({ level }) => {
    const here = ofCase.filter((one) => one.level === level);
    const own = here.find((one) => one.variant === chosen.variant) ?? here[0];
    return {
      level,
      x: own?.x ?? null,
      y: own?.y ?? null,
      edge: own?.edge ?? null,
      torsionRatio: largest(here.map((one) => one.torsionRatio)),
      ax: largest(here.map((one) => one.ax)),
      theta: largest(here.map((one) => one.theta)),
      seismic: limitAt(document.checks, level, 'drift'),
      wind: limitAt(document.checks, level, 'drift-wind'),
    };
  });
}

/** Total wind drift of the building against its limit. */
export function totalWindDrift(document: Pick<ResultDocument, 'checks'>): DriftLimit | null {
  const row = document.checks.find((one) => one.check === 'drift-wind-total' && one.wall === '');
  return row === undefined ? null : toLimit(row);
}

function limitAt(checks: readonly ResultCheck[], level: string, check: string): DriftLimit | null {
  const row = checks.find((one) => one.check === check && one.level === level && one.wall === '');
  return row === undefined ? null : toLimit(row);
}

function toLimit({ demand, capacity, ratio, ok, combination }: ResultCheck): DriftLimit | null {
  if (capacity === null || ratio === null) return null;
  return { demand, limit: capacity, ratio, ok, governs: combination ?? '' };
}

function largest(values: readonly (number | null)[]): number | null {
  return values.reduce<number | null>((most, value) => (value === null ? most : Math.max(value, most ?? value)), null);
}
