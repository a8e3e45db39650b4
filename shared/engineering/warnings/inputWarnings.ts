import type { FactoredCombination } from '../combinations/expandCombinations.ts';
import type { BuildingInput, Warning } from '../input.ts';
import type { Analysis } from '../stages.ts';
import { unitFactors } from '../units.ts';

const highSeismicCategories = ['D', 'E', 'F'];

/** What the typed criteria leave open: each says why it matters. */
export function criteriaWarnings(building: BuildingInput, analysis: Analysis): Warning[] {
  const { settings } = building;
  const { stories } = analysis.model;
  const warnings: Warning[] = [];
  const seismic = analysis.model.cases.some((loadCase) => loadCase.kind === 'seismic');
  const missing = ['sds', 'sdc', 'rho'].filter((name) => !settings.given.includes(name));
  if (seismic && missing.length > 0) {
    warnings.push({
      code: 'criteria-missing',
      message: `A seismic case is given, but not ${missing.join(', ')}: their defaults enter the combinations. State them in the settings.`,
    });
  }
  if (settings.wallClass === 'ordinary' && settings.sdc !== null && highSeismicCategories.includes(settings.sdc)) {
    warnings.push({
      code: 'ordinary-class',
      message: `Seismic design category ${settings.sdc} asks for special structural walls (ASCE/SEI 7 Table 12.2-1); these are designed as ordinary ones.`,
      holds: { walls: null, from: stories[0]?.level ?? '', to: stories[stories.length - 1]?.level ?? '' },
    });
  }
  return warnings;
}

/** Cases in no combination, and loads that a combination names but nobody can enter. */
export function combinationWarnings(
  analysis: Analysis,
  combinations: readonly FactoredCombination[],
  zeroLoads: readonly string[],
): Warning[] {
  const symbolOf = { wind: 'W', seismic: 'E', other: 'H' } as const;
  const warnings = analysis.model.cases.flatMap((loadCase): Warning[] => {
    const symbol = symbolOf[loadCase.kind];
    if (combinations.some(({ factors }) => factors[symbol] !== 0)) return [];
    return [
      {
        code: 'case-not-combined',
        message: `Case ${loadCase.name} is in no combination: no combination has a term in ${symbol}. Its forces are distributed and taken down, but no wall is designed for them.`,
      },
    ];
  });
  if (zeroLoads.length > 0) {
    warnings.push({
      code: 'loads-read-zero',
      message: `${zeroLoads.join(', ')} in the combinations ${zeroLoads.length === 1 ? 'counts' : 'count'} as 0: no table brings ${zeroLoads.length === 1 ? 'it' : 'them'} in.`,
    });
  }
  return warnings;
}

/** The engineer's own base shears against those that the forces add up to. A difference above 0.5 % is said. */
export function baseShearWarnings(building: BuildingInput, analysis: Analysis): Warning[] {
  const { settings } = building;
  const toKip = unitFactors[settings.units].force;
  const unit = settings.units === 'us' ? 'kip' : 'kN';
  return Object.entries(settings.expectedBaseShear).flatMap(([name, expected]): Warning[] => {
    const loadCase = analysis.model.cases.find((candidate) => candidate.name === name);
    if (!loadCase) {
      return [
        {
          code: 'base-shear-differs',
          message: `A base shear of ${expected} ${unit} is expected for ${name}, but forces hold no such case.`,
        },
      ];
    }
    const sum = (column: Float64Array) => column.reduce((total, value) => total + value, 0) / toKip;
    const found = Math.max(Math.abs(sum(loadCase.fxKip)), Math.abs(sum(loadCase.fyKip)));
    if (Math.abs(found - Math.abs(expected)) <= 0.005 * Math.abs(expected)) return [];
    return [
      {
        code: 'base-shear-differs',
        message: `The forces of ${name} add up to ${found.toFixed(1)} ${unit} at the base; the load sheet says ${expected}.`,
      },
    ];
  });
}

/** Story shears act at each level's own point: a point typed beside one moves nothing (engineering.md section 5). */
export function storyShearWarnings({ settings, tables }: BuildingInput): Warning[] {
  if (settings.forcesAre !== 'story-shear') return [];
  const pointed = tables.forces.filter(({ x, y }) => x !== null || y !== null);
  const cases = [...new Set(pointed.map((row) => row.case))];
  if (cases.length === 0) return [];
  return [
    {
      code: 'points-not-used',
      message: `x and y of ${cases.join(', ')} are stored but not used: forces are entered as story shears, and the level forces made of them act at each level's own point. Give the torque as mz.`,
    },
  ];
}
