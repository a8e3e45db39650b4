import { Comparison } from './compareArrays.mjs';
import { ownUnits } from './siUnits.mjs';

const keyOf =
  (...columns) =>
  (row) =>
    JSON.stringify(columns.map((column) => row[column]));

/** Every array of a result that this check solves on its own, in the building's units. */
export function compareResult(building, result, solution) {
  const unit = ownUnits[building.system];
  const comparison = new Comparison();
  const levelOf = (i) => building.stories[i].level;
  const rigid = (rows) => rows.filter((row) => row.basis === 'rigid');
  compareLevels(comparison, building, result, unit);

  const rigidities = building.rigidity.flatMap(({ parts }, i) => {
    const sum = parts.reduce((total, { k }) => total + k, 0) / unit.stiffness;
    return parts.map(({ wall, k }) => ({ level: levelOf(i), wall, k: k / unit.stiffness, scale: { k: sum } }));
  });
  comparison.rows('rigidities', result.rigidities, rigidities, keyOf('level', 'wall'), ['k']);

  const shares = [];
  const lateral = [];
  const transferred = [];
  for (const set of solution.lateral) {
    const name = { case: set.load.name, variant: set.variant };
    const force = (i) => Math.hypot(set.actions[i].x, set.actions[i].y) / unit.force;
    const overturning = (from) =>
      Math.hypot(
        ...['x', 'y'].map((axis) =>
          set.actions.reduce((sum, action, j) => (j < from ? sum : sum + action[axis] * building.stories[j].height), 0),
        ),
      ) / unit.moment;
    for (const { story, wall, direct, torsional, total } of set.shares) {
      const size = force(story);
      shares.push({
        ...name,
        level: levelOf(story),
        wall,
        direct: direct / unit.force,
        torsional: torsional / unit.force,
        total: total / unit.force,
        scale: { direct: size, torsional: size, total: size },
      });
    }
    for (const { story, wall, shear, moment } of set.lateral) {
      const scale = { shear: force(story), moment: overturning(story) };
      lateral.push({
        ...name,
        level: levelOf(story),
        wall,
        shear: shear / unit.force,
        moment: moment / unit.moment,
        scale,
      });
    }
    for (const { story, wall, shear, moment } of set.transferred) {
      const scale = { axial: force(story), shear: force(story), moment: overturning(story) };
      const values = { axial: 0, shear: shear / unit.force, moment: moment / unit.moment };
      transferred.push({ ...name, level: levelOf(story), wall, ...values, scale });
    }
  }
  const gravity = solution.gravity.map((row) => {
    const same = solution.gravity.filter(({ story, case: other }) => story === row.story && other === row.case);
    const sum = same.reduce((total, { axial }) => total + Math.abs(axial), 0) / unit.force;
    const values = { axial: row.axial / unit.force, moment: row.moment / unit.moment };
    return { ...row, ...values, level: levelOf(row.story), scale: { axial: sum, moment: sum } };
  });
  for (const { lowest, story, wall, case: name, axial, moment, scale } of gravity) {
    if (!lowest || story === 0) continue;
    const values = { axial, shear: 0, moment, scale: { ...scale, shear: scale.axial } };
    transferred.push({ case: name, variant: '0', level: levelOf(story - 1), wall, ...values });
  }
  const place = keyOf('case', 'variant', 'level', 'wall');
  comparison.rows('distribution', rigid(result.distribution), shares, place, ['direct', 'torsional', 'total']);
  comparison.rows('lateral', rigid(result.lateral), lateral, place, ['shear', 'moment']);
  comparison.rows('gravity', result.gravity, gravity, keyOf('case', 'level', 'wall'), ['axial', 'moment']);
  comparison.rows('transferred', rigid(result.transferred), transferred, place, ['axial', 'shear', 'moment']);
  return comparison;
}

function compareLevels(comparison, building, result, unit) {
  const levels = new Map(result.levels.map((level) => [level.level, level]));
  building.stories.forEach((story, i) => {
    const level = levels.get(story.level);
    if (level === undefined) {
      comparison.lines.push(`levels ${story.level}: missing in the result`);
      return;
    }
    const where = `levels ${story.level}`;
    const size = Math.max(story.extentx, story.extenty) / unit.length;
    comparison.number(`${where} elevation`, level.elevation, story.top / unit.length, 1);
    comparison.number(`${where} height`, level.height, story.height / unit.length, 1);
    comparison.number(`${where} rigidity x`, level.rigidity?.x, building.rigidity[i].x / unit.length, size);
    comparison.number(`${where} rigidity y`, level.rigidity?.y, building.rigidity[i].y / unit.length, size);
    for (const load of building.cases) {
      const above = load.levels.slice(i);
      const sum = (column, by) => above.reduce((total, force) => total + force[column], 0) / by;
      const force = Math.max(1, Math.hypot(sum('fx', unit.force), sum('fy', unit.force)));
      const given = level.force[load.name];
      const shear = level.shear[load.name];
      comparison.number(`${where} ${load.name} fx`, given?.fx, load.levels[i].fx / unit.force, force);
      comparison.number(`${where} ${load.name} fy`, given?.fy, load.levels[i].fy / unit.force, force);
      comparison.number(`${where} ${load.name} mz`, given?.mz, load.levels[i].mz / unit.moment, force);
      comparison.number(`${where} ${load.name} story vx`, shear?.vx, sum('fx', unit.force), force);
      comparison.number(`${where} ${load.name} story vy`, shear?.vy, sum('fy', unit.force), force);
      comparison.number(`${where} ${load.name} story mz`, shear?.mz, sum('torque', unit.moment), force);
    }
  });
}

/** Listed actions against the own expansion: every one must be among mine, and the extremes must be the same. */
export function compareActions(building, result, solution) {
  const unit = ownUnits[building.system];
  const comparison = new Comparison();
  const listed = new Map();
  for (const action of result.actions.filter((row) => row.basis === 'rigid')) {
    const key = JSON.stringify([action.wall, building.index.get(action.level)]);
    if (!listed.has(key)) listed.set(key, []);
    listed.get(key).push(action);
  }
  let counts = null;
  for (const [key, forces] of solution.actions) {
    const own = forces.map(({ axial, moment, shear }) => [
      axial / unit.force,
      moment / unit.moment,
      shear / unit.force,
    ]);
    const theirs = listed.get(key) ?? [];
    const scales = [0, 1, 2].map((n) => Math.max(1e-9, ...own.map((values) => Math.abs(values[n]))));
    const free = new Set(own);
    for (const { combination, axial, moment, shear } of theirs) {
      const match = [...free].find((values) =>
        [axial, moment, shear].every((value, n) => Math.abs(value - values[n]) <= 1e-6 * scales[n]),
      );
      comparison.compared += 1;
      if (match === undefined)
        comparison.lines.push(
          `actions ${key} ${combination}: [${[axial, moment, shear].join(', ')}] is not in the own expansion`,
        );
      else free.delete(match);
    }
    const extremes = [
      ['axial largest', ([a]) => a],
      ['axial smallest', ([a]) => -a],
      ['moment', ([, m]) => Math.abs(m)],
      ['shear', ([, , v]) => Math.abs(v)],
    ];
    for (const [name, pick] of extremes) {
      const mine = Math.max(...own.map(pick));
      const there = Math.max(...theirs.map(({ axial, moment, shear }) => pick([axial, moment, shear])));
      comparison.number(`actions ${key} ${name}`, there, mine, Math.abs(mine));
    }
    counts ??= { own: own.length, listed: theirs.length };
  }
  return { comparison, counts };
}
