/**
 * Cases with the force of every level, stories from the base up. Rows of one level and case add up. Story shears become
 * level forces by the difference of successive rows, mz too, at the level's own point.
 */
export function readCases(building, rows) {
  const { stories, index, settings } = building;
  const byShear = settings.forcesAre === 'story-shear';
  const cases = new Map();
  for (const row of rows) {
    if (!cases.has(row.case)) {
      const empty = stories.map(() => ({ fx: 0, fy: 0, mz: 0, torque: 0 }));
      cases.set(row.case, { name: row.case, kind: row.kind.toLowerCase(), levels: empty });
    }
    const i = index.get(row.level);
    const sum = cases.get(row.case).levels[i];
    const mz = row.mz ?? 0;
    sum.fx += row.fx;
    sum.fy += row.fy;
    sum.mz += mz;
    if (!byShear) sum.torque += mz + (row.x ?? stories[i].x) * row.fy - (row.y ?? stories[i].y) * row.fx;
  }
  const list = [...cases.values()];
  for (const load of list) {
    if (byShear) load.levels = load.levels.map((shear, i) => difference(shear, load.levels[i + 1], stories[i]));
    const total = (axis) => Math.abs(load.levels.reduce((sum, force) => sum + force[axis], 0));
    load.direction = total('fx') >= total('fy') ? 'x' : 'y';
  }
  return list;
}

function difference(here, above, story) {
  const own = { fx: 0, fy: 0, mz: 0, ...here };
  for (const column of ['fx', 'fy', 'mz']) own[column] -= above?.[column] ?? 0;
  return { ...own, torque: own.mz + story.x * own.fy - story.y * own.fx };
}
