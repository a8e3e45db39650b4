/**
 * Invented buildings for the whole chain, from a seed: node scripts/independent/generateChain.mjs SEED DIR. The plain
 * building of generateBuilding.mjs with bases, story shears, service level, orthogonal and wind cases, live reduction,
 * shares of flexible floors, own shares and transfers.
 */
import { generateBuilding, writeBuilding } from './generateBuilding.mjs';
import { makeRandom } from './makeRandom.mjs';

export function generateChain(seed) {
  const building = generateBuilding(seed);
  const random = makeRandom(seed + 5000);
  const tools = {
    random,
    chance: (probability) => random() < probability,
    pick: (list) => list[Math.floor(random() * list.length)],
    between: (low, high) => Number((low + (high - low) * random()).toFixed(3)),
    us: building.us,
  };
  const { chance, pick } = tools;
  const { settings, tables } = building;
  settings.basis = pick([
    ['rigid', 'compatible'],
    ['compatible'],
    ['rigid', 'flexible'],
    ['flexible', 'compatible', 'rigid', 'envelope'],
    ['rigid', 'compatible', 'envelope'],
  ]);
  const flexible = settings.basis.includes('flexible');
  if (!settings.basis.includes('rigid') || chance(0.6)) standOnBase(tables, building);
  tools.names = [...new Set(tables.walls.slice(1).map((row) => row[0]))];
  addSettings(settings, tools);
  if (chance(0.3)) toStoryShears(building, tools);
  if (chance(0.6)) addFloorGravity(tables.levels, tools);
  addLiveAreas(tables.gravity, tools);
  if (flexible) addShares(tables, tools);
  if (chance(0.35)) tables.overrides = makeOverrides(building, tools);
  return building;
}

function addSettings(settings, { chance, pick, between, us, names }) {
  if (chance(0.5)) settings.amplify = true;
  if (chance(0.5)) settings.orthogonal = 0.3;
  if (chance(0.4)) settings.windCases = true;
  if (chance(0.5)) settings.liveReduction = true;
  if (chance(0.4)) settings.kll = pick([2, 3, 4]);
  if (chance(0.4)) settings.liveFactor = 0.5;
  if (chance(0.3)) settings.forceLevel = 'service';
  if (chance(0.4))
    Object.assign(settings, { cd: pick([4, 4.5]), ie: pick([1.25, 1.5]), riskCategory: pick(['III', 'IV']) });
  if (chance(0.2)) settings.driftLimit = 0.0125;
  if (chance(0.3)) settings.windDriftFactor = 0.7;
  if (chance(0.3))
    settings.baseSprings = { [names[0]]: between(2e5, 9e6), [names[2]]: between(2e5, 9e6) * (us ? 1 : 1.356) };
}

const column = (rows, name) => rows[0].findIndex((head) => head.toLowerCase().replaceAll(/[\s_]/g, '') === name);

/** Every wall from the lowest story, its lowest band drawn down. */
function standOnBase(tables) {
  const [head, ...rows] = tables.walls;
  const [name, from] = [head.indexOf('wall'), head.indexOf('from_level')];
  const bottom = rows[0][from];
  const seen = new Set();
  for (const row of rows) {
    if (!seen.has(row[name])) row[from] = bottom;
    seen.add(row[name]);
  }
}

/** The same case in rows of every level, read as story shears. */
function toStoryShears({ settings, tables }, { between }) {
  settings.forcesAre = 'story-shear';
  const [head, ...rows] = tables.forces;
  const levelAt = column(tables.levels, 'level');
  const upward = levelsUp(tables.levels).map((row) => row[levelAt]);
  const cases = new Map(rows.map((row) => [row[1], row[2]]));
  const factor = head[3] === 'fx' || head[3] === 'fy' ? 1 : 1000;
  tables.forces = [head];
  for (const [name, kind] of cases) {
    let [x, y, m] = [0, 0, 0];
    for (const level of [...upward].reverse()) {
      x += between(-5, 60) * (name.endsWith('Y') ? 0.2 : 1);
      y += between(-5, 60) * (name.endsWith('Y') ? 1 : 0.2);
      m += between(-300, 300);
      const row = [level, name, kind, Number((x * factor).toFixed(3)), Number(y.toFixed(3))];
      tables.forces.push(head.length > 5 ? [...row, '', '', Number(m.toFixed(3))] : row);
    }
  }
}

function levelsUp(levels) {
  const at = column(levels, 'elevation');
  const rows = levels.slice(1);
  return at < 0 ? [...rows].reverse() : rows.sort((a, b) => a[at] - b[at]);
}

function addFloorGravity(levels, { between, us }) {
  levels[0].push('gravity');
  for (const row of levels.slice(1)) row.push(between(400, 1500) * (us ? 1 : 4));
}

function addLiveAreas(gravity, { chance, pick, between, us }) {
  const areaHead = pick(us ? ['tributary_area', 'tributary area (m2)'] : ['tributary_area', 'tributary_area [ft2]']);
  const inFeet = us === (areaHead === 'tributary_area');
  gravity[0].push(areaHead, 'live_class');
  for (const row of gravity.slice(1)) {
    const area = chance(0.8) ? between(90, 1400) : '';
    row.push(area === '' ? '' : Number((area * (inFeet ? 1 : 0.0929)).toFixed(3)));
    row.push(chance(0.25) ? pick(['heavy', 'garage', 'assembly', 'storage', 'reducible']) : '');
  }
}

/** Skew walls need shares; some parallel ones have them too. */
function addShares(tables, { chance, between }) {
  const [head, ...rows] = tables.walls;
  head.push('share_x', 'share_y');
  const shares = new Map();
  for (const row of rows) {
    const [dx, dy] = [row[3] - row[1], row[4] - row[2]];
    const skew = Math.abs(dx) > 1e-6 && Math.abs(dy) > 1e-6;
    if (!shares.has(row[0])) {
      if (skew)
        shares.set(
          row[0],
          chance(0.3) ? ['', between(0, 0.12)] : [between(0, 0.12), chance(0.5) ? between(0, 0.12) : ''],
        );
      else
        shares.set(
          row[0],
          row[0] === rows[1]?.[0] && chance(0.4)
            ? [Math.abs(dx) > Math.abs(dy) ? between(0.1, 0.3) : '', '']
            : ['', ''],
        );
    }
    row.push(...shares.get(row[0]));
  }
}

function makeOverrides({ tables, us }, { chance, pick, between, names }) {
  const head = ['kind', 'level', 'wall', 'case', 'shear', 'axial', 'moment', 'share', 'reason'];
  const level = () => pick(tables.levels.slice(1))[column(tables.levels, 'level')];
  const cases = [...new Set(tables.forces.slice(1).map((row) => row[1]))];
  const rows = [];
  const scale = us ? 1 : 4;
  if (chance(0.5))
    rows.push(['share', level(), names[0], chance(0.5) ? pick(cases) : '', '', '', '', between(0.1, 0.6), 'own study']);
  const values = () => [between(-20, 40) * scale, between(-20, 60) * scale, between(-200, 300) * scale];
  if (chance(0.25))
    rows.push(['share', rows[0]?.[1] ?? level(), names[2], '', '', '', '', between(0.1, 0.3), 'own study']);
  if (chance(0.6))
    rows.push(['transfer', level(), pick([names[1], names[2]]), pick(cases), ...values(), '', 'from the wall above']);
  if (chance(0.4)) rows.push(['transfer', level(), names[3], '', ...values(), '', 'every case']);
  if (chance(0.4))
    rows.push([
      'transfer',
      level(),
      names[3],
      pick(['D', 'L', 'S']),
      '',
      between(10, 60) * scale,
      between(0, 90),
      '',
      'gravity from above',
    ]);
  return rows.length === 0 ? null : [head, ...rows];
}

const [, script, seed, folder] = process.argv;
if (script?.endsWith('generateChain.mjs') && folder !== undefined) writeBuilding(generateChain(Number(seed)), folder);
