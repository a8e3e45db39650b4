import type { BuildingInput, Settings } from '../input.ts';
import { unitFactors } from '../units.ts';

import { buildGravity, buildLoadCases } from './buildLoads.ts';
import { addGravityTransfers } from './addGravityTransfers.ts';
import { buildOverrides } from './buildOverrides.ts';
import { buildStories, buildStoryHeights } from './buildStories.ts';
import { buildWalls } from './buildWalls.ts';
import type { Model, ModelSettings } from './model.ts';

/**
 * The kip-inch model of a building whose tables passed `checkTables`. The only place where typed units become internal ones.
 */
export function toModel(input: BuildingInput): Model {
  const { settings, tables } = input;
  const heights = buildStoryHeights(tables.levels, settings);
  const walls = buildWalls(tables.walls, heights, settings);
  const stories = buildStories(heights, walls, settings);
  const cases = buildLoadCases(tables.forces, stories, settings);
  const overrides = buildOverrides(tables.overrides, stories, walls, settings);
  const gravity = buildGravity(tables.gravity, stories, walls, settings);
  addGravityTransfers(gravity, overrides, cases, walls.length);
  return {
    settings: toModelSettings(settings),
    stories,
    walls,
    cases,
    gravity,
    overrides,
  };
}

/** Allowable story drift, all other structures: ASCE/SEI 7 Table 12.12-1 by risk category. */
const driftLimits = { I: 0.02, II: 0.02, III: 0.015, IV: 0.01 } as const;

export function toModelSettings(settings: Settings): ModelSettings {
  const factors = unitFactors[settings.units];
  const { stiffness } = settings;
  return {
    units: settings.units,
    code: settings.code,
    wallClass: settings.wallClass,
    fyKsi: settings.fy * factors.steelStrength,
    fytKsi: settings.fyt * factors.steelStrength,
    lambda: settings.lambda,
    coverIn: settings.cover * factors.barLength,
    edgeIn: settings.edge * factors.barLength,
    joint: settings.joint,
    slabThicknessIn: settings.slabThickness * factors.barLength,
    flexureFactor: stiffness.flexure,
    shearFactor: stiffness.shear,
    endFactor: stiffness.end === 'fixed' ? 12 : 3,
    stiffnessWeightPcf: stiffness.unitWeight === null ? null : stiffness.unitWeight * factors.density,
    selfWeight: settings.selfWeight,
    concreteWeightPcf: settings.concreteWeight * factors.density,
    basis: settings.basis,
    accidental: settings.accidental,
    amplify: settings.amplify,
    orthogonal: settings.orthogonal,
    windCases: settings.windCases,
    liveReduction: settings.liveReduction,
    kll: settings.kll,
    cd: settings.cd,
    ie: settings.ie,
    driftLimit: settings.driftLimit ?? driftLimits[settings.riskCategory],
    windDriftFactor: settings.windDriftFactor,
    strengthFactor: settings.forceLevel === 'service' ? { wind: 1 / 0.6, seismic: 1 / 0.7 } : { wind: 1, seismic: 1 },
    baseSprings: new Map(Object.entries(settings.baseSprings).map(([wall, value]) => [wall, value * factors.moment])),
    liveFactor: settings.liveFactor,
    sds: settings.sds,
    rho: settings.rho,
    omega0: settings.omega0,
    oopEccentricityIn: settings.oopEccentricity * factors.barLength,
    bandStories: settings.bandStories,
    bars: settings.bars,
  };
}
