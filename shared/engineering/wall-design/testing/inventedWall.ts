import type { ModelSettings } from '../../model/model.ts';
import type { Expansion, WallDemand, WallStory } from '../designTypes.ts';

/** Test data, invented: settings, and a wall with forces that grow downward. Used by tests only. */
export const usSettings: ModelSettings = {
  units: 'us',
  code: 'aci318-19',
  wallClass: 'ordinary',
  fyKsi: 60,
  fytKsi: 60,
  lambda: 1,
  coverIn: 0.75,
  edgeIn: 3,
  joint: 'roughened',
  slabThicknessIn: 8,
  flexureFactor: 0.5,
  shearFactor: 1,
  endFactor: 3,
  stiffnessWeightPcf: null,
  concreteWeightPcf: 150,
  selfWeight: true,
  basis: ['rigid'],
  accidental: 0.05,
  amplify: false,
  orthogonal: 0,
  windCases: false,
  liveReduction: false,
  kll: 1,
  cd: 5,
  ie: 1,
  driftLimit: 0.02,
  windDriftFactor: 0.6,
  strengthFactor: { wind: 1, seismic: 1 },
  baseSprings: new Map(),
  liveFactor: 1,
  sds: 0,
  rho: 1,
  omega0: 2.5,
  oopEccentricityIn: 0,
  bandStories: 3,
  bars: {
    web: { sizes: [4, 5, 6, 7, 8], spacings: [6, 8, 9, 10, 12, 14, 16, 18] },
    horizontal: { sizes: [4, 5, 6], spacings: [6, 8, 9, 10, 12, 14, 16, 18] },
    ends: { sizes: [5, 6, 7, 8, 9, 10, 11], spacings: [6, 8, 9, 10, 12, 14, 16, 18] },
    ties: { sizes: [3, 4, 5], spacings: [3, 3.5, 4, 4.5, 5, 6, 8] },
  },
};

export const siSettings: ModelSettings = {
  ...usSettings,
  units: 'si',
  fyKsi: 420 / 6.894757293168361,
  fytKsi: 420 / 6.894757293168361,
  coverIn: 20 / 25.4,
  edgeIn: 75 / 25.4,
  bars: {
    web: { sizes: [13, 16, 19, 22, 25], spacings: [150, 200, 225, 250, 300, 350, 400, 450] },
    horizontal: { sizes: [13, 16, 19], spacings: [150, 200, 225, 250, 300, 350, 400, 450] },
    ends: { sizes: [16, 19, 22, 25, 29, 32, 36], spacings: [150, 200, 225, 250, 300, 350, 400, 450] },
    ties: { sizes: [10, 13, 16], spacings: [75, 90, 100, 115, 125, 150, 200] },
  },
};

export interface InventedWall {
  readonly stories: number;
  readonly lengthIn: number;
  readonly thicknessIn: (story: number) => number;
  readonly fcPsi: (story: number) => number;
  readonly storyHeightIn: number;
  /** dead load that each floor brings, live half of it */
  readonly deadKip: number;
  /** wind force at each floor; the seismic force is 0.8 of it */
  readonly windKip: number;
}

export const middlingWall: InventedWall = {
  stories: 9,
  lengthIn: 216,
  thicknessIn: (story) => (story < 4 ? 12 : 10),
  fcPsi: () => 5000,
  storyHeightIn: 132,
  deadKip: 48,
  windKip: 17,
};

const factors: readonly (readonly [string, number, number, number, number, number])[] = [
  ['1.4D', 1.4, 0, 0, 0, 0],
  ['1.2D + 1.6L', 1.2, 1.6, 0, 0, 0],
  ['1.2D + 1.0W + 1.0L: W positive', 1.2, 1, 0, 1, 0],
  ['1.2D + 1.0W + 1.0L: W negative', 1.2, 1, 0, -1, 0],
  ['0.9D + 1.0W: W positive', 0.9, 0, 0, 1, 0],
  ['0.9D + 1.0W: W negative', 0.9, 0, 0, -1, 0],
  ['0.9D + 1.0E: E positive', 0.9, 0, 0, 0, 1],
  ['0.9D + 1.0E: E negative', 0.9, 0, 0, 0, -1],
];

/** A demand made of an invented wall: equal floor forces, sums taken down by hand-written loops. */
export function inventedDemand(wall: InventedWall): WallDemand {
  const stories: WallStory[] = Array.from({ length: wall.stories }, (_, story) => ({
    story,
    level: `L${String(story + 1)}`,
    heightIn: wall.storyHeightIn,
    bottomElevationIn: story * wall.storyHeightIn,
    topElevationIn: (story + 1) * wall.storyHeightIn,
    lengthIn: wall.lengthIn,
    thicknessIn: wall.thicknessIn(story),
    fcPsi: wall.fcPsi(story),
  }));
  const expansions: Expansion[] = factors.map(([name, D, L, , W, E], index) => ({
    name,
    wind: W !== 0,
    seismic: E !== 0,
    factors: { D, L, Lr: 0, S: 0 },
    gravitySet: index,
  }));
  const size = expansions.length * wall.stories;
  const axialKip = new Float64Array(size);
  const momentKipIn = new Float64Array(size);
  const shearKip = new Float64Array(size);
  factors.forEach(([, D, L, , W, E], index) => {
    for (let story = 0; story < wall.stories; story += 1) {
      const floors = wall.stories - story;
      const at = index * wall.stories + story;
      const force = (W + 0.8 * E) * wall.windKip;
      axialKip[at] = floors * wall.deadKip * (D + 0.5 * L);
      shearKip[at] = floors * force;
      momentKipIn[at] = (floors * (floors + 1) * force * wall.storyHeightIn) / 2;
    }
  });
  return {
    wall: 'W1',
    stories,
    heightIn: wall.stories * wall.storyHeightIn,
    gravitySetCount: expansions.length,
    forces: [{ basis: 'rigid', expansions, axialKip, momentKipIn, shearKip }],
    deadKip: Float64Array.from(stories, (_, story) => (wall.stories - story) * wall.deadKip),
  };
}
