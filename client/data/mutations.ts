import { useMutation, useQueryClient, type QueryClient, type UseMutationResult } from '@tanstack/react-query';

import type { AcknowledgmentBody, AcknowledgmentRow } from '#shared/contracts/acknowledgments';
import type { BuildingResource } from '#shared/contracts/buildings';
import type { SchedulePatch, SchedulePatchAnswer } from '#shared/contracts/schedule';
import type { Session, SignIn } from '#shared/contracts/session';
import type { EditableTable } from '#shared/contracts/tableColumns';
import type { CellValue, TablePatch, TablePatchAnswer, TableResource, UploadAnswer } from '#shared/contracts/tables';

import type { ApiError } from './ApiError.ts';
import { api } from './api.ts';
import { editedTable } from './editedTable.ts';
import { keys } from './keys.ts';
import { routes } from './routes.ts';

/** All that hangs on one building, and its line in the list. */
async function invalidateBuilding(client: QueryClient, id: string): Promise<void> {
  await Promise.all([
    client.invalidateQueries({ queryKey: keys.building(id) }),
    client.invalidateQueries({ queryKey: keys.buildings }),
  ]);
}

/** Edits of a building go one after the other, in the order they were made: an undo waits for the edit it shall undo. */
const inOrder = (id: string): { id: string } => ({ id: `building-${id}` });

export function useSignIn(): UseMutationResult<Session, ApiError, SignIn> {
  const client = useQueryClient();
  return useMutation<Session, ApiError, SignIn>({
    mutationFn: (body) => api<Session>('POST', routes.session, { body }),
    onSuccess: (session) => {
      client.clear();
      client.setQueryData(keys.session, session);
    },
  });
}

export function useSignOut(): UseMutationResult<unknown, ApiError, unknown> {
  const client = useQueryClient();
  return useMutation<unknown, ApiError, unknown>({
    mutationFn: () => api<unknown>('DELETE', routes.session),
    onSuccess: () => {
      client.clear();
    },
  });
}

/** building.json fields of a new building; what is left out takes its default. */
export type NewBuilding = { readonly name: string; readonly number?: string; readonly units: 'us' | 'si' };

export function useCreateBuilding(): UseMutationResult<BuildingResource, ApiError, NewBuilding> {
  const client = useQueryClient();
  return useMutation<BuildingResource, ApiError, NewBuilding>({
    mutationFn: (body) => api<BuildingResource>('POST', routes.buildings, { body }),
    onSuccess: () => client.invalidateQueries({ queryKey: keys.buildings }),
  });
}

/** Changed settings only, with the version that was read. */
export type BuildingPatch = { readonly version: number } & Readonly<Record<string, unknown>>;

export function usePatchBuilding(id: string): UseMutationResult<BuildingResource, ApiError, BuildingPatch> {
  const client = useQueryClient();
  return useMutation<BuildingResource, ApiError, BuildingPatch>({
    mutationFn: (body) => api<BuildingResource>('PATCH', routes.building(id), { body }),
    scope: inOrder(id),
    onSuccess: (building) => {
      client.setQueryData(keys.settings(id), building);
    },
    onSettled: () => invalidateBuilding(client, id),
  });
}

/** Cells show the edit at once; a refusal puts the stored rows back. */
export function usePatchTable<T extends EditableTable>(
  id: string,
  table: T,
): UseMutationResult<TablePatchAnswer<T>, ApiError, Partial<TablePatch>, { before: TableResource<T> | undefined }> {
  const client = useQueryClient();
  const key = keys.table(id, table);
  return useMutation<TablePatchAnswer<T>, ApiError, Partial<TablePatch>, { before: TableResource<T> | undefined }>({
    mutationFn: (body) => api<TablePatchAnswer<T>>('PATCH', routes.table(id, table), { body }),
    scope: inOrder(id),
    onMutate: async (patch) => {
      await client.cancelQueries({ queryKey: key });
      const before = client.getQueryData<TableResource<T>>(key);
      if (before !== undefined) client.setQueryData(key, editedTable(before, patch));
      return { before };
    },
    onError: (_error, _patch, context) => {
      if (context?.before !== undefined) client.setQueryData(key, context.before);
    },
    onSettled: () => invalidateBuilding(client, id),
  });
}

export type PutTable = {
  readonly version: number;
  readonly rows: readonly Readonly<Record<string, CellValue>>[];
};

export function usePutTable(id: string, table: EditableTable): UseMutationResult<unknown, ApiError, PutTable> {
  const client = useQueryClient();
  return useMutation<unknown, ApiError, PutTable>({
    mutationFn: ({ version, rows }) =>
      api<unknown>('PUT', routes.table(id, table), { body: { rows }, headers: { 'If-Match': `"${version}"` } }),
    onSettled: () => invalidateBuilding(client, id),
  });
}

export type Upload = {
  readonly file: File;
  readonly table: EditableTable;
  readonly dryRun: boolean;
  /** own header to our column; null leaves the column out */
  readonly columns?: Readonly<Record<string, string | null>>;
};

export function useUpload(id: string): UseMutationResult<UploadAnswer, ApiError, Upload> {
  const client = useQueryClient();
  return useMutation<UploadAnswer, ApiError, Upload>({
    mutationFn: ({ file, table, dryRun, columns }) => {
      const form = new FormData();
      form.set('table', table);
      if (dryRun) form.set('dryRun', 'true');
      if (columns !== undefined) form.set('columns', JSON.stringify(columns));
      form.set('file', file);
      return api<UploadAnswer>('POST', routes.uploads(id), { form });
    },
    onSuccess: async (_answer, { dryRun }) => {
      if (!dryRun) await invalidateBuilding(client, id);
    },
  });
}

export type ScheduleEdit = { readonly rowId: string; readonly patch: SchedulePatch };

export function usePatchSchedule(id: string): UseMutationResult<SchedulePatchAnswer, ApiError, ScheduleEdit> {
  const client = useQueryClient();
  return useMutation<SchedulePatchAnswer, ApiError, ScheduleEdit>({
    mutationFn: ({ rowId, patch }) => api<SchedulePatchAnswer>('PATCH', routes.scheduleRow(id, rowId), { body: patch }),
    scope: inOrder(id),
    onSettled: () => invalidateBuilding(client, id),
  });
}

/** Settles the warnings of a code, level and wall with a reason. */
export function useAcknowledge(id: string): UseMutationResult<AcknowledgmentRow, ApiError, AcknowledgmentBody> {
  const client = useQueryClient();
  return useMutation<AcknowledgmentRow, ApiError, AcknowledgmentBody>({
    mutationFn: (body) => api<AcknowledgmentRow>('POST', routes.acknowledgments(id), { body }),
    scope: { id: `acknowledgments-${id}` },
    onSettled: () => invalidateBuilding(client, id),
  });
}

/** The person's own last edit, of whatever kind it was. */
export function useUndo(id: string): UseMutationResult<unknown, ApiError, unknown> {
  const client = useQueryClient();
  return useMutation<unknown, ApiError, unknown>({
    mutationFn: () => api<unknown>('POST', routes.undo(id), { body: {} }),
    scope: inOrder(id),
    onSettled: () => invalidateBuilding(client, id),
  });
}
