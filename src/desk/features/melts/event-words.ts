import type { CardEvent, CastLook, StopReason } from '#shared/domain/pour-card/card-event.ts';
import { formatMass, formatTemperature, type Units } from '#shared/lib/units.ts';

const looks: Readonly<Record<CastLook, string>> = {
  full: 'the casting is full',
  misrun: 'the casting is misrun',
  porous: 'the casting is porous',
  cracked: 'the casting is cracked',
  'not-seen': 'the casting was not looked at',
};

const stops: Readonly<Record<StopReason, string>> = {
  spill: 'a spill',
  burn: 'a burn',
  equipment: 'equipment',
  other: 'another reason',
};

/** One entry of the melt book as a sentence, in the studio's units. */
export const eventWords = (event: CardEvent, units: Units): string => {
  const mass = (grams: number): string => formatMass(grams, units.mass);
  const degrees = (celsius: number): string => formatTemperature(celsius, units.temperature);
  switch (event.type) {
    case 'card-opened':
      return 'Card opened.';
    case 'carried-on':
      return 'Card carried on here.';
    case 'guard-confirmed':
      return `${event.prompts.length} safety points confirmed.`;
    case 'charge-weighed':
      return `${mass(event.massG)} of ${event.kind} weighed in.`;
    case 'charge-taken-out':
      return `${mass(event.massG)} of ${event.kind} taken out.`;
    case 'charge-closed':
      return 'Charge closed.';
    case 'reading-taken':
      return `Melt read at ${degrees(event.temperatureC)}${event.confirmed ? ', questioned and confirmed' : ''}.`;
    case 'melt-ready':
      return 'Melt ready to pour.';
    case 'flask-out':
      return event.furnaceC === null
        ? 'Flask out of the furnace; its display was not read.'
        : `Flask out of the furnace at ${degrees(event.furnaceC)}.`;
    case 'poured':
      return 'Poured.';
    case 'quenched':
      return 'Quenched.';
    case 'closed':
      return `Card closed: button ${mass(event.buttonMassG)}, loss ${mass(event.lossMassG)}, ${looks[event.look]}.${event.note ? ` “${event.note}”` : ''}`;
    case 'stopped':
      return `Work stopped because of ${stops[event.reason]}.`;
    case 'resumed':
      return 'Work resumed.';
    case 'abandoned':
      return `Card ended early: “${event.note}”`;
  }
};

const lateAfterMs = 5_000;

/** Seconds between happening and being recorded where they differ by more than five; null where they do not. */
export const recordedLateS = (occurredAt: string, recordedAt: string): number | null => {
  const ms = Date.parse(recordedAt) - Date.parse(occurredAt);
  return ms > lateAfterMs ? Math.round(ms / 1000) : null;
};
