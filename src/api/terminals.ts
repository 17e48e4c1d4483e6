import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type {
  CreateEnrolmentRequest,
  Enrolment,
  EnrolTerminalRequest,
  Terminal,
} from '#shared/contracts/terminal.ts';
import { http } from '#src/lib/http.ts';
import { sessionQuery } from './session.ts';

/** The studio's terminals, for the owner. */
export const terminalsQuery = queryOptions({
  queryKey: ['terminals'],
  queryFn: () => http.get<Terminal[]>('/api/terminals'),
});

/** Makes a one-time enrolment code. */
export const useCreateEnrolment = () =>
  useMutation({
    mutationFn: (request: CreateEnrolmentRequest) => http.post<Enrolment>('/api/terminals/codes', request),
  });

/** Enrols this device. */
export const useEnrolTerminal = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (request: EnrolTerminalRequest) => http.post<Terminal>('/api/terminals', request),
    onSuccess: () => client.invalidateQueries({ queryKey: sessionQuery.queryKey }),
  });
};

/** Ends a terminal at once. */
export const useRevokeTerminal = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => http.post<Terminal>(`/api/terminals/${id}/revoke`),
    onSuccess: () => client.invalidateQueries({ queryKey: terminalsQuery.queryKey }),
  });
};
