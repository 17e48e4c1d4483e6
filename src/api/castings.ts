import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { Casting, MoveCastingRequest } from '#shared/contracts/casting.ts';
import type { Flask } from '#shared/contracts/flask.ts';
import { http } from '#src/lib/http.ts';

/** How often lists of the running day are read again, ms. */
const everyMs = 5_000;

/** Castings planned for a local day (`year-month-day`), or all that are open. */
export const castingsQuery = (on?: string) =>
  queryOptions({
    queryKey: ['castings', on ?? 'open'],
    queryFn: () => http.get<Casting[]>(`/api/castings${on === undefined ? '' : `?on=${on}`}`),
    refetchInterval: everyMs,
  });

/** Every flask. */
export const flasksQuery = queryOptions({
  queryKey: ['flasks'],
  queryFn: () => http.get<Flask[]>('/api/flasks'),
});

/** Moves a casting to another state. */
export const useMoveCasting = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, ...request }: MoveCastingRequest & { readonly id: string }) =>
      http.post<Casting>(`/api/castings/${id}/move`, request),
    onSuccess: () => client.invalidateQueries({ queryKey: ['castings'] }),
  });
};
