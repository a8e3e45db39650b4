/**
 * Invented buildings from a seed, as a folder of tables: node scripts/independent/generateBuilding.mjs SEED DIR.
 * Skew walls, walls that stop or start part-way, bands with other lengths and offsets, both unit systems, header units
 * other than the building's, several cases, negative gravity, typed combinations.
 */
import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

import { makeRandom } from './makeRandom.mjs';

export function generateBuilding(seed) {
  const random = makeRandom(seed);
  const between = (low, high, decimals = 2) => Number((low + (high - low) * random()).toFixed(decimals));
  const chance = (probability) => random() < probability;
  const pick = (list) => list[Math.floor(random() * list.length)];
  const us = chance(0.5);
  const plan = us ? 1 : 0.3048; // sizes below are in ft
  const load = us ? 1 : 4.4482; // forces below are in kip
  const length = (low, high) => between(low * plan, high * plan, 3);
  const force = (low, high) => between(low * load, high * load, 3);
  const count = 1 + Math.floor(random() * 9);
  const names = Array.from({ length: count }, (_, i) => pick(['L', 'L', 'L']) + String(i + 1));
  if (chance(0.3)) names[count - 1] = 'Roof, main';
  if (chance(0.3)) names[0] = '-1';
  const shape = { random, between, chance, pick, us, length, force, count, names };
  return {
    us,
    delimiter: pick([',', ',', ';', '\t']),
    settings: makeSettings(shape),
    tables: {
      levels: makeLevels(shape),
      ...makeWalls(shape),
      forces: makeForces(shape),
      combinations: chance(0.3) ? makeCombinations(shape) : null,
    },
  };
}

function makeSettings({ between, chance, pick, us }) {
  const settings = { name: 'Generated', units: us ? 'us' : 'si', basis: ['rigid'] };
  if (chance(0.5)) settings.accidental = pick([0, 0.05, 0.1]);
  if (chance(0.6)) Object.assign(settings, { sds: between(0.1, 1.2, 3), rho: pick([1, 1.3]), sdc: pick(['B', 'C']) });
  if (chance(0.3)) settings.loads = 'asce7-16';
  if (chance(0.3)) settings.liveFactor = 0.5;
  if (chance(0.3)) settings.selfWeight = false;
  if (chance(0.3)) settings.fc = us ? pick([4000, 6000, 8000]) : pick([28, 42, 55]);
  if (chance(0.3)) settings.concreteWeight = us ? 145.5 : 23.5;
  const stiffness = {};
  if (chance(0.3)) stiffness.end = 'fixed';
  if (chance(0.3)) stiffness.flexure = between(0.3, 1);
  if (chance(0.3)) stiffness.shear = between(0.3, 1);
  if (chance(0.2)) stiffness.unitWeight = us ? 148 : 23;
  return Object.keys(stiffness).length > 0 ? { ...settings, stiffness } : settings;
}

function makeLevels({ chance, length, names, pick, us }) {
  const head = ['level', chance(0.3) ? (us ? 'height (in)' : 'Height [cm]') : 'height'];
  const headFactor = head[1] === 'height' ? 1 : us ? 12 : 100;
  const withElevation = chance(0.4);
  const extents = pick(['none', 'all', 'edges']);
  if (withElevation) head.push('elevation');
  if (extents !== 'none')
    head.push('extent_x', 'Extent Y', ...(extents === 'edges' ? ['edge_x', 'edge_y'] : ['x', 'y']));
  let elevation = withElevation ? length(-20, 20) : 0;
  const rows = names.map((name) => {
    const height = length(8.5, 16);
    elevation += height;
    const row = [name, Number((height * headFactor).toFixed(6))];
    if (withElevation) row.push(Number(elevation.toFixed(6)));
    if (extents !== 'none') row.push(length(70, 110), length(50, 80), length(-2, 3), length(-2, 3));
    return row;
  });
  const upward = withElevation && chance(0.5);
  return [head, ...(upward ? rows : rows.reverse())];
}

function makeWalls(shape) {
  const { random, between, chance, pick, us, length, force, count, names } = shape;
  const thicknessHead = us ? pick(['thickness', 'Thickness (mm)']) : pick(['thickness', 'thickness [m]']);
  const thickness = () => {
    const inches = 8 + 2 * Math.floor(random() * 5);
    if (thicknessHead === 'thickness') return us ? inches : 25 * inches;
    return us ? Number((inches * 25.4).toFixed(4)) : inches * 0.025;
  };
  const head = [
    'wall',
    'x1',
    'y1',
    'x2',
    'y2',
    thicknessHead,
    'from_level',
    'to_level',
    'fc',
    'opening',
    'flexure_factor',
    'shear_factor',
  ];
  const rows = [];
  const gravity = [
    [
      'level',
      'wall',
      us ? pick(['dead', 'dead (lb)']) : pick(['dead', 'dead [MN]']),
      'live',
      'roof_live',
      'snow',
      'eccentricity',
    ],
  ];
  const deadFactor = { dead: 1, 'dead (lb)': 1000, 'dead [MN]': 0.001 }[gravity[0][2]];
  const walls = 4 + Math.floor(random() * 6);
  for (let n = 0; n < walls; n += 1) {
    const full = n < 4;
    const from = full || chance(0.6) ? 0 : Math.floor(random() * count);
    const to = full || chance(0.5) ? count - 1 : from + Math.floor(random() * (count - from));
    const angle = n < 2 ? 0 : n < 4 ? Math.PI / 2 : between(0, 6.28, 4);
    const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
    const x = n === 2 ? length(0, 10) : n === 3 ? length(60, 90) : length(10, 80);
    const y = n === 0 ? length(0, 10) : n === 1 ? length(40, 60) : length(10, 45);
    let half = length(5, 17);
    let shift = 0;
    const name = chance(0.1) ? `W "${String(n)}"` : `W${String(n)}`;
    let start = from;
    while (start <= to) {
      const end = chance(0.5) ? to : start + Math.floor(random() * (to - start + 1));
      const [a, b] = [shift - half, shift + half];
      rows.push([
        name,
        x + cos * a,
        y + sin * a,
        x + cos * b,
        y + sin * b,
        thickness(),
        names[start],
        names[end],
        chance(0.2) ? (us ? 7000 : 50) : '',
        chance(0.2) ? between(0.05, 0.3) : '',
        chance(0.1) ? 0.35 : '',
        chance(0.1) ? 0.8 : '',
      ]);
      if (chance(0.3)) half *= between(0.7, 1);
      if (chance(0.3)) shift += length(-2, 2);
      start = end + 1;
    }
    for (let i = from; i <= to; i += 1) {
      const times = chance(0.1) ? 2 : chance(0.9) ? 1 : 0;
      for (let k = 0; k < times; k += 1) {
        const sign = chance(0.05) ? -1 : 1;
        const top = i === count - 1;
        const dead = Number((sign * force(5, 60) * deadFactor).toFixed(6));
        const light = top ? ['', force(2, 10), force(2, 12)] : [force(2, 25), '', ''];
        gravity.push([names[i], name, dead, ...light, chance(0.3) ? length(-3, 3) : '']);
      }
    }
  }
  return { walls: [head, ...rows], gravity };
}

function makeForces({ chance, length, force, pick, us, count, names }) {
  const withPoint = chance(0.4);
  const forceHead = us ? 'fx' : pick(['fx', 'Fx (N)']);
  const factor = forceHead === 'fx' ? 1 : 1000;
  const head = ['level', 'case', 'kind', forceHead, 'fy', ...(withPoint ? ['x', 'y', us ? 'mz (kip-in)' : 'mz'] : [])];
  const cases = [
    ['WX', 'wind', 1, 0.05],
    ['WY', 'wind', 0, -1],
    ['EX', 'seismic', 1, 0],
    ['EY', 'seismic', 0.3, 1],
    ['soil', 'other', 0.4, 0.2],
  ].filter((_, i) => i === 2 || chance(0.6));
  const rows = [];
  for (const [name, kind, px, py] of cases) {
    for (let i = count - 1; i >= 0; i -= 1) {
      if (chance(0.08)) continue;
      const size = force(10, 60) * (1 + i / 4);
      const row = [names[i], name, kind, Number((size * px * factor).toFixed(3)), Number((size * py).toFixed(3))];
      if (withPoint)
        row.push(...(chance(0.7) ? [length(30, 50), length(20, 40)] : ['', '']), chance(0.4) ? force(-900, 900) : '');
      rows.push(row);
      if (chance(0.05)) rows.push(row); // the same level and case again: adds up
    }
  }
  if (rows.length === 0)
    rows.push([names[0], 'EX', 'seismic', force(10, 60) * factor, 0, ...(withPoint ? ['', '', ''] : [])]);
  return [head, ...rows];
}

function makeCombinations({ chance }) {
  const texts = [
    '1.4D',
    '1.2D+1E+2L',
    '(0.9 - 0.2SDS)D+rhoE+1.6H',
    '1.2D + 1.0W + 0.5(L + (Lr or S))',
    '0.9D-1.0W',
    '(1.2D + L)/2 + Omega0 E',
  ];
  const rows = texts.filter((_, i) => i < 2 || chance(0.7)).map((text, i) => [`typed ${String(i + 1)}`, text]);
  return [['name', 'expression'], ...rows];
}

/** Writes the folder: building.json and one file a table. */
export function writeBuilding(building, folder) {
  mkdirSync(folder, { recursive: true });
  writeFileSync(join(folder, 'building.json'), JSON.stringify(building.settings, null, 2));
  const { delimiter } = building;
  const quote = (cell) => (/["\n,;\t]/.test(String(cell)) ? `"${String(cell).replaceAll('"', '""')}"` : String(cell));
  for (const [name, rows] of Object.entries(building.tables)) {
    if (rows === null) continue;
    writeFileSync(join(folder, `${name}.csv`), `${rows.map((row) => row.map(quote).join(delimiter)).join('\n')}\n`);
  }
}

const [, script, seed, folder] = process.argv;
if (script?.endsWith('generateBuilding.mjs') && folder !== undefined)
  writeBuilding(generateBuilding(Number(seed)), folder);
