import { randomUUID } from 'node:crypto';
import type { PourCard } from '#shared/contracts/card.ts';
import type { Client } from './test-server.ts';

/** Asks for a casting's card as a terminal does; the key is new unless told otherwise. */
export const askForCard = (
  client: Client,
  castingId: string,
  { key = randomUUID(), occurredAt = '2026-12-01T10:00:00.000Z', carryOn = false } = {},
) => client.post(`/api/cards/${castingId}/open`).send({ key, occurredAt, carryOn });

/** Opens a casting's card, and gives it with the id of its melt. */
export const openCard = async (
  client: Client,
  castingId: string,
): Promise<{ readonly card: PourCard; readonly meltId: string }> => {
  const card = (await askForCard(client, castingId).expect(200)).body as PourCard;
  if (!card.melt) throw new Error('The card was opened and has no melt.');
  return { card, meltId: card.melt.id };
};
