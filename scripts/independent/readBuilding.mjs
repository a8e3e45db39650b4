import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

import { readCsvTable } from './csvTable.mjs';
import { readCases } from './readCases.mjs';
import { ownUnits } from './siUnits.mjs';

/** A building of a folder in newtons and meters: plain objects, stories from the base up. */
export function readBuilding(folder) {
  const given = JSON.parse(readFileSync(join(folder, 'building.json'), 'utf8'));
  const system = given.units;
  const unit = ownUnits[system];
  const us = system === 'us';
  const settings = {
    loads: 'asce7-22',
    lambda: 1,
    selfWeight: true,
    accidental: 0.05,
    liveFactor: 1,
    sds: 0,
    rho: 1,
    omega0: 2.5,
    basis: ['rigid', 'compatible'],
    amplify: false,
    orthogonal: 0,
    windCases: false,
    liveReduction: false,
    kll: 1,
    cd: 5,
    ie: 1,
    riskCategory: 'II',
    windDriftFactor: 0.6,
    forcesAre: 'level-force',
    forceLevel: 'strength',
    baseSprings: {},
    ...given,
    fc: (given.fc ?? (us ? 5000 : 35)) * unit.strength,
    fy: (given.fy ?? (us ? 60 : 420)) * unit.steel,
    fyt: (given.fyt ?? (us ? 60 : 420)) * unit.steel,
    concreteWeight: (given.concreteWeight ?? (us ? 150 : 24)) * unit.density,
    edge: (given.edge ?? (us ? 3 : 75)) * unit.thickness,
    stiffness: { flexure: 0.5, shear: 1, end: 'cantilever', ...given.stiffness },
  };
  if (typeof settings.stiffness.unitWeight === 'number') settings.stiffness.unitWeight *= unit.density;
  const table = (name) => {
    const file = join(folder, `${name}.csv`);
    return existsSync(file) ? readCsvTable(name, readFileSync(file, 'utf8'), system) : [];
  };
  const building = { system, settings, walls: new Map(), combinations: table('combinations') };
  building.stories = readStories(table('levels'));
  building.index = new Map(building.stories.map((story, i) => [story.level, i]));
  readWalls(building, table('walls'));
  placeStories(building);
  building.gravity = table('gravity');
  building.overrides = table('overrides');
  building.cases = readCases(building, table('forces'));
  return building;
}

function readStories(rows) {
  const ordered = [...rows];
  if (rows.every((row) => row.elevation !== undefined)) ordered.sort((a, b) => b.elevation - a.elevation);
  const stories = ordered.reverse().map((row) => ({ ...row }));
  const known = stories.findIndex((story) => story.elevation !== undefined);
  let bottom = 0;
  if (known >= 0) {
    bottom = stories[known].elevation;
    for (let i = 0; i <= known; i += 1) bottom -= stories[i].height;
  }
  for (const story of stories) {
    story.bottom = bottom;
    bottom += story.height;
    story.top = bottom;
  }
  return stories;
}

/** Every wall as one segment a story, from its lowest story up. */
function readWalls(building, rows) {
  const { settings, walls, index } = building;
  for (const row of rows) {
    const from = index.get(row.fromlevel);
    const to = index.get(row.tolevel);
    if (!walls.has(row.wall)) walls.set(row.wall, { name: row.wall, segments: new Map() });
    const length = Math.hypot(row.x2 - row.x1, row.y2 - row.y1);
    for (let story = from; story <= to; story += 1) {
      walls.get(row.wall).segments.set(story, {
        x1: row.x1,
        y1: row.y1,
        x2: row.x2,
        y2: row.y2,
        length,
        c: (row.x2 - row.x1) / length,
        s: (row.y2 - row.y1) / length,
        x: (row.x1 + row.x2) / 2,
        y: (row.y1 + row.y2) / 2,
        thickness: row.thickness,
        fc: row.fc ?? settings.fc,
        opening: row.opening ?? 0,
        flexure: row.flexurefactor ?? settings.stiffness.flexure,
        shear: row.shearfactor ?? settings.stiffness.shear,
        sharex: row.sharex,
        sharey: row.sharey,
      });
    }
  }
  for (const wall of walls.values()) {
    wall.from = Math.min(...wall.segments.keys());
    wall.to = Math.max(...wall.segments.keys());
  }
}

/** Points and extents that were left blank. */
function placeStories(building) {
  building.stories.forEach((story, i) => {
    const standing = [...building.walls.values()].map((wall) => wall.segments.get(i)).filter(Boolean);
    const along = (axis) => {
      const ends = standing.flatMap((segment) => [segment[`${axis}1`], segment[`${axis}2`]]);
      const low = Math.min(...ends);
      const high = Math.max(...ends);
      const extent = story[`extent${axis}`];
      const edge = story[`edge${axis}`];
      story[`extent${axis}`] ??= high - low;
      story[`edge${axis}`] ??=
        story[axis] !== undefined ? story[axis] - (extent ?? high - low) / 2 : extent === undefined ? low : undefined;
      story[axis] ??= extent !== undefined && edge !== undefined ? edge + extent / 2 : (low + high) / 2;
    };
    along('x');
    along('y');
  });
}
