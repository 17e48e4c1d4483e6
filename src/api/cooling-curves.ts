import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { MeltCurves, RecordCurveRequest } from '#shared/contracts/cooling-curve.ts';
import { http } from '#src/lib/http.ts';

/** The cooling curves of a melt, oldest first. */
export const coolingCurvesQuery = (meltId: string) =>
  queryOptions({
    queryKey: ['melts', meltId, 'cooling-curves'],
    queryFn: () => http.get<MeltCurves>(`/api/melts/${meltId}/cooling-curves`),
  });

/** Hands in a melt's cooling curve; the answer holds what is made of it. */
export const useRecordCurve = (meltId: string) => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (request: RecordCurveRequest) =>
      http.post<MeltCurves>(`/api/melts/${meltId}/cooling-curves`, request),
    onSuccess: (curves) => client.setQueryData(coolingCurvesQuery(meltId).queryKey, curves),
  });
};
