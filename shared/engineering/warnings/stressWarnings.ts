import type { Warning } from '../input.ts';
import type { Analysis, WallOutcome } from '../stages.ts';
import { unitFactors } from '../units.ts';
import { barOrNull } from '../wall-design/bars.ts';
import type { DesignRow } from '../wall-design/designTypes.ts';

import { sayStress } from './sayAmount.ts';
import { levelOf, sayRun, storyRuns } from './storyRuns.ts';
import { wallExtremes } from './wallExtremes.ts';

/** Limits of plausibility: common practice, no source (engineering.md section 8). */
const webSteelLimit = 0.01;
const endSteelLimit = 0.04;
const axialLimit = 0.35;
const shearRootLimit = 6;

/** `plausibility-shear`, `plausibility-axial`, `plausibility-steel`, `plausibility-ends`: walls that are worked hard. */
export function stressWarnings({ model }: Pick<Analysis, 'model'>, outcomes: readonly WallOutcome[]): Warning[] {
  return outcomes.flatMap(({ demand, design }) => [
    ...forceWarnings(model, demand),
    ...design.rows.flatMap((row) => steelWarnings(model, demand, row)),
  ]);
}

function forceWarnings({ stories, settings }: Analysis['model'], demand: WallOutcome['demand']): Warning[] {
  if (demand.forces.every(({ expansions }) => expansions.length === 0)) return [];
  const extremes = wallExtremes(demand);
  const first = demand.stories[0]?.story ?? 0;
  const { units } = settings;
  const overOf = (stress: 'shearPsi' | 'axialPsi', limitOf: (fcPsi: number) => number) =>
    storyRuns(stories.length, (story) => {
      const psi = extremes[story - first]?.[stress];
      const limit = limitOf(demand.stories[story - first]?.fcPsi ?? 0);
      return psi !== undefined && psi > limit ? { psi, limit } : null;
    }).map((run) => ({ run, worst: run.facts.reduce((a, b) => (b.psi / b.limit > a.psi / a.limit ? b : a)) }));
  const shear = overOf('shearPsi', (fcPsi) => shearRootLimit * Math.sqrt(fcPsi)).map(({ run, worst }): Warning => ({
    code: 'plausibility-shear',
    level: levelOf(stories, run),
    wall: demand.wall,
    message: `Vu of ${demand.wall} at ${sayRun(stories, run)} is up to ${sayStress(worst.psi, units)} of Acv, above 6 sqrt(f'c) = ${sayStress(worst.limit, units)} (common practice): little is left below the limit of the section. A thicker or longer wall is the usual answer.`,
  }));
  const axial = overOf('axialPsi', (fcPsi) => axialLimit * fcPsi).map(({ run, worst }): Warning => ({
    code: 'plausibility-axial',
    level: levelOf(stories, run),
    wall: demand.wall,
    message: `Pu of ${demand.wall} at ${sayRun(stories, run)} is up to ${sayStress(worst.psi, units)} of Ag, above 0.35 f'c = ${sayStress(worst.limit, units)} (common practice): the wall has little ductility and creeps. Check the gravity that was brought in.`,
  }));
  return [...shear, ...axial];
}

/** Areas over the whole thickness; end zones over their own area. */
function steelWarnings({ settings }: Analysis['model'], demand: WallOutcome['demand'], row: DesignRow): Warning[] {
  const { units } = settings;
  const toIn = unitFactors[units].barLength;
  const thicknessIn = demand.stories.find(({ level }) => level === row.from)?.thicknessIn ?? 0;
  const areaOf = (bar: number): number => barOrNull(units, bar)?.areaIn2 ?? 0;
  const { vertical, horizontal, ends } = row.cells;
  const at = { level: row.from, wall: row.wall };
  const range = row.from === row.to ? row.from : `${row.from} to ${row.to}`;
  const warnings: Warning[] = [];
  if (thicknessIn === 0) return [];
  const webs = [
    { name: 'vertical', layer: vertical },
    { name: 'horizontal', layer: horizontal },
  ].map(({ name, layer }) => ({
    name,
    ratio: (layer.curtains * areaOf(layer.bar)) / (layer.spacing * toIn * thicknessIn),
  }));
  const heavy = webs.filter(({ ratio }) => ratio > webSteelLimit);
  if (heavy.length > 0) {
    const said = heavy.map(({ name, ratio }) => `${name} ${(100 * ratio).toFixed(2)} %`).join(' and ');
    warnings.push({
      code: 'plausibility-steel',
      ...at,
      message: `Distributed steel of ${row.wall} at ${range}: ${said}, above 1 % (common practice): the wall is hard to build and to pour. A thicker wall or end zones are the usual answer.`,
    });
  }
  const endRatio = ends ? (ends.count * areaOf(ends.bar)) / (ends.length * toIn * thicknessIn) : 0;
  if (endRatio > endSteelLimit) {
    warnings.push({
      code: 'plausibility-ends',
      ...at,
      message: `End zones of ${row.wall} at ${range} hold ${(100 * endRatio).toFixed(1)} % of steel, above 4 % (common practice): laps double it. Longer end zones or a longer wall are the usual answer.`,
    });
  }
  return warnings;
}
