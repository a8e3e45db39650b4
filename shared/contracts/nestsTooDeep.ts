/** The deepest contract has five levels; what nests far deeper is meant to exhaust whoever prints or merges it. */
const deepest = 32;

/** True where lists and objects stand more than 32 levels inside each other. Goes no deeper than that itself. */
export function nestsTooDeep(value: unknown, left = deepest): boolean {
  if (typeof value !== 'object' || value === null) return false;
  if (left === 0) return true;
  return Object.values(value).some((inner) => nestsTooDeep(inner, left - 1));
}
