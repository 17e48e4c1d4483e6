import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type {
  CreatedInstrument,
  CreateInstrumentRequest,
  Instrument,
  InstrumentReading,
  PyrometerCheck,
  RecordCheckRequest,
} from '#shared/contracts/instrument.ts';
import type { PushedReadings, PushReadingsRequest } from '#shared/contracts/instrument-reading.ts';
import { http } from '#src/lib/http.ts';

/** Every instrument with its last reading and check. */
export const instrumentsQuery = queryOptions({
  queryKey: ['instruments'],
  queryFn: () => http.get<Instrument[]>('/api/instruments'),
});

/** The last reading an instrument sent, for whoever follows it from afar; null before the first. */
export const latestReadingQuery = (id: string) =>
  queryOptions({
    queryKey: ['instruments', id, 'latest'],
    queryFn: async () =>
      (await http.get<{ readonly reading: InstrumentReading | null }>(`/api/instruments/${id}/latest`))
        .reading,
    refetchInterval: 1_000,
  });

/** Every check of an instrument, newest first. */
export const checksQuery = (id: string) =>
  queryOptions({
    queryKey: ['instruments', id, 'checks'],
    queryFn: () => http.get<PyrometerCheck[]>(`/api/instruments/${id}/checks`),
  });

const useRefresh = () => {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: instrumentsQuery.queryKey });
};

/** Enters an instrument; the answer holds its token, this once. */
export const useCreateInstrument = () =>
  useMutation({
    mutationFn: (request: CreateInstrumentRequest) =>
      http.post<CreatedInstrument>('/api/instruments', request),
    onSuccess: useRefresh(),
  });

/** Ends an instrument at once. */
export const useRevokeInstrument = () =>
  useMutation({
    mutationFn: (id: string) => http.post<Instrument>(`/api/instruments/${id}/revoke`),
    onSuccess: useRefresh(),
  });

/** Records a check at a freezing point. */
export const useRecordCheck = (id: string) =>
  useMutation({
    mutationFn: (request: RecordCheckRequest) =>
      http.post<Instrument>(`/api/instruments/${id}/checks`, request),
    onSuccess: useRefresh(),
  });

/** Sends readings that this terminal took from its own serial port; with the same key they are recorded once. */
export const pushReadings = (request: PushReadingsRequest): Promise<PushedReadings> =>
  http.post<PushedReadings>('/api/instrument-readings', request);
