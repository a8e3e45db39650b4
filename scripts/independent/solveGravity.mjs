import { foot, pound } from './siUnits.mjs';

export const gravityCases = { D: 'dead', L: 'live', Lr: 'rooflive', S: 'snow' };

/** Live rows that 4.7.2 does not reduce and whose factor stays 1.0: other classes, and more than 100.5 psf on the area. */
function isKept(row) {
  if (row.liveclass !== undefined && row.liveclass.toLowerCase() !== 'reducible') return true;
  const area = row.tributaryarea ?? 0;
  return area > 0 && (row.live ?? 0) / area > (100.5 * pound) / foot ** 2;
}

/**
 * Axial and moment of every wall at every story bottom by gravity case. Loads of a level enter at the top of its story
 * with their eccentricity toward (x2, y2); self-weight of a story acts at its own centroid; where the centroid moves,
 * the axial from above gains a lever. L is reduced; `kept` is the part of it whose live factor stays 1.0.
 */
export function solveGravity(building) {
  const out = [];
  for (const wall of building.walls.values()) {
    for (const [name, column] of Object.entries(gravityCases)) {
      if (name === 'L') out.push(...solveLive(building, wall));
      else out.push(...runDown(building, wall, name, (row) => row[column] ?? 0));
    }
  }
  return out;
}

function runDown(building, wall, name, loadOf, withAssigned = true) {
  const { settings, stories } = building;
  const out = [];
  let axial = 0;
  let moment = 0;
  for (let i = wall.to; i >= wall.from; i -= 1) {
    const segment = wall.segments.get(i);
    const above = wall.segments.get(i + 1);
    if (above !== undefined) {
      const lever = (above.x - segment.x) * segment.c + (above.y - segment.y) * segment.s;
      moment += axial * lever;
    }
    for (const row of rowsAt(building, wall, i)) {
      axial += loadOf(row);
      moment += loadOf(row) * (row.eccentricity ?? 0);
    }
    if (name === 'D' && settings.selfWeight) {
      const faceArea = segment.length * stories[i].height * (1 - segment.opening);
      axial += segment.thickness * faceArea * settings.concreteWeight;
    }
    const assigned = withAssigned ? assignedAt(building, wall, name, i) : { axial: 0, moment: 0 };
    axial += assigned.axial;
    moment += assigned.moment;
    out.push({
      story: i,
      wall: wall.name,
      case: name,
      axial,
      moment,
      lowest: i === wall.from,
      kept: { axial: 0, moment: 0 },
    });
  }
  return out;
}

const rowsAt = (building, wall, i) =>
  building.gravity.filter((row) => row.wall === wall.name && row.level === building.stories[i].level);

/** A transfer typed for a gravity case enters at its level and goes down. */
function assignedAt(building, wall, name, i) {
  const sum = { axial: 0, moment: 0 };
  for (const row of building.overrides) {
    if (row.kind !== 'transfer' || row.case !== name || row.wall !== wall.name) continue;
    if (building.index.get(row.level) !== i) continue;
    sum.axial += row.axial ?? 0;
    sum.moment += row.moment ?? 0;
  }
  return sum;
}

function solveLive(building, wall) {
  const { settings } = building;
  const part = (test, assigned) => runDown(building, wall, 'L', (row) => (test(row) ? (row.live ?? 0) : 0), assigned);
  const kept = part(isKept, false);
  const reducible = (row) =>
    !isKept(row) && settings.liveReduction && (row.tributaryarea ?? 0) > 0 && (row.live ?? 0) > 0;
  const full = part((row) => !isKept(row) && !reducible(row), true);
  const reduced = part(reducible, false);
  let area = 0;
  let floors = 0;
  return full.map((row, n) => {
    const rows = rowsAt(building, wall, row.story).filter(reducible);
    area += rows.reduce((sum, { tributaryarea }) => sum + tributaryarea, 0);
    floors += rows.length > 0 ? 1 : 0;
    const factor = liveFactorOf(settings.kll * area, floors);
    const add = (column) => row[column] + kept[n][column] + factor * reduced[n][column];
    return {
      ...row,
      axial: add('axial'),
      moment: add('moment'),
      kept: { axial: kept[n].axial, moment: kept[n].moment },
    };
  });
}

/** 0.25 + 15 / sqrt(area in ft2), from 400 ft2, not below 0.5 for one floor and 0.4 for more. */
export function liveFactorOf(area, floors) {
  const feet = area / foot ** 2;
  if (feet < 400) return 1;
  return Math.max(floors > 1 ? 0.4 : 0.5, 0.25 + 15 / Math.sqrt(feet));
}
