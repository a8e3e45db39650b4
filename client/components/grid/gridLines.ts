/** A grid from top to bottom: group heads, rows and group feet, each a line of its own. */
export type GridLine =
  | { readonly kind: 'head'; readonly group: string; readonly key: string }
  | { readonly kind: 'row'; readonly rowIndex: number; readonly key: string }
  | { readonly kind: 'foot'; readonly group: string; readonly key: string };

export function gridLines<Row>(
  rows: readonly Row[],
  rowId: (row: Row) => string,
  groupOf: ((row: Row) => string) | undefined,
  parts: { readonly heads: boolean; readonly feet: boolean },
): readonly GridLine[] {
  const lines: GridLine[] = [];
  let open: string | null = null;
  const close = () => {
    if (open !== null && parts.feet) lines.push({ kind: 'foot', group: open, key: `foot ${open}` });
  };
  rows.forEach((row, rowIndex) => {
    const group = groupOf?.(row) ?? null;
    if (group !== open) {
      close();
      open = group;
      if (group !== null && parts.heads) lines.push({ kind: 'head', group, key: `head ${group}` });
    }
    lines.push({ kind: 'row', rowIndex, key: rowId(row) });
  });
  close();
  return lines;
}
