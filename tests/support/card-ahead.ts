import { randomUUID } from 'node:crypto';
import type { APIResponse, Page } from 'playwright-core';
import type { PourCard } from '#shared/contracts/card.ts';
import type { CardContext } from '#shared/domain/pour-card/card-state.ts';
import { buildFlaskCode } from '#shared/lib/codes.ts';
import { checksBefore, eventsTo, type ReachableStep } from '#tests/factories/card-events.ts';
import { askThrough } from './ask-through.ts';
import type { ServedStudio } from './served-studio.ts';

/** A card that was led ahead, and a way to deliver further events in the same person's name. */
export interface CardAhead {
  readonly castingId: string;
  readonly meltId: string;
  readonly plannedG: number;
  readonly context: CardContext;
  readonly deliver: (event: object) => Promise<APIResponse>;
}

const bodyOf = async <Body>(response: APIResponse): Promise<Body> => {
  if (!response.ok()) throw new Error(`${response.url()}: ${response.status()} ${await response.text()}`);
  return (await response.json()) as Body;
};

/**
 * Opens a flask's card at the terminal of a page and leads it to a step through the API, as whoever is signed in
 * there: what a test is about then begins at once.
 */
export const cardAhead = async (
  page: Page,
  studio: ServedStudio,
  flask: number,
  step: ReachableStep,
): Promise<CardAhead> => {
  const ask = askThrough(page, studio.origin, 'terminal');
  const stamp = () => ({ key: randomUUID(), occurredAt: studio.services.now().toISOString() });
  const found = await bodyOf<PourCard>(await ask.get(`/api/cards?code=${buildFlaskCode(flask)}`));
  const castingId = found.casting.id;
  const { melt, context } = await bodyOf<PourCard>(await ask.post(`/api/cards/${castingId}/open`, stamp()));
  if (!melt) throw new Error('The card was opened and has no melt.');
  const deliver = (event: object): Promise<APIResponse> =>
    ask.post(`/api/melts/${melt.id}/events`, { ...stamp(), event });
  const checks = step === 'guard' || step === 'done' ? [] : checksBefore(step, context);
  for (const event of [...eventsTo(step, context), ...checks]) await bodyOf(await deliver(event));
  return { castingId, meltId: melt.id, plannedG: context.plannedMetalG, context, deliver };
};
