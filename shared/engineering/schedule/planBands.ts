import type { BarLists } from '../input.ts';
import type { DesignContext } from '../wall-design/designContext.ts';
import type { OwnCells } from '../wall-design/designTypes.ts';
import { horizontalBars, wallBars } from '../wall-design/reinforcement.ts';

import type { BandNeeds } from './bandNeeds.ts';
import { chooseHorizontal } from './chooseHorizontal.ts';
import type { HorizontalCell } from './chooseHorizontal.ts';
import { chooseVertical } from './chooseVertical.ts';
import type { VerticalChoice } from './chooseVertical.ts';
import type { CellsAbove } from './choosing.ts';
import type { FlexureJudge } from './flexureJudge.ts';

/** Bars of a band before laps, ties and notes. */
export interface BandPlan extends VerticalChoice {
  readonly horizontal: HorizontalCell;
}

export interface BandTask {
  readonly needs: BandNeeds;
  readonly judge: FlexureJudge;
  readonly own: OwnCells;
}

const mostRounds = 5;

function verticalFor(
  task: BandTask,
  own: OwnCells,
  horizontal: HorizontalCell,
  above: CellsAbove | null,
  used: ReadonlySet<number>,
  lists: BarLists,
  context: DesignContext,
): VerticalChoice {
  return chooseVertical({
    needs: task.needs,
    judge: task.judge,
    lists,
    horizontal: horizontalBars(own.horizontal ?? horizontal, context),
    above,
    used,
    fixed: {
      ...(own.vertical ? { vertical: own.vertical } : {}),
      ...(own.ends === undefined ? {} : { ends: own.ends }),
    },
    context,
  });
}

function horizontalFor(
  task: BandTask,
  vertical: VerticalChoice,
  above: CellsAbove | null,
  used: ReadonlySet<number>,
  lists: BarLists,
  context: DesignContext,
): HorizontalCell {
  const bars = wallBars(vertical, context);
  return chooseHorizontal({ needs: task.needs, lists, bars, above: above?.horizontal ?? null, used, context });
}

/** A first guess at horizontal bars before any are chosen: the smallest of the list at its widest spacing. */
function firstHorizontal(lists: BarLists): HorizontalCell {
  const [size = 0] = [...lists.horizontal.sizes].sort((a, b) => a - b);
  const [spacing = 0] = [...lists.horizontal.spacings].sort((a, b) => b - a);
  return { curtains: 1, bar: size, spacing, end: 'hook' };
}

function samePlan(a: BandPlan, b: BandPlan): boolean {
  const ends =
    a.ends === null || b.ends === null
      ? a.ends === b.ends
      : a.ends.bar === b.ends.bar && a.ends.count === b.ends.count && a.ends.length === b.ends.length;
  const grid = (one: BandPlan['vertical'], other: BandPlan['vertical']): boolean =>
    one.curtains === other.curtains && one.bar === other.bar && one.spacing === other.spacing;
  return ends && a.tied === b.tied && grid(a.vertical, b.vertical) && grid(a.horizontal, b.horizontal);
}

const same = (a: readonly BandPlan[], b: readonly BandPlan[]): boolean =>
  a.length === b.length && a.every((plan, index) => samePlan(plan, b[index] as BandPlan));

/**
 * Bars of all bands of a wall, given and returned from the top band down: vertical steel of all bands, then horizontal steel, in
 * rounds until nothing moves (cover, fit and the bracket of 11.6.2 tie the two), at most five; what is then not settled the checks show.
 * The engineer's own cells stand and count as what the bands below may not undercut.
 */
export function planBands(tasks: readonly BandTask[], lists: BarLists, context: DesignContext): BandPlan[] {
  let plans: BandPlan[] = [];
  for (let round = 0; round < mostRounds; round += 1) {
    const used = new Set<number>();
    const verticals: VerticalChoice[] = [];
    tasks.forEach((task, index) => {
      const before = plans[index]?.horizontal ?? firstHorizontal(lists);
      const aboveVertical = verticals[index - 1];
      const above = aboveVertical ? { ...aboveVertical, horizontal: before } : null;
      const choice = verticalFor(task, task.own, before, above, used, lists, context);
      used.add(choice.vertical.bar);
      if (choice.ends) used.add(choice.ends.bar);
      verticals.push(choice);
    });
    const next: BandPlan[] = [];
    tasks.forEach((task, index) => {
      const vertical = verticals[index] as VerticalChoice;
      const above = next[index - 1] ?? null;
      const horizontal = task.own.horizontal ?? horizontalFor(task, vertical, above, used, lists, context);
      used.add(horizontal.bar);
      next.push({ ...vertical, horizontal });
    });
    if (same(plans, next)) break;
    plans = next;
  }
  return plans;
}

/** What choice would take for one band if the engineer's cells there were released, the bands above as they stand. */
export function planWithout(
  task: BandTask,
  above: CellsAbove | null,
  lists: BarLists,
  context: DesignContext,
): BandPlan {
  const used = new Set<number>(
    above ? [above.vertical.bar, above.horizontal.bar, ...(above.ends ? [above.ends.bar] : [])] : [],
  );
  let horizontal: HorizontalCell = firstHorizontal(lists);
  let plan: BandPlan | null = null;
  for (let round = 0; round < mostRounds; round += 1) {
    const vertical = verticalFor(task, {}, horizontal, above, used, lists, context);
    const chosen = horizontalFor(task, vertical, above, used, lists, context);
    const next = { ...vertical, horizontal: chosen };
    if (plan && same([plan], [next])) break;
    plan = next;
    horizontal = chosen;
  }
  if (!plan) throw new Error('no round was run');
  return plan;
}
