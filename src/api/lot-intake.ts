import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { IntakePreview, IntakeResult, TakeIntakeRequest } from '#shared/contracts/lot-intake.ts';
import { http } from '#src/lib/http.ts';

/** Looks through a sheet of lots; nothing is taken in. */
export const usePreviewIntake = () =>
  useMutation({
    mutationFn: (text: string) => http.postLong<IntakePreview>('/api/lot-intake/preview', { text }),
  });

/** Takes the good rows of a sheet in, all of them or none. */
export const useTakeIntake = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (request: TakeIntakeRequest) => http.postLong<IntakeResult>('/api/lot-intake', request),
    onSuccess: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: ['lots'] }),
        client.invalidateQueries({ queryKey: ['metal'] }),
      ]),
  });
};
