import type { ForceRow, GravityRow, Settings } from '../input.ts';
import { unitFactors } from '../units.ts';

import type { GravityCase, GravityColumns, LoadCase, Story, WallLine } from './model.ts';

/**
 * Lateral cases in the order in which their names first appear. A level and case given twice add up. A force acts at its own
 * x, y, else at the level's point; torque about the origin = mz + x Fy - y Fx (kip-in).
 */
export function buildLoadCases(rows: readonly ForceRow[], stories: readonly Story[], settings: Settings): LoadCase[] {
  const factors = unitFactors[settings.units];
  const storyOf = new Map(stories.map((story, index) => [story.level, index]));
  const byName = new Map<string, Omit<LoadCase, 'direction'>>();
  for (const row of rows) {
    const column = () => new Float64Array(stories.length);
    const loadCase = byName.get(row.case) ?? {
      name: row.case,
      kind: row.kind,
      fxKip: column(),
      fyKip: column(),
      torqueKipIn: column(),
      mzKipIn: column(),
    };
    byName.set(row.case, loadCase);
    const index = storyOf.get(row.level);
    const story = index === undefined ? undefined : stories[index];
    if (index === undefined || !story) continue;
    const fx = row.fx * factors.force;
    const fy = row.fy * factors.force;
    const x = row.x === null ? story.xIn : row.x * factors.planLength;
    const y = row.y === null ? story.yIn : row.y * factors.planLength;
    const mz = (row.mz ?? 0) * factors.moment;
    add(loadCase.fxKip, index, fx);
    add(loadCase.fyKip, index, fy);
    add(loadCase.mzKipIn, index, mz);
    add(loadCase.torqueKipIn, index, mz + x * fy - y * fx);
  }
  if (settings.forcesAre === 'story-shear') for (const loadCase of byName.values()) toLevelForces(loadCase, stories);
  return [...byName.values()].map((loadCase) => {
    const total = (column: Float64Array) => Math.abs(column.reduce((sum, value) => sum + value, 0));
    return { ...loadCase, direction: total(loadCase.fyKip) > total(loadCase.fxKip) ? 'y' : 'x' };
  });
}

/**
 * Story shears to level forces: differences of successive rows, of mz too, acting at each level's own point (engineering.md
 * section 5).
 */
function toLevelForces(loadCase: Omit<LoadCase, 'direction'>, stories: readonly Story[]): void {
  const { fxKip, fyKip, mzKipIn, torqueKipIn } = loadCase;
  for (const column of [fxKip, fyKip, mzKipIn]) {
    for (let story = 0; story < stories.length - 1; story += 1) {
      column[story] = (column[story] ?? 0) - (column[story + 1] ?? 0);
    }
  }
  stories.forEach((story, index) => {
    torqueKipIn[index] = (mzKipIn[index] ?? 0) + story.xIn * (fyKip[index] ?? 0) - story.yIn * (fxKip[index] ?? 0);
  });
}

const gravityColumnOf = { D: 'dead', L: 'live', Lr: 'roof_live', S: 'snow' } as const;

/** Gravity as brought in at each level, before it is summed down: kip, and kip-in from its eccentricity toward (x2, y2). */
export function buildGravity(
  rows: readonly GravityRow[],
  stories: readonly Story[],
  walls: readonly WallLine[],
  settings: Settings,
): GravityColumns {
  const factors = unitFactors[settings.units];
  const storyOf = new Map(stories.map((story, index) => [story.level, index]));
  const wallOf = new Map(walls.map((wall, index) => [wall.name, index]));
  const size = stories.length * walls.length;
  const columns = () => ({
    D: new Float64Array(size),
    L: new Float64Array(size),
    Lr: new Float64Array(size),
    S: new Float64Array(size),
  });
  const axialKip = columns();
  const momentKipIn = columns();
  const column = () => new Float64Array(size);
  const reducible = { axialKip: column(), momentKipIn: column(), areaIn2: column(), floors: column() };
  const full = { axialKip: column(), momentKipIn: column() };
  for (const row of rows) {
    const story = storyOf.get(row.level);
    const wall = wallOf.get(row.wall);
    if (story === undefined || wall === undefined) continue;
    const at = story * walls.length + wall;
    const eccentricityIn = (row.eccentricity ?? 0) * factors.planLength;
    for (const name of Object.keys(gravityColumnOf) as GravityCase[]) {
      const kip = (row[gravityColumnOf[name]] ?? 0) * factors.force;
      add(axialKip[name], at, kip);
      add(momentKipIn[name], at, kip * eccentricityIn);
    }
    const liveKip = (row.live ?? 0) * factors.force;
    const areaIn2 = (row.tributary_area ?? 0) * factors.area;
    const heavy = isHeavy(row, liveKip, areaIn2);
    if (heavy) {
      add(full.axialKip, at, liveKip);
      add(full.momentKipIn, at, liveKip * eccentricityIn);
    } else if (areaIn2 > 0 && liveKip !== 0) {
      add(reducible.axialKip, at, liveKip);
      add(reducible.momentKipIn, at, liveKip * eccentricityIn);
      add(reducible.areaIn2, at, areaIn2);
      reducible.floors[at] = 1;
    }
  }
  return { axialKip, momentKipIn, reducible, full };
}

/** 100.5 psf in kip/in2: live load above it counts as heavy (ASCE/SEI 7 4.7.3, with half a psf for rounding). */
const heavyKipPerIn2 = 100.5 / 1000 / 144;

/** Live load that may not be reduced: by its class, or above 100 psf over its area. */
export function isHeavy(row: GravityRow, liveKip: number, areaIn2: number): boolean {
  if (row.live_class !== null && row.live_class !== 'reducible') return true;
  return areaIn2 > 0 && liveKip / areaIn2 > heavyKipPerIn2;
}

function add(column: Float64Array, index: number, value: number) {
  column[index] = (column[index] ?? 0) + value;
}
