import { randomUUID } from 'node:crypto';
import type { Client } from './test-server.ts';

/** Sends one event of a card as a terminal does; the key is new and the moment is `START` unless told otherwise. */
export const deliverEvent = (
  client: Client,
  meltId: string,
  event: object,
  { key = randomUUID(), occurredAt = '2026-12-01T10:00:00.000Z' }: { key?: string; occurredAt?: string } = {},
) => client.post(`/api/melts/${meltId}/events`).send({ key, occurredAt, event });
