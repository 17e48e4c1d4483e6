import { ok, refuse } from '#shared/lib/result.ts';
import { formatMass, formatTemperature } from '#shared/lib/units.ts';
import { check, confirmGuard, doStep, openSteps, skipStep } from './apply-steps.ts';
import { doneWhenExplained, explain } from './apply-variance.ts';
import type { CardEvent, CardEventType, ChargeWeighing, TimedCardEvent } from './card-event.ts';
import { secondsBetween, type Applied, type Handler } from './card-handler.ts';
import { chargedG, freshCard, isOver, lastReading, type CardContext, type CardState } from './card-state.ts';
import { cardStepNames, cardSteps, type CardStep } from './card-step.ts';
import { changeLots } from './change-lots.ts';
import * as departures from './departures.ts';
import { flaskTemperatureAt } from './flask-cooling.ts';
import { judgeCharge } from './judge-charge.ts';
import { judgeMetal, sentenceOfMetal } from './judge-metal.ts';

/** The steps on which each event may happen; events that are not listed may happen on any step. */
const allowedOn: Readonly<Partial<Record<CardEventType, readonly CardStep[]>>> = {
  'guard-confirmed': ['guard'],
  checked: cardSteps,
  'step-done': cardSteps,
  'step-skipped': cardSteps,
  'charge-weighed': ['charge'],
  'charge-taken-out': ['charge'],
  'charge-closed': ['charge'],
  'reading-taken': ['melt', 'flask-out', 'pour'],
  'melt-ready': ['melt'],
  'flask-out': ['flask-out'],
  poured: ['pour'],
  quenched: ['quench'],
  closed: ['close'],
};

/** What has to wait until the instruction's steps before the part are behind. */
const afterSteps: readonly CardEventType[] = [
  'charge-weighed',
  'charge-closed',
  'melt-ready',
  'flask-out',
  'quenched',
  'closed',
];

const roundMass = (grams: number): number => Math.round(grams * 1000) / 1000;

const changeCharge = (
  state: CardState,
  { kind, massG: weighedG, lot }: ChargeWeighing,
  sign: 1 | -1,
  { units }: CardContext,
): Applied => {
  const massG = roundMass(state.charge[kind] + sign * weighedG);
  if (massG < 0) {
    return refuse(
      `Only ${formatMass(state.charge[kind], units.mass)} of ${kind} is in the crucible, so no more can be taken out.`,
    );
  }
  const charged = { ...state, charge: { ...state.charge, [kind]: massG } };
  if (!lot) return ok(charged);
  const lots = changeLots(state.lots ?? [], lot, sign * weighedG, units.mass);
  return lots.ok ? ok({ ...charged, lots: lots.value }) : lots;
};

const closeCharge: Handler<'charge-closed'> = (state, { offPlan = false }, context, at) => {
  const verdict = judgeCharge(state, context);
  const mass = (grams: number): string => formatMass(grams, context.units.mass);
  const wanted = `The charge is ${mass(verdict.totalG)}. The card wants between ${mass(verdict.lowG)} and ${mass(verdict.highG)}`;
  if (verdict.kind === 'too-many-returns') {
    return refuse(
      `${Math.round(verdict.returnsShare * 100)} % of the charge is returns; the studio allows ${Math.round(context.limits.returnsShare * 100)} %. Take returns out and add grain.`,
    );
  }
  if (verdict.kind === 'good') return closeMetal(state, context, at);
  const isTaken = offPlan && context.rules !== undefined && verdict.totalG > 0;
  if (!isTaken) return refuse(`${wanted}: ${verdict.kind === 'short' ? 'weigh more in' : 'take some out'}.`);
  if (state.worker?.role === 'apprentice') return refuse(`${wanted}: a caster has to decide this.`);
  const off = departures.ofCharge(verdict, context, at);
  return closeMetal({ ...state, departures: [...state.departures, ...off] }, context, at);
};

/** A charge by lots is closed only when its fineness holds at the certificates' lower bounds. */
const closeMetal = (state: CardState, context: CardContext, at: string): Applied => {
  const metal = judgeMetal(state, context);
  const refusal = metal && sentenceOfMetal(metal, context);
  if (refusal) return refuse(refusal);
  const off = metal ? departures.ofComposition(metal, at) : [];
  return ok({ ...state, step: 'melt', departures: [...state.departures, ...off] });
};

const takeReading: Handler<'reading-taken'> = (state, event, context, at) =>
  ok({
    ...state,
    readings: [...state.readings, { temperatureC: event.temperatureC, at }],
    departures: [
      ...state.departures,
      ...(event.confirmed ? departures.ofConfirmedReading(event.temperatureC, context, at) : []),
    ],
  });

const makeReady: Handler<'melt-ready'> = (state, _event, { figures, units }) => {
  const reading = lastReading(state);
  if (!reading) return refuse('Take a reading of the melt first.');
  const { low, high } = figures.pourC;
  const degrees = (celsius: number): string => formatTemperature(celsius, units.temperature);
  const last = `The last reading is ${degrees(reading.temperatureC)}.`;
  if (reading.temperatureC < low) {
    return refuse(`${last} The pour window opens at ${degrees(low)}: keep heating.`);
  }
  if (reading.temperatureC > high) {
    return refuse(`${last} The pour window ends at ${degrees(high)}: let it cool.`);
  }
  return ok({ ...state, step: 'flask-out' });
};

const takeFlaskOut: Handler<'flask-out'> = (state, event, context, at) =>
  ok({
    ...state,
    step: 'pour',
    flaskOut: { at, startC: event.furnaceC ?? context.figures.flaskHoldC },
    departures: [...state.departures, ...departures.ofFurnaceReading(event.furnaceC, context, at)],
  });

const pour: Handler<'poured'> = (state, _event, context, at) => {
  const { figures } = context;
  if (!state.flaskOut) return refuse('The flask has not been taken out of the furnace.');
  const secondsOut = secondsBetween(state.flaskOut.at, at);
  const mould = { startC: state.flaskOut.startC, roomC: figures.roomC, perSecond: figures.coolingPerSecond };
  const poured = {
    at,
    meltC: lastReading(state)?.temperatureC ?? null,
    flaskC: flaskTemperatureAt(mould, secondsOut),
    secondsOut,
  };
  return ok({
    ...state,
    step: 'quench',
    pour: poured,
    departures: [...state.departures, ...departures.ofPour(poured, context, at)],
  });
};

const quench: Handler<'quenched'> = (state, _event, context, at) => {
  if (!state.pour) return refuse('Nothing has been poured yet.');
  const waitedS = secondsBetween(state.pour.at, at);
  return ok({
    ...state,
    step: 'close',
    quenchedAt: at,
    departures: [...state.departures, ...departures.ofQuench(waitedS, context, at)],
  });
};

const close: Handler<'closed'> = (state, event, context, at) => {
  const mass = (grams: number): string => formatMass(grams, context.units.mass);
  const metalIn = chargedG(state);
  const castMassG = roundMass(metalIn - event.buttonMassG - event.lossMassG);
  if (castMassG < 0) {
    return refuse(
      `Button and loss come to ${mass(event.buttonMassG + event.lossMassG)}, but only ${mass(metalIn)} went in. Weigh again.`,
    );
  }
  const { buttonMassG, lossMassG, look, note } = event;
  const closed = {
    ...state,
    closing: { at, buttonMassG, lossMassG, castMassG, look, note },
    departures: [...state.departures, ...departures.ofClosing(event, metalIn, context, at)],
  };
  return ok(context.rules ? doneWhenExplained(closed, context) : { ...closed, step: 'done' });
};

const handlers: { readonly [Type in CardEventType]: Handler<Type> } = {
  'card-opened': (state, { worker }) =>
    state.lastEvent === null
      ? ok(worker ? { ...state, worker } : state)
      : refuse('This card is already open.'),
  'carried-on': (state, { worker }) => ok(worker ? { ...state, worker } : state),
  'guard-confirmed': confirmGuard,
  checked: check,
  'step-done': doStep,
  'step-skipped': skipStep,
  'variance-explained': explain,
  photographed: (state) => ok(state),
  'charge-weighed': (state, event, context) => changeCharge(state, event, 1, context),
  'charge-taken-out': (state, event, context) => changeCharge(state, event, -1, context),
  'charge-closed': closeCharge,
  'reading-taken': takeReading,
  'melt-ready': makeReady,
  'flask-out': takeFlaskOut,
  poured: pour,
  quenched: quench,
  closed: close,
  stopped: (state, { reason }, _context, at) =>
    state.stopped
      ? refuse('Work is already stopped.')
      : ok({
          ...state,
          stopped: reason,
          departures: [...state.departures, ...departures.ofStop(reason, at)],
        }),
  resumed: (state) => (state.stopped ? ok({ ...state, stopped: null }) : refuse('Work is not stopped.')),
  abandoned: (state) => ok({ ...state, step: 'abandoned', stopped: null }),
};

const whileStopped: readonly CardEventType[] = ['resumed', 'abandoned', 'carried-on', 'photographed'];

const refusalOnPart = (state: CardState, type: CardEventType, context: CardContext): string | null => {
  const parts = state.worker?.parts ?? null;
  if (parts && !parts.includes(state.step as CardStep)) {
    return `“${cardStepNames[state.step as CardStep]}” is not for whoever does this card now. A caster has to take it over.`;
  }
  const [open] = openSteps(state, context);
  return open && afterSteps.includes(type) ? `First: ${open.sentence}` : null;
};

const refusalFor = (state: CardState, { type }: CardEvent, context: CardContext): string | null => {
  if (isOver(state)) return 'This card is closed. Amend the melt at the desk instead.';
  if (state.lastEvent === null && type !== 'card-opened') return 'This card has not been opened.';
  if (state.stopped && !whileStopped.includes(type)) return 'Work is stopped. Resume it first.';
  const steps = allowedOn[type];
  if (steps && !steps.includes(state.step as CardStep)) {
    return `That belongs to another step: the card stands at “${cardStepNames[state.step as CardStep]}”.`;
  }
  if (type === 'closed' && state.closing) return 'The masses are written down. What is left is the reasons.';
  return steps ? refusalOnPart(state, type, context) : null;
};

/** Applies one event to a card; a refusal is one sentence, and leaves the card as it was. */
export const applyEvent = (
  state: CardState,
  { event, occurredAt }: TimedCardEvent,
  context: CardContext,
): Applied => {
  const refusal = refusalFor(state, event, context);
  if (refusal !== null) return refuse(refusal);
  // The table pairs each type with its own handler, which TypeScript cannot follow through an index.
  const handler = handlers[event.type] as Handler<CardEventType>;
  const applied = handler(state, event, context, occurredAt);
  if (!applied.ok) return applied;
  const moved = applied.value.step !== state.step || state.lastEvent === null;
  return ok({ ...applied.value, lastEvent: event.type, ...(moved ? { since: occurredAt } : {}) });
};

/** Folds a card's events, oldest first, into its state; throws when the record itself is not a possible card. */
export const foldCard = (events: readonly TimedCardEvent[], context: CardContext): CardState =>
  events.reduce((state, timed) => {
    const applied = applyEvent(state, timed, context);
    if (!applied.ok)
      throw new Error(`The record holds an impossible event (${timed.event.type}): ${applied.error}`);
    return applied.value;
  }, freshCard);
