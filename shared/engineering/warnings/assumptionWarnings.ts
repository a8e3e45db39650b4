import type { Warning } from '../input.ts';
import type { Analysis } from '../stages.ts';

import { sayNames } from './sayAmount.ts';

/** What is assumed or left to the engineer in every building: `base-fixed`, `out-of-plane`, `collectors` (engineering.md section 8). */
export function assumptionWarnings({
  model,
  displacements,
  effects,
}: Pick<Analysis, 'model' | 'displacements' | 'effects'>): Warning[] {
  const warnings: Warning[] = [];
  if (displacements !== null) {
    const sprung = model.walls.map(({ name }) => name).filter((name) => model.settings.baseSprings.has(name));
    const except = sprung.length === 0 ? '' : `, ${sayNames(sprung)} on rotation springs`;
    warnings.push({
      code: 'base-fixed',
      message: `The whole-height solution holds every wall fixed at its base${except}: footings and soil that give way let drifts grow and move shear between walls. State base springs where that matters.`,
    });
  }
  warnings.push({
    code: 'out-of-plane',
    message:
      'Walls are designed for forces in their plane. Wind and seismic forces across them and slenderness are outside: the out-of-plane aid of each story looks at axial load and in-plane moment only (ACI 318 11.5.3, 11.8; ASCE/SEI 7 12.11).',
  });
  warnings.push({
    code: 'collectors',
    message: `Floors are taken to bring every wall its force. What each wall takes from each floor is listed with the takedown${effects === null ? '' : ', assigned transfers beside it'}; collectors, chords and the diaphragm's own shear are designed outside (ASCE/SEI 7 12.10).`,
  });
  return warnings;
}
