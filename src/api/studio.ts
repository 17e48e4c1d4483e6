import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { Studio, UpdateStudioRequest } from '#shared/contracts/studio.ts';
import { http } from '#src/lib/http.ts';
import { sessionQuery } from './session.ts';

/** The studio's settings, for the owner. */
export const studioQuery = queryOptions({
  queryKey: ['studio'],
  queryFn: () => http.get<Studio>('/api/studio'),
});

/** Stores the studio's settings. */
export const useUpdateStudio = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (request: UpdateStudioRequest) => http.patch<Studio>('/api/studio', request),
    onSuccess: async (studio) => {
      client.setQueryData(studioQuery.queryKey, studio);
      await client.invalidateQueries({ queryKey: sessionQuery.queryKey });
    },
  });
};
