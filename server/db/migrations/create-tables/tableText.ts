import type { TableColumnOptions } from 'typeorm';

/** A table of the first migration in few words; `references` are to `id`. */
export interface TableText {
  readonly name: string;
  readonly columns: readonly TableColumnOptions[];
  readonly references?: readonly (readonly [column: string, table: string, onDelete: string])[];
  readonly uniques?: readonly (readonly string[])[];
  readonly indexes?: readonly (readonly string[])[];
}

const column = (name: string, type: string, isNullable: boolean): TableColumnOptions => ({ name, type, isNullable });

export const varchar = (name: string, length: number, isNullable = false): TableColumnOptions => ({
  ...column(name, 'varchar', isNullable),
  length: String(length),
});
export const text = (name: string, isNullable = false): TableColumnOptions => column(name, 'text', isNullable);
export const integer = (name: string, isNullable = false): TableColumnOptions => column(name, 'integer', isNullable);
export const double = (name: string, isNullable = false): TableColumnOptions =>
  column(name, 'double precision', isNullable);
export const boolean = (name: string, isNullable = false): TableColumnOptions => column(name, 'boolean', isNullable);

/** UUIDv7 made by the application. */
export const id: TableColumnOptions = { ...varchar('id', 36), isPrimary: true };
