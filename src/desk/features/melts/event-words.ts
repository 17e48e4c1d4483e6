import type { StepAnswer } from '#shared/domain/instruction/instruction-step.ts';
import type {
  CardEvent,
  CastLook,
  PhotographSubject,
  StopReason,
} from '#shared/domain/pour-card/card-event.ts';
import { varianceReasonNames } from '#shared/domain/pour-card/variance.ts';
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

const photographed: Readonly<Record<PhotographSubject, string>> = {
  tree: 'tree',
  defect: 'defect',
  other: 'work',
};

/** What was answered at a step, in the studio's units; empty where being done is all. */
export const answerWords = (answer: StepAnswer, { mass, temperature }: Units): string => {
  switch (answer.kind) {
    case 'weigh':
      return formatMass(answer.massG, mass);
    case 'read':
      return formatTemperature(answer.temperatureC, temperature);
    case 'scan':
      return answer.code;
    case 'choose':
      return `“${answer.option}”`;
    case 'countersign':
      return `signed by ${answer.by.name}${answer.by.onDevice ? ', PIN checked by the terminal alone' : ''}`;
    default:
      return '';
  }
};

const doneWords = (answer: StepAnswer, units: Units): string => {
  const said = answerWords(answer, units);
  return said ? `done: ${said}` : 'done';
};

/** One entry of the melt book as a sentence, in the studio's units; `sentenceOf` names a step of the instruction by its key. */
export const eventWords = (
  event: CardEvent,
  units: Units,
  sentenceOf: (key: string) => string = (key) => key,
): string => {
  const mass = (grams: number): string => formatMass(grams, units.mass);
  const degrees = (celsius: number): string => formatTemperature(celsius, units.temperature);
  switch (event.type) {
    case 'card-opened':
      return 'Card opened.';
    case 'carried-on':
      return 'Card carried on here.';
    case 'guard-confirmed':
      return event.prompts.length > 0
        ? `${event.prompts.length} safety points confirmed.`
        : 'Guard confirmed.';
    case 'checked':
      return `Checked: ${event.keys.map(sentenceOf).join(' ')}`;
    case 'step-done':
      return `“${sentenceOf(event.key)}” ${doneWords(event.answer, units)}.`;
    case 'step-skipped':
      return `“${sentenceOf(event.key)}” skipped.`;
    case 'variance-explained':
      return `Reason given: ${varianceReasonNames[event.reason].toLowerCase()}${event.words ? `, “${event.words}”` : ''}${event.by ? `; signed by ${event.by.name}` : ''}${event.hold ? '; pieces held' : ''}.`;
    case 'photographed':
      return `Photograph taken of the ${photographed[event.of]}.`;
    case 'charge-weighed':
      return `${mass(event.massG)} of ${event.kind} weighed in.`;
    case 'charge-taken-out':
      return `${mass(event.massG)} of ${event.kind} taken out.`;
    case 'charge-closed':
      return event.offPlan ? 'Charge closed off its plan.' : 'Charge closed.';
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
