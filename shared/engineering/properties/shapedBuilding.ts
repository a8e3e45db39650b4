import type { BuildingInput, ForceRow, GravityRow, LevelRow, Settings, Tables, WallRow } from '../input.ts';

/** What a random building is made from: ft, kip, kip-ft, in for thickness, dx and dy give a direction. */
export interface Shape {
  readonly heights: readonly number[];
  readonly half: readonly number[];
  readonly thickness: readonly number[];
  readonly extra: readonly { dx: number; dy: number; x: number; y: number; half: number; from: number; to: number }[];
  readonly forces: readonly { fx: number; fy: number; mz: number; x: number; y: number }[];
  readonly dead: number;
}

export const levelName = (index: number): string => `F${String(index + 1)}`;

const wallRow = (wall: string, from: string, to: string, ends: readonly number[], thickness: number): WallRow => ({
  wall,
  x1: ends[0] ?? 0,
  y1: ends[1] ?? 0,
  x2: ends[2] ?? 0,
  y2: ends[3] ?? 0,
  thickness,
  from_level: from,
  to_level: to,
  fc: null,
  share_x: null,
  share_y: null,
  opening: null,
  flexure_factor: null,
  shear_factor: null,
});

/** Forces of one case at every level, from the shape's list at `offset`. */
export function forceRows(shape: Shape, name: string, offset: number, kind: ForceRow['kind']): ForceRow[] {
  return shape.heights.map((_, i) => {
    const force = shape.forces[i + offset] ?? { fx: 1, fy: 1, mz: 0, x: 40, y: 30 };
    return { level: levelName(i), case: name, kind, ...force };
  });
}

/** Two walls each way, walls at any angle besides, one seismic and one wind case, gravity on the four; US units. */
export function shapedBuilding(shape: Shape, settings: Settings): BuildingInput {
  const top = shape.heights.length - 1;
  const levels: LevelRow[] = shape.heights
    .map((height, i) => ({
      level: levelName(i),
      height,
      elevation: null,
      x: 40,
      y: 30,
      extent_x: 80,
      extent_y: 60,
      edge_x: 0,
      edge_y: 0,
      diaphragm: null,
      weight: null,
      gravity: null,
    }))
    .reverse();
  const [a = 5, b = 5, c = 5, d = 5] = shape.half;
  const base: [string, number[]][] = [
    ['X1', [30 - a, 2, 30 + a, 2]],
    ['X2', [45 - b, 57, 45 + b, 57]],
    ['Y1', [3, 28 - c, 3, 28 + c]],
    ['Y2', [76, 33 - d, 76, 33 + d]],
  ];
  const walls = base.map(([name, ends], i) =>
    wallRow(name, levelName(0), levelName(top), ends, shape.thickness[i] ?? 10),
  );
  shape.extra.forEach(({ dx, dy, x, y, half, from, to }, i) => {
    const size = Math.sqrt(dx * dx + dy * dy);
    const [low, high] = [Math.min(from, to, top), Math.min(Math.max(from, to), top)];
    const [cos, sin] = [(dx / size) * half, (dy / size) * half];
    walls.push(wallRow(`S${String(i)}`, levelName(low), levelName(high), [x - cos, y - sin, x + cos, y + sin], 12));
  });
  const gravity: GravityRow[] = base.flatMap(([wall]) =>
    shape.heights.map((_, i) => ({
      level: levelName(i),
      wall,
      dead: shape.dead,
      live: shape.dead / 4,
      roof_live: null,
      snow: i === top ? shape.dead / 8 : null,
      tributary_area: null,
      eccentricity: 0.5,
      live_class: null,
    })),
  );
  const tables: Tables = {
    levels,
    walls,
    forces: [...forceRows(shape, 'E1', 0, 'seismic'), ...forceRows(shape, 'W1', 4, 'wind')],
    gravity,
    combinations: [],
    overrides: [],
  };
  return { settings, tables };
}

/** Every point of the plan moved or turned. */
export function mapPlan(
  input: BuildingInput,
  point: (x: number, y: number) => readonly [number, number],
  vector: (x: number, y: number) => readonly [number, number] = (x, y) => [x, y],
): BuildingInput {
  const { tables } = input;
  const walls = tables.walls.map((row) => {
    const [x1, y1] = point(row.x1, row.y1);
    const [x2, y2] = point(row.x2, row.y2);
    return { ...row, x1, y1, x2, y2 };
  });
  const levels = tables.levels.map((row) => {
    const [x, y] = point(row.x ?? 0, row.y ?? 0);
    return { ...row, x, y, edge_x: x - 40, edge_y: y - 30 };
  });
  const forces = tables.forces.map((row) => {
    const [x, y] = point(row.x ?? 0, row.y ?? 0);
    const [fx, fy] = vector(row.fx, row.fy);
    return { ...row, x, y, fx, fy };
  });
  return { ...input, tables: { ...tables, walls, levels, forces } };
}
