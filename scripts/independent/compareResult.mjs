import { Comparison } from './compareArrays.mjs';
import { compareDrifts } from './compareDrifts.mjs';
import { ownUnits } from './siUnits.mjs';

const keyOf =
  (...columns) =>
  (row) =>
    JSON.stringify(columns.map((column) => row[column]));

/** Every array of a result before the combinations that this check solves on its own, in the building's units. */
export function compareResult(building, result, solution) {
  const unit = ownUnits[building.system];
  const comparison = new Comparison();
  const levelOf = (i) => building.stories[i].level;
  compareLevels(comparison, building, result, unit);

  const rigidities = building.rigidity.flatMap(({ parts }, i) => {
    const sum = parts.reduce((total, { k }) => total + k, 0) / unit.stiffness;
    return parts.map(({ wall, k }) => ({ level: levelOf(i), wall, k: k / unit.stiffness, scale: { k: sum } }));
  });
  comparison.rows('rigidities', result.rigidities, rigidities, keyOf('level', 'wall'), ['k']);

  const shares = [];
  const lateral = [];
  const transferred = [];
  for (const set of solution.sets) {
    if (set.variant === 'twist') continue;
    const name = { basis: set.basis, case: set.load.name, variant: set.variant };
    const force = (i) => Math.hypot(set.actions[i].x, set.actions[i].y) / unit.force;
    const overturning = (from) =>
      Math.hypot(
        ...['x', 'y'].map((axis) =>
          set.actions.reduce((sum, action, j) => (j < from ? sum : sum + action[axis] * building.stories[j].height), 0),
        ),
      ) / unit.moment;
    for (const { story, wall, direct, torsional, total } of set.shares) {
      const size = force(story);
      const parts = set.basis === 'rigid' ? { direct: direct / unit.force, torsional: torsional / unit.force } : {};
      const scale = { direct: size, torsional: size, total: size };
      shares.push({ ...name, level: levelOf(story), wall, ...parts, total: total / unit.force, scale });
    }
    for (const { story, wall, shear, moment } of set.lateral) {
      const scale = { shear: force(story), moment: overturning(story) };
      const values = { shear: shear / unit.force, moment: moment / unit.moment };
      lateral.push({ ...name, level: levelOf(story), wall, ...values, scale });
    }
    for (const { story, wall, axial, shear, moment } of set.transferred) {
      const scale = { axial: force(story), shear: force(story), moment: overturning(story) };
      const values = { axial: axial / unit.force, shear: shear / unit.force, moment: moment / unit.moment };
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
    for (const basis of solution.bases)
      transferred.push({ basis, case: name, variant: '0', level: levelOf(story - 1), wall, ...values });
  }
  const place = keyOf('basis', 'case', 'variant', 'level', 'wall');
  const rigid = (rows) => rows.filter((row) => row.basis === 'rigid');
  comparison.rows('distribution', result.distribution, shares, place, ['total']);
  comparison.rows('distribution', rigid(result.distribution), rigid(shares), place, ['direct', 'torsional']);
  comparison.rows('lateral', result.lateral, lateral, place, ['shear', 'moment']);
  comparison.rows('gravity', result.gravity, gravity, keyOf('case', 'level', 'wall'), ['axial', 'moment']);
  comparison.rows('transferred', result.transferred, transferred, place, ['axial', 'shear', 'moment']);
  compareDrifts(comparison, building, result, solution);
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
