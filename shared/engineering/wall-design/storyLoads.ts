import type { Expansion, WallDemand, WallForces } from './designTypes.ts';

/**
 * The expansions of one story section that share an axial force, as far as design asks: the largest |M| and |V| and the first
 * expansion that has each. Strength depends on the axial force alone, so nothing else can govern.
 */
export interface LoadGroup {
  readonly axialKip: number;
  /** with E: the dead load that helps a joint is 0.9 - 0.2 SDS */
  readonly seismic: boolean;
  momentKipIn: number;
  momentExpansion: number;
  shearKip: number;
  shearExpansion: number;
}

/** Adds one action to the groups of a section. Groups are few (one per gravity set), so the search is linear. */
export function addAction(
  groups: LoadGroup[],
  axialKip: number,
  momentKipIn: number,
  shearKip: number,
  seismic: boolean,
  expansion: number,
): void {
  const moment = Math.abs(momentKipIn);
  const shear = Math.abs(shearKip);
  for (const group of groups) {
    if (group.axialKip !== axialKip || group.seismic !== seismic) continue;
    if (moment > group.momentKipIn) {
      group.momentKipIn = moment;
      group.momentExpansion = expansion;
    }
    if (shear > group.shearKip) {
      group.shearKip = shear;
      group.shearExpansion = expansion;
    }
    return;
  }
  groups.push({
    axialKip,
    seismic,
    momentKipIn: moment,
    momentExpansion: expansion,
    shearKip: shear,
    shearExpansion: expansion,
  });
}

/** Groups of every story of a wall in one basis, `[story]`, in the order in which expansions first bring an axial force. */
export function storyLoads(demand: WallDemand, forces: WallForces): LoadGroup[][] {
  const count = demand.stories.length;
  const stories: LoadGroup[][] = demand.stories.map(() => []);
  for (let index = 0; index < forces.expansions.length; index += 1) {
    const { seismic } = forces.expansions[index] as Expansion;
    for (let story = 0; story < count; story += 1) {
      const at = index * count + story;
      addAction(
        stories[story] as LoadGroup[],
        forces.axialKip[at] as number,
        forces.momentKipIn[at] as number,
        forces.shearKip[at] as number,
        seismic,
        index,
      );
    }
  }
  return stories;
}
