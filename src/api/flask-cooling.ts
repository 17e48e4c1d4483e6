import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { FlaskSizeCooling, LogFlaskRequest } from '#shared/contracts/flask-cooling.ts';
import { http } from '#src/lib/http.ts';

/** How flasks cool, size by size, with what was logged. */
export const flaskCoolingQuery = queryOptions({
  queryKey: ['flask-cooling'],
  queryFn: () => http.get<FlaskSizeCooling[]>('/api/flask-cooling'),
});

/** Logs how warm a flask's mould is out of the furnace. */
export const useLogFlask = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (request: LogFlaskRequest) => http.post<FlaskSizeCooling[]>('/api/flask-cooling', request),
    onSuccess: (sizes) => client.setQueryData(flaskCoolingQuery.queryKey, sizes),
  });
};
