/**
 * Residuals of a result against the tables alone: force and torque of the shares, overturning of the wall moments about
 * both axes at every story bottom, vertical load. Nothing of the solver's own shares is used; walls that stop above the
 * base count with what the result lists as transferred.
 */
export function residuals(building, result, unit, solution) {
  const out = [];
  for (const basis of solution.bases) {
    for (const set of solution.sets) {
      if (set.basis === basis && set.variant !== 'twist') out.push(...ofSet(building, result, unit, set));
    }
    out.push(...verticalResiduals(building, result, unit, basis));
  }
  return out;
}

/** Stories below an own share do not close in torque; `flexible` closes each direction by force, skew walls push sideways. */
function ofSet(building, result, unit, { basis, load, variant, actions }) {
  const out = [];
  const own = (rows) => rows.filter((row) => row.basis === basis && row.case === load.name && row.variant === variant);
  const shares = own(result.distribution);
  const lateral = own(result.lateral);
  const stopped = own(result.transferred);
  const belongs = (row) => row.case === undefined || row.case === load.name;
  const overrides = building.overrides.filter(belongs);
  const sideways =
    basis === 'flexible' &&
    [...building.walls.values()].some(
      (wall) => Math.abs(wall.segments.get(wall.from).c * wall.segments.get(wall.from).s) > 1e-9,
    );
  const directionOf = (row) => {
    const wall = building.walls.get(row.wall);
    return wall.segments.get(wall.from);
  };
  const size = Math.hypot(actions[0].x, actions[0].y);
  building.stories.forEach((story, i) => {
    const here = shares.filter((row) => row.level === story.level);
    const forces = (pick) => here.map((row) => row.total * unit.force * pick(directionOf(row)));
    const add = (line, parts, applied, base) =>
      out.push({ line, basis, case: load.name, variant, level: story.level, value: relative(parts, applied, base) });
    if (sideways) return;
    add(
      'force x',
      forces(({ c }) => c),
      actions[i].x,
      size,
    );
    add(
      'force y',
      forces(({ s }) => s),
      actions[i].y,
      size,
    );
    const shared = overrides.some((row) => row.kind === 'share' && row.level === story.level);
    if (basis !== 'flexible' && !shared)
      add(
        'torque',
        forces(({ c, s, x, y }) => x * s - y * c),
        actions[i].torque,
        actions[0].torque,
      );
    if (overrides.some((row) => row.kind === 'transfer')) return;
    const moments = lateral.filter((row) => row.level === story.level);
    const above = stopped.filter((row) => building.index.get(row.level) >= i);
    for (const [line, part, component] of [
      ['overturning x', 'c', 'fx'],
      ['overturning y', 's', 'fy'],
    ]) {
      const parts = [...moments, ...above].map((row) => row.moment * unit.moment * directionOf(row)[part]);
      const applied = (from) =>
        load.levels.reduce(
          (sum, force, j) =>
            j < from ? sum : sum + force[component] * (building.stories[j].top - building.stories[from].bottom),
          0,
        );
      add(line, parts, applied(i), size * (building.stories.at(-1).top - building.stories[0].bottom));
    }
  });
  return out;
}

function verticalResiduals(building, result, unit, basis) {
  const columns = { D: 'dead', L: 'live', Lr: 'rooflive', S: 'snow' };
  if (building.settings.liveReduction) delete columns.L; // what is reduced does not arrive; the arrays are compared instead
  return Object.entries(columns).flatMap(([name, column]) => {
    const applied = (from) => {
      let sum = 0;
      for (const row of building.gravity) if (building.index.get(row.level) >= from) sum += row[column] ?? 0;
      for (const row of building.overrides)
        if (row.kind === 'transfer' && row.case === name && building.index.get(row.level) >= from)
          sum += row.axial ?? 0;
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
        (row) => row.basis === basis && row.case === name && building.index.get(row.level) >= i,
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
