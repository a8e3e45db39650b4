import { compressionZones, readReinforcement, sectionOf, strengthOf } from '../wall-design/reinforcement.ts';
import type { DesignContext } from '../wall-design/designContext.ts';
import type { Check, DesignRow, Expansion, ScheduleCells, WallDemand, WallStory } from '../wall-design/designTypes.ts';
import { sectionChecks } from '../wall-design/sectionChecks.ts';

import type { LoadedSection } from './bandNeeds.ts';
import { verticalSteel } from './chooseVertical.ts';

/** Checks of a row's stories, each basis by itself, from the lowest story up. */
export function checkRow(
  demand: WallDemand,
  stories: readonly WallStory[],
  sections: readonly LoadedSection[],
  cells: ScheduleCells,
  context: DesignContext,
): Check[] {
  const first = stories[0] as WallStory;
  const reinforcement = readReinforcement(cells, context);
  const { bars } = reinforcement;
  const zones = compressionZones(bars, reinforcement.ties !== null);
  const bare = compressionZones(bars, false);
  const strength = strengthOf(sectionOf(bars, first, zones, context), context);
  const untied = zones.ends === bare.ends ? strength : strengthOf(sectionOf(bars, first, bare, context), context);
  const steelIn2 = verticalSteel(bars, first.lengthIn);
  return sections.flatMap(({ section, groups }, index) =>
    groups.flatMap((loads, basis) =>
      sectionChecks(section, loads, reinforcement, strength, untied, steelIn2, context).map(
        ({ expansion, ...check }): Check => ({
          basis: (demand.forces[basis] as WallDemand['forces'][number]).basis,
          level: (stories[index] as WallStory).level,
          wall: demand.wall,
          ...check,
          combination:
            expansion === null
              ? null
              : ((demand.forces[basis] as WallDemand['forces'][number]).expansions[expansion] as Expansion).name,
        }),
      ),
    ),
  );
}

/** Checks whose ratio says how much strength or steel is used. The others (counts, spacings, lengths) speak only where they fail. */
const graded = new Set(['flexure', 'shear', 'shear-limit', 'horizontal-steel', 'vertical-steel', 'axial', 'joint']);

/**
 * The check that governs a row: a failing one before any other, then the largest ratio of those that grade strength or steel (a curtain
 * or a lap exactly as required would read 1.00 everywhere and hide them). Ties to the first in list order. No ratio counts as the worst.
 */
export function governing(checks: readonly Check[]): Pick<DesignRow, 'ratio' | 'governs' | 'ok'> {
  const failing = checks.filter((check) => !check.ok);
  const pool = failing.length > 0 ? failing : checks.filter((check) => graded.has(check.check));
  let worst: Check | null = null;
  for (const check of pool) {
    if (!worst || (check.ratio ?? Infinity) > (worst.ratio ?? Infinity)) worst = check;
  }
  if (!worst) return { ratio: null, governs: null, ok: false };
  const { check, clause, combination, level, basis, ratio } = worst;
  return { ratio, governs: { check, clause, combination, level, basis }, ok: failing.length === 0 };
}
