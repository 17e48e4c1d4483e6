import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type {
  CreatePersonRequest,
  Person,
  PersonAtTerminal,
  UpdatePersonRequest,
} from '#shared/contracts/person.ts';
import type { SupervisedStep } from '#shared/contracts/supervised.ts';
import { http } from '#src/lib/http.ts';

/** Everyone in the studio, for the owner. */
export const peopleQuery = queryOptions({
  queryKey: ['people'],
  queryFn: () => http.get<Person[]>('/api/people'),
});

/** Those who may sign in at this terminal. */
export const peopleAtTerminalQuery = queryOptions({
  queryKey: ['people', 'terminal'],
  queryFn: () => http.get<PersonAtTerminal[]>('/api/terminal/people'),
});

/** What a person did under supervision as an apprentice, newest first. */
export const supervisedQuery = (id: string) =>
  queryOptions({
    queryKey: ['people', id, 'supervised'],
    queryFn: () => http.get<SupervisedStep[]>(`/api/people/${id}/supervised`),
  });

/** Where the same is had as a CSV file. */
export const supervisedCsvPath = (id: string): string => `/api/people/${id}/supervised.csv`;

const usePeopleChange = <Request>(send: (request: Request) => Promise<Person>) => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: send,
    onSuccess: () => client.invalidateQueries({ queryKey: peopleQuery.queryKey }),
  });
};

/** Adds a person. */
export const useCreatePerson = () =>
  usePeopleChange((request: CreatePersonRequest) => http.post<Person>('/api/people', request));

/** Changes a person. */
export const useUpdatePerson = (id: string) =>
  usePeopleChange((request: UpdatePersonRequest) => http.patch<Person>(`/api/people/${id}`, request));

/** Opens a person's terminal sign-in again. */
export const useUnlockPerson = () =>
  usePeopleChange((id: string) => http.post<Person>(`/api/people/${id}/unlock`));
