import { unitLabels } from '#shared/contracts/quantities';
import type { ResultDocument, ResultLevel } from '#shared/contracts/result';
import type { StackStory } from '#shared/drawing/stackTypes';
import { forceDecimals, formatForce } from '#shared/format/force';
import { formatNumber } from '#shared/format/number';
import { formatRatio } from '#shared/format/ratio';

import type { LevelDrift } from './levelDrifts.ts';

export const stackQuantities = ['shear', 'drift', 'torsion'] as const;
export type StackQuantity = (typeof stackQuantities)[number];

export const quantityTexts: Readonly<Record<StackQuantity, string>> = {
  shear: 'Story shear',
  drift: 'Drift',
  torsion: 'Torsion',
};

export interface StackContent {
  readonly stories: readonly StackStory[];
  readonly caption: string;
  readonly unit: string;
  readonly limit?: number;
}

/** What the stack's bars show: story shear, drift over its limit, or the torsion ratio. */
export function stackContent(
  document: ResultDocument,
  down: readonly ResultLevel[],
  drifts: readonly LevelDrift[],
  quantity: StackQuantity,
  caseName: string,
): StackContent {
  const place = ({ level, elevation, height }: ResultLevel) => ({ level, elevation, height });
  if (quantity === 'shear') {
    const shears = down.map((level) => {
      const { vx = 0, vy = 0 } = level.shear[caseName] ?? {};
      return Math.sqrt(vx * vx + vy * vy);
    });
    const decimals = forceDecimals(shears);
    return {
      stories: down.map((level, index) => ({
        ...place(level),
        value: shears[index] ?? 0,
        text: formatForce(shears[index] ?? 0, decimals),
      })),
      caption: `Story shear ${caseName}`,
      unit: unitLabels.force[document.units],
    };
  }
  if (quantity === 'torsion')
    return {
      stories: down.map((level, index) => {
        const value = drifts[index]?.torsionRatio ?? null;
        return { ...place(level), value, text: value === null ? '–' : formatNumber(value, 2) };
      }),
      caption: `Torsion ratio ${caseName}`,
      unit: '',
      limit: 1.2,
    };
  return {
    stories: down.map((level, index) => {
      const worst = worseOf(drifts[index]);
      return {
        ...place(level),
        value: worst?.ratio ?? null,
        text: worst === null ? '–' : formatRatio(worst.ratio),
        over: worst !== null && !worst.ok,
      };
    }),
    caption: 'Drift over its limit',
    unit: '',
    limit: 1,
  };
}

/** seismic or wind, whichever is nearer to its limit */
function worseOf(drift: LevelDrift | undefined): { readonly ratio: number; readonly ok: boolean } | null {
  const limits = [drift?.seismic, drift?.wind].filter((one) => one !== null && one !== undefined);
  return limits.reduce<(typeof limits)[number] | null>(
    (worst, one) => (worst === null || one.ratio > worst.ratio ? one : worst),
    null,
  );
}
