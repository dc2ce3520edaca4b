import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import { list } from '../../../api/list';
import type { ListState } from '../../../lib/list-state';

export type Batch = Dto<'BatchDto'>;
export type BatchItem = Dto<'BatchItemDto'>;
export type BatchInput = Dto<'BatchInputDto'>;
export type BatchLine = Dto<'BatchLineDto'>;
export type BatchStep = Dto<'BatchStepDto'>;
export type Characteristic = Dto<'BatchCharacteristicDto'>;
export type PickList = Dto<'PickListDto'>;
export type PickRow = Dto<'PickRowDto'>;
export type Picked = Dto<'PickedDto'>;
export type IssueLine = Dto<'IssueLineDto'>;
export type Fault = Dto<'FaultDto'>;
export type UnitItem = Dto<'UnitItemDto'>;
export type Unit = Dto<'UnitDto'>;
export type UnitRuns = Dto<'UnitRunsDto'>;
export type TestRun = Dto<'TestRunDto'>;

/** Everything that a change at the bench may touch: queues, strips and units as well. */
export const benchKey = ['bench'] as const;

/** What is picked or finished changes the shelf and Today. */
const touched = [benchKey, ['shelf'], ['today']] as const;

export const openBatchesQuery = queryOptions({
  queryKey: [...benchKey, 'open'] as const,
  queryFn: ({ signal }) =>
    answer(api.GET('/api/batches', { params: { query: { open: true, sort: 'dueOn', pageSize: 100 } }, signal })),
});

export const batchesQuery = (state: ListState) =>
  queryOptions({
    queryKey: [...benchKey, 'batches', state] as const,
    queryFn: ({ signal }) => list('/api/batches', state, signal),
  });

export const batchQuery = (number: string) =>
  queryOptions({
    queryKey: [...benchKey, 'batch', number] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/batches/{number}', { params: { path: { number } }, signal })),
  });

export const pickListQuery = (number: string) =>
  queryOptions({
    queryKey: [...benchKey, 'pick-list', number] as const,
    queryFn: ({ signal }) =>
      answer(api.GET('/api/batches/{number}/pick-list', { params: { path: { number } }, signal })),
  });

export const unitsQuery = (state: ListState) =>
  queryOptions({
    queryKey: [...benchKey, 'units', state] as const,
    queryFn: ({ signal }) => list('/api/units', state, signal),
  });

export const unitQuery = (serial: string) =>
  queryOptions({
    queryKey: [...benchKey, 'unit', serial] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/units/{serial}', { params: { path: { serial } }, signal })),
  });

export const runsQuery = (serial: string) =>
  queryOptions({
    queryKey: [...benchKey, 'runs', serial] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/units/{serial}/test-runs', { params: { path: { serial } }, signal })),
  });

export const faultsQuery = (state: ListState) =>
  queryOptions({
    queryKey: [...benchKey, 'faults', state] as const,
    queryFn: ({ signal }) => list('/api/faults', state, signal),
  });

export const faultQuery = (number: string) =>
  queryOptions({
    queryKey: [...benchKey, 'fault', number] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/faults/{number}', { params: { path: { number } }, signal })),
  });

export const firstPassesQuery = queryOptions({
  queryKey: [...benchKey, 'first-passes'] as const,
  queryFn: ({ signal }) => answer(api.GET('/api/first-passes', { signal })),
});

/** Parts with a released bill, to choose from. */
export const buildablePartsQuery = queryOptions({
  queryKey: [...benchKey, 'buildable-parts'] as const,
  queryFn: ({ signal }) =>
    answer(api.GET('/api/bills', { params: { query: { state: 'released', sort: 'code', pageSize: 200 } }, signal })),
});

interface Keyed<Body> {
  body: Body;
  key: string;
}

const keyed = (key: string) => ({ 'Idempotency-Key': key });

export function usePlanBatch(): UseMutationResult<Batch, Error, Keyed<BatchInput>> {
  return useMutation({
    mutationFn: ({ body, key }) => answer(api.POST('/api/batches', { body, params: { header: keyed(key) } })),
    meta: { touches: touched, showsRefusal: true },
  });
}

export function useChooseSubAssembly(number: string): UseMutationResult<Batch, Error, Dto<'SubAssemblyInputDto'>> {
  return useMutation({
    mutationFn: (body) =>
      answer(api.PUT('/api/batches/{number}/sub-assemblies', { body, params: { path: { number } } })),
    meta: { touches: touched },
  });
}

export function useClaimMissing(): UseMutationResult<Batch, Error, string> {
  return useMutation({
    mutationFn: (number) => answer(api.POST('/api/batches/{number}/claims', { params: { path: { number } } })),
    meta: { touches: touched },
  });
}

export function useWithdraw(number: string): UseMutationResult<Batch, Error, string> {
  return useMutation({
    mutationFn: (reason) =>
      answer(api.POST('/api/batches/{number}/withdrawal', { body: { reason }, params: { path: { number } } })),
    meta: { touches: touched, showsRefusal: true },
  });
}

export function useStartBuilding(): UseMutationResult<Batch, Error, string> {
  return useMutation({
    mutationFn: (number) => answer(api.POST('/api/batches/{number}/building', { params: { path: { number } } })),
    meta: { touches: touched },
  });
}

export function useIssue(number: string): UseMutationResult<unknown, Error, Keyed<IssueLine[]>> {
  return useMutation({
    mutationFn: ({ body, key }) =>
      answer(
        api.POST('/api/batches/{number}/issues', {
          body: { lines: body },
          params: { path: { number }, header: keyed(key) },
        }),
      ),
    meta: { touches: touched, showsRefusal: true },
  });
}

export function useGiveBack(number: string): UseMutationResult<unknown, Error, Keyed<IssueLine[]>> {
  return useMutation({
    mutationFn: ({ body, key }) =>
      answer(
        api.POST('/api/batches/{number}/returns', {
          body: { lines: body },
          params: { path: { number }, header: keyed(key) },
        }),
      ),
    meta: { touches: touched, showsRefusal: true },
  });
}

interface Tick {
  position: number;
  units: string[];
  done: boolean;
}

export function useTick(number: string): UseMutationResult<Batch, Error, Tick> {
  return useMutation({
    mutationFn: ({ position, ...body }) =>
      answer(api.PUT('/api/batches/{number}/steps/{position}', { body, params: { path: { number, position } } })),
    meta: { touches: touched },
  });
}

export function useFinishUnit(serial: string): UseMutationResult<unknown, Error, Keyed<{ bin: string }>> {
  return useMutation({
    mutationFn: ({ body, key }) =>
      answer(api.POST('/api/units/{serial}/completion', { body, params: { path: { serial }, header: keyed(key) } })),
    meta: { touches: touched, showsRefusal: true },
  });
}

export function useScrapUnit(serial: string): UseMutationResult<unknown, Error, string> {
  return useMutation({
    mutationFn: (reason) =>
      answer(api.POST('/api/units/{serial}/scrapping', { body: { reason }, params: { path: { serial } } })),
    meta: { touches: touched, showsRefusal: true },
  });
}

export function useMakePieces(number: string): UseMutationResult<unknown, Error, Keyed<Dto<'MadePiecesDto'>>> {
  return useMutation({
    mutationFn: ({ body, key }) =>
      answer(api.POST('/api/batches/{number}/made-pieces', { body, params: { path: { number }, header: keyed(key) } })),
    meta: { touches: touched, showsRefusal: true },
  });
}

export function useReportFault(serial: string): UseMutationResult<Fault, Error, Keyed<Dto<'FaultInputDto'>>> {
  return useMutation({
    mutationFn: ({ body, key }) =>
      answer(api.POST('/api/units/{serial}/faults', { body, params: { path: { serial }, header: keyed(key) } })),
    meta: { touches: touched, showsRefusal: true },
  });
}

export function useRework(number: string): UseMutationResult<Fault, Error, Dto<'ReworkInputDto'>> {
  return useMutation({
    mutationFn: (body) => answer(api.POST('/api/faults/{number}/rework', { body, params: { path: { number } } })),
    meta: { touches: touched, showsRefusal: true },
  });
}

export function useNoFault(number: string): UseMutationResult<Fault, Error, Dto<'NoFaultInputDto'>> {
  return useMutation({
    mutationFn: (body) => answer(api.POST('/api/faults/{number}/no-fault', { body, params: { path: { number } } })),
    meta: { touches: touched, showsRefusal: true },
  });
}
