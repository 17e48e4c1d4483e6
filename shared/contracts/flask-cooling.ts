import { z } from 'zod';
import type { ChosenCooling } from '#shared/domain/instrument/choose-cooling.ts';
import type { CoolingFit } from '#shared/domain/instrument/fit-flask-cooling.ts';
import { temperatureC } from './common.ts';

/** Logs the temperature of a flask's mould out of the furnace; `key` is made once for a delivery. */
export const logFlaskRequest = z
  .object({
    key: z.uuid(),
    /** The casting in the flask; or, for a trial with a spare flask, the flask and an outing of its own. */
    castingId: z.uuid('That is not a casting of ours.').optional(),
    flaskId: z.uuid('That is not a flask of ours.').optional(),
    outingId: z.uuid().optional(),
    instrumentId: z.uuid('That is not an instrument of ours.').optional(),
    /** The room; the studio's own where it is left out. */
    roomC: z.number().min(-10, 'Not below -10.').max(60, 'At most 60.').optional(),
    readings: z
      .array(
        z.object({
          secondsOut: z
            .number({ error: 'Type the seconds since it came out.' })
            .min(0, 'Not below 0.')
            .max(14_400, 'At most four hours.'),
          temperatureC,
        }),
      )
      .min(1, 'There is no reading in it.')
      .max(600, 'At most 600 readings at a time.'),
  })
  .refine(
    ({ castingId, flaskId, outingId }) =>
      castingId === undefined ? flaskId !== undefined && outingId !== undefined : flaskId === undefined,
    {
      error: 'Say which casting it is; or which flask, with an outing of its own.',
      path: ['castingId'],
    },
  );
/** Logs the temperature of a flask's mould out of the furnace. */
export type LogFlaskRequest = z.input<typeof logFlaskRequest>;

/** One logged temperature of a mould. */
export interface LoggedFlaskReading {
  readonly secondsOut: number;
  readonly temperatureC: number;
}

/** One flask's time out of the furnace, as it was logged. */
export interface LoggedOuting {
  readonly id: string;
  readonly flaskCode: string;
  readonly at: string;
  readonly roomC: number;
  readonly readings: readonly LoggedFlaskReading[];
}

/** How flasks of one diameter cool: what a card uses, what the table says, and what was logged. */
export interface FlaskSizeCooling {
  readonly diameterMm: number;
  readonly chosen: ChosenCooling;
  /** The studio's table, at the nearest diameter. */
  readonly defaultPerSecond: number;
  readonly fit: CoolingFit | null;
  readonly outings: readonly LoggedOuting[];
}
