/** A band by its lowest and highest story: `L4 – L5`, one story `L5`. */
export const printLevelRange = (from: string, to: string): string => (from === to ? to : `${from} – ${to}`);

/** Reads `L4 – L5`, `L4 - L5`, `L4 to L5` and `L5` back; names that themselves hold ` - ` are not read. */
export function parseLevelRange(text: string): { from: string; to: string } | null {
  const parts = text
    .trim()
    .split(/\s+(?:[–-]|to)\s+/)
    .map((part) => part.trim());
  const [from, to = from, ...rest] = parts;
  return from && to && rest.length === 0 ? { from, to } : null;
}

/** The limits of a band in words: `top of L3 to L5`, at the foot `base to L5`. `below` is the story under the band. */
export const sayBandLimits = (below: string | null, to: string): string =>
  below === null ? `base to ${to}` : `top of ${below} to ${to}`;
