import { editableTables, type EditableTable } from '#shared/contracts/tableColumns';

const words: readonly (readonly [RegExp, EditableTable])[] = [
  [/overrid|transfer/, 'overrides'],
  [/combin|combo/, 'combinations'],
  [/gravit|dead|takedown/, 'gravity'],
  [/force|lateral|wind|seism|diaphragm/, 'forces'],
  [/wall/, 'walls'],
  [/level|stor(y|ies|ey)|floor/, 'levels'],
];

/** The table that a file is most likely for, by its name; null: the person says. */
export function guessTable(fileName: string): EditableTable | null {
  const name = fileName.toLowerCase();
  const exact = editableTables.find((table) => name.replace(/\.[a-z]+$/, '') === table);
  return exact ?? words.find(([word]) => word.test(name))?.[1] ?? null;
}

/** Files of one drop in the order in which tables refer to each other. */
export function inTableOrder(files: readonly File[]): readonly File[] {
  const place = (file: File) => {
    const table = guessTable(file.name);
    return table === null ? editableTables.length : editableTables.indexOf(table);
  };
  return [...files].sort((a, b) => place(a) - place(b));
}
