import type { SectionFile } from '../contracts/section.ts';
import { unitFactors } from '../engineering/units.ts';
import { findBar } from '../engineering/wall-design/bars.ts';
import type { DesignContext } from '../engineering/wall-design/designContext.ts';
import { horizontalRatio, thicknessCheck } from '../engineering/wall-design/detailChecks.ts';
import type { PlainCheck } from '../engineering/wall-design/plainCheck.ts';
import { plainCheck } from '../engineering/wall-design/plainCheck.ts';
import {
  compressionZones,
  horizontalBars,
  sectionOf,
  strengthOf,
  wallBars,
} from '../engineering/wall-design/reinforcement.ts';
import type { HorizontalBars } from '../engineering/wall-design/reinforcement.ts';
import type { WallSection } from '../engineering/wall-design/sectionCurve.ts';
import { sectionChecks } from '../engineering/wall-design/sectionChecks.ts';
import { leastRatios, shearDemand, spacingLimits } from '../engineering/wall-design/steelNeeded.ts';
import { addAction } from '../engineering/wall-design/storyLoads.ts';
import type { LoadGroup } from '../engineering/wall-design/storyLoads.ts';
import {
  axialCheck,
  flexureCheck,
  jointCheck,
  shearChecks,
  shearWallOf,
} from '../engineering/wall-design/strengthChecks.ts';
import type { SectionInPlace } from '../engineering/wall-design/strengthChecks.ts';

/** The bars of a section file as the solver takes them, with the checks that such a file allows. */
export interface SectionSteel {
  readonly section: WallSection;
  readonly horizontalRatio: number;
  readonly checks: readonly PlainCheck[];
}

const all = { web: true, ends: true };

function loadsOf(file: SectionFile): LoadGroup[] {
  const { force, moment } = unitFactors[file.units];
  const groups: LoadGroup[] = [];
  file.actions.forEach((action, index) => {
    addAction(groups, action.axial * force, action.moment * moment, action.shear * force, false, index);
  });
  return groups;
}

/** Horizontal steel by itself, where vertical bars are given as layers: its ratio (11.6) and its spacing (11.7.3.1). */
function horizontalChecks(
  place: SectionInPlace,
  groups: readonly LoadGroup[],
  horizontal: HorizontalBars,
  context: DesignContext,
): PlainCheck[] {
  const demand = shearDemand(shearWallOf(place, context), groups, context);
  const rhoT = horizontalRatio(horizontal, place.thicknessIn);
  const least = leastRatios(demand, horizontal.bar, horizontal.bar, rhoT, context).horizontal;
  const clause = demand.low ? 'low-shear' : 'high-shear';
  const limitIn = spacingLimits(demand.low, place.lengthIn, place.thicknessIn, context).horizontalIn;
  const expansion = demand.low ? null : demand.expansion;
  return [
    plainCheck(context, 'horizontal-steel', clause, 'steelRatio', least, rhoT, expansion),
    plainCheck(context, 'spacing', 'spacing-horizontal', 'barLength', horizontal.spacingIn, limitIn, null),
  ];
}

/** Bars given as layers: strength is checked, arrangement only where it is known. */
function layered(
  file: SectionFile,
  layers: NonNullable<SectionFile['layers']>,
  place: SectionInPlace,
  context: DesignContext,
): SectionSteel {
  const { barLength } = unitFactors[file.units];
  const groups = loadsOf(file);
  const section: WallSection = {
    lengthIn: place.lengthIn,
    thicknessIn: place.thicknessIn,
    fcPsi: place.fcPsi,
    fyKsi: context.fyKsi,
    layers: layers.map(({ position, area }) => ({
      positionIn: position * barLength,
      areaIn2: area * barLength * barLength,
      compression: true,
    })),
  };
  const horizontal = file.horizontal
    ? horizontalBars({ ...file.horizontal, end: file.horizontal.end ?? 'hook' }, context)
    : null;
  const rhoT = horizontal ? horizontalRatio(horizontal, place.thicknessIn) : 0;
  const steelIn2 = section.layers.reduce((total, layer) => total + layer.areaIn2, 0);
  const checks = [
    flexureCheck(groups, strengthOf(section, context), context),
    ...shearChecks(place, groups, rhoT, context),
    ...(horizontal ? horizontalChecks(place, groups, horizontal, context) : []),
    thicknessCheck(place.thicknessIn, context),
    axialCheck(place, groups, context),
    jointCheck(place, groups, steelIn2, context),
  ];
  return { section, horizontalRatio: rhoT, checks: checks.filter((check) => check !== null) };
}

/** Reads the bars of a file and runs the checks that it allows. Laps are unknown: `splice` is left out. */
export function sectionSteel(file: SectionFile, place: SectionInPlace, context: DesignContext): SectionSteel {
  if (file.layers) return layered(file, file.layers, place, context);
  const { vertical, horizontal: cell } = file;
  if (!vertical || !cell) throw new Error('a section file without bars passed its checks');
  const bars = wallBars({ vertical, ends: file.ends ?? null }, context);
  const horizontal = horizontalBars({ ...cell, end: cell.end ?? 'hook' }, context);
  const ties = file.ties
    ? { bar: findBar(file.units, file.ties.bar), spacingIn: file.ties.spacing * context.limits.toIn }
    : null;
  const section = sectionOf(bars, place, all, context);
  const untied = sectionOf(bars, place, compressionZones(bars, false), context);
  const checks = sectionChecks(
    place,
    loadsOf(file),
    { bars, horizontal, ties, laps: { webIn: null, endsIn: null, horizontalIn: null, splice: 'no lap' } },
    strengthOf(section, context),
    strengthOf(untied, context),
    section.layers.reduce((total, layer) => total + layer.areaIn2, 0),
    context,
  );
  return { section, horizontalRatio: horizontalRatio(horizontal, place.thicknessIn), checks };
}
