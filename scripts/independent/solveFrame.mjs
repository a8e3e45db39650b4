import { ownUnits } from './siUnits.mjs';
import { modulusOf } from './solveLateral.mjs';

/**
 * The whole height at once as a plain frame: three unknowns a floor (two translations and the turn about the origin) and
 * one rotation for every wall and floor that it passes, all kept, one full matrix, elimination with row exchange. Null
 * where a wall starts above the base: such a wall has no fixed foot.
 */
export function makeFrame(building) {
  const walls = [...building.walls.values()];
  if (walls.some((wall) => wall.from > 0)) return null;
  const floors = building.stories.length;
  let size = 3 * floors;
  for (const wall of walls) {
    wall.turns = building.stories.map((_, i) => (i <= wall.to ? size++ : null));
    const spring = building.settings.baseSprings[wall.name];
    wall.foot = spring === undefined ? null : size++;
    wall.spring = (spring ?? 0) * ownUnits[building.system].moment;
  }
  const matrix = Array.from({ length: size }, () => new Float64Array(size));
  const pieces = walls.flatMap((wall) => Array.from({ length: wall.to + 1 }, (_, i) => makePiece(building, wall, i)));
  for (const { columns, stiffness } of pieces) {
    for (let a = 0; a < 4; a += 1) {
      for (let b = 0; b < 4; b += 1) {
        for (const [m, p] of columns[a]) for (const [n, q] of columns[b]) matrix[m][n] += p * q * stiffness[a][b];
      }
    }
  }
  for (const wall of walls) if (wall.foot !== null) matrix[wall.foot][wall.foot] += wall.spring;
  return { floors, pieces, solve: eliminate(matrix) };
}

/** One wall in one story: end values are bottom and top displacement along the wall and rotation, as sums over unknowns. */
function makePiece(building, wall, i) {
  const segment = wall.segments.get(i);
  const { c, s, x, y } = segment;
  const h = building.stories[i].height;
  const modulus = modulusOf(segment, building.settings);
  const bending = (modulus * segment.flexure * segment.thickness * segment.length ** 3) / 12;
  const shear = (0.4 * modulus * segment.shear * segment.thickness * segment.length) / 1.2;
  const f = (12 * bending) / (shear * h * h);
  const k = bending / (h ** 3 * (1 + f));
  const [near, far] = [(4 + f) * h * h, (2 - f) * h * h];
  const along = (floor) =>
    floor < 0
      ? []
      : [
          [3 * floor, c],
          [3 * floor + 1, s],
          [3 * floor + 2, x * s - y * c],
        ];
  const below = i === 0 ? wall.foot : wall.turns[i - 1];
  return {
    wall: wall.name,
    story: i,
    columns: [along(i - 1), below === null ? [] : [[below, 1]], along(i), [[wall.turns[i], 1]]],
    stiffness: [
      [12, 6 * h, -12, 6 * h],
      [6 * h, near, -6 * h, far],
      [-12, -6 * h, 12, -6 * h],
      [6 * h, far, -6 * h, near],
    ].map((row) => row.map((value) => value * k)),
  };
}

/** Answers a function that solves for one right-hand side. */
function eliminate(matrix) {
  const size = matrix.length;
  const order = matrix.map((_, i) => i);
  for (let p = 0; p < size; p += 1) {
    let best = p;
    for (let r = p + 1; r < size; r += 1) if (Math.abs(matrix[r][p]) > Math.abs(matrix[best][p])) best = r;
    [matrix[p], matrix[best]] = [matrix[best], matrix[p]];
    [order[p], order[best]] = [order[best], order[p]];
    for (let r = p + 1; r < size; r += 1) {
      if (matrix[r][p] === 0) continue;
      const factor = (matrix[r][p] /= matrix[p][p]);
      for (let q = p + 1; q < size; q += 1) matrix[r][q] -= factor * matrix[p][q];
    }
  }
  return (given) => {
    const value = Float64Array.from(order, (from) => given[from] ?? 0);
    for (let r = 0; r < size; r += 1) for (let q = 0; q < r; q += 1) value[r] -= matrix[r][q] * value[q];
    for (let r = size - 1; r >= 0; r -= 1) {
      for (let q = r + 1; q < size; q += 1) value[r] -= matrix[r][q] * value[q];
      value[r] /= matrix[r][r];
    }
    return value;
  };
}

/** Shear and bottom moment of every wall and story from the end forces of its piece, and the movement of every floor. */
export function solveFrame(frame, forces) {
  const given = forces.flatMap(({ x, y, torque }) => [x, y, torque]);
  const value = frame.solve(given);
  const shares = frame.pieces.map(({ wall, story, columns, stiffness }) => {
    const ends = columns.map((terms) => terms.reduce((sum, [n, factor]) => sum + factor * value[n], 0));
    const at = (row) => stiffness[row].reduce((sum, factor, n) => sum + factor * ends[n], 0);
    return { wall, story, total: at(2), moment: -at(1) };
  });
  const floors = Array.from({ length: frame.floors }, (_, i) => ({
    x: value[3 * i],
    y: value[3 * i + 1],
    turn: value[3 * i + 2],
  }));
  return { shares, floors };
}
