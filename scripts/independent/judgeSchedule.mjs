import { alphaC, barArea, layBars, makeFlexure, shearStrength } from './sectionStrength.mjs';
import { inch, psi } from './siUnits.mjs';

/**
 * Judges every story of every schedule row again (ordinary walls, ACI 318-19): flexure, shear, distributed steel, spacing,
 * curtains. Answers a list of lines, one for each judgement that differs from what the result says. Bars in
 * compression without ties carry nothing (engineering.md section 6 on 11.7.4.1).
 */
export function judgeSchedule(building, result, solution) {
  const found = { lines: [], flexure: 0, shear: 0, sections: 0, worstFlexure: 0, worstShear: 0 };
  if (result.code !== 'aci318-19' || (building.settings.wallClass ?? 'ordinary') !== 'ordinary') return found;
  const checks = new Map();
  for (const check of result.checks)
    checks.set(JSON.stringify([check.basis, check.wall, check.level, check.check]), check);
  for (const row of result.schedule) {
    const wall = building.walls.get(row.wall);
    let verdict = true;
    for (let i = building.index.get(row.from); i <= building.index.get(row.to); i += 1) {
      for (const basis of solution.bases) {
        const actions = solution.actions.get(basis).get(JSON.stringify([row.wall, i]));
        const of = (name) => checks.get(JSON.stringify([basis, row.wall, building.stories[i].level, name]));
        verdict = judgeStory({ building, row, wall, i, actions, of, found }) && verdict;
      }
    }
    if (row.ok && !verdict) found.lines.push(`row ${row.wall} ${row.from} to ${row.to}: ok in the result, not ok here`);
  }
  return found;
}

function judgeStory({ building, row, wall, i, actions, of, found }) {
  const { settings, system, stories } = building;
  const segment = wall.segments.get(i);
  const height = stories[wall.to].top - stories[wall.from].bottom;
  const unit = system === 'us' ? inch : 1e-3;
  const { bars, webSpacing } = layBars(row, segment, system, settings.edge);
  const where = `${row.wall} ${stories[i].level}`;
  found.sections += 1;

  const flexure = makeFlexure({
    segment,
    bars,
    fy: settings.fy,
    compressed: { end: row.ties !== null && row.ends !== null, web: false },
  });
  const bending = worst(actions, ({ axial, moment }) => {
    const capacity = flexure(axial);
    return capacity === null || capacity <= 0
      ? moment === 0 && capacity !== null
        ? 0
        : Infinity
      : Math.abs(moment) / capacity;
  });
  const ratioT = steelRatio(row.horizontal, row.horizontal.spacing * unit, segment, system);
  const shear = worst(
    actions,
    ({ axial, shear: force }) => Math.abs(force) / shearStrength(segment, height, axial, ratioT, settings),
  );
  compareRatio(found, where, 'flexure', of('flexure'), bending);
  compareRatio(found, where, 'shear', of('shear'), shear);

  let verdict = bending <= 1 + 1e-6 && shear <= 1 + 1e-6;
  const rule = distributedSteel({ actions, segment, height, settings, row, ratioT, system });
  const web = row.ends === null ? webSpacing : Math.max(webSpacing, 0);
  const ratioL = steelRatio(row.vertical, web, segment, system);
  const tests = [
    ['rho_t', ratioT, rule.leastT],
    ['rho_l', ratioL, rule.leastL],
    ['vertical spacing', rule.mostVertical, row.vertical.spacing * unit],
    ['horizontal spacing', rule.mostHorizontal, row.horizontal.spacing * unit],
    [
      'curtains',
      Math.min(row.vertical.curtains, row.horizontal.curtains),
      segment.thickness > 10.0001 * rule.inchHere ? 2 : 1,
    ],
  ];
  for (const [name, has, needs] of tests) {
    if (has >= needs * (1 - 1e-6)) continue;
    verdict = false;
    if (row.ok) found.lines.push(`${where}: ${name} has ${has.toPrecision(6)}, needs ${needs.toPrecision(6)}`);
  }
  return verdict;
}

const steelRatio = (cell, spacing, segment, system) =>
  (cell.curtains * barArea(cell.bar, system)) / (spacing * segment.thickness);

const worst = (actions, ratio) => actions.reduce((largest, action) => Math.max(largest, ratio(action)), 0);

/** Least steel and largest spacings of 11.6 and 11.7; SI buildings have the limits of 318M. */
function distributedSteel({ actions, segment, height, settings, row, ratioT, system }) {
  const us = system === 'us';
  const root = Math.min(100, Math.sqrt(segment.fc / psi)) * psi;
  const area = segment.length * segment.thickness;
  const low = actions.every(
    ({ axial, shear }) =>
      Math.abs(shear) <= 0.5 * 0.75 * alphaC(segment, height, axial) * settings.lambda * root * area * (1 + 1e-9),
  );
  const fyt = Math.min(settings.fyt, 60000 * psi);
  const small = (bar) => bar <= (us ? 5 : 16);
  const strong = (stress) => stress >= (us ? 60000 * psi : 420e6) * (1 - 1e-9);
  const most = Math.min(3 * segment.thickness, us ? 18 * inch : 0.45);
  const inchHere = us ? inch : 0.025;
  if (low) {
    return {
      leastT: small(row.horizontal.bar) && strong(settings.fyt) ? 0.002 : 0.0025,
      leastL: small(row.vertical.bar) && strong(settings.fy) ? 0.0012 : 0.0015,
      mostVertical: most,
      mostHorizontal: most,
      inchHere,
    };
  }
  const needed = actions.reduce((largest, { axial, shear }) => {
    const stress = Math.abs(shear) / (0.75 * area) - alphaC(segment, height, axial) * settings.lambda * root;
    return Math.max(largest, stress / fyt);
  }, 0);
  const slope = 0.5 * Math.max(0, 2.5 - height / segment.length) * (ratioT - 0.0025);
  return {
    leastT: 0.0025,
    leastL: Math.max(0.0025, Math.min(0.0025 + slope, needed)),
    mostVertical: Math.min(most, segment.length / 3),
    mostHorizontal: Math.min(most, segment.length / 5),
    inchHere,
  };
}

function compareRatio(found, where, name, check, ratio) {
  if (check === undefined) {
    found.lines.push(`${where}: no ${name} check in the result`);
    return;
  }
  const theirs = check.ratio ?? Infinity;
  const deviation = theirs === ratio ? 0 : Math.abs(theirs - ratio) / Math.max(theirs, ratio);
  const worstName = name === 'flexure' ? 'worstFlexure' : 'worstShear';
  found[name] += 1;
  if (Number.isFinite(deviation)) found[worstName] = Math.max(found[worstName], deviation);
  if (!(deviation <= 0.001) && Math.max(theirs, ratio) > 1e-4) {
    found.lines.push(`${where}: ${name} ratio ${String(theirs)} in the result, ${String(ratio)} here`);
  }
}
