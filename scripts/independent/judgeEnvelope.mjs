/** Rows of `envelope` stand where asked and hold the worst of the chosen bases, each from one basis whole. */
export function judgeEnvelope(building, result, solution) {
  const lines = [];
  const asked = building.settings.basis.includes('envelope');
  const rows = result.checks.filter(({ basis }) => basis === 'envelope');
  if (!asked) return rows.length === 0 ? [] : ['checks: rows of envelope that nobody asked for'];
  const keyOf = ({ wall, level, check }) => JSON.stringify([wall, level, check]);
  const behind = new Map();
  for (const check of result.checks) {
    if (!solution.bases.includes(check.basis) || check.wall === '') continue;
    const key = keyOf(check);
    behind.set(key, [...(behind.get(key) ?? []), check]);
  }
  const size = ({ ratio }) => ratio ?? Infinity;
  for (const row of rows) {
    const list = behind.get(keyOf(row)) ?? [];
    const worst = Math.max(...list.map(size));
    const whole = list.some(
      (check) =>
        size(check) === worst && check.demand === row.demand && check.capacity === row.capacity && check.ok === row.ok,
    );
    if (size(row) !== worst || !whole) lines.push(`envelope ${keyOf(row)}: not the worst of its bases`);
    behind.delete(keyOf(row));
  }
  for (const key of behind.keys()) lines.push(`envelope ${key}: missing in the result`);
  return lines;
}
