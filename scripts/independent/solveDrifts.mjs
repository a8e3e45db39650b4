/**
 * Drifts of one case and variant from the movement of the floors: at the level's own point, at the two edges across the
 * case's direction, torsion ratio from story drifts and Ax from level displacements (both before any amplification).
 */
const across = { x: 'y', y: 'x' };

/** Displacement of a floor in one direction at a point. */
const moved = (floor, axis, x, y) => (axis === 'x' ? floor.x - floor.turn * y : floor.y + floor.turn * x);
const still = { x: 0, y: 0, turn: 0 };

function edges(story, axis) {
  const low = story[`edge${across[axis]}`];
  return [low, low + story[`extent${across[axis]}`]];
}

function edgeValues(story, axis, floor) {
  return edges(story, axis).map((at) => (axis === 'x' ? moved(floor, 'x', 0, at) : moved(floor, 'y', at, 0)));
}

const ratioOf = ([a, b]) => Math.max(Math.abs(a), Math.abs(b)) / (Math.abs(a + b) / 2);

/** Ax of every level: the larger of both variants, between 1 and 3. */
export function amplification(building, load, plus, minus) {
  return building.stories.map((story, i) => {
    const one = ({ floors }) => (ratioOf(edgeValues(story, load.direction, floors[i])) / 1.2) ** 2;
    return Math.min(3, Math.max(1, one(plus), one(minus)));
  });
}

export function storyDrifts(building, load, variant, { floors, plain, ax }) {
  const axis = load.direction;
  const seismic = load.kind === 'seismic';
  return building.stories.map((story, i) => {
    const relative = (set) => {
      const [upper, lower] = [set[i], set[i - 1] ?? still];
      return { x: upper.x - lower.x, y: upper.y - lower.y, turn: upper.turn - lower.turn };
    };
    const drift = relative(floors);
    const h = story.height;
    const x = moved(drift, 'x', story.x, story.y) / h;
    const y = moved(drift, 'y', story.x, story.y) / h;
    const edge = Math.max(...edgeValues(story, axis, drift).map(Math.abs)) / h;
    const named = seismic && variant !== '0';
    const torsionRatio = named ? Math.min(10, ratioOf(edgeValues(story, axis, relative(plain)))) : null;
    const worst = torsionRatio !== null && torsionRatio > 1.2 ? edge : Math.abs(axis === 'x' ? x : y);
    return { story: i, x, y, edge, torsionRatio, ax: named ? ax[i] : null, theta: theta(building, load, i, worst) };
  });
}

function theta(building, load, i, drift) {
  if (load.kind !== 'seismic') return null;
  const above = building.stories.slice(i);
  if (above.some((story) => story.gravity === undefined)) return null;
  const weight = above.reduce((sum, story) => sum + story.gravity, 0);
  const shear = load.levels.slice(i).reduce((sum, force) => sum + force[`f${load.direction}`], 0);
  return shear === 0 ? null : (weight * drift) / Math.abs(shear);
}
