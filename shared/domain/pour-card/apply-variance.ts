import { ok, refuse } from '#shared/lib/result.ts';
import type { CardContext, CardState } from './card-state.ts';
import type { Handler } from './card-handler.ts';
import type { Departure } from './variance.ts';

/** A departure that still wants its reason, with its place on the card. */
export interface OpenVariance {
  readonly index: number;
  readonly departure: Departure;
}

/** The departures that still want a reason, oldest first; none on cards that ask for none. */
export const openVariances = (
  { departures }: Pick<CardState, 'departures'>,
  { rules }: Pick<CardContext, 'rules'>,
): readonly OpenVariance[] =>
  rules ? departures.flatMap((departure, index) => (departure.explained ? [] : [{ index, departure }])) : [];

/** Whether a second person has to sign for a departure: it is far off, or an apprentice does the card. */
export const wantsCountersign = (departure: Departure, { worker }: Pick<CardState, 'worker'>): boolean =>
  departure.isMajor === true || worker?.role === 'apprentice';

/** Whether a reason on this card asks for its pieces to be held. */
export const holdsPieces = ({ departures }: Pick<CardState, 'departures'>): boolean =>
  departures.some(({ explained }) => explained?.hold === true);

/** The card once nothing is left to do on it: closed, with a reason for each departure. */
export const doneWhenExplained = (state: CardState, context: Pick<CardContext, 'rules'>): CardState =>
  state.closing && openVariances(state, context).length === 0 ? { ...state, step: 'done' } : state;

/** Writes the reason of a departure; refused without words or a second person where they are wanted. */
export const explain: Handler<'variance-explained'> = (state, event, context, at) => {
  const { index, reason, words, hold, by } = event;
  const departure = state.departures[index];
  if (!departure || !context.rules) return refuse('The card has no such departure.');
  if (departure.explained)
    return refuse('This departure has its reason already. Amend the melt at the desk.');
  const isMajor = wantsCountersign(departure, state);
  if ((reason === 'other' || isMajor) && words.trim() === '')
    return refuse('Say in a few words what happened.');
  if (isMajor && !by) return refuse('A second person has to sign for this.');
  if (by && by.personId === state.worker?.personId)
    return refuse('Someone else has to sign, not whoever does the work.');
  const explained = { at, reason, words, hold, by };
  const departures = state.departures.map((each, i) => (i === index ? { ...each, explained } : each));
  return ok(doneWhenExplained({ ...state, departures }, context));
};
