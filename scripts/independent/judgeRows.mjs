/** Met by choosing from a list, often exactly: they enter a row's ratio only where they are not met. */
const detailing = new Set(['curtains', 'splice', 'spacing', 'fit', 'thickness', 'ties']);

/** Rows against the checks behind them, and quantities against their parts: lines for all that does not hold. */
export function judgeRows(building, result) {
  const lines = [];
  const covered = new Map();
  for (const row of result.schedule) {
    const [from, to] = [building.index.get(row.from), building.index.get(row.to)];
    const where = `row ${row.wall} ${row.from} to ${row.to}`;
    if (!(from <= to)) lines.push(`${where}: lowest story above the highest`);
    const checks = result.checks.filter((check) => {
      const i = building.index.get(check.level);
      return check.wall === row.wall && i >= from && i <= to;
    });
    if (checks.length === 0) lines.push(`${where}: no check stands behind it`);
    if (row.ok !== checks.every((check) => check.ok))
      lines.push(`${where}: ok is ${String(row.ok)}, its checks say otherwise`);
    if (row.state === 'ok' && !row.ok) lines.push(`${where}: state ok, verdict not`);
    const ratios = checks.filter(({ check, ok }) => !ok || !detailing.has(check)).map((check) => check.ratio);
    const worst = ratios.includes(null) ? null : Math.max(...ratios);
    if (row.ratio !== worst && Math.abs(row.ratio - worst) > 1e-12)
      lines.push(`${where}: ratio ${String(row.ratio)}, worst of its checks ${String(worst)}`);
    for (const check of checks) {
      if (check.ok && check.ratio !== null && check.ratio > 1 + 1e-9)
        lines.push(`${where}: ${check.check} ok at ${String(check.ratio)}`);
    }
    for (let i = from; i <= to; i += 1) {
      const key = JSON.stringify([row.wall, i]);
      if (covered.has(key)) lines.push(`${where}: story ${building.stories[i].level} stands in two rows`);
      covered.set(key, row);
      const segment = building.walls.get(row.wall).segments.get(i);
      if (segment === undefined) lines.push(`${where}: the wall does not stand in ${building.stories[i].level}`);
    }
  }
  for (const wall of building.walls.values()) {
    for (const i of wall.segments.keys()) {
      if (!covered.has(JSON.stringify([wall.name, i])))
        lines.push(`${wall.name} ${building.stories[i].level}: in no row`);
    }
  }
  return [...lines, ...judgeQuantities(result.quantities)];
}

function judgeQuantities(quantities) {
  const lines = [];
  const agree = (where, whole, parts) => {
    const sum = parts.reduce((total, part) => total + part, 0);
    if (Math.abs(sum - whole) > 1e-9 * Math.max(1, Math.abs(whole)))
      lines.push(`${where}: ${String(whole)}, parts ${String(sum)}`);
  };
  for (const name of ['concrete', 'steel']) {
    agree(
      `quantities ${name}`,
      quantities[name],
      quantities.walls.map((wall) => wall[name]),
    );
    for (const wall of quantities.walls)
      agree(
        `quantities ${wall.wall} ${name}`,
        wall[name],
        wall.bands.map((band) => band[name]),
      );
  }
  agree('quantities rate', quantities.rate, [quantities.steel / quantities.concrete]);
  return lines;
}
