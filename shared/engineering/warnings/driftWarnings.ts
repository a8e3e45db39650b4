import type { LoadStandard, Warning } from '../input.ts';
import type { Analysis } from '../stages.ts';

import { heldStories, levelOf, sayRun, storyRuns } from './storyRuns.ts';

/**
 * Torsional irregularity and stability by stories with the same verdict, and stability that could not be checked. Classes of torsion: 7-16
 * has 1a above 1.2 and 1b above 1.4; 7-22 has one above 1.2, with rho 1.3 above 1.4 unless shown otherwise (engineering.md section 3).
 */
export function driftWarnings(
  { model, drifts }: Pick<Analysis, 'model' | 'drifts'>,
  loads: LoadStandard = 'asce7-22',
): Warning[] {
  const { stories } = model;
  const largest = (pick: (drift: (typeof drifts)[number]) => number | null): number[] =>
    stories.map((_, story) =>
      drifts.reduce((most, drift) => (drift.story === story ? Math.max(most, pick(drift) ?? 0) : most), 0),
    );
  const ratios = largest(({ torsionRatio }) => torsionRatio);
  const thetas = largest(({ theta }) => theta);
  const most = (values: readonly number[]): number => values.reduce((a, b) => Math.max(a, b), 0);
  const warnings: Warning[] = [];
  const twisted = storyRuns(
    stories.length,
    (story) => ((ratios[story] ?? 0) > 1.2 ? (ratios[story] ?? 0) : null),
    (ratio) => (ratio > 1.4 ? 'extreme' : ''),
  );
  for (const run of twisted) {
    const ratio = most(run.facts);
    warnings.push({
      code: 'torsional-irregularity',
      level: levelOf(stories, run),
      message: `Torsion ratio up to ${ratio.toFixed(2)} at ${sayRun(stories, run)}, ${torsionClass(ratio, loads)} (ASCE/SEI ${loads === 'asce7-16' ? '7-16' : '7-22'} Table 12.3-1). Accidental torsion is to be amplified by Ax in the categories that ask for it.`,
    });
  }
  for (const run of storyRuns(stories.length, (story) => ((thetas[story] ?? 0) > 0.1 ? (thetas[story] ?? 0) : null))) {
    warnings.push({
      code: 'p-delta',
      level: levelOf(stories, run),
      message: `Stability coefficient up to ${most(run.facts).toFixed(2)} at ${sayRun(stories, run)}, above 0.10: P-delta has to be taken into account and is not in these forces (ASCE/SEI 7 12.8.7).`,
      holds: { walls: null, ...heldStories(stories, run) },
    });
  }
  const seismic = model.cases.some(({ kind }) => kind === 'seismic');
  const missing = stories.filter(({ gravityKip }) => gravityKip === null).length;
  if (seismic && missing > 0) {
    warnings.push({
      code: 'p-delta-not-checked',
      message: `P-delta not checked: floor gravity is not given for ${missing === stories.length ? 'any level' : 'every level'} (column gravity of the levels).`,
    });
  }
  return warnings;
}

function torsionClass(ratio: number, loads: LoadStandard): string {
  if (loads === 'asce7-16') return ratio > 1.4 ? 'above 1.4: extreme, type 1b' : 'above 1.2: type 1a';
  return ratio > 1.4 ? 'above 1.2, and above 1.4: rho 1.3 unless shown otherwise' : 'above 1.2';
}
