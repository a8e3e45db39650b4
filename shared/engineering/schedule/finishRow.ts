import type { BarLists } from '../input.ts';
import { inchesPerFoot, inchesPerMeter } from '../units.ts';
import type { DesignContext } from '../wall-design/designContext.ts';
import type { DesignRow, OwnCells, ScheduleCells, WallStory } from '../wall-design/designTypes.ts';
import { roundUpLength } from '../wall-design/detailLimits.ts';
import { hookLength } from '../wall-design/developmentLength.ts';
import { horizontalBars, readReinforcement, wallBars } from '../wall-design/reinforcement.ts';
import { lapCell, verticalDevelopment } from '../wall-design/rowLaps.ts';

import { chooseTies } from './chooseTies.ts';
import type { BandPlan } from './planBands.ts';
import { rowNotes } from './rowNotes.ts';
import { horizontalMass, tieMass, verticalMass } from './rowMass.ts';

/** A band with its place in the wall. */
export interface RowPlace {
  readonly stories: readonly WallStory[];
  readonly atBase: boolean;
  /** bars of the band above; null at the top */
  readonly above: BandPlan | null;
}

const firstOf = (place: RowPlace): WallStory => place.stories[0] as WallStory;

/**
 * How far vertical bars of a band run past its top where the band above has others (8.7.3-like practice of engineering.md section 6):
 * the larger of 0.8 lw and ld, in or mm. Null at the top and where the bars above are the same.
 */
export function extendAbove(plan: BandPlan, place: RowPlace, context: DesignContext): number | null {
  const { above } = place;
  if (!above) return null;
  const key = ({ vertical, ends }: BandPlan): string => JSON.stringify([vertical, ends]);
  if (key(above) === key(plan)) return null;
  const { lengthIn, fcPsi } = firstOf(place);
  const developmentIn = verticalDevelopment(
    wallBars(plan, context),
    horizontalBars(plan.horizontal, context),
    fcPsi,
    context,
  );
  return roundUpLength(Math.max(0.8 * lengthIn, developmentIn), context.limits);
}

/** Hooked embedment of dowels, ldh of 25.4.3.1 in the wall's own concrete, in or mm. */
function embedments(plan: BandPlan, place: RowPlace, context: DesignContext): { web: number; ends: number | null } {
  const { fyKsi, lambda, rules, limits } = context;
  const bars = wallBars(plan, context);
  const { fcPsi } = firstOf(place);
  const of = (bar: typeof bars.web): number =>
    roundUpLength(hookLength(bar, fyKsi, fcPsi, lambda, rules, limits), limits);
  return { web: of(bars.web), ends: bars.ends && of(bars.ends.bar) };
}

/** All cells of a row from its bars: laps, ties and notes are worked out, the engineer's own cells put over them. */
export function finishCells(
  plan: BandPlan,
  own: OwnCells,
  place: RowPlace,
  lists: BarLists,
  context: DesignContext,
): ScheduleCells {
  const bars = wallBars(plan, context);
  const first = firstOf(place);
  const last = place.stories[place.stories.length - 1] as WallStory;
  const perPlan = context.units === 'us' ? inchesPerFoot : inchesPerMeter;
  // six decimals: enough for an inch in a meter, and free of the noise of conversion
  const plain = (elevationIn: number): number => Math.round((elevationIn / perPlan) * 1e6) / 1e6;
  const elevations = { from: plain(first.bottomElevationIn), to: plain(last.topElevationIn) };
  const automaticTies =
    plan.tied && bars.ends
      ? chooseTies(bars.ends, plan.horizontal.spacing, first.thicknessIn, lists, elevations, context)
      : null;
  const cells = {
    vertical: plan.vertical,
    horizontal: plan.horizontal,
    ends: plan.ends,
    ties: own.ties === undefined ? automaticTies : own.ties,
    laps: own.laps ?? lapCell(bars, horizontalBars(plan.horizontal, context), first.fcPsi, context),
  };
  const notes = rowNotes(
    {
      cells,
      atBase: place.atBase,
      embedment: embedments(plan, place, context),
      extendAbove: extendAbove(plan, place, context),
    },
    context,
  );
  return { ...cells, notes: own.notes ?? notes };
}

/** Dowels at the wall's base: they match the web bars; the notes say those of end zones. Null above the base. */
export function dowelCell(plan: BandPlan, place: RowPlace, context: DesignContext): DesignRow['dowels'] {
  if (!place.atBase) return null;
  const { bar, spacing } = plan.vertical;
  return { bar, count: null, spacing, embedment: embedments(plan, place, context).web };
}

/** Concrete (solid) and steel with laps of a row, in3 and lb. */
export function rowQuantities(
  plan: BandPlan,
  cells: ScheduleCells,
  place: RowPlace,
  context: DesignContext,
): { readonly concreteIn3: number; readonly steelLb: number } {
  const { lengthIn, thicknessIn } = firstOf(place);
  const { limits, coverIn } = context;
  const heightsIn = place.stories.map((story) => story.heightIn);
  const { bars, horizontal, ties, laps } = readReinforcement(cells, context);
  const extraIn = (extendAbove(plan, place, context) ?? 0) * limits.toIn;
  let steelLb = verticalMass(bars, lengthIn, heightsIn, laps, extraIn);
  steelLb += horizontalMass(horizontal, lengthIn, heightsIn, laps.horizontalIn ?? 0, limits);
  if (ties && bars.ends && cells.ties) {
    const { legsAcross } = cells.ties;
    steelLb += tieMass({ ...ties, legsAcross }, bars.ends.lengthIn, thicknessIn, coverIn, heightsIn);
  }
  return { concreteIn3: lengthIn * thicknessIn * heightsIn.reduce((sum, height) => sum + height, 0), steelLb };
}
