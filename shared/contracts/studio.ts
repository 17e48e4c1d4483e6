import { z } from 'zod';
import { markPlaces, type MarkPlace } from '#shared/domain/metal/fineness-marks.ts';
import type { ProcessTables } from '#shared/domain/studio/process-tables.ts';
import type { StudioLimits } from '#shared/domain/studio/studio-limits.ts';
import { words, type Abilities } from './common.ts';

const celsius = z
  .number({ error: 'Type a temperature.' })
  .min(0, 'Not below 0.')
  .max(1500, 'Not above 1500.');
/** At least a degree wide, so that whole degrees always fit in: a card shows and judges whole ones. */
const range = z.object({ low: celsius, high: celsius }).refine(({ low, high }) => high - low >= 1, {
  error: 'The upper end must be at least 1 °C above the lower end.',
  path: ['high'],
});
const bands = z.object({ thin: range, medium: range, heavy: range });
const source = words(600, 'Say where the figures come from.');

/** The owner's tables, as sent to be stored. */
export const processTables = z
  .object({
    superheat: z.object({ vacuum: bands, centrifugal: bands }),
    flask: z.object({ silver: bands, 'yellow-gold': bands, 'rose-gold': bands, 'white-gold': bands }),
    flaskCooling: z
      .array(
        z.object({
          diameterMm: z.number().min(20, 'At least 20 mm.').max(400, 'At most 400 mm.'),
          perSecond: z.number().min(0.00005, 'Too slow to be a flask.').max(0.02, 'Too fast to be a flask.'),
        }),
      )
      .min(1, 'Keep at least one flask size.')
      .max(20),
    flaskDropC: z.number().min(1, 'At least 1.').max(200, 'At most 200.'),
    transferDropC: z.number().min(0, 'Not below 0.').max(100, 'At most 100.'),
    roomC: z.number().min(-10, 'Not below -10.').max(50, 'At most 50.'),
    waxDensityGPerCm3: z.number().min(0.7, 'Wax is denser than that.').max(1.3, 'Wax is lighter than that.'),
    buttonShare: z.number().min(0, 'Not below 0.').max(2, 'At most 2.'),
    sources: z.object({
      superheat: source,
      flask: source,
      flaskCooling: source,
      flaskDrop: source,
      transferDrop: source,
      wax: source,
      button: source,
    }),
  })
  .refine(
    ({ flask, flaskDropC, roomC }) =>
      Object.values(flask).every((family) =>
        Object.values(family).every(({ low }) => low - flaskDropC > roomC),
      ),
    // Such a flask could wait for ever, and the pour window would have no end.
    { error: 'A flask that may cool by so much would be as cold as the room.', path: ['flaskDropC'] },
  ) satisfies z.ZodType<ProcessTables>;

/** The studio's limits, as sent to be stored. */
export const studioLimits = z.object({
  chargeTolerance: z.number().min(0.001, 'At least 0.1 %.').max(0.2, 'At most 20 %.'),
  returnsShare: z.number().min(0, 'Not below 0.').max(1, 'At most 100 %.'),
  lossShare: z.number().min(0, 'Not below 0.').max(0.2, 'At most 20 %.'),
  furnaceMaxC: z.number().min(900, 'At least 900.').max(2000, 'At most 2000.'),
  questionAboveC: z.number().min(20, 'At least 20.').max(500, 'At most 500.'),
  countersignFactor: z.number().min(1, 'At least 1.').max(10, 'At most 10.'),
}) satisfies z.ZodType<StudioLimits>;

/** Changes the studio's settings; `version` is the one that was edited. */
export const updateStudioRequest = z.object({
  version: z.int().positive(),
  name: words(80, 'Name the studio.'),
  temperatureUnit: z.enum(['C', 'F']),
  massUnit: z.enum(['g', 'dwt', 'ozt']),
  timeZone: words(60, 'Choose a time zone.').refine((zone) => {
    try {
      return Boolean(new Intl.DateTimeFormat('en', { timeZone: zone }));
    } catch {
      return false;
    }
  }, 'That is not a time zone: write it like Europe/Lisbon.'),
  idleLockS: z.int().min(30, 'At least 30 seconds.').max(3600, 'At most an hour.'),
  processTables,
  limits: studioLimits,
  /** Whose fineness marks the studio works to; as it was when left out. */
  marksPlace: z.enum(markPlaces).optional(),
  /** Days between two checks of an instrument; as it was when left out. */
  pyrometerCheckDays: z
    .int('Type whole days.')
    .min(1, 'At least a day.')
    .max(366, 'At most a year.')
    .optional(),
});
/** Changes the studio's settings. */
export type UpdateStudioRequest = z.infer<typeof updateStudioRequest>;

/** The studio's settings. */
export interface Studio extends Omit<
  UpdateStudioRequest,
  'processTables' | 'limits' | 'marksPlace' | 'pyrometerCheckDays'
> {
  readonly processTables: ProcessTables;
  readonly limits: StudioLimits;
  readonly marksPlace: MarkPlace;
  readonly pyrometerCheckDays: number;
  readonly abilities: Abilities<'update'>;
}
