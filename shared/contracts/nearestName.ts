/** Edits (insert, delete, replace) between two words. */
function editDistance(a: string, b: string): number {
  let previous = Array.from({ length: b.length + 1 }, (_, index) => index);
  for (let i = 1; i <= a.length; i += 1) {
    const current = [i];
    for (let j = 1; j <= b.length; j += 1) {
      const replaced = (previous[j - 1] ?? 0) + (a[i - 1] === b[j - 1] ? 0 : 1);
      current.push(Math.min(replaced, (previous[j] ?? 0) + 1, (current[j - 1] ?? 0) + 1));
    }
    previous = current;
  }
  return previous[b.length] ?? 0;
}

/** The known name that a mistyped one most likely stands for, or null where none is near. Case does not count. */
export function nearestName(typed: string, known: readonly string[]): string | null {
  const word = typed.slice(0, 60).toLowerCase();
  let best: string | null = null;
  let bestDistance = Infinity;
  for (const name of known) {
    const distance = editDistance(word, name.toLowerCase());
    if (distance < bestDistance) {
      best = name;
      bestDistance = distance;
    }
  }
  return best !== null && bestDistance <= Math.max(1, Math.floor(best.length / 3)) ? best : null;
}
