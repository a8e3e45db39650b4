import type { EditableTable } from '#shared/contracts/tableColumns';

/** Addresses of the API, as the contract names them. */
export const routes = {
  session: '/api/session',
  buildings: '/api/buildings',
  building: (id: string) => `/api/buildings/${id}`,
  table: (id: string, table: EditableTable) => `/api/buildings/${id}/${table}`,
  uploads: (id: string) => `/api/buildings/${id}/uploads`,
  results: (id: string) => `/api/buildings/${id}/results`,
  schedule: (id: string) => `/api/buildings/${id}/schedule`,
  scheduleRow: (id: string, rowId: string) => `/api/buildings/${id}/schedule/${rowId}`,
  acknowledgments: (id: string) => `/api/buildings/${id}/acknowledgments`,
  undo: (id: string) => `/api/buildings/${id}/undo`,
  workbook: (id: string) => `/api/buildings/${id}/schedule.xlsx`,
} as const;
