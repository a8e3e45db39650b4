import type { Warning } from '../input.ts';
import type { Analysis } from '../stages.ts';

/** Torsional irregularity by level, stability, and stability that could not be checked. */
export function driftWarnings(analysis: Analysis): Warning[] {
  const { model, drifts } = analysis;
  const warnings: Warning[] = [];
  model.stories.forEach((level, story) => {
    const here = drifts.filter((drift) => drift.story === story);
    const ratio = here.reduce((most, drift) => Math.max(most, drift.torsionRatio ?? 0), 0);
    if (ratio > 1.2) {
      warnings.push({
        code: 'torsional-irregularity',
        level: level.level,
        message: `Torsion ratio ${ratio.toFixed(2)} at ${level.level}, above 1.2${ratio > 1.4 ? ' and above 1.4: extreme; rho 1.3 unless shown otherwise' : ''} (ASCE/SEI 7 Table 12.3-1). Accidental torsion is to be amplified by Ax in the categories that ask for it.`,
      });
    }
    const theta = here.reduce((most, drift) => Math.max(most, drift.theta ?? 0), 0);
    if (theta > 0.1) {
      warnings.push({
        code: 'p-delta',
        level: level.level,
        message: `Stability coefficient ${theta.toFixed(2)} at ${level.level}, above 0.10: P-delta has to be taken into account (ASCE/SEI 7 12.8.7).`,
      });
    }
  });
  const seismic = model.cases.some(({ kind }) => kind === 'seismic');
  if (seismic && drifts.length > 0 && model.stories.some(({ gravityKip }) => gravityKip === null)) {
    warnings.push({
      code: 'p-delta-not-checked',
      message: 'P-delta not checked: floor gravity is not given for every level (column gravity of the levels).',
    });
  }
  return warnings;
}
