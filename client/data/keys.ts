import type { EditableTable } from '#shared/contracts/tableColumns';

/** Query keys. Everything of one building lies under `building(id)`, so that one edit invalidates all that hangs on it. */
export const keys = {
  session: ['session'] as const,
  buildings: ['buildings'] as const,
  building: (id: string) => ['building', id] as const,
  settings: (id: string) => ['building', id, 'settings'] as const,
  table: (id: string, table: EditableTable) => ['building', id, 'table', table] as const,
  results: (id: string) => ['building', id, 'results'] as const,
  acknowledgments: (id: string) => ['building', id, 'acknowledgments'] as const,
  schedule: (id: string) => ['building', id, 'schedule'] as const,
};
