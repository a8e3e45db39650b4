import type { BuildingInput, ForceRow, Settings, WallRow } from '../input.ts';

export interface HandWall {
  readonly wall: string;
  /** x1, y1, x2, y2 in ft or m */
  readonly ends: readonly [number, number, number, number];
  /** in or mm */
  readonly thickness: number;
}

export interface HandPlan {
  /** from the base up, ft or m; the stories are named F1, F2 ... */
  readonly heights: readonly number[];
  readonly extent: readonly [number, number];
  readonly walls: readonly HandWall[];
  readonly forces: readonly (Pick<ForceRow, 'level' | 'kind' | 'fx' | 'fy'> & Partial<ForceRow>)[];
}

/** A building of full-height walls on a rectangle from the origin, for examples worked by hand or in print. */
export function handPlan(plan: HandPlan, settings: Settings): BuildingInput {
  const names = plan.heights.map((_, i) => `F${String(i + 1)}`);
  const walls: WallRow[] = plan.walls.map(({ wall, ends, thickness }) => ({
    wall,
    x1: ends[0],
    y1: ends[1],
    x2: ends[2],
    y2: ends[3],
    thickness,
    from_level: names[0] ?? '',
    to_level: names[names.length - 1] ?? '',
    fc: null,
    share_x: null,
    share_y: null,
    opening: null,
    flexure_factor: null,
    shear_factor: null,
  }));
  const [x, y] = plan.extent;
  const levels = plan.heights.map((height, i) => ({
    level: names[i] ?? '',
    height,
    elevation: null,
    x: x / 2,
    y: y / 2,
    extent_x: x,
    extent_y: y,
    edge_x: 0,
    edge_y: 0,
    diaphragm: null,
    weight: null,
    gravity: null,
  }));
  const forces = plan.forces.map((row) => ({ case: 'P', x: null, y: null, mz: null, ...row }));
  return {
    settings,
    tables: { levels: levels.reverse(), walls, forces, gravity: [], combinations: [], overrides: [] },
  };
}
