import type { ModelSettings } from '../model/model.ts';
import { designContext } from '../wall-design/designContext.ts';
import type { DesignContext } from '../wall-design/designContext.ts';
import type {
  Check,
  DesignRow,
  DesignWall,
  OverwritableCell,
  OwnCells,
  WallDemand,
  WallStory,
} from '../wall-design/designTypes.ts';
import { overwritableCells } from '../wall-design/designTypes.ts';
import { storyLoads } from '../wall-design/storyLoads.ts';

import { bandLimits } from './bandLimits.ts';
import type { Band } from './bandLimits.ts';
import { bandNeeds } from './bandNeeds.ts';
import type { LoadedSection } from './bandNeeds.ts';
import { checkRow, governing } from './checkRow.ts';
import { dowelCell, extendAbove, finishCells, rowQuantities } from './finishRow.ts';
import type { RowPlace } from './finishRow.ts';
import { flexureJudge } from './flexureJudge.ts';
import { planBands, planWithout } from './planBands.ts';
import type { BandPlan, BandTask } from './planBands.ts';

const outOfPlaneNote = 'out-of-plane slenderness to 11.4/11.8 needed';

/** Story sections of a wall with the loads of every basis; the joint at a story's bottom has the weaker of the two concretes. */
function loadedSections(demand: WallDemand): LoadedSection[] {
  const byBasis = demand.forces.map((forces) => storyLoads(demand, forces));
  return demand.stories.map((story, index) => ({
    section: {
      lengthIn: story.lengthIn,
      thicknessIn: story.thicknessIn,
      fcPsi: story.fcPsi,
      storyHeightIn: story.heightIn,
      wallHeightIn: demand.heightIn,
      joint: {
        fcPsi: Math.min(story.fcPsi, demand.stories[index - 1]?.fcPsi ?? story.fcPsi),
        deadKip: demand.deadKip[index] as number,
      },
    },
    groups: byBasis.map((stories) => stories[index] ?? []),
  }));
}

const ownOf = (band: Band): OwnCells => band.pinned?.own ?? {};

function overwrittenCells(own: OwnCells): OverwritableCell[] {
  return overwritableCells.filter((cell) => own[cell] !== undefined);
}

/** The joint in words for the schedule. */
function jointWords(context: DesignContext): string {
  if (context.joint === 'plain') return 'plain';
  return context.units === 'us' ? 'roughened 1/4 in' : 'roughened 6 mm';
}

/** One row with its checks; `plan` is what stands, `above` the plan of the band above. */
function designRow(
  demand: WallDemand,
  band: Band,
  task: BandTask,
  sections: readonly LoadedSection[],
  plan: BandPlan,
  above: BandPlan | null,
  settings: ModelSettings,
  context: DesignContext,
): { row: DesignRow; checks: Check[] } {
  const stories = demand.stories.slice(band.from, band.to + 1);
  const own = ownOf(band);
  const place: RowPlace = { stories, atBase: band.from === 0, above };
  const cells = finishCells(plan, own, place, settings.bars, context);
  const overwritten = overwrittenCells(own);
  const automatic =
    overwritten.length === 0
      ? cells
      : finishCells(planWithout(task, above, settings.bars, context), {}, place, settings.bars, context);
  const checks = checkRow(demand, stories, sections, cells, context);
  const slender = checks.some((check) => check.check === 'axial' && !check.ok);
  const row: DesignRow = {
    wall: demand.wall,
    from: (stories[0] as WallStory).level,
    to: (stories[stories.length - 1] as WallStory).level,
    cells,
    automatic,
    overwritten,
    extendAbove: extendAbove(plan, place, context),
    dowels: dowelCell(plan, place, context),
    joint: jointWords(context),
    trim: null,
    notDesigned: slender ? [outOfPlaneNote] : [],
    ...governing(checks),
    ...rowQuantities(plan, cells, place, context),
  };
  return { row, checks };
}

/**
 * Designs one ordinary wall: bands, the lightest arrangement for each that leaves nothing lighter below than above, the engineer's own
 * cells over it, and every check of every story, basis and expansion. A band that nothing satisfies keeps its strongest arrangement and
 * reads not ok. Pure: equal inputs give equal bits.
 */
export const designWall: DesignWall = (demand, settings, pinned) => {
  const context = designContext(settings);
  const sections = loadedSections(demand);
  const bands = bandLimits(demand.wall, demand.stories, settings.bandStories, pinned).reverse();
  const sectionsOf = (band: Band): LoadedSection[] => sections.slice(band.from, band.to + 1);
  const tasks = bands.map((band): BandTask => {
    const needs = bandNeeds(sectionsOf(band), context);
    return { needs, judge: flexureJudge(needs, context), own: ownOf(band) };
  });
  const plans = planBands(tasks, settings.bars, context);
  const designed = bands.map((band, index) => {
    const above = plans[index - 1] ?? null;
    const plan = plans[index] as BandPlan;
    return designRow(demand, band, tasks[index] as BandTask, sectionsOf(band), plan, above, settings, context);
  });
  return {
    wall: demand.wall,
    rows: designed.map(({ row }) => row),
    checks: designed.flatMap(({ checks }) => checks),
  };
};
