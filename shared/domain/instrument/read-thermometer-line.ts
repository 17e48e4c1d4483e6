import { parseDecimal } from '#shared/lib/decimal.ts';
import { toCelsius, type Celsius, type TemperatureUnit } from '#shared/lib/units.ts';
import { thermocouples, thermocoupleTypes, type ThermocoupleType } from './thermocouple.ts';

/** Why an instrument has no temperature to tell. */
export type ThermometerFault = 'open' | 'over-range' | 'under-range' | 'other';

/** What one line of an instrument says: a temperature, a fault of its own, or nothing that can be read. */
export type ThermometerLine =
  | {
      readonly kind: 'reading';
      readonly type: ThermocoupleType;
      readonly temperatureC: Celsius;
      readonly sequence: number;
    }
  | {
      readonly kind: 'fault';
      readonly type: ThermocoupleType;
      readonly fault: ThermometerFault;
      readonly sequence: number;
      readonly sentence: string;
    }
  | { readonly kind: 'unreadable'; readonly sentence: string };

/** The longest line that is looked at, characters; a longer one is noise. */
export const longestLine = 120;

/** The sequence number after which an instrument begins again at 0. */
export const lastSequence = 9999;

const faultSentences: Readonly<Record<ThermometerFault, string>> = {
  open: 'The thermocouple is open: broken, or not plugged in. Nothing is read until it is whole again.',
  'over-range': 'The thermocouple is above its range. Take it out, or read with another.',
  'under-range':
    'The thermocouple is below its range: are its two wires the wrong way round, or is it of another type?',
  other: 'The instrument reports a fault of its own. See its sheet.',
};

/** The state an instrument writes, and the fault it means; null where all is well. */
const states: Readonly<Record<string, ThermometerFault | null>> = {
  ok: null,
  open: 'open',
  over: 'over-range',
  under: 'under-range',
  fault: 'other',
};

const unreadable = (sentence: string): ThermometerLine => ({ kind: 'unreadable', sentence });

/** The check mark of a line: all characters before the `*` combined by exclusive or, two hexadecimal digits. */
export const checkMarkOf = (text: string): string => {
  let mark = 0;
  for (const character of text) mark ^= (character.codePointAt(0) ?? 0) & 0xff;
  return mark.toString(16).toUpperCase().padStart(2, '0');
};

/** The line without its check mark; null where the mark does not fit it. A line need not carry one. */
const withoutMark = (line: string): string | null => {
  const star = line.lastIndexOf('*');
  if (star < 0) return line;
  const body = line.slice(0, star);
  return line.slice(star + 1).toUpperCase() === checkMarkOf(body) ? body : null;
};

const isType = (text: string): text is ThermocoupleType =>
  (thermocoupleTypes as readonly string[]).includes(text);
const isUnit = (text: string): text is TemperatureUnit => text === 'C' || text === 'F';

const judgeValue = (
  type: ThermocoupleType,
  {
    text,
    unit,
    sequence,
  }: { readonly text: string; readonly unit: TemperatureUnit; readonly sequence: number },
): ThermometerLine => {
  const value = parseDecimal(text);
  if (!value.ok) return unreadable(`The line’s temperature, “${text}”, is not a number.`);
  const temperatureC = toCelsius(value.value, unit);
  const { lowestC, highestC } = thermocouples[type];
  const fault = temperatureC > highestC ? 'over-range' : temperatureC < lowestC ? 'under-range' : null;
  if (fault) return { kind: 'fault', type, fault, sequence, sentence: faultSentences[fault] };
  return { kind: 'reading', type, temperatureC, sequence };
};

/**
 * Reads one line of a thermometer, `T;K;892.4;C;117;ok` with `*` and a check mark behind it where the instrument makes
 * one (docs/instruments.md). Never throws: what is not such a line comes back as unreadable, with the reason.
 */
export const readThermometerLine = (raw: string): ThermometerLine => {
  const line = raw.trim();
  if (line === '') return unreadable('The line is empty.');
  if (line.length > longestLine) return unreadable('The line is too long to be a reading.');
  const body = withoutMark(line);
  if (body === null) return unreadable('The line came damaged: its check mark does not fit.');
  const parts = body.split(';').map((part) => part.trim());
  const [mark, type = '', text = '', unit = '', count = '', state = ''] = parts;
  if (mark !== 'T' || parts.length !== 6)
    return unreadable('That is not a line of a thermometer: it has six parts, and the first is T.');
  if (!isType(type))
    return unreadable(`Type ${type || 'none'} is not one of ${thermocoupleTypes.join(', ')}.`);
  if (!/^\d{1,4}$/.test(count)) return unreadable('The line’s number is not one from 0 to 9999.');
  const sequence = Number(count);
  const fault = Object.hasOwn(states, state) ? states[state] : undefined;
  if (fault === undefined)
    return unreadable(`The state “${state}” is none of ${Object.keys(states).join(', ')}.`);
  if (fault !== null) return { kind: 'fault', type, fault, sequence, sentence: faultSentences[fault] };
  if (!isUnit(unit)) return unreadable('The unit is neither C nor F.');
  return judgeValue(type, { text, unit, sequence });
};

/** How many lines were lost between two that arrived one after the other; 0 when they follow, or when the count began anew. */
export const linesLost = (before: number, after: number): number => {
  const step = (after - before + lastSequence + 1) % (lastSequence + 1);
  // An instrument that was switched off begins at 0 again: that is no loss.
  return step === 0 || after < 2 ? 0 : step - 1;
};

/** Writes a line as an instrument would, with its check mark. */
export const writeThermometerLine = (
  type: ThermocoupleType,
  said: { readonly temperatureC: Celsius } | { readonly fault: ThermometerFault },
  sequence: number,
): string => {
  const count = sequence % (lastSequence + 1);
  const stateOf = (fault: ThermometerFault): string =>
    Object.keys(states).find((state) => states[state] === fault) ?? 'fault';
  const body =
    'fault' in said
      ? `T;${type};;C;${count};${stateOf(said.fault)}`
      : `T;${type};${said.temperatureC.toFixed(1)};C;${count};ok`;
  return `${body}*${checkMarkOf(body)}`;
};
