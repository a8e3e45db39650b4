/** JSON with sorted keys: two values with the same text are equal bit for bit (JSON prints every double exactly). */
export function canonicalText(value: unknown): string {
  return JSON.stringify(value, (_key, part: unknown) => {
    if (part === null || typeof part !== 'object' || Array.isArray(part)) return part;
    const entries = Object.entries(part).filter(([, member]) => member !== undefined);
    return Object.fromEntries(entries.sort(([a], [b]) => (a < b ? -1 : 1)));
  });
}
