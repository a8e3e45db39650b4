import type { BuildingInput, Warning } from '../input.ts';
import { isHeavy } from '../model/buildLoads.ts';
import type { Analysis } from '../stages.ts';
import { unitFactors } from '../units.ts';

import { levelOf, sayRun, storyRuns } from './storyRuns.ts';

const psfPerKipPerIn2 = 1000 * 144;
const kilonewtonsPerSquareMeterPerPsf = 0.047880258980336;

/** `live-heavy`: live load above 100.5 psf over its area that was not classed as heavy (ASCE/SEI 7 4.7.3). */
export function liveWarnings({ settings, tables }: BuildingInput, { model }: Pick<Analysis, 'model'>): Warning[] {
  const { stories } = model;
  const factors = unitFactors[settings.units];
  const heavy = new Map<string, number>();
  for (const row of tables.gravity) {
    const liveKip = (row.live ?? 0) * factors.force;
    const areaIn2 = (row.tributary_area ?? 0) * factors.area;
    if ((row.live_class ?? 'reducible') !== 'reducible' || !isHeavy(row, liveKip, areaIn2)) continue;
    const key = JSON.stringify([row.wall, row.level]);
    heavy.set(key, Math.max(heavy.get(key) ?? 0, (liveKip / areaIn2) * psfPerKipPerIn2));
  }
  if (heavy.size === 0) return [];
  return model.walls.flatMap(({ name }) =>
    storyRuns(stories.length, (story) => heavy.get(JSON.stringify([name, stories[story]?.level])) ?? null).map(
      (run): Warning => {
        const psf = run.facts.reduce((most, one) => Math.max(most, one), 0);
        const said =
          settings.units === 'si'
            ? `${(psf * kilonewtonsPerSquareMeterPerPsf).toFixed(2)} kN/m2`
            : `${psf.toFixed(0)} psf`;
        return {
          code: 'live-heavy',
          level: levelOf(stories, run),
          wall: name,
          message: `Live load of ${name} at ${sayRun(stories, run)} is ${said} over its area, above 100 psf: it counts as heavy, is not reduced, and keeps a factor of 1.0 in the standard's combinations. Class it in the gravity table, or correct load or area.`,
        };
      },
    ),
  );
}
