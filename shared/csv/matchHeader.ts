import { nearestName } from '../contracts/nearestName.ts';
import { tableColumns } from '../contracts/tableColumns.ts';

import { quoteText } from './quoteText.ts';
import { readUnit } from './unitConversion.ts';

import type { Column } from '../contracts/tableColumns.ts';
import type { TableName, UnitSystem } from '../engineering/input.ts';

/** Own header (as typed) to a column of ours, null to leave the column out. */
export type ColumnChoices = Readonly<Record<string, string | null>>;

export interface MatchedColumn {
  readonly column: Column;
  /** place of the cell in a record */
  readonly index: number;
  readonly convert: ((value: number) => number) | null;
  /** false where the header names a unit that does not fit: the numbers are then looked at but not compared */
  readonly unitKnown: boolean;
}

export interface HeaderMatch {
  /** in the order of the contract */
  readonly matched: readonly MatchedColumn[];
  readonly columns: readonly { readonly header: string; readonly column: string | null }[];
  /** unit as typed, by our column */
  readonly headerUnits: Readonly<Record<string, string>>;
  readonly problems: readonly { readonly column: string; readonly message: string }[];
  readonly notices: readonly string[];
}

/** Case, spaces and underscores do not count in a header. */
export const foldHeader = (header: string): string => header.toLowerCase().replace(/[\s_]/g, '');

/** `height (ft)` to its name and unit. */
export function splitHeader(header: string): { readonly name: string; readonly unit: string | null } {
  const parts = /^(.*?)\s*[[(]\s*([^\][()]*?)\s*[\])]$/s.exec(header.trim());
  return parts ? { name: parts[1] ?? '', unit: parts[2] ?? '' } : { name: header.trim(), unit: null };
}

/** Headers that a table knows, folded, with the file's own ones that were matched by hand. */
export function knownHeaders(table: TableName, choices: ColumnChoices = {}): ReadonlySet<string> {
  return new Set([
    ...tableColumns[table].map((column) => foldHeader(column.name)),
    ...Object.keys(choices).map((header) => foldHeader(splitHeader(header).name)),
  ]);
}

/** Which column of ours each header stands for, with units, doubles, unknown and missing columns. */
export function matchHeader(
  table: TableName,
  headers: readonly string[],
  units: UnitSystem,
  choices: ColumnChoices = {},
): HeaderMatch {
  const ours: readonly Column[] = tableColumns[table];
  const problems: { column: string; message: string }[] = [];
  const notices: string[] = [];
  const columns: { header: string; column: string | null }[] = [];
  const headerUnits: Record<string, string> = {};
  const found = new Map<string, MatchedColumn & { readonly header: string }>();
  const unknown: string[] = [];

  headers.forEach((typed, index) => {
    const header = typed.trim();
    const { name, unit } = splitHeader(header);
    const chosen = Object.hasOwn(choices, header) ? choices[header] : undefined;
    const wanted = chosen === undefined ? name : (chosen ?? '');
    const column =
      wanted === '' ? undefined : ours.find((candidate) => foldHeader(candidate.name) === foldHeader(wanted));
    columns.push({ header, column: column?.name ?? null });
    if (!column) {
      if (chosen)
        problems.push({
          column: header,
          message: `${quoteText(header)} was matched to ${quoteText(chosen)}, which is no column of ${table}.csv; choose one of ${ours.map((own) => own.name).join(', ')}`,
        });
      else if (header !== '') unknown.push(quoteText(header));
      return;
    }
    const earlier = found.get(column.name);
    if (earlier) {
      problems.push({
        column: column.name,
        message: `${column.name} stands twice, as ${quoteText(earlier.header)} and as ${quoteText(header)}; leave one of them out`,
      });
      return;
    }
    let convert: MatchedColumn['convert'] = null;
    let unitKnown = true;
    if (unit !== null && unit !== '') {
      const reading = readUnit(unit, column.quantity ?? 'plain', units);
      if (reading.ok) {
        convert = reading.convert;
        headerUnits[column.name] = reading.unit;
      } else {
        unitKnown = false;
        problems.push({ column: column.name, message: `${quoteText(header)} ${reading.message}` });
      }
    }
    found.set(column.name, { column, index, convert, unitKnown, header });
  });

  const missing = ours.filter((column) => column.required && !found.has(column.name));
  for (const column of missing) {
    const near = headers.find(
      (header) =>
        nearestName(splitHeader(header).name, [column.name]) !== null &&
        !columns.some((entry) => entry.header === header.trim() && entry.column !== null),
    );
    const remedy =
      near === undefined
        ? `add a column ${column.name}`
        : `${quoteText(near.trim())} may be meant; name it ${column.name}`;
    problems.push({ column: column.name, message: `the column ${column.name} is missing in the header; ${remedy}` });
  }
  for (const header of unknown) notices.push(`column ${header} is none of ${table}.csv and was left out`);
  const order = (name: string): number => {
    const at = ours.findIndex((column) => column.name === name);
    return at === -1 ? ours.length : at;
  };
  problems.sort((a, b) => order(a.column) - order(b.column));
  const matched = ours.flatMap((column) => found.get(column.name) ?? []);
  return { matched, columns, headerUnits, problems, notices };
}
