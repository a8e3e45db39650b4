/** Rows as tab-separated text, as spreadsheets put it on the clipboard: quoted where a cell holds a tab, quote or line break. */
export function toClipboard(rows: readonly (readonly string[])[]): string {
  const cell = (text: string) => (/[\t\n\r"]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text);
  return rows.map((row) => row.map(cell).join('\t')).join('\n');
}

/** The other way round; a line break at the very end adds no row. */
export function fromClipboard(text: string): readonly (readonly string[])[] {
  const rows: string[][] = [];
  let row: string[] = [];
  let cell = '';
  let quoted = false;
  const endCell = () => {
    row.push(cell);
    cell = '';
  };
  const endRow = () => {
    endCell();
    rows.push(row);
    row = [];
  };
  const source = text.replaceAll('\r\n', '\n').replaceAll('\r', '\n');
  for (let i = 0; i < source.length; i += 1) {
    const sign = source.charAt(i);
    if (quoted) {
      if (sign !== '"') cell += sign;
      else if (source.charAt(i + 1) === '"') {
        cell += '"';
        i += 1;
      } else quoted = false;
    } else if (sign === '"' && cell === '') quoted = true;
    else if (sign === '\t') endCell();
    else if (sign === '\n') endRow();
    else cell += sign;
  }
  if (cell !== '' || row.length > 0) endRow();
  return rows;
}
