import type { Result } from '#shared/lib/result.ts';
import type { CardEvent, CardEventType } from './card-event.ts';
import type { CardContext, CardState } from './card-state.ts';

/** The card after an event, or why the event is refused. */
export type Applied = Result<CardState>;

/** What one kind of event does to a card at the instant `at`. */
export type Handler<Type extends CardEventType> = (
  state: CardState,
  event: Extract<CardEvent, { type: Type }>,
  context: CardContext,
  at: string,
) => Applied;

/** Seconds from one instant to another, never negative. */
export const secondsBetween = (from: string, to: string): number =>
  Math.max(0, (Date.parse(to) - Date.parse(from)) / 1000);
