import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type {
  ChangePotRequest,
  ChargeOutcome,
  ChargeProposal,
  CloseOutRequest,
  FilledCrucible,
  PlanChargeRequest,
  RunningCharge,
  SavedChargePlan,
  SavePlanRequest,
} from '#shared/contracts/charge.ts';
import type { Melt } from '#shared/contracts/melt.ts';
import { http } from '#src/lib/http.ts';

/** The charge plan kept for a casting, null where there is none. */
export const chargePlanQuery = (castingId: string) =>
  queryOptions({
    queryKey: ['charge-plans', castingId],
    // No plan is answered with no content at all.
    queryFn: async () =>
      (await http.get<SavedChargePlan | undefined>(`/api/charge-plans?castingId=${castingId}`)) ?? null,
  });

/** Where the charge of a running card stands, and what remains; asked anew for each state of its crucible. */
export const runningChargeQuery = (meltId: string, crucible: string) =>
  queryOptions({
    queryKey: ['melts', meltId, 'charge', crucible],
    queryFn: () => http.get<RunningCharge>(`/api/melts/${meltId}/charge`),
    staleTime: Number.POSITIVE_INFINITY,
    retry: false,
  });

/** Plans a charge from the lots on hand; nothing is kept. */
export const useProposeCharge = () =>
  useMutation({
    mutationFn: (request: PlanChargeRequest) =>
      http.post<ChargeProposal[]>('/api/charge-plans/proposals', request),
  });

/** Keeps a charge plan; the newest counts. */
export const useSaveChargePlan = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (request: SavePlanRequest) => http.post<SavedChargePlan>('/api/charge-plans', request),
    onSuccess: () => client.invalidateQueries({ queryKey: ['charge-plans'] }),
  });
};

/** Says what to add to a pot so that it becomes an alloy; nothing is kept. */
export const useChangePot = () =>
  useMutation({
    mutationFn: (request: ChangePotRequest) => http.post<ChargeOutcome>('/api/charge-plans/pot', request),
  });

/** Every crucible that the ledger has metal in, the oldest melt first. */
export const cruciblesQuery = queryOptions({
  queryKey: ['metal', 'crucibles'],
  queryFn: () => http.get<FilledCrucible[]>('/api/metal/crucibles'),
});

/** Empties the crucible of a melt whose card has ended with metal in it. */
export const useCloseOut = (meltId: string) => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (request: CloseOutRequest) => http.post<Melt>(`/api/melts/${meltId}/close-out`, request),
    onSuccess: () =>
      Promise.all([['lots'], ['metal'], ['melts']].map((queryKey) => client.invalidateQueries({ queryKey }))),
  });
};
