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

/** The group of an axial force among those of a section, made where there is none. Groups are few, so the search is linear. */
function groupOf(groups: LoadGroup[], axialKip: number, seismic: boolean, expansion: number): LoadGroup {
  for (const group of groups) if (group.axialKip === axialKip && group.seismic === seismic) return group;
  const group = {
    axialKip,
    seismic,
    momentKipIn: -1,
    momentExpansion: expansion,
    shearKip: -1,
    shearExpansion: expansion,
  };
  groups.push(group);
  return group;
}

function addTo(group: LoadGroup, momentKipIn: number, shearKip: number, expansion: number): void {
  const moment = Math.abs(momentKipIn);
  const shear = Math.abs(shearKip);
  if (moment > group.momentKipIn) {
    group.momentKipIn = moment;
    group.momentExpansion = expansion;
  }
  if (shear > group.shearKip) {
    group.shearKip = shear;
    group.shearExpansion = expansion;
  }
}

/** Adds one action to the groups of a section. */
export function addAction(
  groups: LoadGroup[],
  axialKip: number,
  momentKipIn: number,
  shearKip: number,
  seismic: boolean,
  expansion: number,
): void {
  addTo(groupOf(groups, axialKip, seismic, expansion), momentKipIn, shearKip, expansion);
}

/**
 * Groups of every story of a wall in one basis, `[story]`, in the order in which expansions first bring an axial force. Expansions of one
 * combination follow each other, so the group of the last one is asked first.
 */
export function storyLoads(demand: WallDemand, forces: WallForces): LoadGroup[][] {
  const count = demand.stories.length;
  const stories: LoadGroup[][] = demand.stories.map(() => []);
  const last: (LoadGroup | undefined)[] = demand.stories.map(() => undefined);
  const { axialKip, momentKipIn, shearKip } = forces;
  for (let index = 0; index < forces.expansions.length; index += 1) {
    const { seismic } = forces.expansions[index] as Expansion;
    for (let story = 0; story < count; story += 1) {
      const at = index * count + story;
      const axial = axialKip[at] as number;
      let group = last[story];
      if (!group || group.axialKip !== axial || group.seismic !== seismic) {
        group = groupOf(stories[story] as LoadGroup[], axial, seismic, index);
        last[story] = group;
      }
      addTo(group, momentKipIn[at] as number, shearKip[at] as number, index);
    }
  }
  return stories;
}
