/** What the engineer assigned: own shares of a story shear, and what a wall gets from a transfer. */

const belongs = (row, load) => row.case === undefined || row.case === load.name;

/** A wall's own share of the story shear along its direction; the change goes to the others by rigidity, without turning. */
export function applyShares(building, load, actions, shares) {
  const rows = building.overrides.filter((row) => row.kind === 'share' && belongs(row, load));
  if (rows.length === 0) return shares;
  const out = shares.map((share) => ({ ...share }));
  for (let i = 0; i < building.stories.length; i += 1) {
    const own = new Map(rows.filter((row) => building.index.get(row.level) === i).map((row) => [row.wall, row.share]));
    if (own.size === 0) continue;
    const here = out.filter((share) => share.story === i);
    let change = { x: 0, y: 0 };
    for (const share of here.filter(({ wall }) => own.has(wall))) {
      const { c, s } = building.walls.get(share.wall).segments.get(i);
      const set = own.get(share.wall) * (actions[i].x * c + actions[i].y * s);
      change = { x: change.x + (share.total - set) * c, y: change.y + (share.total - set) * s };
      share.total = set;
    }
    const others = building.rigidity[i].parts.filter(({ wall }) => !own.has(wall));
    const sum = (pick) => others.reduce((total, { k, segment }) => total + k * pick(segment), 0);
    const [xx, yy, xy] = [sum(({ c }) => c * c), sum(({ s }) => s * s), sum(({ c, s }) => c * s)];
    const size = xx * yy - xy * xy;
    const u = (yy * change.x - xy * change.y) / size;
    const v = (xx * change.y - xy * change.x) / size;
    for (const { wall, k, segment } of others) {
      here.find((share) => share.wall === wall).total += k * (segment.c * u + segment.s * v);
    }
  }
  return out;
}

/** Shear in the story of the level, axial and moment from there down; the sum of a wall's rows of this case. */
export function transferAt(building, load, wall, i) {
  const sum = { shear: 0, axial: 0, moment: 0 };
  for (const row of building.overrides) {
    if (row.kind !== 'transfer' || row.wall !== wall || building.index.get(row.level) !== i || !belongs(row, load))
      continue;
    for (const part of ['shear', 'axial', 'moment']) sum[part] += row[part] ?? 0;
  }
  return sum;
}
