import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { Alloy, CreateAlloyRequest, CreateRevisionRequest } from '#shared/contracts/alloy.ts';
import { http } from '#src/lib/http.ts';

/** Every alloy with its revisions. */
export const alloysQuery = queryOptions({
  queryKey: ['alloys'],
  queryFn: () => http.get<Alloy[]>('/api/alloys'),
});

/** One alloy with its revisions. */
export const alloyQuery = (id: string) =>
  queryOptions({ queryKey: ['alloys', id], queryFn: () => http.get<Alloy>(`/api/alloys/${id}`) });

const useAlloyChange = <Request>(send: (request: Request) => Promise<Alloy>) => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: send,
    onSuccess: (alloy) => {
      client.setQueryData(alloyQuery(alloy.id).queryKey, alloy);
      return client.invalidateQueries({ queryKey: alloysQuery.queryKey, exact: true });
    },
  });
};

/** Adds an alloy with its first draft. */
export const useCreateAlloy = () =>
  useAlloyChange((request: CreateAlloyRequest) => http.post<Alloy>('/api/alloys', request));

/** Adds a draft revision. */
export const useCreateRevision = (alloyId: string) =>
  useAlloyChange((request: CreateRevisionRequest) =>
    http.post<Alloy>(`/api/alloys/${alloyId}/revisions`, request),
  );

/** Marks a draft as checked. */
export const useCheckRevision = () =>
  useAlloyChange((revisionId: string) => http.post<Alloy>(`/api/alloy-revisions/${revisionId}/check`));

/** Approves a checked revision. */
export const useApproveRevision = () =>
  useAlloyChange((revisionId: string) => http.post<Alloy>(`/api/alloy-revisions/${revisionId}/approve`));
