import { infiniteQueryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { CorrectMovementRequest, Movement, MovementPage } from '#shared/contracts/ledger.ts';
import { http } from '#src/lib/http.ts';

/** The movements of one lot, newest first, page by page. */
export const movementsOfLotQuery = (lotId: string) =>
  infiniteQueryOptions({
    queryKey: ['metal', 'movements', lotId],
    queryFn: ({ pageParam }) =>
      http.get<MovementPage>(
        `/api/metal/movements?lotId=${lotId}${pageParam === null ? '' : `&before=${pageParam}`}`,
      ),
    initialPageParam: null as string | null,
    getNextPageParam: ({ next }) => next,
  });

/** Corrects a movement by a counter-movement that a second person signs. */
export const useCorrectMovement = (movementId: string) => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (request: CorrectMovementRequest) =>
      http.post<Movement>(`/api/metal/movements/${movementId}/corrections`, request),
    onSuccess: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: ['lots'] }),
        client.invalidateQueries({ queryKey: ['metal'] }),
      ]),
  });
};
