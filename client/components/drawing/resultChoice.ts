import type { ResultDocument, ResultLevel, Variant } from '#shared/contracts/result';
import type { Basis } from '#shared/engineering/input';

/** Levels from the top down, as stack and tables show them. */
export const levelsDown = (document: ResultDocument): readonly ResultLevel[] =>
  [...document.levels].sort((a, b) => b.elevation - a.elevation);

/** What a page shows: the choice of the address where it exists, else the first basis and case, as typed, in the lowest story. */
export interface ResultChoice {
  readonly bases: readonly Basis[];
  readonly basis: Basis;
  readonly cases: readonly string[];
  readonly case: string;
  readonly variants: readonly Variant[];
  readonly variant: Variant;
  readonly level: ResultLevel;
}

const unique = <T>(values: readonly T[]): readonly T[] => [...new Set(values)];

interface Wanted {
  readonly level: string | null;
  readonly case: string | null;
  readonly variant: Variant;
  readonly basis?: string | null;
}

/** Null where nothing was distributed. */
export function resultChoice(document: ResultDocument, wanted: Wanted): ResultChoice | null {
  const down = levelsDown(document);
  const level = down.find((one) => one.level === wanted.level) ?? down.at(-1);
  const bases = unique(document.distribution.map((one) => one.basis));
  const cases = unique(document.distribution.map((one) => one.case));
  const basis = bases.find((one) => one === wanted.basis) ?? bases[0];
  const chosen = cases.find((name) => name === wanted.case) ?? cases[0];
  if (!level || !basis || chosen === undefined) return null;
  const rows = document.distribution.filter((one) => one.case === chosen && one.basis === basis);
  const variants = unique(rows.map((one) => one.variant));
  const variant = variants.find((one) => one === wanted.variant) ?? variants[0] ?? '0';
  return { bases, basis, cases, case: chosen, variants, variant, level };
}

/** The variant in view where a basis lists it, else the case as built: flexible floors carry no eccentricity. */
export function variantUnder(
  document: Pick<ResultDocument, 'distribution'>,
  basis: Basis,
  caseName: string,
  wanted: Variant,
): Variant {
  const listed = document.distribution.some(
    (one) => one.basis === basis && one.case === caseName && one.variant === wanted,
  );
  return listed ? wanted : '0';
}

/** Variants of a case as words: `as typed`, `e +5 %`. */
export function sayVariant(variant: Variant, accidental: number): string {
  if (variant === '0') return 'e as built';
  const percent = `${Number((accidental * 100).toFixed(2))} %`;
  return variant === '+' ? `+${percent}` : `−${percent}`;
}

/**
 * The wall that a page starts from: the one with the largest force of the case in any story, as built where that was computed. It
 * does not change with the story, so that walking the stack stays with one wall.
 */
export function leadingWall(
  document: ResultDocument,
  chosen: Pick<ResultChoice, 'basis' | 'case' | 'variants'>,
): string | null {
  let leading: { readonly wall: string; readonly total: number } | null = null;
  for (const one of document.distribution) {
    if (one.basis !== chosen.basis || one.case !== chosen.case || one.variant !== chosen.variants[0]) continue;
    if (leading === null || Math.abs(one.total) > Math.abs(leading.total)) leading = one;
  }
  return leading === null ? null : leading.wall;
}
