import { queryOptions } from '@tanstack/react-query';
import type {
  CountersignMeltRequest,
  MeltEvent,
  OpenCardRequest,
  PourCard,
  RecordEventRequest,
} from '#shared/contracts/card.ts';
import type { Countersigned } from '#shared/domain/instruction/instruction-step.ts';
import { http } from '#src/lib/http.ts';

/** Looks up what a scanned or typed code means; rejects with the reason in one sentence. */
export const findCard = (code: string): Promise<PourCard> =>
  http.get(`/api/cards?code=${encodeURIComponent(code)}`);

/** A casting's card. */
export const cardQuery = (castingId: string) =>
  queryOptions({
    queryKey: ['cards', castingId],
    queryFn: () => http.get<PourCard>(`/api/cards/${castingId}`),
  });

/** Opens a card at this terminal, or goes on with it. */
export const openCard = (castingId: string, request: OpenCardRequest): Promise<PourCard> =>
  http.post(`/api/cards/${castingId}/open`, request);

/** Writes one event to the melt book; sending it again is harmless. */
export const recordEvent = (meltId: string, request: RecordEventRequest): Promise<MeltEvent> =>
  http.post(`/api/melts/${meltId}/events`, request);

/** Has another person sign for something on a melt; rejects with why the sign was not taken. */
export const countersignMelt = (meltId: string, request: CountersignMeltRequest): Promise<Countersigned> =>
  http.post(`/api/melts/${meltId}/countersigns`, request);
