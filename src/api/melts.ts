import { infiniteQueryOptions, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { AmendMeltRequest, Melt, MeltPage } from '#shared/contracts/melt.ts';
import { http } from '#src/lib/http.ts';

/** The melt book, newest first, page by page. */
export const meltsQuery = infiniteQueryOptions({
  queryKey: ['melts'],
  queryFn: ({ pageParam }) =>
    http.get<MeltPage>(`/api/melts${pageParam === null ? '' : `?before=${pageParam}`}`),
  initialPageParam: null as number | null,
  getNextPageParam: ({ next }) => next,
});

/** One melt with everything that happened on it. */
export const meltQuery = (id: string) =>
  queryOptions({
    queryKey: ['melts', id],
    queryFn: () => http.get<Melt>(`/api/melts/${id}`),
    refetchInterval: 5_000,
  });

/** Where a photograph of a melt is kept. */
export const photographPath = (meltId: string, id: string): string =>
  `/api/melts/${meltId}/photographs/${id}`;

/** The picture itself; it never changes. */
export const photographQuery = (meltId: string, id: string) =>
  queryOptions({
    queryKey: ['melts', meltId, 'photographs', id],
    queryFn: () => http.blob(photographPath(meltId, id)),
    staleTime: Infinity,
  });

/** Adds a remark to a melt. */
export const useAmendMelt = (id: string) => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (request: AmendMeltRequest) => http.post<Melt>(`/api/melts/${id}/amendments`, request),
    onSuccess: (melt) => client.setQueryData(meltQuery(id).queryKey, melt),
  });
};
