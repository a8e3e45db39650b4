import { storyActions } from './solveLateral.mjs';

/**
 * Residuals of a result against the tables alone: force and torque of the shares, overturning of the wall moments about
 * both axes at every story bottom, vertical load. Nothing of the solver's own shares is used; walls that stop above the
 * base count with what the result lists as transferred.
 */
export function residuals(building, result, unit) {
  const out = [];
  const place = (rows) => {
    const map = new Map();
    for (const row of rows) {
      const key = JSON.stringify([row.case, row.variant, row.level]);
      if (!map.has(key)) map.set(key, []);
      map.get(key).push(row);
    }
    return map;
  };
  const rigid = (rows) => rows.filter((row) => row.basis === 'rigid');
  const shares = place(rigid(result.distribution));
  const lateral = place(rigid(result.lateral));
  for (const load of building.cases) {
    const variants = load.kind === 'seismic' && building.settings.accidental > 0 ? ['0', '+', '-'] : ['0'];
    for (const variant of variants) {
      const actions = storyActions(building, load, variant);
      building.stories.forEach((story, i) => {
        const rows = shares.get(JSON.stringify([load.name, variant, story.level])) ?? [];
        const moments = lateral.get(JSON.stringify([load.name, variant, story.level])) ?? [];
        const segment = (row) => building.walls.get(row.wall).segments.get(i);
        const forces = (pick) => rows.map((row) => row.total * unit.force * pick(segment(row)));
        const add = (line, parts, applied, base) =>
          out.push({ line, case: load.name, variant, level: story.level, value: relative(parts, applied, base) });
        add(
          'force x',
          forces(({ c }) => c),
          actions[i].x,
          actions[0].x,
        );
        add(
          'force y',
          forces(({ s }) => s),
          actions[i].y,
          actions[0].y,
        );
        add(
          'torque',
          forces(({ c, s, x, y }) => x * s - y * c),
          actions[i].torque,
          actions[0].torque,
        );
        const stopped = rigid(result.transferred).filter(
          (row) => row.case === load.name && row.variant === variant && building.index.get(row.level) >= i,
        );
        const directionOf = (row) => {
          const wall = building.walls.get(row.wall);
          return wall.segments.get(wall.from);
        };
        for (const [line, part, component] of [
          ['overturning x', 'c', 'fx'],
          ['overturning y', 's', 'fy'],
        ]) {
          const parts = [...moments, ...stopped].map((row) => row.moment * unit.moment * directionOf(row)[part]);
          const applied = (from) =>
            load.levels.reduce(
              (sum, force, j) =>
                j < from ? sum : sum + force[component] * (building.stories[j].top - building.stories[from].bottom),
              0,
            );
          add(line, parts, applied(i), applied(0));
        }
      });
    }
  }
  return [...out, ...verticalResiduals(building, result, unit)];
}

function verticalResiduals(building, result, unit) {
  const columns = { D: 'dead', L: 'live', Lr: 'rooflive', S: 'snow' };
  return Object.entries(columns).flatMap(([name, column]) => {
    const applied = (from) => {
      let sum = 0;
      for (const row of building.gravity) if (building.index.get(row.level) >= from) sum += row[column] ?? 0;
      if (name !== 'D' || !building.settings.selfWeight) return sum;
      for (const wall of building.walls.values()) {
        for (const [i, { length, thickness, opening }] of wall.segments) {
          if (i >= from)
            sum += length * thickness * building.stories[i].height * (1 - opening) * building.settings.concreteWeight;
        }
      }
      return sum;
    };
    return building.stories.map((story, i) => {
      const standing = result.gravity.filter((row) => row.case === name && row.level === story.level);
      const stopped = result.transferred.filter(
        (row) => row.basis === 'rigid' && row.case === name && building.index.get(row.level) >= i,
      );
      const parts = [...standing, ...stopped].map((row) => row.axial * unit.force);
      return {
        line: 'vertical',
        case: name,
        variant: '0',
        level: story.level,
        value: relative(parts, applied(i), applied(0)),
      };
    });
  });
}

/** Sum less applied, over the larger of the action and the sum of magnitudes, not below 0.1 % of the base value. */
function relative(parts, applied, base) {
  const sum = parts.reduce((total, part) => total + part, 0);
  const magnitudes = parts.reduce((total, part) => total + Math.abs(part), 0);
  const scale = Math.max(Math.abs(applied), magnitudes, Math.abs(base) / 1000);
  return scale === 0 ? 0 : Math.abs(sum - applied) / scale;
}
