import type { BuildingInput, Settings } from '../input.ts';

const [foot, inch, kip] = [0.3048, 25.4, 4.4482216152605];
const psi = kip / (inch * inch);

const by = (value: number | null, factor: number): number | null => (value === null ? null : value * factor);

/** A building in US units written down in SI by exact factors; what only reinforcement depends on comes from the SI defaults. */
export function siTwin({ settings, tables }: BuildingInput, si: Settings): BuildingInput {
  const { fc, concreteWeight, baseSprings, stiffness, ...plain } = settings;
  const { units, fy, fyt, cover, edge, slabThickness, bars, oopEccentricity } = si;
  return {
    settings: {
      ...plain,
      ...{ units, fy, fyt, cover, edge, slabThickness, bars, oopEccentricity },
      stiffness,
      fc: fc * psi,
      concreteWeight: (concreteWeight * kip) / (1000 * foot * foot * foot),
      baseSprings: Object.fromEntries(Object.entries(baseSprings).map(([wall, k]) => [wall, k * kip * foot])),
    },
    tables: {
      ...tables,
      levels: tables.levels.map((row) => ({
        ...row,
        height: row.height * foot,
        elevation: by(row.elevation, foot),
        x: by(row.x, foot),
        y: by(row.y, foot),
        extent_x: by(row.extent_x, foot),
        extent_y: by(row.extent_y, foot),
        edge_x: by(row.edge_x, foot),
        edge_y: by(row.edge_y, foot),
        weight: by(row.weight, kip),
        gravity: by(row.gravity, kip),
      })),
      walls: tables.walls.map((row) => ({
        ...row,
        x1: row.x1 * foot,
        y1: row.y1 * foot,
        x2: row.x2 * foot,
        y2: row.y2 * foot,
        thickness: row.thickness * inch,
        fc: by(row.fc, psi),
      })),
      forces: tables.forces.map((row) => ({
        ...row,
        fx: row.fx * kip,
        fy: row.fy * kip,
        mz: by(row.mz, kip * foot),
        x: by(row.x, foot),
        y: by(row.y, foot),
      })),
      gravity: tables.gravity.map((row) => ({
        ...row,
        dead: row.dead * kip,
        live: by(row.live, kip),
        roof_live: by(row.roof_live, kip),
        snow: by(row.snow, kip),
        tributary_area: by(row.tributary_area, foot * foot),
        eccentricity: by(row.eccentricity, foot),
      })),
      overrides: tables.overrides.map((row) => ({
        ...row,
        shear: by(row.shear, kip),
        axial: by(row.axial, kip),
        moment: by(row.moment, kip * foot),
      })),
    },
  };
}
