import { readSettings } from '#shared/contracts/settings';
import type { BuildingInput, ForceRow, GravityRow, LevelRow, WallRow } from '#shared/engineering/input';

/** Park and Miller's minimal generator: the same seed gives the same building on every machine. */
function generator(seed: number): () => number {
  let state = seed % 2_147_483_647;
  return () => {
    state = (state * 48_271) % 2_147_483_647;
    return state / 2_147_483_647;
  };
}

/**
 * A seeded building for measuring: walls both ways at scattered places, every fifth one cut off at half height, two thickness
 * steps, two wind and two seismic cases each way, gravity on every wall and level. Wind cases, 30 % orthogonal and amplified accidental
 * eccentricity unless `plain`. US units.
 */
export function generateBuilding(levelCount: number, wallCount: number, seed: number, plain = false): BuildingInput {
  const random = generator(seed);
  const between = (low: number, high: number) => Math.round((low + (high - low) * random()) * 10) / 10;
  const names = Array.from({ length: levelCount }, (_, index) => `N${index + 1}`);
  const levels: LevelRow[] = [...names].reverse().map((level) => ({
    level,
    height: 11,
    elevation: null,
    x: 70,
    y: 45,
    extent_x: 150,
    extent_y: 100,
    edge_x: 0,
    edge_y: 0,
    diaphragm: null,
    weight: null,
    gravity: null,
  }));
  const walls: WallRow[] = [];
  for (let index = 0; index < wallCount; index += 1) {
    const alongX = index % 2 === 0;
    const length = between(14, 32);
    const x1 = between(4, 110);
    const y1 = between(4, 64);
    const top = index % 5 === 4 ? Math.ceil(levelCount / 2) : levelCount;
    const limits = [0, Math.ceil(top / 3), Math.ceil((2 * top) / 3), top];
    [18, 15, 12].forEach((thickness, band) => {
      const from = limits[band] ?? 0;
      const to = limits[band + 1] ?? 0;
      if (to <= from) return;
      walls.push({
        wall: `W${index + 1}`,
        x1,
        y1,
        x2: alongX ? x1 + length : x1,
        y2: alongX ? y1 : y1 + length,
        thickness,
        from_level: names[from] ?? '',
        to_level: names[to - 1] ?? '',
        fc: null,
        share_x: null,
        share_y: null,
        opening: null,
        flexure_factor: null,
        shear_factor: null,
      });
    });
  }
  const forces: ForceRow[] = [];
  for (const [name, kind, x, y] of [
    ['WX1', 'wind', 1, 0],
    ['WX2', 'wind', 0.8, 0],
    ['WY1', 'wind', 0, 1],
    ['WY2', 'wind', 0, 0.8],
    ['EX1', 'seismic', 1, 0],
    ['EX2', 'seismic', 0.9, 0.1],
    ['EY1', 'seismic', 0, 1],
    ['EY2', 'seismic', 0.1, 0.9],
  ] as const) {
    names.forEach((level, index) => {
      const force = (kind === 'wind' ? 3 : (6 * (index + 1)) / levelCount) * wallCount * 0.4;
      forces.push({ level, case: name, kind, fx: x * force, fy: y * force, x: null, y: null, mz: null });
    });
  }
  const gravity: GravityRow[] = [];
  for (const { wall, from_level, to_level } of walls) {
    for (let index = names.indexOf(from_level); index <= names.indexOf(to_level); index += 1) {
      gravity.push({
        level: names[index] ?? '',
        wall,
        dead: 45,
        live: 18,
        roof_live: null,
        snow: null,
        tributary_area: null,
        eccentricity: null,
        live_class: null,
      });
    }
  }
  const ways = plain ? { basis: ['rigid'] } : { windCases: true, orthogonal: 0.3, accidental: 0.05, amplify: true };
  const reading = readSettings({
    ...{ name: `Bench ${levelCount} x ${wallCount}`, units: 'us', sds: 0.3, sdc: 'C', rho: 1 },
    ...ways,
  });
  if (!reading.ok) throw new Error('the bench settings were refused');
  return { settings: reading.settings, tables: { levels, walls, forces, gravity, combinations: [], overrides: [] } };
}
