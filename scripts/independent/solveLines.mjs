/**
 * Flexible floors: the part of a level's force in one direction that each wall of the story takes, as a force in that
 * direction. Explicit shares first; what is left spans between lines of parallel walls as simple beams under a uniform
 * load over the extent, overhangs go whole to the outermost line, and a line divides by rigidity.
 */
const inch = 0.0254;
const halfDegree = Math.sin((0.5 * Math.PI) / 180);

export function levelParts(building, i, axis) {
  const story = building.stories[i];
  const { parts } = building.rigidity[i];
  const shared = parts.filter(({ segment }) => segment.sharex !== undefined || segment.sharey !== undefined);
  const out = new Map();
  let left = 1;
  for (const { wall, segment } of shared) {
    const share = segment[`share${axis}`] ?? 0;
    left -= share;
    if (share !== 0) out.set(wall, share);
  }
  const across = axis === 'x' ? 'y' : 'x';
  const free = parts
    .filter((part) => !shared.includes(part) && Math.abs(part.segment[axis === 'x' ? 's' : 'c']) <= halfDegree)
    .sort((a, b) => a.segment[across] - b.segment[across]);
  const lines = [];
  for (const part of free) {
    const line = lines.at(-1);
    if (line !== undefined && part.segment[across] - line.first <= inch) line.parts.push(part);
    else lines.push({ first: part.segment[across], parts: [part] });
  }
  for (const line of lines) {
    line.k = line.parts.reduce((sum, { k }) => sum + k, 0);
    line.at = line.parts.reduce((sum, { k, segment }) => sum + k * segment[across], 0) / line.k;
  }
  const low = story[`edge${across}`];
  const extent = story[`extent${across}`];
  const widths = lineWidths(
    lines.map(({ at }) => at),
    low,
    low + extent,
  );
  lines.forEach((line, n) => {
    for (const { wall, k } of line.parts) {
      const share = ((left * widths[n]) / extent) * (k / line.k);
      if (share !== 0) out.set(wall, share);
    }
  });
  return out;
}

/** Reactions of simple spans between the lines under a load of 1 over low to high; overhangs to the outermost line. */
export function lineWidths(lines, low, high) {
  const widths = lines.map(() => 0);
  const last = lines.length - 1;
  if (last < 0) return widths;
  widths[0] += Math.max(0, Math.min(lines[0], high) - low);
  widths[last] += Math.max(0, high - Math.max(lines[last], low));
  for (let n = 0; n < last; n += 1) {
    const [a, b] = [lines[n], lines[n + 1]];
    const [from, to] = [Math.max(a, low), Math.min(b, high)];
    if (to <= from) continue;
    const right = ((to - from) * ((from + to) / 2 - a)) / (b - a);
    widths[n] += to - from - right;
    widths[n + 1] += right;
  }
  return widths;
}

/**
 * Shears of all walls under the level forces of one case, from the top down. The parts along x and y are kept apart: what a
 * wall that stops took of Fx goes on as Fx, of Fy as Fy (the balance is of the force in its own direction).
 */
export function solveLines(building, load) {
  const carried = new Map();
  const arriving = building.stories.map(() => ({ x: 0, y: 0 }));
  const shares = [];
  for (let i = building.stories.length - 1; i >= 0; i -= 1) {
    const force = { x: load.levels[i].fx + arriving[i].x, y: load.levels[i].fy + arriving[i].y };
    for (const axis of ['x', 'y']) {
      for (const [wall, part] of levelParts(building, i, axis)) {
        if (!carried.has(wall)) carried.set(wall, { x: 0, y: 0 });
        carried.get(wall)[axis] += part * force[axis];
      }
    }
    for (const { wall, segment } of building.rigidity[i].parts) {
      const { x, y } = carried.get(wall) ?? { x: 0, y: 0 };
      shares.push({ story: i, wall, total: (x === 0 ? 0 : x / segment.c) + (y === 0 ? 0 : y / segment.s) });
      if (building.walls.get(wall).from !== i || i === 0) continue;
      arriving[i - 1].x += x;
      arriving[i - 1].y += y;
      carried.delete(wall);
    }
  }
  return shares;
}
