/** Table 12.12-1 for buildings that are neither masonry nor low with tolerant partitions. */
const seismicLimits = { I: 0.02, II: 0.02, III: 0.015, IV: 0.01 };

/** drifts[] against own values, nulls where the whole height can't be solved, and the drift rows of checks[]. */
export function compareDrifts(comparison, building, result, solution) {
  const listed = new Map(result.drifts.map((row) => [JSON.stringify([row.case, row.variant, row.level]), row]));
  const values = ['x', 'y', 'edge', 'torsionRatio', 'ax', 'theta'];
  let own = 0;
  for (const { load, variant, rows } of solution.drifts) {
    building.stories.forEach(({ level }, i) => {
      own += 1;
      const key = JSON.stringify([load.name, variant, level]);
      const theirs = listed.get(key);
      if (theirs === undefined) {
        comparison.lines.push(`drifts ${key}: missing in the result`);
        return;
      }
      const row = rows?.[i];
      const scale = row === undefined ? 0 : Math.max(Math.abs(row.x), Math.abs(row.y), row.edge);
      for (const column of values) {
        const mine = row?.[column] ?? null;
        const their = theirs[column] ?? null;
        if (mine === null || their === null) {
          if (mine !== their) comparison.lines.push(`drifts ${key} ${column}: ${String(their)}, here ${String(mine)}`);
        } else comparison.number(`drifts ${key} ${column}`, their, mine, column === 'theta' ? 1e-3 : scale);
      }
    });
  }
  if (own !== listed.size || own !== result.drifts.length)
    comparison.lines.push(`drifts: ${String(result.drifts.length)} rows in the result, ${String(own)} here`);
  compareDriftChecks(comparison, building, result, solution);
}

function compareDriftChecks(comparison, building, result, solution) {
  const { settings } = building;
  const service = settings.forceLevel === 'service';
  const expected = new Map();
  const raise = (name, level, demand, capacity) => {
    const key = JSON.stringify([name, level]);
    if (!(expected.get(key)?.demand >= demand)) expected.set(key, { demand, capacity });
  };
  const seismicLimit = settings.driftLimit ?? seismicLimits[settings.riskCategory];
  for (const { load, variant, rows } of solution.drifts) {
    if (rows === null || load.kind === 'other') continue;
    if (load.kind === 'seismic' && settings.accidental > 0 && variant === '0') continue;
    let roof = 0;
    rows.forEach((row, i) => {
      const { level, height } = building.stories[i];
      const along = row[load.direction];
      roof += along * height;
      const drift = row.torsionRatio !== null && row.torsionRatio > 1.2 ? row.edge : Math.abs(along);
      if (load.kind === 'seismic')
        raise('drift', level, (drift * settings.cd) / settings.ie / (service ? 0.7 : 1), seismicLimit);
      else raise('drift-wind', level, (drift * settings.windDriftFactor) / (service ? 0.6 : 1), 1 / 400);
    });
    const top = building.stories.at(-1);
    const total =
      (Math.abs(roof) * settings.windDriftFactor) / (service ? 0.6 : 1) / (top.top - building.stories[0].bottom);
    if (load.kind === 'wind') raise('drift-wind-total', top.level, total, 1 / 400);
  }
  const listed = result.checks.filter(({ check }) => check.startsWith('drift'));
  if (listed.length !== expected.size)
    comparison.lines.push(`drift checks: ${String(listed.length)} in the result, ${String(expected.size)} here`);
  for (const { check, level, demand, capacity, ok } of listed) {
    const mine = expected.get(JSON.stringify([check, level]));
    const where = `check ${check} ${level}`;
    comparison.number(`${where} demand`, demand, mine?.demand, mine?.demand);
    comparison.number(`${where} capacity`, capacity, mine?.capacity, 1);
    if (ok !== mine?.demand <= mine?.capacity * (1 + 1e-9)) comparison.lines.push(`${where}: ok is ${String(ok)}`);
  }
}
