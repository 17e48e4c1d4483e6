import { z } from 'zod';
import type { ThermometerFault } from '#shared/domain/instrument/read-thermometer-line.ts';
import { instant, temperatureC } from './common.ts';
import type { InstrumentReading } from './instrument.ts';

const faults = ['open', 'over-range', 'under-range', 'other'] as const satisfies readonly ThermometerFault[];

const reading = z
  .object({
    temperatureC: temperatureC.optional(),
    fault: z.enum(faults, { error: `A fault is one of ${faults.join(', ')}.` }).optional(),
    takenAt: instant.optional(),
    sequence: z.int({ error: 'The number of a line is a whole one.' }).min(0).max(1_000_000_000).optional(),
  })
  .refine((each) => (each.temperatureC === undefined) !== (each.fault === undefined), {
    error: 'A reading has either temperatureC or fault.',
    path: ['temperatureC'],
  });

const batch = z.object({
  key: z.uuid('Give each delivery a key of its own, a UUID; send it again with the same one.'),
  /** Which instrument it is, where a terminal's token is used. */
  instrumentId: z.uuid('That is not an instrument of ours.').optional(),
  readings: z
    .array(reading, { error: 'Send temperatureC, or a list of readings.' })
    .min(1, 'There is no reading in it.')
    .max(600, 'At most 600 readings at a time.'),
});

const asBatch = (value: unknown): unknown => {
  if (value === null || typeof value !== 'object' || Array.isArray(value) || 'readings' in value)
    return value;
  const { key, instrumentId, ...one } = value as Readonly<Record<string, unknown>>;
  return 'temperatureC' in one || 'fault' in one ? { key, instrumentId, readings: [one] } : value;
};

/** What a logger sends: one reading, or a batch of them. */
export const pushReadingsRequest = z.preprocess(asBatch, batch);
/** A batch of readings. */
export type PushReadingsRequest = z.output<typeof pushReadingsRequest>;

/** What became of a delivery. */
export interface PushedReadings {
  readonly instrumentId: string;
  readonly recorded: number;
  /** Whether it had come before; nothing is recorded twice. */
  readonly again: boolean;
  readonly latest: InstrumentReading;
}
