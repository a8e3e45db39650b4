import { unitLabels } from '../contracts/quantities.ts';
import type { ResultAction, ResultCheck, ResultQuantities, ResultRow } from '../contracts/result.ts';
import { governingExpansions } from '../engineering/combinations/governingExpansions.ts';
import type { UnitSystem } from '../engineering/input.ts';
import type { Analysis, WallOutcome } from '../engineering/stages.ts';
import type { UnitFactors } from '../engineering/units.ts';
import { megapascalsPerPsi } from '../engineering/units.ts';
import type { Check, CheckQuantity, DesignRow } from '../engineering/wall-design/designTypes.ts';

import { levelsInWords } from './levelsInWords.ts';

interface CheckUnit {
  readonly unit: string;
  /** building's value = internal value / factor */
  readonly factor: number;
}

function checkUnit(quantity: CheckQuantity, system: UnitSystem, units: UnitFactors): CheckUnit {
  switch (quantity) {
    case 'force':
      return { unit: unitLabels.force[system], factor: units.force };
    case 'moment':
      return { unit: unitLabels.moment[system], factor: units.moment };
    case 'barLength':
      return { unit: unitLabels.thickness[system], factor: units.barLength };
    case 'stress':
      return { unit: unitLabels.concreteStrength[system], factor: system === 'us' ? 1 : 1 / megapascalsPerPsi };
    case 'steelRatio':
    case 'count':
    case 'none':
      return { unit: '', factor: 1 };
  }
}

export function checkRows(walls: readonly WallOutcome[], system: UnitSystem, units: UnitFactors): ResultCheck[] {
  return walls.flatMap(({ design }) =>
    design.checks.map((check) => {
      const { unit, factor } = checkUnit(check.quantity, system, units);
      return {
        basis: check.basis,
        level: check.level,
        wall: check.wall,
        check: check.check,
        demand: check.demand / factor,
        capacity: check.capacity === null ? null : check.capacity / factor,
        unit,
        ratio: check.ratio,
        clause: check.clause,
        combination: check.combination,
        ok: check.ok,
      };
    }),
  );
}

/**
 * The worst of the bases for each wall, story and check, as rows of the basis `envelope`: nothing is mixed, a row is one of those above.
 */
export function envelopeRows(walls: readonly WallOutcome[], system: UnitSystem, units: UnitFactors): ResultCheck[] {
  const worst = new Map<string, ResultCheck>();
  for (const row of checkRows(walls, system, units)) {
    const key = `${row.wall}\n${row.level}\n${row.check}`;
    const known = worst.get(key);
    const rank = (check: ResultCheck) => (check.ratio ?? Number.POSITIVE_INFINITY) + (check.ok ? 0 : 1e9);
    if (!known || rank(row) > rank(known)) worst.set(key, row);
  }
  return [...worst.values()].map((row) => ({ ...row, basis: 'envelope' }));
}

/** Factored actions of one wall that govern an extreme or a check; every expansion with `all`. From the top down, basis by basis. */
export function wallActions({ demand, design }: WallOutcome, units: UnitFactors, all: boolean): ResultAction[] {
  const count = demand.stories.length;
  return demand.forces.flatMap((forces) => {
    const indexOf = new Map(forces.expansions.map((expansion, index) => [expansion.name, index] as const).reverse());
    const named = combinationsByPlace(design.checks, forces.basis, indexOf);
    return [...demand.stories].reverse().flatMap((section) => {
      const story = demand.stories.indexOf(section);
      const chosen = all
        ? forces.expansions.map((_, index) => index)
        : [...new Set([...governingExpansions(demand, forces, story), ...(named.get(section.level) ?? [])])].sort(
            (a, b) => a - b,
          );
      return chosen.map((index) => ({
        basis: forces.basis,
        level: section.level,
        wall: demand.wall,
        combination: forces.expansions[index]?.name ?? '',
        axial: (forces.axialKip[index * count + story] ?? 0) / units.force,
        moment: (forces.momentKipIn[index * count + story] ?? 0) / units.moment,
        shear: (forces.shearKip[index * count + story] ?? 0) / units.force,
      }));
    });
  });
}

/** Places of a basis's combinations named by its checks, by level. */
function combinationsByPlace(checks: readonly Check[], basis: string, indexOf: ReadonlyMap<string, number>) {
  const places = new Map<string, number[]>();
  for (const check of checks) {
    const index = check.combination === null ? undefined : indexOf.get(check.combination);
    if (index === undefined || check.basis !== basis) continue;
    const key = check.level;
    const list = places.get(key) ?? [];
    list.push(index);
    places.set(key, list);
  }
  return places;
}

/** Rows of the schedule; `unsettled` says whether a wall's band from a story up waits for an engineer's decision. */
export function scheduleRows(
  analysis: Analysis,
  walls: readonly WallOutcome[],
  units: UnitFactors,
  unsettled: (wall: string, fromStory: number) => boolean,
): { readonly rows: DesignRow[]; readonly schedule: ResultRow[] } {
  const { stories } = analysis.model;
  const rows = walls.flatMap(({ design }) => design.rows);
  const storyOf = new Map(stories.map((story, index) => [story.level, index]));
  const sectionOf = (row: DesignRow) => {
    const demand = walls.find((outcome) => outcome.demand.wall === row.wall)?.demand;
    return demand?.stories.find((story) => story.level === row.from);
  };
  const schedule = rows.map((row): ResultRow => {
    const section = sectionOf(row);
    const waits = row.notDesigned.length > 0 || unsettled(row.wall, storyOf.get(row.from) ?? 0);
    return {
      wall: row.wall,
      from: row.from,
      to: row.to,
      levels: levelsInWords(stories, row.from, row.to),
      thickness: (section?.thicknessIn ?? 0) / units.barLength,
      fc: (section?.fcPsi ?? 0) / units.concreteStrength,
      ...row.cells,
      extendAbove: row.extendAbove,
      dowels: row.dowels,
      joint: row.joint,
      trim: row.trim,
      notDesigned: row.notDesigned,
      ratio: row.ratio,
      governs: row.governs,
      ok: row.ok,
      state: !row.ok ? 'over' : waits ? 'not settled' : 'ok',
    };
  });
  return { rows, schedule };
}

export function quantityRows(walls: readonly WallOutcome[], units: UnitFactors): ResultQuantities {
  const amount = (concreteIn3: number, steelLb: number) => {
    const concrete = concreteIn3 / units.volume;
    const steel = steelLb / units.mass;
    return { concrete, steel, rate: concrete === 0 ? 0 : steel / concrete };
  };
  const total = (rows: readonly DesignRow[]) =>
    amount(
      rows.reduce((sum, row) => sum + row.concreteIn3, 0),
      rows.reduce((sum, row) => sum + row.steelLb, 0),
    );
  return {
    ...total(walls.flatMap(({ design }) => design.rows)),
    walls: walls.map(({ design }) => ({
      wall: design.wall,
      ...total(design.rows),
      bands: design.rows.map((row) => ({ from: row.from, to: row.to, ...amount(row.concreteIn3, row.steelLb) })),
    })),
  };
}
