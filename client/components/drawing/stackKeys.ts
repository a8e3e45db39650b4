/** Where a key leads in the list of stories, given from the top down; null where the key is not for the stack. */
export function storyForKey(
  levels: readonly string[],
  chosen: string | null,
  key: string,
  typed: string,
): string | null {
  const at = chosen === null ? -1 : levels.indexOf(chosen);
  const last = levels.length - 1;
  const pick = (index: number): string | null => levels[Math.max(0, Math.min(last, index))] ?? null;
  switch (key) {
    case 'ArrowUp':
      return pick(at < 0 ? last : at - 1);
    case 'ArrowDown':
      return pick(at < 0 ? 0 : at + 1);
    case 'Home':
      return pick(last);
    case 'End':
      return pick(0);
  }
  if (typed === '') return null;
  return jump(levels, at, typed.toLowerCase());
}

/** The next story whose name, or the number in it, begins with what was typed; a single letter goes round. */
function jump(levels: readonly string[], at: number, typed: string): string | null {
  const fits = (level: string): boolean => {
    const name = level.toLowerCase();
    return name.startsWith(typed) || name.replace(/^\D+/, '').startsWith(typed);
  };
  const start = typed.length === 1 ? at + 1 : Math.max(at, 0);
  for (let step = 0; step < levels.length; step += 1) {
    const level = levels[(start + step) % levels.length];
    if (level !== undefined && fits(level)) return level;
  }
  return null;
}
