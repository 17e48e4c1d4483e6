import { z } from 'zod';
import { fixedPoints, type FixedPointName } from '#shared/domain/instrument/fixed-point.ts';
import { instrumentKinds, type InstrumentKind } from '#shared/domain/instrument/instrument.ts';
import type { CheckDue } from '#shared/domain/instrument/pyrometer-check.ts';
import type { ThermometerFault } from '#shared/domain/instrument/read-thermometer-line.ts';
import { thermocoupleTypes, type ThermocoupleType } from '#shared/domain/instrument/thermocouple.ts';
import { instant, optionalWords, temperatureC, words, type Abilities } from './common.ts';

/** Enters an instrument; its token is told once, in the answer. */
export const createInstrumentRequest = z
  .object({
    name: words(60, 'Name the instrument.'),
    kind: z.enum(instrumentKinds, { error: 'Choose what it is.' }),
    thermocouple: z.enum(thermocoupleTypes, { error: 'Choose the letter of its thermocouple.' }).nullable(),
    terminalId: z.uuid('Choose a terminal.').nullable(),
  })
  .refine(({ kind, thermocouple }) => (kind === 'thermometer') === (thermocouple !== null), {
    error: 'A thermometer has a thermocouple; nothing else has one.',
    path: ['thermocouple'],
  });
/** Enters an instrument. */
export type CreateInstrumentRequest = z.infer<typeof createInstrumentRequest>;

/** Records a check at a freezing point; `key` is made once for it. */
export const recordCheckRequest = z.object({
  key: z.uuid(),
  point: z.enum(fixedPoints, { error: 'Choose the metal.' }),
  readC: temperatureC,
  wanderC: z
    .number({ error: 'Type how far it wandered.' })
    .min(0, 'Not below 0.')
    .max(100, 'That is no plateau.'),
  note: optionalWords(500),
  checkedAt: instant.optional(),
});
/** Records a check at a freezing point. */
export type RecordCheckRequest = z.input<typeof recordCheckRequest>;

/** A temperature as the instrument gave it and with its offset, or the fault it told. */
export interface InstrumentReading {
  readonly rawC: number | null;
  readonly offsetC: number;
  /** Raw with the offset; null where the instrument told a fault. */
  readonly temperatureC: number | null;
  readonly fault: ThermometerFault | null;
  readonly takenAt: string;
  /** How long ago that was when it was answered, seconds. */
  readonly ageS: number;
}

/** One check of an instrument. */
export interface PyrometerCheck {
  readonly id: string;
  readonly point: FixedPointName;
  readonly readC: number;
  readonly wanderC: number;
  readonly offsetC: number;
  readonly uncertaintyC: number;
  /** What it found, in words. */
  readonly sentence: string;
  readonly note: string;
  readonly person: string;
  readonly checkedAt: string;
}

/** An instrument with its last reading and its last check. */
export interface Instrument {
  readonly id: string;
  readonly name: string;
  readonly kind: InstrumentKind;
  readonly thermocouple: ThermocoupleType | null;
  readonly terminal: { readonly id: string; readonly name: string; readonly bay: string } | null;
  readonly active: boolean;
  readonly createdAt: string;
  readonly revokedAt: string | null;
  readonly lastReading: InstrumentReading | null;
  readonly lastCheck: PyrometerCheck | null;
  /** Null for a balance, which is not checked against freezing points. */
  readonly due: CheckDue | null;
  readonly abilities: Abilities<'revoke' | 'check'>;
}

/** An instrument just entered, with the token that is told this once. */
export interface CreatedInstrument {
  readonly instrument: Instrument;
  readonly token: string;
}
