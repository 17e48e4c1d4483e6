import { z } from 'zod';
import { faultOfMass } from '#shared/lib/plausible-mass.ts';

/** Path parameter naming one record. */
export const idParams = z.object({ id: z.uuid('That is not a record of ours.') });

/** A short line of words: trimmed, never empty, at most `max` characters. */
export const words = (max: number, empty: string) =>
  z.string({ error: empty }).trim().min(1, empty).max(max, `Keep it under ${max} characters.`);

/** Words that may be left out; trimmed, at most `max` characters. */
export const optionalWords = (max: number) =>
  z.string().trim().max(max, `Keep it under ${max} characters.`).default('');

const plausibleMass = (options: { readonly mayBeNone: boolean }) =>
  z.number({ error: 'Type a mass in numbers.' }).superRefine((grams, context) => {
    const message = faultOfMass(grams, options);
    if (message !== null) context.addIssue({ code: 'custom', message });
  });

/** A mass in grams that a studio could weigh: above zero, at most 100 kg. */
export const massG = plausibleMass({ mayBeNone: false });

/** A mass in grams that may be nothing. */
export const massOrNoneG = plausibleMass({ mayBeNone: true });

/** A temperature in °C within what a workshop can meet. */
export const temperatureC = z
  .number({ error: 'Type a temperature in numbers.' })
  .min(-10, 'That is colder than any workshop.')
  .max(2000, 'That is hotter than any furnace here.');

/** A clock that has lost its time begins in 1970; no record is older than this. */
const earliestMs = Date.UTC(2000, 0, 1);

/** An ISO 8601 instant with its offset, from the year 2000 on. */
export const instant = z.iso
  .datetime({ offset: true, error: 'That is not a moment in time.' })
  .refine((text) => Date.parse(text) >= earliestMs, 'That is before there were records: set the clock.');

/** What the signed-in person may do with a record, sent beside it. */
export type Abilities<Key extends string> = Readonly<Record<Key, boolean>>;
