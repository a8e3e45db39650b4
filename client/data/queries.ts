import { keepPreviousData, useQuery, type UseQueryResult } from '@tanstack/react-query';

import type { AcknowledgmentList } from '#shared/contracts/acknowledgments';
import type { BuildingListRow, BuildingResource } from '#shared/contracts/buildings';
import type { ResultDocument } from '#shared/contracts/result';
import type { ScheduleResource } from '#shared/contracts/schedule';
import type { Session } from '#shared/contracts/session';
import type { EditableTable } from '#shared/contracts/tableColumns';
import type { TableResource } from '#shared/contracts/tables';

import type { ApiError } from './ApiError.ts';
import { api } from './api.ts';
import { keys } from './keys.ts';
import { routes } from './routes.ts';

export function useSession(): UseQueryResult<Session, ApiError> {
  return useQuery<Session, ApiError>({
    queryKey: keys.session,
    queryFn: ({ signal }) => api<Session>('GET', routes.session, { signal }),
    staleTime: 60_000,
  });
}

export function useBuildings(): UseQueryResult<readonly BuildingListRow[], ApiError> {
  return useQuery<readonly BuildingListRow[], ApiError>({
    queryKey: keys.buildings,
    queryFn: async ({ signal }) =>
      (await api<{ rows: readonly BuildingListRow[] }>('GET', routes.buildings, { signal })).rows,
  });
}

export function useBuilding(id: string): UseQueryResult<BuildingResource, ApiError> {
  return useQuery<BuildingResource, ApiError>({
    queryKey: keys.settings(id),
    queryFn: ({ signal }) => api<BuildingResource>('GET', routes.building(id), { signal }),
  });
}

export function useTable<T extends EditableTable>(id: string, table: T): UseQueryResult<TableResource<T>, ApiError> {
  return useQuery<TableResource<T>, ApiError>({
    queryKey: keys.table(id, table),
    queryFn: ({ signal }) => api<TableResource<T>>('GET', routes.table(id, table), { signal }),
  });
}

/** What was computed last stays readable while newer figures are on their way. */
export function useResults(id: string): UseQueryResult<ResultDocument, ApiError> {
  return useQuery<ResultDocument, ApiError>({
    queryKey: keys.results(id),
    queryFn: ({ signal }) => api<ResultDocument>('GET', routes.results(id), { signal }),
    placeholderData: keepPreviousData,
  });
}

export function useSchedule(id: string): UseQueryResult<ScheduleResource, ApiError> {
  return useQuery<ScheduleResource, ApiError>({
    queryKey: keys.schedule(id),
    queryFn: ({ signal }) => api<ScheduleResource>('GET', routes.schedule(id), { signal }),
    placeholderData: keepPreviousData,
  });
}

/** Warnings that engineers have settled, lapsed ones included. */
export function useAcknowledgments(id: string): UseQueryResult<AcknowledgmentList, ApiError> {
  return useQuery<AcknowledgmentList, ApiError>({
    queryKey: keys.acknowledgments(id),
    queryFn: ({ signal }) => api<AcknowledgmentList>('GET', routes.acknowledgments(id), { signal }),
  });
}
